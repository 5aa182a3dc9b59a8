import { describe, expect, it } from 'vitest';
import { type Path, line } from '#shared/geometry/path.ts';
import type { Point } from '#shared/geometry/point.ts';
import { areaInside, overlapOf } from '#shared/geometry/region.ts';
import { gap, placedChain, shapeOf } from '#shared/sheets/layout.ts';
import { papers } from '#shared/sheets/papers.ts';
import { plainOrder } from '#shared/sheets/print-order.ts';
import { type SheetPlan, planSheets } from '#shared/sheets/sheet-plan.ts';
import { inRows, sheetsOf } from '#shared/sheets/shelves.ts';
import type { Tile } from '#shared/sheets/tile-plan.ts';
import { plainRows } from '../support/plain-rows.ts';
import { tenGowns } from '../support/ten-gowns.ts';

const gowns = tenGowns().map(({ name, draft }) => {
  const shapes = draft.pieces.map((each) => shapeOf(each));
  return {
    name,
    pieces: draft.pieces,
    plan: planSheets(draft.pieces, plainOrder),
    plain: sheetsOf(plainRows(shapes), papers.A4, plainOrder),
    rows: sheetsOf(inRows(shapes, papers.A4, plainOrder), papers.A4, plainOrder),
  };
});

/** A chain as a closed path of straight strokes. */
const closed = (chain: readonly Point[]): Path =>
  chain.map((from, i) => line(from, chain[(i + 1) % chain.length] ?? from));

/** How near the corners of one chain come to the strokes of another, mm. */
function nearestTo(corners: readonly Point[], strokes: readonly Point[]): number {
  let least = Infinity;
  strokes.forEach((from, i) => {
    const to = strokes[(i + 1) % strokes.length] ?? from;
    const [dx, dy] = [to.x - from.x, to.y - from.y];
    const size = dx * dx + dy * dy;
    for (const { x, y } of corners) {
      const along = size === 0 ? 0 : ((x - from.x) * dx + (y - from.y) * dy) / size;
      const share = Math.min(1, Math.max(0, along));
      least = Math.min(least, Math.hypot(x - from.x - share * dx, y - from.y - share * dy));
    }
  });
  return least;
}

const nearest = (a: readonly Point[], b: readonly Point[]): number =>
  Math.min(nearestTo(a, b), nearestTo(b, a));

const median = (values: readonly number[]): number => {
  const sorted = [...values].sort((a, b) => a - b);
  const [low, high] = [Math.floor((sorted.length - 1) / 2), Math.ceil((sorted.length - 1) / 2)];
  return ((sorted[low] ?? 0) + (sorted[high] ?? 0)) / 2;
};

/** Sheets glued to one another, directly or by others, from the first of some. */
function heldTogether(tiles: readonly Tile[], all: ReadonlyMap<string, Tile>): number {
  const wanted = new Set(tiles.map((each) => each.name));
  const reached = new Set<string>();
  const queue = tiles.slice(0, 1).map((each) => each.name);
  for (let name = queue.pop(); name !== undefined; name = queue.pop()) {
    const tile = all.get(name);
    if (!tile || reached.has(name) || !wanted.has(name)) continue;
    reached.add(name);
    for (const side of tile.glued) queue.push(tile.neighbours[side] ?? '');
  }
  return reached.size;
}

