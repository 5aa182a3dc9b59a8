import { memo, type Dispatch } from 'react';

import type { Drafted } from '#shared/engine/drafted.ts';
import { coreMeasures } from '#shared/body/card.ts';
import { measureGuide } from '#shared/body/measure-guide.ts';
import { speak } from '#shared/units/speak.ts';

import { useMedia } from '../../../lib/use-media.ts';
import { Button } from '../../../ui/button.tsx';
import { problemWords } from '../problem-words.ts';
import type { TableAction, TableState } from '../table-state.ts';
import { useNearest } from '../use-nearest.ts';

type FootProps = {
  readonly draft: Drafted;
  readonly state: TableState;
  readonly dispatch: Dispatch<TableAction>;
};

/** Under the drawing: whether it is that of the figures typed, what the knee allows, and each warning once that nobody has answered. */
export const Foot = memo(function Foot({ draft, state, dispatch }: FootProps) {
  const wayOut = useNearest(state);
  const narrow = useMedia('(max-width: 639px)');
  const { drawn, unit } = state;
  const fault = drawn.problems.find((problem) => problem.severity === 'error');
  const doubts = drawn.fresh
    ? drawn.problems.filter(({ overruled }) => overruled === undefined)
    : [];
  const notes = doubts.map((problem) => (
    <p key={`${problem.field} ${problem.code}`}>{speak(problem.said, unit)}</p>
  ));
  // On a phone several notes would leave no room for what they are about.
  const folded = narrow && doubts.length > 1;
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
      {wayOut !== undefined && (
        <p className="flex flex-wrap items-center gap-x-3">
          The nearest that can be drawn:
          <Button slim onClick={() => dispatch({ type: 'put', parts: wayOut.parts })}>
            {wayOut.words}
          </Button>
        </p>
      )}
      {folded ? (
        <details>
          <summary>{`${doubts.length} notes on this drawing`}</summary>
          {notes}
        </details>
      ) : (
        notes
      )}
      {'walking' in draft && (
        <p
          className={`${draft.walking.caution ? '' : 'text-slate'} ${drawn.fresh ? '' : 'max-sm:hidden'}`}
        >
          {speak(draft.walking.said, unit)}
        </p>
      )}
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
