import { describe, expect, it } from 'vitest';
import { arrange } from '#shared/sheets/arrange.ts';
import { type Layout, type Shape, boxOf, placedChain, shapeOf } from '#shared/sheets/layout.ts';
import { papers } from '#shared/sheets/papers.ts';
import { plainOrder, presetOrder } from '#shared/sheets/print-order.ts';
import { choosePieces } from '#shared/sheets/selection.ts';
import { planSheets } from '#shared/sheets/sheet-plan.ts';
import { planTiles } from '#shared/sheets/tile-plan.ts';
import { oblong } from '../support/paper-pieces.ts';

const sizes: readonly (readonly [number, number])[] = [
  [110, 208],
  [185, 219],
  [275, 590],
  [600, 695],
  [140, 146],
  [300, 591],
];
const pieces = sizes.map(([width, height], i) => oblong(`piece-${i}`, width, height));
const shapes = pieces.map((each) => shapeOf(each));

/** The drawing on A4 after so many moves. */
function arranged(laid: readonly Shape[], moves = 60): Layout {
  const search = arrange(laid, papers.A4, plainOrder, moves);
  let step = search.next();
  while (!step.done) step = search.next();
  return step.value;
}

describe('pieces laid on one drawing', () => {
  it('never touch each other, and stay on the drawing', () => {
    const layout = arranged(shapes);
    const boxes = layout.placements.map((each) => boxOf(placedChain(each)));
    expect(boxes.length).toBe(shapes.length);
    boxes.forEach((a, i) => {
      expect(a.x).toBeGreaterThan(0);
      expect(a.y).toBeGreaterThan(0);
      expect(a.x + a.width).toBeLessThan(layout.width);
      expect(a.y + a.height).toBeLessThan(layout.height);
      for (const b of boxes.slice(i + 1)) {
        const clear =
          a.x + a.width + 5 < b.x ||
          b.x + b.width + 5 < a.x ||
          a.y + a.height + 5 < b.y ||
          b.y + b.height + 5 < a.y;
        expect(clear).toBe(true);
      }
    });
  });

  it('are turned, never mirrored and never resized', () => {
    for (const { motion } of arranged(shapes).placements) {
      expect(motion.cos ** 2 + motion.sin ** 2).toBe(1);
    }
  });

  it('lie the same way every time', () => {
    expect(arranged(shapes)).toEqual(arranged(shapes));
  });

  it('take no more sheets together than each on sheets of its own', () => {
    const together = planTiles(arranged(shapes), papers.A4).tiles.length;
    const apart = shapes.map((each) => planTiles(arranged([each]), papers.A4).tiles.length);
    expect(together).toBeLessThanOrEqual(apart.reduce((sum, each) => sum + each, 0));
  });

  it('are turned where that saves a sheet', () => {
    const lying = arranged([shapeOf(oblong('band', 260, 100))]);
    expect(planTiles(lying, papers.A4).tiles.length).toBe(1);
  });
});

describe('what is printed', () => {
  const gown = [
    oblong('front-top', 110, 208),
    oblong('front-middle', 275, 590, { part: 'middle' }),
    oblong('flare-front', 600, 695, { part: 'flare' }),
  ];

  it('is the top alone for a bodice toile, and every piece for the whole gown', () => {
    expect(choosePieces(gown, 'bodice-toile').map((each) => each.name)).toEqual(['front-top']);
    expect(choosePieces(gown, 'whole-gown')).toEqual(gown);
  });

  it('counts its cover among the sheets', () => {
    expect(planSheets(gown, presetOrder('A4', 'bodice-toile')).sheets).toBe(2);
  });

  it('is a cover alone where nothing is chosen', () => {
    expect(planSheets([], presetOrder('A4', 'whole-gown')).plan.tiles).toEqual([]);
  });
});
