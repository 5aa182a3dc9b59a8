import { expect, it } from 'vitest';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { placedChain } from '#shared/sheets/layout.ts';
import { plainOrder } from '#shared/sheets/print-order.ts';
import { planSheets } from '#shared/sheets/sheet-plan.ts';
import { laidOutlines, sheetBeside } from '../../../../src/features/print-room/plan-picture.ts';
import { middleBody } from '../../../support/middle-body.ts';

const { pieces } = draftGown({ card: middleBody, style: {}, rules: balanced });
const plan = planSheets(pieces, plainOrder, { effort: 'quick' });
const { tiles } = plan.plan;

it('the arrow keys reach every sheet from the first', () => {
  const reached = new Set(tiles.slice(0, 1));
  for (const tile of reached) {
    for (const [x, y] of [
      [1, 0],
      [-1, 0],
      [0, 1],
      [0, -1],
    ] as const) {
      const next = sheetBeside(tiles, tile, { x, y });
      if (next !== undefined) reached.add(next);
    }
  }
  expect([...reached].map(({ name }) => name).sort()).toEqual(tiles.map(({ name }) => name).sort());
});

it('the number of a piece stands inside its outline, however it is curved', () => {
  for (const [index, { middle }] of laidOutlines(plan).entries()) {
    const placement = plan.layout.placements[index];
    const chain = placement ? placedChain(placement) : [];
    const crossings = chain.filter((from, i) => {
      const to = chain[(i + 1) % chain.length] ?? from;
      if (from.y > middle.y === to.y > middle.y) return false;
      return from.x + ((middle.y - from.y) / (to.y - from.y)) * (to.x - from.x) > middle.x;
    });
    expect(crossings.length % 2).toBe(1);
  }
});
