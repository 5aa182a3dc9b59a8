import { describe, expect, it } from 'vitest';

import { balanced } from '#shared/drafting/house-rule-presets.ts';
import type { MeasureCard } from '#shared/body/card.ts';

import { nearest } from '../../../../src/features/drafting-table/nearest.ts';
import {
  emptyTable,
  tableState,
  type TableAction,
  type TableState,
} from '../../../../src/features/drafting-table/table-state.ts';
import { middleBody } from '../../../support/middle-body.ts';

/** A gown of this body on the table, and what the maker does to it. */
const table = (card: MeasureCard, ...actions: readonly TableAction[]): TableState =>
  actions.reduce(
    tableState,
    tableState(emptyTable, { type: 'gown laid', gown: { card, style: {}, rules: balanced } }),
  );

/** The table once the way out is taken. */
function taken(state: TableState): TableState {
  const way = nearest(state);
  return way === undefined ? state : tableState(state, { type: 'put', parts: way.parts });
}

describe('what cannot be drawn', () => {
  it('offers the bound a figure broke, and draws it', () => {
    const wide = table(middleBody, { type: 'moved', field: 'style.dartLength', value: 400 });
    expect(wide.drawn.fresh).toBe(false);
    expect(nearest(wide)?.words).toMatch(/^Dart length: take 15\.0 cm$/);
    expect(taken(wide).drawn).toMatchObject({ fresh: true, draft: { style: { dartLength: 150 } } });
  });

  it('offers the princess seam where darts would stand up in a cone', () => {
    const full = { ...middleBody, bustGirth: 1020 };
    const darts = table(full, { type: 'chosen', choice: { shaping: 'darts' } });
    expect(darts.drawn.fresh).toBe(false);
    expect(nearest(darts)?.words).toBe('Shaping: take princess');
    expect(taken(darts).drawn.fresh).toBe(true);
  });

  it('offers to leave an ease open that turns the bust', () => {
    const turned = table(
      { ...middleBody, underbustGirth: 860 },
      { type: 'moved', field: 'style.ease.underbust', value: 70 },
    );
    expect(turned.drawn.fresh).toBe(false);
    expect(nearest(turned)?.words).toBe('Ease at the under-bust: leave it open');
    expect(taken(turned).drawn.fresh).toBe(true);
  });

  it('never offers another body, and nothing where nothing is refused', () => {
    expect(nearest(table(middleBody))).toBeUndefined();
    const odd = table({ ...middleBody, waistGirth: 1200 });
    expect(odd.drawn.fresh).toBe(false);
    expect(nearest(odd)).toBeUndefined();
  });
});
