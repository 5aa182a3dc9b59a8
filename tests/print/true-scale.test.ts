import { describe, expect, it } from 'vitest';
import { tilesPdf } from '#server/features/print/tiles-pdf.ts';
import { testSquares } from '#shared/exports/cover.ts';
import { presetOrder } from '#shared/sheets/print-order.ts';
import { planSheets } from '#shared/sheets/sheet-plan.ts';
import { papers as papersByName } from '#shared/sheets/papers.ts';
import { printerMargin } from '#shared/sheets/tile-grid.ts';
import { oblong } from '../support/paper-pieces.ts';
import { paperDraft } from '../support/paper-draft.ts';
import { type Picture, inkIn, renderPart, strokesAlong } from '../support/pgm.ts';

const papers = ['A4', 'Letter'] as const;

/** Lengths of a square's two sides from a picture of it with 5 mm of white round it, mm. */
async function sidesOf(pdf: Uint8Array, square: { x: number; y: number; side: number }) {
  const around = 3;
  const picture = await renderPart(pdf, 1, {
    x: square.x - around,
    y: square.y - around,
    width: square.side + 2 * around,
    height: square.side + 2 * around,
  });
  // 3 mm inside its edges a square holds nothing but its own sides.
  const inside = (around + 3) * 10;
  const side = (middles: readonly number[]): number =>
    ((middles.at(-1) ?? 0) - (middles[0] ?? 0)) / 10;
  return {
    across: side(strokesAlong(picture, { row: inside })),
    down: side(strokesAlong(picture, { column: inside })),
  };
}

describe.each(papers)('on %s, printed and measured', (paper) => {
  const draft = paperDraft([oblong('front', 300, 120)]);
  const print = () => tilesPdf(draft, presetOrder(paper, 'bodice-toile'), 'cm');

  it('the 100 mm square is 100.0 mm both ways within a tenth', async () => {
    const { across, down } = await sidesOf(
      await print(),
      testSquares({ ...papersByName[paper], margin: 10 }).metric,
    );
    expect(Math.abs(across - 100)).toBeLessThanOrEqual(0.1);
    expect(Math.abs(down - 100)).toBeLessThanOrEqual(0.1);
  });

  it('the 4 in square is 101.6 mm both ways within a tenth', async () => {
    const { across, down } = await sidesOf(
      await print(),
      testSquares({ ...papersByName[paper], margin: 10 }).inch,
    );
    expect(Math.abs(across - 101.6)).toBeLessThanOrEqual(0.1);
    expect(Math.abs(down - 101.6)).toBeLessThanOrEqual(0.1);
  });
});

/** Lays the second sheet on the first's glue strip, as a maker does, and gives the picture of both. */
function glued(first: Picture, second: Picture, step: number, way: 'right' | 'below'): Picture {
  const shift = Math.round(step * 10);
  return {
    width: first.width + (way === 'right' ? shift : 0),
    height: first.height + (way === 'below' ? shift : 0),
    grey: (x, y) => {
      const onSecond = way === 'right' ? x >= shift : y >= shift;
      if (!onSecond) return first.grey(x, y);
      return way === 'right' ? second.grey(x - shift, y) : second.grey(x, y - shift);
    },
  };
}

describe.each(papers)('two neighbouring %s sheets, trimmed and glued on their strip', (paper) => {
  const order = presetOrder(paper, 'bodice-toile');

  async function sheets(width: number, height: number) {
    const draft = paperDraft([oblong('front', width, height)]);
    const { plan } = planSheets(draft.pieces, order);
    const pdf = await tilesPdf(draft, order, 'cm');
    const area = { x: printerMargin, y: printerMargin, ...plan.use };
    const [first, second] = [await renderPart(pdf, 2, area), await renderPart(pdf, 3, area)];
    return { plan, first, second };
  }

  it('carry a piece 300 mm wide across their seam true to a tenth', async () => {
    const { plan, first, second } = await sheets(300, 120);
    expect(plan.tiles.map((each) => each.name)).toEqual(['A1', 'A2']);
    const both = glued(first, second, plan.step.x, 'right');
    // 8 mm below the top of the piece its two upright edges are the only lines but the sheets' frames.
    const middles = strokesAlong(both, { row: 100 });
    const [left, right] = [middles.find((each) => each > 15) ?? 0, 0];
    const far =
      middles.findLast((each) => each < plan.use.width * 10 + plan.step.x * 10 - 15) ?? right;
    expect(Math.abs((far - left) / 10 - 300)).toBeLessThanOrEqual(0.1);
  });

  it('carry a piece 400 mm long across their seam true to a tenth', async () => {
    const { plan, first, second } = await sheets(120, 400);
    expect(plan.tiles.map((each) => each.name)).toEqual(['A1', 'B1']);
    const both = glued(first, second, plan.step.y, 'below');
    const middles = strokesAlong(both, { column: 1000 });
    const near = middles.find((each) => each > 15) ?? 0;
    const far =
      middles.findLast((each) => each < plan.use.height * 10 + plan.step.y * 10 - 15) ?? 0;
    expect(Math.abs((far - near) / 10 - 400)).toBeLessThanOrEqual(0.1);
  });

  it('show the same stretch of the piece in the strip they share', async () => {
    const { plan, first, second } = await sheets(300, 120);
    const from = Math.round(plan.step.x * 10);
    let apart = 0;
    // Past the match marks and the small print, only the piece's own lines stand in the strip.
    for (let y = 25; y < 700; y += 1) {
      for (let x = 45; x < plan.overlap * 10 - 5; x += 1) {
        apart = Math.max(apart, Math.abs(first.grey(from + x, y) - second.grey(x, y)));
      }
    }
    expect(apart).toBeLessThan(64);
  });

  it('put the two halves of each match mark on one another', async () => {
    const { plan, first, second } = await sheets(300, 120);
    const from = Math.round(plan.step.x * 10);
    const mark = Math.round(plan.use.height * 0.2 * 10);
    // The right half of the lozenge: whole on the first sheet, cut by the trim line on the second.
    const right = { y: mark - 45, width: 45, height: 90 };
    const onFirst = inkIn(first, { ...right, x: from + 4 });
    const onSecond = inkIn(second, { ...right, x: 4 });
    expect(onFirst).toBeGreaterThan(150);
    expect(Math.abs(onFirst - onSecond) / onFirst).toBeLessThan(0.05);
  });
});
