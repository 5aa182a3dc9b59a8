import { describe, expect, it } from 'vitest';
import { tilesPdf } from '#server/features/print/tiles-pdf.ts';
import { testSquares } from '#shared/exports/cover.ts';
import { smallSide, smallSquare } from '#shared/exports/small-square.ts';
import { tilesJob } from '#shared/exports/tiles.ts';
import { boxOf, placedChain } from '#shared/sheets/layout.ts';
import { plainOrder, presetOrder, sheetNames } from '#shared/sheets/print-order.ts';
import { type SheetPlan, coverDrawing, coverSize, planSheets } from '#shared/sheets/sheet-plan.ts';
import { printerMargin } from '#shared/sheets/tile-grid.ts';
import { paperDraft } from '../support/paper-draft.ts';
import { oblong } from '../support/paper-pieces.ts';
import { type Picture, inkIn, renderPart, strokesAlong } from '../support/pgm.ts';

const papers = ['A4', 'Letter'] as const;

/** Lengths of a square's two sides from a picture of it, whatever else stands in it, mm. */
async function sidesOf(
  pdf: Uint8Array,
  page: number,
  square: { readonly x: number; readonly y: number; readonly side: number },
) {
  const around = 3;
  const picture = await renderPart(pdf, page, {
    x: square.x - around,
    y: square.y - around,
    width: square.side + 2 * around,
    height: square.side + 2 * around,
  });
  // The picture begins on a whole pixel, and the square may not.
  const left = square.x - Math.round((square.x - around) * 10) / 10;
  const top = square.y - Math.round((square.y - around) * 10) / 10;
  const side = (middles: readonly number[], from: number): number => {
    const near = (wanted: number): number =>
      middles.reduce((best, each) =>
        Math.abs(each - wanted) < Math.abs(best - wanted) ? each : best,
      );
    return (near((from + square.side) * 10) - near(from * 10)) / 10;
  };
  return {
    across: side(strokesAlong(picture, { row: Math.round(top * 10 + 15) }), left),
    down: side(strokesAlong(picture, { column: Math.round(left * 10 + 15) }), top),
  };
}

/** Where the cover's corner stands: on its own sheet, or where it lies among the pieces of the first. */
function coverCorner({ cover, layout, plan }: SheetPlan) {
  const among = layout.placements.find(({ shape }) => shape.piece === coverDrawing);
  const tile = plan.tiles.find(
    ({ shows }) => among && shows.includes(layout.placements.indexOf(among)),
  );
  return cover === 'own sheet' || !among || !tile
    ? { page: 1, x: 0, y: 0, size: { ...plan.paper, margin: plan.margin } }
    : {
        page: plan.tiles.indexOf(tile) + 1,
        x: among.motion.dx - tile.at.x + plan.margin,
        y: among.motion.dy - tile.at.y + plan.margin,
        size: { ...coverSize, margin: 10 },
      };
}

const everyPaper = [
  ...sheetNames.map((paper) => ({ name: paper, order: { ...plainOrder, paper } })),
  { name: 'A4 lying', order: { ...plainOrder, orientation: 'landscape' as const } },
  {
    name: 'custom paper with wide margins',
    order: { ...plainOrder, paper: { width: 300, height: 450 }, margin: 15, overlap: 20 },
  },
  { name: 'half scale', order: { ...plainOrder, scale: 0.5 as const } },
];

