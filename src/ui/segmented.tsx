import { useId } from 'react';

export type Choice<T extends string> = { readonly value: T; readonly label: string };

type SegmentedProps<T extends string> = {
  readonly legend: string;
  readonly choices: readonly Choice<T>[];
  readonly value: T;
  readonly onChoose: (value: T) => void;
};

/**
 * A few choices side by side, one of them taken: radio buttons in a row. The hidden legend stays inside the row,
 * else a column that scrolls would lengthen the page by it.
 */
export function Segmented<T extends string>({
  legend,
  choices,
  value,
  onChoose,
}: SegmentedProps<T>) {
  const name = useId();
  return (
    <fieldset className="relative inline-flex rounded-one border border-rule bg-cloth p-px">
      <legend className="sr-only">{legend}</legend>
      {choices.map((choice) => (
        <label
          key={choice.value}
          className="relative cursor-pointer rounded-one px-3 py-1 text-slate has-checked:bg-paper has-checked:font-semibold has-checked:text-ink has-focus-visible:outline-2 has-focus-visible:outline-brass"
        >
          <input
            type="radio"
            name={name}
            className="absolute inset-0 cursor-pointer appearance-none outline-none"
            checked={choice.value === value}
            onChange={() => onChoose(choice.value)}
          />
          {choice.label}
        </label>
      ))}
    </fieldset>
  );
}
