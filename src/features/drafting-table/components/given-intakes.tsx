import type { Dispatch } from 'react';

import type { HouseRules } from '#shared/drafting/house-rules.ts';
import { intakeFigures } from '#shared/drafting/intake-figures.ts';
import { isOffShoulder } from '#shared/drafts/gown/style-card.ts';

import { Segmented } from '../../../ui/segmented.tsx';
import type { TableAction, TableState } from '../table-state.ts';
import { FigureField, fieldProps } from './figure-field.tsx';

type GivenIntakesProps = {
  readonly state: TableState;
  readonly dispatch: Dispatch<TableAction>;
};

/** What most dressmakers take in by habit: 1 1/2 in at the top, 2 and 2 and 1 below (common practice, no source), mm. */
const usual: Required<HouseRules>['intakes'] = {
  topLine: 38.1,
  underbust: 50.8,
  waistSeam: 50.8,
  waist: 25.4,
};

/** Whether darts are derived from the body or given outright, and where a gown off the shoulder ends. */
export const GivenIntakes = ({ state, dispatch }: GivenIntakesProps) => {
  const { rules } = state;
  const put = (next: HouseRules) =>
    dispatch({ type: 'put', parts: { rules: JSON.stringify(next) } });
  const { intakes: _, ...derived } = rules;
  const given = rules.intakes;
  return (
    <>
      <h3 className="pt-3 pb-1 font-semibold">Dart intakes</h3>
      <Segmented
        legend="Dart intakes"
        choices={[
          { value: 'derived', label: 'from the body' },
          { value: 'given', label: 'given outright' },
        ]}
        value={given === undefined ? 'derived' : 'given'}
        onChoose={(chosen) => put(chosen === 'given' ? { ...rules, intakes: usual } : derived)}
      />
      <p className="pt-1 text-sm leading-snug text-slate">
        {given === undefined
          ? 'Side seam and darts share what lies between bust, waist and hip.'
          : 'The side seam takes whatever these leave; the proof says where it bulges.'}
      </p>
      {given !== undefined &&
        intakeFigures.map(({ place, label, hint }) => (
          <FigureField
            key={place}
            {...fieldProps(`rules.intakes.${place}`, state)}
            label={label}
            hint={hint}
            open={given[place]}
            dispatch={dispatch}
          />
        ))}
      {isOffShoulder(state) && (
        <>
          <h3 className="pt-3 pb-1 font-semibold">Off the shoulder the top ends at</h3>
          <Segmented
            legend="Off the shoulder the top ends at"
            choices={[
              { value: 'across', label: 'width across' },
              { value: 'shoulder', label: 'shoulder width' },
            ]}
            value={rules.armholeAt}
            onChoose={(armholeAt) => put({ ...rules, armholeAt })}
          />
        </>
      )}
    </>
  );
};
