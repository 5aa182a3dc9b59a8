import { memo } from 'react';

import type { Draft } from '#shared/engine/draft.ts';
import { speak } from '#shared/units/speak.ts';

import type { TableState } from '../table-state.ts';

type FootProps = { readonly draft: Draft; readonly state: TableState };

/** Under the drawing: whether it is that of the figures typed, what the knee allows, and each warning once. */
export const Foot = memo(function Foot({ draft, state: { drawn, unit } }: FootProps) {
  const faults = drawn.problems.filter((problem) => problem.severity === 'error');
  return (
    <div className="figures max-h-28 min-h-15 shrink-0 space-y-1 overflow-y-auto border-t border-rule px-4 py-2 text-sm sm:pl-10">
      <div role="status">
        {!drawn.fresh && (
          <p className="font-semibold text-madder">
            {faults[0] === undefined
              ? 'This is the last drawing. It follows again once the ten measures are in.'
              : `This is the last drawing that held. ${speak(faults[0].said, unit)}`}
          </p>
        )}
      </div>
      {drawn.fresh &&
        drawn.problems.map((problem) => (
          <p key={`${problem.field} ${problem.code}`}>{speak(problem.said, unit)}</p>
        ))}
      <p className={draft.walking.caution ? '' : 'text-slate'}>{speak(draft.walking.said, unit)}</p>
    </div>
  );
});
