import { describe, expect, test } from 'vitest';

import { coreMeasures } from '#shared/body/card.ts';
import { quarterRule } from '#shared/drafting/house-rule-presets.ts';

import { keepTable, keptTable } from '../../../../src/features/drafting-table/saved-table.ts';
import {
  emptyTable,
  tableState,
  type TableState,
} from '../../../../src/features/drafting-table/table-state.ts';

const inches = [36.25, 30, 28.375, 38.5, 7.5, 10.5, 13.25, 17.375, 8, 41.75];

/** The ten measures typed one after the other, as a maker in inches does. */
const typedTable = (): TableState =>
  coreMeasures.reduce(
    (state, key, index) =>
      tableState(state, { type: 'typed', field: `card.${key}`, text: String(inches[index]) }),
    tableState(emptyTable, { type: 'unit', unit: 'in' }),
  );

/** A browser's storage in a drawer of its own. */
function drawer(text?: string): Storage {
  const kept = new Map<string, string>(text === undefined ? [] : [['ellwand.table', text]]);
  return {
    getItem: (key) => kept.get(key) ?? null,
    setItem: (key, value) => void kept.set(key, value),
    removeItem: (key) => void kept.delete(key),
    clear: () => kept.clear(),
    key: () => null,
    length: kept.size,
  };
}

describe('typing on the drafting table', () => {
  test('a drawing lies there from the tenth measure on, not before', () => {
    const ten = typedTable();
    expect(ten.drawn.fresh).toBe(true);
    expect(ten.drawn.draft?.inputs.card.bustGirth).toBeCloseTo(920.75, 6);
    const nine = tableState(ten, { type: 'typed', field: 'card.hipGirth', text: '' });
    expect(nine.drawn.fresh).toBe(false);
  });

  test('what cannot be read stays as typed, and the last drawing stays with it', () => {
    const ten = typedTable();
    const odd = tableState(ten, { type: 'typed', field: 'card.hipGirth', text: '38 1/' });
    expect(odd.entries['card.hipGirth']?.text).toBe('38 1/');
    expect(odd.drawn.draft).toBe(ten.drawn.draft);
    expect(odd.drawn.fresh).toBe(false);
    expect(odd.drawn.problems.map(({ field }) => field)).toEqual(['card.hipGirth']);
    const settled = tableState(odd, { type: 'settled', field: 'card.hipGirth' });
    expect(settled.entries['card.hipGirth']?.text).toBe('38 1/');
  });

  test('a figure outside its bounds is refused under its field before the card is full', () => {
    const one = tableState(emptyTable, { type: 'typed', field: 'card.hipGirth', text: '980' });
    expect(one.drawn.problems.map(({ field, code }) => [field, code])).toEqual([
      ['card.hipGirth', 'out-of-range'],
    ]);
  });

  test('switching to centimetres and back keeps the exact value', () => {
    const odd = tableState(typedTable(), {
      type: 'typed',
      field: 'card.waistGirth',
      text: '28 5/16',
    });
    const there = tableState(odd, { type: 'unit', unit: 'cm' });
    expect(there.entries['card.waistGirth']).toEqual({ text: '71.9', value: 719.1375 });
    const back = tableState(there, { type: 'unit', unit: 'in' });
    expect(back.entries['card.waistGirth']).toEqual({ text: '28\u00a05⁄16', value: 719.1375 });
  });

  test('a handle and the style card are one figure', () => {
    const moved = tableState(typedTable(), {
      type: 'moved',
      field: 'style.kneeFinished',
      value: 800.1,
    });
    expect(moved.entries['style.kneeFinished']).toEqual({ text: '31\u00a01⁄2', value: 800.1 });
    expect(moved.drawn.draft?.style).toMatchObject({ kneeFinished: 800.1 });
  });

  test('an emptied style figure takes its default again', () => {
    const first = typedTable();
    const set = tableState(first, { type: 'moved', field: 'style.neckWidth', value: 90 });
    const emptied = tableState(set, { type: 'typed', field: 'style.neckWidth', text: '' });
    expect(emptied.drawn.draft?.style).toEqual(first.drawn.draft?.style);
  });
});

describe('the table kept in the browser', () => {
  test('comes back with its drawing, its unit and what could not be read', () => {
    const storage = drawer();
    const odd = tableState(typedTable(), {
      type: 'typed',
      field: 'style.heelHeight',
      text: 'high',
    });
    const even = tableState(odd, { type: 'ruled', rules: quarterRule });
    expect(keepTable(even, storage)).toBe(true);
    const back = keptTable('cm', storage);
    expect(back.unit).toBe('in');
    expect(back.rules).toEqual(quarterRule);
    expect(back.entries['style.heelHeight']?.text).toBe('high');
    const mended = tableState(back, { type: 'typed', field: 'style.heelHeight', text: '2' });
    expect(mended.drawn.draft?.number).toBe(
      tableState(even, { type: 'typed', field: 'style.heelHeight', text: '2' }).drawn.draft?.number,
    );
  });

  test.each([
    ['nothing', undefined],
    ['no JSON', '{"version":1,'],
    ['another version', '{"version":99,"unit":"in"}'],
    ['a list', '[]'],
    ['wrong kinds', '{"version":1,"unit":7,"name":{},"entries":{"card.bustGirth":{"value":"92"}}}'],
    ['unknown fields', '{"version":1,"entries":{"__proto__":{"value":1},"card.shoe":{"value":1}}}'],
  ])('that holds %s gives an empty card', (_, text) => {
    expect(keptTable('in', drawer(text)).drawn).toEqual(emptyTable.drawn);
  });
});
