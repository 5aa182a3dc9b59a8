import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { shift } from '#shared/geometry/motion.ts';
import { type Point, point } from '#shared/geometry/point.ts';
import { type Layout, placedChain } from '#shared/sheets/layout.ts';
import { papers } from '#shared/sheets/papers.ts';
import { planTiles, tileName } from '#shared/sheets/tile-plan.ts';

const square = (piece: string, x: number, y: number, width: number, height = width) => ({
  shape: { piece, chain: [point(0, 0), point(width, 0), point(width, height), point(0, height)] },
  motion: shift(x, y),
});

const names = (layout: Layout): readonly string[] =>
  planTiles(layout, papers.A4).tiles.map((each) => each.name);

describe('the sheets of a drawing', () => {
  it('are named by row letter and column number, past Z by two letters', () => {
    expect([tileName(0, 0), tileName(1, 2), tileName(25, 0), tileName(26, 9)]).toEqual([
      'A1',
      'B3',
      'Z1',
      'AA10',
    ]);
  });

  it('leave out those with nothing on them', () => {
    const layout = {
      width: 700,
      height: 700,
      placements: [square('near', 5, 5, 100), square('far', 580, 580, 100)],
    };
    expect(names(layout)).toEqual(['A1', 'C4']);
  });

  it('keep the paper inside a piece, and say which piece it is', () => {
    const layout = { width: 720, height: 1000, placements: [square('flare', 5, 5, 700, 990)] };
    const { tiles, rows, columns } = planTiles(layout, papers.A4);
    expect(tiles.length).toBe(rows * columns);
    expect(tiles.find((each) => each.name === 'B2')?.inside).toBe('flare');
    expect(tiles.find((each) => each.name === 'A1')?.inside).toBeUndefined();
  });

  it('name as neighbours only sheets that are printed, and glue only where a piece runs on', () => {
    const layout = {
      width: 360,
      height: 530,
      placements: [square('tall', 5, 5, 100, 500), square('small', 250, 5, 50)],
    };
    const plan = planTiles(layout, papers.A4);
    expect(plan.tiles.map((each) => [each.name, each.neighbours])).toEqual([
      ['A1', { right: 'A2', below: 'B1' }],
      ['A2', { left: 'A1' }],
      ['B1', { above: 'A1' }],
    ]);
    expect(plan.tiles.map((each) => each.glued)).toEqual([['below'], [], ['above']]);
    expect(plan.glueSeams).toBe(1);
  });

  it('need no sheet for a line that an earlier sheet shows in its glue strip', () => {
    const within = { width: 375, height: 100, placements: [square('edge', 5, 5, 183, 90)] };
    const beyond = { width: 375, height: 100, placements: [square('edge', 5, 5, 187, 90)] };
    expect(names(within)).toEqual(['A1']);
    expect(names(beyond)).toEqual(['A1', 'A2']);
  });

  it('show every line of every piece on some printed sheet', () => {
    const place = fc.record({
      x: fc.integer({ min: 2, max: 900 }),
      y: fc.integer({ min: 2, max: 900 }),
      width: fc.integer({ min: 5, max: 700 }),
      height: fc.integer({ min: 5, max: 700 }),
    });
    fc.assert(
      fc.property(fc.array(place, { minLength: 1, maxLength: 4 }), (places) => {
        const layout: Layout = {
          width: Math.max(...places.map((each) => each.x + each.width)) + 2,
          height: Math.max(...places.map((each) => each.y + each.height)) + 2,
          placements: places.map((each, i) =>
            square(`p${i}`, each.x, each.y, each.width, each.height),
          ),
        };
        const { tiles, use } = planTiles(layout, papers.A4);
        const shown = ({ x, y }: Point): boolean =>
          tiles.some(
            ({ at }) =>
              x >= at.x - 0.01 &&
              x <= at.x + use.width + 0.01 &&
              y >= at.y - 0.01 &&
              y <= at.y + use.height + 0.01,
          );
        for (const chain of layout.placements.map(placedChain)) {
          chain.forEach((from, i) => {
            const to = chain[(i + 1) % chain.length] ?? from;
            for (let share = 0; share <= 1; share += 0.02) {
              const at = point(from.x + (to.x - from.x) * share, from.y + (to.y - from.y) * share);
              if (!shown(at)) throw new Error(`Nothing shows ${at.x}, ${at.y}.`);
            }
          });
        }
      }),
      { numRuns: 200 },
    );
  });
});
