import { memo, type Dispatch } from 'react';

import { easeLevels, type StyleLength } from '#shared/drafts/gown/style-card.ts';
import { styleHints, styleLabels } from '#shared/drafts/gown/style-labels.ts';

import { Segmented } from '../../../ui/segmented.tsx';
import { applies } from '../table-inputs.ts';
import type { TableAction, TableState } from '../table-state.ts';
import { FigureField, fieldProps } from './figure-field.tsx';
import { TopLineChoice } from './top-line-choice.tsx';

type StyleCardProps = {
  readonly state: TableState;
  readonly dispatch: Dispatch<TableAction>;
};

const topKeys = ['topDrop', 'neckDepth', 'neckWidth', 'sideDepth', 'backDepth'] as const;
const middleKeys = ['dartLength', 'kneeLevel', 'kneeFinished'] as const;
const flareKeys = ['flareLength', 'floorClearance', 'heelHeight', 'clothWidth'] as const;

const circles = [
  { value: 0.25, label: 'quarter circle' },
  { value: 0.5, label: 'half circle' },
  { value: 0.75, label: 'three quarters' },
  { value: 1, label: 'full circle' },
] as const;

/** What the gown shall be; a figure left open takes the default that stands there in grey. */
export const StyleCard = memo(function StyleCard({ state, dispatch }: StyleCardProps) {
  const style = state.drawn.draft?.style;
  const row = (key: StyleLength) => (
    <FigureField
      key={key}
      {...fieldProps(`style.${key}`, state)}
      label={styleLabels[key]}
      hint={styleHints[key]}
      open={style?.[key]}
      dispatch={dispatch}
    />
  );
  const flare = state.entries['style.flareFraction']?.text ?? '0.5';
  return (
    <section aria-labelledby="style-card">
      <h2 id="style-card" className="heading">
        Style card
      </h2>
      <p className="pt-1 text-sm text-slate">Grey figures are the defaults for this body.</p>
      <form onSubmit={(event) => event.preventDefault()}>
        <TopLineChoice
          value={state.topLine}
          onChoose={(topLine) => dispatch({ type: 'chosen', choice: { topLine } })}
        />
        <div className="flex items-center justify-between gap-3 border-b border-rule py-1">
          <span>Shaping</span>
          <Segmented
            legend="Shaping"
            choices={[
              { value: 'princess', label: 'princess' },
              { value: 'darts', label: 'darts' },
            ]}
            value={state.shaping}
            onChoose={(shaping) => dispatch({ type: 'chosen', choice: { shaping } })}
          />
        </div>
        {topKeys.filter((key) => applies(`style.${key}`, state)).map(row)}
        {middleKeys.map(row)}
        <label className="flex items-center justify-between gap-3 border-b border-rule py-1">
          <span>{styleLabels.flareFraction}</span>
          <select
            name="style.flareFraction"
            className="h-9 rounded-one border border-rule bg-paper px-2"
            value={flare}
            onChange={(event) =>
              dispatch({
                type: 'typed',
                field: 'style.flareFraction',
                text: event.currentTarget.value,
              })
            }
          >
            {circles.map(({ value, label }) => (
              <option key={value} value={String(value)}>
                {label}
              </option>
            ))}
          </select>
        </label>
        {flareKeys.map(row)}
        {easeLevels.map((level) => (
          <FigureField
            key={level}
            {...fieldProps(`style.ease.${level}`, state)}
            label={styleLabels[`ease.${level}`]}
            hint={styleHints[`ease.${level}`]}
            open={style?.ease[level]}
            dispatch={dispatch}
          />
        ))}
      </form>
      <h3 className="pt-4 font-semibold">House rule for the side seam</h3>
      <p className="py-1 text-sm text-slate">
        Balanced gives the front a little more than a quarter at the bust; the quarter rule makes
        front and back alike.
      </p>
      <Segmented
        legend="House rule for the side seam"
        choices={[
          { value: 'balanced', label: 'balanced' },
          { value: 'quarterRule', label: 'quarter rule' },
        ]}
        value={state.preset}
        onChoose={(preset) => dispatch({ type: 'chosen', choice: { preset } })}
      />
    </section>
  );
});
