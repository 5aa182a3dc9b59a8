import type { SheetPlan } from '#shared/sheets/sheet-plan.ts';
import { printedTiles } from '#shared/sheets/tile-plan.ts';
import type { Unit } from '#shared/units/said.ts';
import { speak } from '#shared/units/speak.ts';

import { Button } from '../../../ui/button.tsx';
import { RodProgress } from '../../../ui/rod-progress.tsx';
import type { Planning } from '../../../lib/use-plan.ts';

type PlanCountProps = {
  readonly planning: Planning;
  /** The plan as it lies there, with what is left out. */
  readonly plan: SheetPlan | undefined;
  readonly unit: Unit;
  readonly onCancel: () => void;
  readonly onAgain: () => void;
};

/** The plan in one sentence, or how it comes about. */
export const PlanCount = ({ planning, plan, unit, onCancel, onAgain }: PlanCountProps) => {
  if (planning.kind === 'arranging') {
    const { progress } = planning;
    return (
      <p className="flex flex-wrap items-center gap-x-3">
        <RodProgress
          label="Arranging the pieces"
          share={progress === undefined ? undefined : progress.moves / progress.of}
        />
        <span className="figures" aria-hidden="true">
          {progress === undefined ? 'Arranging…' : `Arranging: ${progress.sheets} sheets so far`}
        </span>
        <Button kind="quiet" slim onClick={onCancel}>
          Cancel
        </Button>
      </p>
    );
  }
  return (
    <div role="status" className="figures min-w-0 leading-snug">
      {planning.kind === 'planned' && plan !== undefined && <Counted plan={plan} />}
      {planning.kind === 'waiting' && (
        <p className="text-madder">Nothing to arrange yet: mend what is marked.</p>
      )}
      {planning.kind === 'refused' && (
        <p className="text-madder">{speak(planning.problem.said, unit)}</p>
      )}
      {(planning.kind === 'called off' || planning.kind === 'failed') && (
        <p className="flex flex-wrap items-center gap-x-3">
          {planning.kind === 'failed'
            ? 'The pieces could not be arranged.'
            : 'Arranging was called off.'}
          <Button slim onClick={onAgain}>
            Arrange again
          </Button>
        </p>
      )}
    </div>
  );
};

const Counted = ({ plan }: { readonly plan: SheetPlan }) => {
  const { paper, tiles, glueSeams } = plan.plan;
  const laid = printedTiles(plan.plan).length;
  const out = tiles.length - laid;
  return (
    <>
      <p className="text-lg font-semibold">{`${counted(plan.sheets, 'sheet')} of ${paper.name}`}</p>
      <p className="text-sm text-slate">
        {[
          plan.cover === 'own sheet'
            ? `the cover and ${laid} to lay out`
            : 'the cover among the pieces',
          `${counted(glueSeams, 'seam')} to glue`,
          ...(out === 0 ? [] : [`${out} left out`]),
        ].join(' · ')}
      </p>
    </>
  );
};

const counted = (count: number, what: string): string =>
  `${count} ${what}${count === 1 ? '' : 's'}`;
