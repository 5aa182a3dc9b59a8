import { describe, expect, it } from 'vitest';

import { gownContent } from '#shared/api/gowns.ts';
import { coreMeasures } from '#shared/body/card.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import type { HouseRules } from '#shared/drafting/house-rules.ts';

import {
  choicesIn,
  choicesOf,
  contentOf,
  sameWork,
} from '../../../../src/features/drafting-table/gown-content.ts';
import { presetOf } from '../../../../src/features/drafting-table/table-inputs.ts';
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

  it('keeps house rules of a workroom’s own, figure for figure', () => {
    const own: HouseRules = {
      ...balanced,
      sideShare: 0.3,
      intakes: { topLine: 38, underbust: 50, waistSeam: 50, waist: 25 },
    };
    const laid = tableState(emptyTable, {
      type: 'gown laid',
      gown: { card: middleBody, style: {}, rules: own },
    });
    const content = contentOf(laid, 'cm');
    expect(content.inputs.rules).toEqual(own);
    const { choices } = choicesOf(content);
    expect(contentOf(choices, 'in').inputs.rules).toEqual(own);
    expect(presetOf(own)).toBeUndefined();
  });

  it('tells what was typed over a preset from the preset, which stands again once it is emptied', () => {
    const wide = tableState(table, { type: 'typed', field: 'rules.sideShare', text: '60' });
    const content = contentOf(wide, 'cm');
    expect(content.inputs.rules).toEqual({ ...balanced, sideShare: 0.6 });
    const { choices } = choicesOf(content);
    expect(choices.rules).toEqual(balanced);
    const emptied = tableState(
      { ...emptyTable, ...choices },
      { type: 'typed', field: 'rules.sideShare', text: '' },
    );
    expect(contentOf(emptied, 'cm').inputs.rules).toEqual(balanced);
  });

  it('leaves out figures of choices not made, and finds them again with the choice', () => {
    const banded = tableState(table, { type: 'chosen', choice: { sleeve: 'pleatedBand' } });
    const deep = tableState(banded, { type: 'typed', field: 'style.bandHeight', text: '12' });
    expect(contentOf(deep, 'cm').inputs.style).toMatchObject({
      sleeve: 'pleatedBand',
      bandHeight: 120,
    });
    const bare = tableState(deep, { type: 'chosen', choice: { sleeve: 'none' } });
    expect(contentOf(bare, 'cm').inputs.style).not.toHaveProperty('bandHeight');
    const back = tableState(bare, { type: 'chosen', choice: { sleeve: 'plainBand' } });
    expect(contentOf(back, 'cm').inputs.style).toMatchObject({ bandHeight: 120 });
  });

  it('is the same work however its figures were written', () => {
    const plain = tableState(table, typed('style.heelHeight', '5'));
    const other = tableState(table, typed('style.heelHeight', '50 mm'));
    expect(sameWork(contentOf(plain, 'cm'), contentOf(other, 'cm'))).toBe(true);
    expect(sameWork(contentOf(plain, 'cm'), contentOf(table, 'cm'))).toBe(false);
  });
});
