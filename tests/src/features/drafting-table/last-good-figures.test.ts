import { expect, test } from 'vitest';

import { coreMeasures } from '#shared/body/card.ts';

import { lastGoodFigures } from '../../../../src/features/drafting-table/last-good-figures.ts';
import {
  emptyTable,
  tableState,
  type TableAction,
  type TableState,
} from '../../../../src/features/drafting-table/table-state.ts';

const centimetres = [92, 78, 72.4, 98, 19, 26.5, 33.5, 44, 20.5, 106];

const table = (...actions: readonly TableAction[]): TableState =>
  [
    ...coreMeasures.map((key, index): TableAction => ({
      type: 'typed',
      field: `card.${key}`,
      text: String(centimetres[index]),
    })),
    ...actions,
  ].reduce(tableState, emptyTable);

const printed = (state: TableState): readonly string[] =>
  state.drawn.draft === undefined ? [] : lastGoodFigures(state, state.drawn.draft);

test('a fresh drawing prints what stands in the fields, and nothing is said', () => {
  const state = table({ type: 'typed', field: 'style.neckWidth', text: '8' });
  expect(state.drawn.fresh).toBe(true);
  expect(printed(state)).toEqual([]);
});

test('a figure that cannot be drawn is named with the one that is printed', () => {
  const wrong = table({ type: 'typed', field: 'card.waistGirth', text: '720' });
  expect(wrong.drawn.fresh).toBe(false);
  expect(printed(wrong)).toEqual(['Waist: prints with 72.4 cm, the last good figure']);
  const open = table({ type: 'typed', field: 'card.waistGirth', text: '' });
  expect(printed(open)).toEqual(printed(wrong));
});

test('what was left open and what was chosen meanwhile are named too', () => {
  const state = table(
    { type: 'typed', field: 'style.heelHeight', text: 'high' },
    { type: 'chosen', choice: { shaping: 'darts' } },
  );
  expect(printed(state)).toEqual([
    'Heel height: prints as left open, the last good figure',
    'Shaping: prints princess, the last that held',
  ]);
});
