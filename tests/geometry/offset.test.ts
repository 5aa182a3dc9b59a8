import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { pointAt, tangentAt } from '#shared/geometry/curve.ts';
import { parallel, withoutSpecks } from '#shared/geometry/offset.ts';
import { type Path, cubic, line } from '#shared/geometry/path.ts';
import { type Point, distance, point } from '#shared/geometry/point.ts';
import { arc } from '../support/sample-pieces.ts';

/** Shortest way from a place to a chain of points. */
function away(from: Point, chain: readonly Point[]): number {
  let nearest = Infinity;
  chain.forEach((b, index) => {
    const a = chain[index - 1] ?? b;
    const along = { x: b.x - a.x, y: b.y - a.y };
    const size = along.x ** 2 + along.y ** 2;
    const raw = size === 0 ? 0 : ((from.x - a.x) * along.x + (from.y - a.y) * along.y) / size;
    const t = Math.max(0, Math.min(1, raw));
    nearest = Math.min(nearest, distance(from, point(a.x + t * along.x, a.y + t * along.y)));
  });
  return nearest;
}

const dense = (path: Path, each: number): readonly Point[] =>
  path.flatMap((segment) => Array.from({ length: each + 1 }, (_, i) => pointAt(segment, i / each)));

/** Gentle curves such as seams are: 200 to 400 long, handles at most 30 degrees off the chord. */
const seam = fc
  .record({
    length: fc.double({ min: 200, max: 400, noNaN: true }),
    start: fc.double({ min: -0.5, max: 0.5, noNaN: true }),
    end: fc.double({ min: -0.5, max: 0.5, noNaN: true }),
  })
  .map(({ length, start, end }) => {
    const reach = length / 3;
    return cubic(
      point(0, 0),
      point(reach * Math.cos(start), reach * Math.sin(start)),
      point(length - reach * Math.cos(end), reach * Math.sin(end)),
      point(length, 0),
    );
  });

describe('the parallel of a seam', () => {
  it('lies at the allowance from the seam all along, within 0.05 mm', () => {
    fc.assert(
      fc.property(seam, fc.integer({ min: -25, max: 40 }), (curve, allowance) => {
        const chain = dense([curve], 400);
        for (const place of dense(parallel([curve], allowance).path, 40)) {
          expect(Math.abs(away(place, chain) - Math.abs(allowance))).toBeLessThan(0.05);
        }
      }),
      { numRuns: 100 },
    );
  });

  it('lies to the left of travel, and to the right for a negative distance', () => {
    const straight = [line(point(0, 0), point(100, 0))];
    expect(parallel(straight, 15).path).toEqual([line(point(0, -15), point(100, -15))]);
    expect(parallel(straight, -15).path[0]?.from.y).toBe(15);
  });

  it('turns a circle of 240 into one of 225 and one of 250', () => {
    const knee = arc(point(0, 0), 240, 90, 45);
    for (const [allowance, radius] of [
      [15, 225],
      [-10, 250],
    ] as const) {
      for (const place of dense(parallel(knee, allowance).path, 50)) {
        expect(distance(place, point(0, 0))).toBeCloseTo(radius, 1);
      }
    }
  });

  it('stays smooth where the seam is smooth, and stays compact', () => {
    const side: Path = [
      cubic(point(180, -12), point(200, 60), point(236, 100), point(236, 190)),
      cubic(point(236, 190), point(236, 350), point(190, 420), point(190, 500)),
    ];
    const { path, folded } = parallel(side, 25);
    expect(folded).toBe(false);
    expect(path.length).toBeLessThan(17);
    path.slice(1).forEach((segment, index) => {
      const before = path[index];
      if (!before) return;
      expect(distance(before.to, segment.from)).toBeLessThan(1e-6);
      const a = tangentAt(before, 1);
      const b = tangentAt(segment, 0);
      expect(a.x * b.x + a.y * b.y).toBeGreaterThan(0.9999);
    });
  });

  it('mitres a corner of the seam outside it and cuts it inside', () => {
    const corner: Path = [line(point(0, 0), point(100, 0)), line(point(100, 0), point(100, 100))];
    const outside = parallel(corner, 10).path;
    expect(outside.some(({ to }) => distance(to, point(110, -10)) < 1e-9)).toBe(true);
    const inside = parallel(corner, -10).path;
    expect(inside.map(({ to }) => to)).toEqual([point(90, 10), point(90, 100)]);
  });

  it('leaves out specks, whose direction means nothing', () => {
    const side = line(point(0, 0), point(0, 100));
    const [end, near] = [point(0, 100), point(0.001, 99.999)];
    expect(withoutSpecks([side, cubic(end, near, near, end)])).toEqual([side]);
    expect(withoutSpecks([side])).toEqual([side]);
  });

  it('says that it folds where the seam bends more tightly than the allowance', () => {
    expect(parallel(arc(point(0, 0), 10, 180, 0), 15).folded).toBe(true);
    expect(parallel(arc(point(0, 0), 20, 180, 0), 15).folded).toBe(false);
  });
});
