import type { Choice } from './segmented.tsx';

type SelectProps<T extends string> = {
  readonly name: string;
  readonly choices: readonly Choice<T>[];
  readonly value: T;
  readonly onChoose: (value: T) => void;
  readonly id?: string;
  readonly disabled?: boolean;
  readonly 'aria-label'?: string;
};

/** One of several choices, more than fit side by side. */
export function Select<T extends string>({ choices, value, onChoose, ...rest }: SelectProps<T>) {
  return (
    <select
      {...rest}
      className="h-9 min-w-0 rounded-one border border-rule bg-paper px-2 disabled:opacity-60 pointer-coarse:h-11"
      value={value}
      onChange={(event) => {
        const chosen = choices.find((each) => each.value === event.currentTarget.value);
        if (chosen !== undefined) onChoose(chosen.value);
      }}
    >
      {choices.map((each) => (
        <option key={each.value} value={each.value}>
          {each.label}
        </option>
      ))}
    </select>
  );
}
