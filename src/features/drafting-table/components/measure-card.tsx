import { memo, useState, type Dispatch, type ReactNode } from 'react';

import { coreMeasures, furtherMeasures, type MeasureKey } from '#shared/body/card.ts';
import { measureGuide } from '#shared/body/measure-guide.ts';

import { focusNext } from '../../../lib/focus-next.ts';
import type { BenchAction } from '../bench.ts';
import type { FieldKey } from '../fields.ts';
import type { TableState } from '../table-state.ts';
import { BodyFigure } from './body-figure.tsx';
import { ClearCard } from './clear-card.tsx';
import { Doubts } from './doubts.tsx';
import { HowTaken } from './how-taken.tsx';
import { FigureField, fieldProps } from './figure-field.tsx';

type MeasureCardProps = {
  readonly state: TableState;
  readonly dispatch: Dispatch<BenchAction>;
  /** What else can be done with the card. */
  readonly tools?: ReactNode;
  /** Whether the card lies here without a style card. */
  readonly alone?: boolean;
  /** The last measure has been typed. */
  readonly onFilled?: () => void;
};

/** No strapless gown needs them. */
const sleeveMeasures: readonly MeasureKey[] = [
  'shoulderGirth',
  'upperArmGirth',
  'armLength',
  'wristGirth',
];

const everyMeasure = [...coreMeasures, ...furtherMeasures];

/** The list of measures beside a body figure on which the current measure's tape is lit. */
export const MeasureCard = memo(function MeasureCard({
  state,
  dispatch,
  tools,
  alone = false,
  onFilled,
}: MeasureCardProps) {
  const [current, setCurrent] = useState<FieldKey>();
  const [all, setAll] = useState(false);
  const key = everyMeasure.find((each) => current === `card.${each}`);
  const guide = key === undefined ? undefined : measureGuide[key];
  const body = state.drawn.draft?.body;

  const row = (measure: MeasureKey) => (
    <FigureField
      key={measure}
      {...fieldProps(`card.${measure}`, state)}
      label={measureGuide[measure].label}
      open={body !== undefined && measure in body.estimated ? body.measures[measure] : undefined}
      mark="est."
      describedBy="how-taken"
      dispatch={dispatch}
      onStart={setCurrent}
    />
  );

  return (
    <section aria-labelledby="measure-card">
      <h2 id="measure-card" className="heading">
        Measure card
      </h2>
      <div className="sticky -top-4 z-10 -mx-1 flex min-h-34 gap-3 border-b border-rule bg-cloth px-1 py-2 lg:min-h-44">
        <BodyFigure tape={guide?.tape} label={guide?.label ?? ''} />
        <HowTaken measure={key} unit={state.unit} />
      </div>
      <form
        onSubmit={(event) => {
          event.preventDefault();
          onFilled?.();
        }}
      >
        <label className="flex items-center justify-between gap-3 border-b border-rule py-1">
          <span className="shrink-0">Whose card</span>
          <input
            name="card.name"
            autoComplete="off"
            maxLength={60}
            className="h-9 w-0 min-w-0 grow rounded-one border border-rule bg-paper px-2"
            value={state.name}
            enterKeyHint="next"
            onChange={(event) => dispatch({ type: 'named', name: event.currentTarget.value })}
            onKeyDown={(event) => {
              if (event.key !== 'Enter') return;
              event.preventDefault();
              focusNext(event.currentTarget);
            }}
          />
        </label>
        {alone && (
          <label className="flex items-center justify-between gap-3 border-b border-rule py-1">
            <span className="shrink-0">Measured on</span>
            <input
              name="card.date"
              type="date"
              className="h-9 rounded-one border border-rule bg-paper px-2"
              value={state.date ?? ''}
              onChange={(event) =>
                dispatch({ type: 'put', parts: { date: event.currentTarget.value || null } })
              }
              onKeyDown={(event) => {
                if (event.key !== 'Enter') return;
                event.preventDefault();
                focusNext(event.currentTarget);
              }}
            />
          </label>
        )}
        {coreMeasures.map(row)}
        <Doubts state={state} dispatch={dispatch} />
        <button
          type="button"
          aria-expanded={all}
          className="min-h-10 font-semibold text-brass"
          onClick={() => setAll(!all)}
        >
          {all ? 'Only the ten measures' : `All measures (${everyMeasure.length})`}
        </button>
        <ClearCard what={alone ? 'card' : 'table'} state={state} dispatch={dispatch} />
        {tools}
        {all && (
          <>
            <p className="pb-2 text-sm text-slate">
              What you leave open is estimated from the ten, marked est.
            </p>
            {furtherMeasures.filter((measure) => !sleeveMeasures.includes(measure)).map(row)}
            <h3 className="heading pt-4">For sleeves, later</h3>
            {sleeveMeasures.map(row)}
          </>
        )}
      </form>
    </section>
  );
});
