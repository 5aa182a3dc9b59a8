import { memo, useId, useState, type Dispatch } from 'react';

import type { OptionWords } from '#shared/drafts/gown/choice-words.ts';

import { choiceDrawings, type Line, type Look } from '../choice-drawings.ts';
import { choiceMade, type TableChoice } from '../style-choices.ts';
import { tableChoiceWords } from '../table-choice-words.ts';
import type { TableAction } from '../table-state.ts';

type ChoiceFieldProps = {
  readonly choice: TableChoice;
  readonly value: string;
  /** Why it cannot be drawn as it is chosen here. */
  readonly fault?: string | undefined;
  readonly dispatch: Dispatch<TableAction>;
};

/** The options of one choice side by side, each in one small drawing and its word; one sentence says what it does. */
export const ChoiceField = memo(function ChoiceField(props: ChoiceFieldProps) {
  const { choice, value, fault, dispatch } = props;
  const id = useId();
  const [looked, setLooked] = useState<string>();
  const { label } = tableChoiceWords[choice];
  const options = Object.entries<OptionWords>(tableChoiceWords[choice].options);
  const drawings = new Map(Object.entries<readonly Line[]>(choiceDrawings[choice]));
  const told = options.find(([option]) => option === (looked ?? value))?.[1];
  return (
    <fieldset
      className="border-b border-rule py-2"
      aria-describedby={fault === undefined ? undefined : `${id}-fault`}
    >
      <legend className="float-left w-full pb-1">{label}</legend>
      <div
        className="clear-both grid grid-cols-4 gap-1"
        onPointerLeave={() => setLooked(undefined)}
      >
        {options.map(([option, { word, says }]) => (
          <label
            key={option}
            onPointerEnter={() => setLooked(option)}
            className="relative cursor-pointer rounded-one border border-transparent px-0.5 py-1 text-center text-xs leading-tight text-slate has-checked:border-brass has-checked:bg-paper has-checked:font-semibold has-checked:text-ink has-focus-visible:outline-2 has-focus-visible:outline-brass"
          >
            <input
              type="radio"
              name={`${id}-${choice}`}
              value={option}
              className="absolute inset-0 cursor-pointer appearance-none outline-none"
              checked={option === value}
              aria-description={says}
              onChange={() => {
                setLooked(undefined);
                dispatch({ type: 'chosen', choice: choiceMade(choice, option) });
              }}
            />
            <ChoiceDrawing lines={drawings.get(option) ?? []} chosen={option === value} />
            {word}
          </label>
        ))}
      </div>
      <p className="min-h-5 pt-1 text-sm leading-snug text-slate">{told?.says}</p>
      {fault !== undefined && (
        <p id={`${id}-fault`} className="pt-1 text-sm leading-snug text-madder">
          {fault}
        </p>
      )}
    </fieldset>
  );
});

const looks: { readonly [L in Look]: string } = {
  cut: 'stroke-[1.4]',
  seam: 'stroke-1 [stroke-dasharray:2.5_1.5]',
  thin: 'stroke-[0.8]',
  hair: 'stroke-[0.5] opacity-70',
};

const mirror = 'matrix(-1 0 0 1 40 0)';

const ChoiceDrawing = ({ lines, chosen }: { lines: readonly Line[]; chosen: boolean }) => (
  <svg
    viewBox="0 0 40 50"
    className={`mx-auto h-12 w-10 fill-none ${chosen ? 'stroke-brass' : 'stroke-slate'}`}
    strokeLinejoin="round"
    strokeLinecap="round"
    aria-hidden="true"
  >
    {lines.flatMap(({ look, d, once }) =>
      (once === true ? [undefined] : [undefined, mirror]).map((transform) => (
        <path key={`${d}${transform ?? ''}`} d={d} transform={transform} className={looks[look]} />
      )),
    )}
  </svg>
);
