import { memo } from 'react';

import type { Draft } from '#shared/engine/draft.ts';
import { coreMeasures } from '#shared/body/card.ts';
import { measureGuide } from '#shared/body/measure-guide.ts';
import { speak } from '#shared/units/speak.ts';

import { problemWords } from '../problem-words.ts';
import type { TableState } from '../table-state.ts';

type FootProps = { readonly draft: Draft; readonly state: TableState };

/** Under the drawing: whether it is that of the figures typed, what the knee allows, and each warning once. */
export const Foot = memo(function Foot({ draft, state }: FootProps) {
  const { drawn, unit } = state;
  const fault = drawn.problems.find((problem) => problem.severity === 'error');
  return (
    <div className="figures max-h-[30dvh] min-h-15 shrink-0 space-y-1 overflow-y-auto border-t border-rule px-4 py-2 text-sm sm:max-h-none sm:pl-10">
      <div role="status">
        {!drawn.fresh && (
          <p className="font-semibold text-madder">
            {fault === undefined
              ? `This is the last drawing. ${stillOpen(state)}`
              : `This is the last drawing that held. ${problemWords(fault, state)}`}
          </p>
        )}
      </div>
      {drawn.fresh &&
        drawn.problems.map((problem) => (
          <p key={`${problem.field} ${problem.code}`}>{speak(problem.said, unit)}</p>
        ))}
      <p
        className={`${draft.walking.caution ? '' : 'text-slate'} ${drawn.fresh ? '' : 'max-sm:hidden'}`}
      >
        {speak(draft.walking.said, unit)}
      </p>
    </div>
  );
});

/** Which of the ten measures the drawing waits for. */
function stillOpen({ entries }: TableState): string {
  const open = coreMeasures
    .filter((key) => entries[`card.${key}`] === undefined)
    .map((key) => measureGuide[key].label);
  const [first, ...others] = open;
  if (first === undefined) return '';
  const names = [first, ...others.map((label) => label.toLowerCase())].join(', ');
  return others.length === 0
    ? `${names} is still open: the drawing follows once it is in.`
    : `${names} are still open: the drawing follows once they are in.`;
}