describe.each(everyPaper)('on $name, printed and measured', ({ order }) => {
  const pieces = [oblong('front', 300, 120), oblong('skirt', 500, 900, { part: 'middle' })];
  const draft = paperDraft(pieces);
  const sheets = planSheets(pieces, order);
  const corner = coverCorner(sheets);
  const squares = testSquares(corner.size);

  it.each(['cm', 'in'] as const)(
    'in %s, the squares are true both ways within a tenth',
    async (unit) => {
      const pdf = await tilesPdf(draft, order, unit);
      for (const { x, y, side } of [squares.metric, squares.inch]) {
        const at = { x: x + corner.x, y: y + corner.y, side };
        const { across, down } = await sidesOf(pdf, corner.page, at);
        expect(Math.abs(across - side)).toBeLessThanOrEqual(0.1);
        expect(Math.abs(down - side)).toBeLessThanOrEqual(0.1);
      }
    },
  );

  it('every sheet carries a small square, true both ways within a tenth', async () => {
    const job = tilesJob(draft, order, 'cm');
    const pdf = await tilesPdf(draft, order, 'cm');
    const first = job.pages.length - sheets.plan.tiles.length;
    const places = job.pages
      .slice(first)
      .map((marks) =>
        marks.find((mark) => mark.kind === 'use' && mark.drawing === smallSquare.name),
      );
    expect(places.length).toBeGreaterThan(0);
    for (const [i, mark] of places.entries()) {
      if (mark?.kind !== 'use') throw new Error(`Sheet ${i + 1} has no small square.`);
      if (i > 2) continue;
      const { dx, dy } = mark.motion;
      const { across, down } = await sidesOf(pdf, first + i + 1, { x: dx, y: dy, side: smallSide });
      expect(Math.abs(across - smallSide)).toBeLessThanOrEqual(0.1);
      expect(Math.abs(down - smallSide)).toBeLessThanOrEqual(0.1);
    }
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

/** The stroke nearest to a place, mm. */
const nearest = (middles: readonly number[], place: number): number =>
  middles.reduce((best, each) =>
    Math.abs(each - place * 10) < Math.abs(best - place * 10) ? each : best,
  ) / 10;

describe.each(papers)('two neighbouring %s sheets, trimmed and glued on their strip', (paper) => {
  const order = presetOrder(paper, 'bodice-toile');

  /** A piece that needs two sheets one way, and more the other way. */
  async function sheets(width: number, height: number) {
    const draft = paperDraft([oblong('front', width, height)]);
    const { plan, layout } = planSheets(draft.pieces, order);
    const pdf = await tilesPdf(draft, order, 'cm');
    const area = { x: printerMargin, y: printerMargin, ...plan.use };
    const [first, second] = [await renderPart(pdf, 2, area), await renderPart(pdf, 3, area)];
    const box = boxOf(layout.placements.flatMap(placedChain));
    return { plan, first, second, box };
  }
  const wide = () => sheets(300, 250);
  const long = () => sheets(180, 400);

  it('carry a piece 300 mm wide across their seam true to a tenth', async () => {
    const { plan, first, second, box } = await wide();
    expect(plan.tiles.map((each) => each.name)).toEqual(['A1', 'A2']);
    const both = glued(first, second, plan.step.x, 'right');
    // The fold's line is dashed: it is measured where both edges are drawn.
    const widths = [5, 6, 7, 8, 9, 10, 11, 12, 13, 14].flatMap((below) => {
      const middles = strokesAlong(both, { row: Math.round((box.y + below) * 10) });
      const [left, right] = [nearest(middles, box.x), nearest(middles, box.x + box.width)];
      return Math.abs(left - box.x) < 1 && Math.abs(right - box.x - box.width) < 1
        ? [right - left]
        : [];
    });
    expect(widths.length).toBeGreaterThan(3);
    for (const each of widths) expect(Math.abs(each - 300)).toBeLessThanOrEqual(0.1);
  });

  it('carry a piece 400 mm long across their seam true to a tenth', async () => {
    const { plan, first, second, box } = await long();
    expect(plan.tiles.map((each) => each.name)).toEqual(['A1', 'B1']);
    const both = glued(first, second, plan.step.y, 'below');
    const middles = strokesAlong(both, { column: Math.round((box.x + 150) * 10) });
    const down = nearest(middles, box.y + box.height) - nearest(middles, box.y);
    expect(Math.abs(down - 400)).toBeLessThanOrEqual(0.1);
  });

  it('show the same stretch of the piece in the strip they share', async () => {
    const { plan, first, second } = await wide();
    const from = Math.round(plan.step.x * 10);
    let apart = 0;
    // Between the match marks and the names, only the piece's own lines stand in the strip.
    for (const [top, foot] of [
      [650, 720],
      [1180, 1300],
    ] as const) {
      for (let y = top; y < foot; y += 1) {
        for (let x = 45; x < plan.overlap * 10 - 5; x += 1) {
          apart = Math.max(apart, Math.abs(first.grey(from + x, y) - second.grey(x, y)));
        }
      }
    }
    expect(apart).toBeLessThan(64);
  });

  it('put the two halves of each match mark on one another', async () => {
    const { plan, first, second } = await wide();
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