describe('ten gowns on A4', () => {
  it('take at least 15 % fewer sheets in the median than row by row, and none takes more', () => {
    const saved = gowns.map(({ plan, plain }) => 1 - plan.plan.tiles.length / plain);
    expect(median(saved)).toBeGreaterThanOrEqual(0.15);
    for (const { plan, plain, rows } of gowns) {
      expect(plan.plan.tiles.length).toBeLessThanOrEqual(plain);
      expect(plan.plan.tiles.length).toBeLessThanOrEqual(rows);
    }
  });

  it('are planned the same on every run', () => {
    for (const { pieces, plan } of gowns.slice(0, 2)) {
      expect(planSheets(pieces, plainOrder)).toEqual(plan);
    }
  });

  it('have no piece lie on another, as an independent library measures their areas', () => {
    for (const { plan } of gowns) {
      const paths = plan.layout.placements.map((each) => closed(placedChain(each)));
      paths.forEach((path, i) => {
        for (const other of paths.slice(i + 1)) {
          const { firstArea } = overlapOf(path, other);
          expect(Math.abs(firstArea - areaInside(path))).toBeLessThan(1);
        }
      });
    }
  });

  it('keep the gap between pieces, so that shears get round each', () => {
    for (const { plan } of gowns) {
      const chains = plan.layout.placements.map(placedChain);
      chains.forEach((chain, i) => {
        for (const other of chains.slice(i + 1)) {
          expect(nearest(chain, other)).toBeGreaterThanOrEqual(gap - 1e-6);
        }
      });
    }
  });

  it('turn pieces by quarters, and never mirror or resize them', () => {
    for (const { motion } of gowns.flatMap(({ plan }) => plan.layout.placements)) {
      expect([0, 1]).toContain(Math.abs(motion.cos));
      expect(motion.cos ** 2 + motion.sin ** 2).toBe(1);
    }
  });

  it('have every piece held together by seams that are glued', () => {
    for (const { plan } of gowns) {
      const all = new Map(plan.plan.tiles.map((each) => [each.name, each]));
      plan.layout.placements.forEach((_, which) => {
        const own = plan.plan.tiles.filter(({ shows }) => shows.includes(which));
        expect(own.length).toBeGreaterThan(0);
        expect(heldTogether(own, all)).toBe(own.length);
      });
    }
  });

  it('keep notches off the seams wherever the whole drawing could be shifted to do so', () => {
    for (const { plan } of gowns) expect(betterShift(plan)).toBeUndefined();
  });
});

/** Notches on the seams of a plan whose drawing is shifted; a notch within 1.5 mm of a seam is on it. */
function onSeams({ layout, plan: { step } }: SheetPlan, dx: number, dy: number): number {
  const on = (from: number, to: number, each: number): boolean => {
    const seam = Math.floor((Math.max(from, to) + 1.5) / each) * each;
    return seam > 0 && seam > Math.min(from, to) - 1.5;
  };
  return layout.placements
    .flatMap(({ shape, motion }) =>
      (shape.spots ?? []).map((spot) =>
        spot.map(({ x, y }) => ({
          x: motion.cos * x - motion.sin * y + motion.dx + dx,
          y: motion.sin * x + motion.cos * y + motion.dy + dy,
        })),
      ),
    )
    .filter(([a, b]) => a && b && (on(a.x, b.x, step.x) || on(a.y, b.y, step.y))).length;
}

/** A shift of the whole drawing that parts fewer notches and needs no sheet more. */
function betterShift(plan: SheetPlan) {
  const now = onSeams(plan, 0, 0);
  if (now === 0) return undefined;
  for (let dx = -10; dx <= 10; dx += 2) {
    for (let dy = -10; dy <= 10; dy += 2) {
      if (onSeams(plan, dx, dy) >= now) continue;
      const placements = plan.layout.placements.map(({ shape, motion }) => ({
        shape,
        motion: { ...motion, dx: motion.dx + dx, dy: motion.dy + dy },
      }));
      const places = placements.flatMap(placedChain);
      if (places.some(({ x, y }) => x < 1.5 || y < 1.5)) continue;
      const layout = {
        width: Math.max(...places.map(({ x }) => x)) + 1.5,
        height: Math.max(...places.map(({ y }) => y)) + 1.5,
        placements,
      };
      if (sheetsOf(layout, papers.A4, plainOrder) <= plan.plan.tiles.length) return { dx, dy };
    }
  }
  return undefined;
}
