import type { Dispatch } from 'react';

import { coreMeasures } from '#shared/body/card.ts';
import { measureGuide } from '#shared/body/measure-guide.ts';

import { Button } from '../../../ui/button.tsx';
import { valueOf } from '../fields.ts';
import { problemWords } from '../problem-words.ts';
import type { TableAction, TableState } from '../table-state.ts';
import { Samples } from './samples.tsx';

type EmptyTableProps = {
  readonly state: TableState;
  readonly dispatch: Dispatch<TableAction>;
  readonly onType: () => void;
};

/** Before there is a drawing: the rod fills with the measures as they are typed. */
export const EmptyTable = ({ state, dispatch, onType }: EmptyTableProps) => {
  const taken = coreMeasures.filter((key) => valueOf(state.entries[`card.${key}`]) !== undefined);
  const open = coreMeasures.filter((key) => !taken.includes(key));
  const faults = state.drawn.problems.filter((problem) => problem.severity === 'error');
  return (
    <div className="flex min-h-0 grow flex-col items-start gap-4 overflow-y-auto p-4 sm:p-10">
      <MeasureRod taken={taken} />
      <p className="text-xl font-semibold sm:text-2xl">
        {taken.length === 0 ? 'Type ten measures' : `${taken.length} of 10 measures`}
      </p>
      {taken.length > 0 && open.length > 0 && (
        <p className="max-w-prose">
          {`Still open: ${open.map((key) => measureGuide[key].label.toLowerCase()).join(', ')}.`}
        </p>
      )}
      {faults.map((problem) => (
        <p key={`${problem.field} ${problem.code}`} className="figures max-w-prose text-madder">
          {problemWords(problem, state)}
        </p>
      ))}
      {taken.length === 0 && (
        <>
          <p className="max-w-prose">
            The pieces of a strapless gown appear here, proven to sew together, and follow every
            figure you change. Or lay out a sample body and look round first.
          </p>
          <Button kind="primary" onClick={onType}>
            Type ten measures
          </Button>
          <h2 className="heading pt-4">Sample bodies</h2>
          <Samples dispatch={dispatch} />
        </>
      )}
    </div>
  );
};

/** A rod of ten marks; each measure taken fills one stretch with brass. */
const MeasureRod = ({ taken }: { taken: readonly string[] }) => (
  <svg viewBox="0 0 402 26" className="h-auto w-full max-w-xl shrink-0" aria-hidden="true">
    {coreMeasures.map((key, index) => (
      <rect
        key={key}
        x={1 + index * 40}
        y={16}
        width={40}
        height={8}
        className={taken.includes(key) ? 'fill-brass' : 'fill-transparent'}
      />
    ))}
    <path
      d={`M1 24H401${Array.from({ length: 21 }, (_, mark) => `M${1 + mark * 20} 24V${mark % 2 === 0 ? 4 : 15}`).join('')}`}
      className="fill-none stroke-brass"
      strokeWidth={1.5}
    />
  </svg>
);
