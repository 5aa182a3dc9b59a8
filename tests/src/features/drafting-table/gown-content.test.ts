import { describe, expect, it } from 'vitest';

import { gownContent } from '#shared/api/gowns.ts';
import { coreMeasures } from '#shared/body/card.ts';

import {
  choicesIn,
  choicesOf,
  contentOf,
  sameWork,
} from '../../../../src/features/drafting-table/gown-content.ts';
import {
  emptyTable,
  tableState,
  type TableAction,
} from '../../../../src/features/drafting-table/table-state.ts';
import { middleBody } from '../../../support/middle-body.ts';

const typed = (field: `style.${'neckDepth' | 'heelHeight'}`, text: string): TableAction => ({
  type: 'typed',
  field,
  text,
});

const table = coreMeasures.reduce(
  (state, key) =>
    tableState(state, { type: 'typed', field: `card.${key}`, text: String(middleBody[key] / 10) }),
  tableState({ ...emptyTable, name: 'Ida ' }, typed('style.heelHeight', 'high')),
);

describe('a gown as it is kept', () => {
  it('keeps every letter of the fields, and comes back as it lay', () => {
    const content = gownContent.parse(JSON.parse(JSON.stringify(contentOf(table, 'cm'))));
    expect(content.unread).toEqual(['style.heelHeight']);
    const { choices, unit } = choicesOf(content);
    expect(unit).toBe('cm');
    expect(choices.name).toBe('Ida ');
    expect(choices.entries).toEqual(table.entries);
    expect(contentOf(choices, unit)).toEqual(content);
  });

  it('is written in the reader’s own unit where it is laid on another table', () => {
    const { entries } = choicesIn(contentOf(table, 'cm'), 'in');
    expect(entries['card.bustGirth']).toEqual({ text: '36\u00a01⁄4', value: 920 });
    expect(entries['style.heelHeight']?.text).toBe('high');
  });

  it('leaves out what a straight top line has no use for, and finds it again under another shape', () => {
    const dipped = tableState(table, typed('style.neckDepth', '23'));
    const straight = tableState(dipped, { type: 'chosen', choice: { topLine: 'straight' } });
    const content = contentOf(straight, 'cm');
    expect(content.inputs.style).not.toHaveProperty('neckDepth');
    const { choices } = choicesOf(content);
    expect(choices.entries['style.neckDepth']).toMatchObject({ value: 230 });
  });

  it('is the same work however its figures were written', () => {
    const plain = tableState(table, typed('style.heelHeight', '5'));
    const other = tableState(table, typed('style.heelHeight', '50 mm'));
    expect(sameWork(contentOf(plain, 'cm'), contentOf(other, 'cm'))).toBe(true);
    expect(sameWork(contentOf(plain, 'cm'), contentOf(table, 'cm'))).toBe(false);
  });
});
