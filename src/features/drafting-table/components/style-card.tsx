import { memo, type Dispatch } from 'react';

import { easeLevels, type StyleChoice, type StyleLength } from '#shared/drafts/gown/style-card.ts';
import { styleHints, styleLabels } from '#shared/drafts/gown/style-labels.ts';

import { messageFor } from '../problem-words.ts';
import { applies } from '../style-choices.ts';
import type { TableAction, TableState } from '../table-state.ts';
import { BlockStyle } from './block-style.tsx';
import { ChoiceField } from './choice-field.tsx';
import { FigureField, fieldProps } from './figure-field.tsx';
import { FlareFraction } from './flare-fraction.tsx';
import { HouseRulesPanel } from './house-rules-panel.tsx';

type StyleCardProps = {
  readonly state: TableState;
  readonly dispatch: Dispatch<TableAction>;
};

type Item = { readonly choice: StyleChoice } | { readonly figure: StyleLength };

const choice = (each: StyleChoice): Item => ({ choice: each });
const figures = (...keys: readonly StyleLength[]): readonly Item[] =>
  keys.map((figure) => ({ figure }));

/** The card from the top of the gown down; every choice stands before the figures it brings with it. */
const parts: readonly { readonly title: string; readonly items: readonly Item[] }[] = [
  {
    title: 'Top',
    items: [
      choice('topLine'),
      ...figures('topDrop', 'neckDepth', 'neckWidth', 'sideDepth', 'backDepth'),
      choice('sleeve'),
      ...figures('bandHeight', 'pleatRatio', 'armEase'),
      choice('shaping'),
      choice('waistSeam'),
      ...figures('waistSeamRise'),
    ],
  },
  {
    title: 'Skirt',
    items: [
      ...figures('dartLength', 'kneeLevel', 'kneeFinished'),
      choice('flare'),
      ...figures('flareFraction', 'hemSweep', 'flareLength', 'floorClearance', 'heelHeight'),
      ...figures('train'),
    ],
  },
  {
    title: 'Closing and inside',
    items: [choice('closure'), choice('facing'), choice('lining'), choice('boning')],
  },
  { title: 'Cloth', items: [choice('cloth'), ...figures('stretch', 'shrinkage', 'clothWidth')] },
];

/** What the gown shall be; a figure left open takes the default that stands there in grey. */
export const StyleCard = memo(function StyleCard({ state, dispatch }: StyleCardProps) {
  const draft = state.drawn.draft;
  const style = draft?.garment === 'gown' ? draft.style : undefined;
  const figure = (key: StyleLength) =>
    key === 'flareFraction' ? (
      <FlareFraction
        key={key}
        text={state.entries['style.flareFraction']?.text}
        dispatch={dispatch}
      />
    ) : (
      <FigureField
        key={key}
        {...fieldProps(`style.${key}`, state)}
        label={styleLabels[key]}
        hint={styleHints[key]}
        open={style?.[key]}
        dispatch={dispatch}
      />
    );
  const item = (each: Item) => {
    if ('figure' in each) return applies(`style.${each.figure}`, state) && figure(each.figure);
    return (
      <ChoiceField
        key={each.choice}
        choice={each.choice}
        value={state[each.choice]}
        fault={messageFor(`style.${each.choice}`, state.drawn.problems, state)}
        dispatch={dispatch}
      />
    );
  };
  const gownParts = () => (
    <>
      {parts.map(({ title, items }) => (
        <div key={title} className="pt-3">
          <h3 className="font-semibold">{title}</h3>
          {items.map(item)}
        </div>
      ))}
      <h3 className="pt-4 font-semibold">Ease</h3>
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
    </>
  );
  return (
    <section aria-labelledby="style-card">
      <h2 id="style-card" className="heading">
        Style card
      </h2>
      <p className="pt-1 text-sm text-slate">Grey figures are the defaults for this body.</p>
      <form onSubmit={(event) => event.preventDefault()}>
        <ChoiceField choice="garment" value={state.garment} dispatch={dispatch} />
        {state.garment === 'gown' ? gownParts() : <BlockStyle state={state} dispatch={dispatch} />}
        <HouseRulesPanel state={state} dispatch={dispatch} />
      </form>
    </section>
  );
});
