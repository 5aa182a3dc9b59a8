import fc from 'fast-check';
import { svgPathProperties } from 'svg-path-properties';
import { describe, expect, it } from 'vitest';
import { arc } from '#shared/geometry/arc.ts';
import {
  flatten,
  pathCrossings,
  pathLength,
  pointAt,
  reverse,
  segmentLength,
  splitSegment,
  stationAtLength,
} from '#shared/geometry/curve.ts';
import { cubic, type Cubic, line } from '#shared/geometry/path.ts';
import { distance, point } from '#shared/geometry/point.ts';

/** Curves as a draft has them: they go forward all the way and have no cusp. */
const curve: fc.Arbitrary<Cubic> = fc
  .record({
    run: fc.integer({ min: 5, max: 400 }),
    first: fc.integer({ min: 15, max: 50 }),
    second: fc.integer({ min: 50, max: 85 }),
    bends: fc.tuple(
      fc.integer({ min: -100, max: 100 }),
      fc.integer({ min: -100, max: 100 }),
      fc.integer({ min: -100, max: 100 }),
    ),
  })
  .map(({ run, first, second, bends: [b1, b2, b3] }) =>
    cubic(
      point(0, 0),
      point((run * first) / 100, (run * b1) / 100),
      point((run * second) / 100, (run * b2) / 100),
      point(run, (run * b3) / 100),
    ),
  );

/** Length by ten thousand chords: slow, and too short by a hair. */
function chordLength(segment: Cubic): number {
  let sum = 0;
  let last = segment.from;
  for (let i = 1; i <= 10_000; i += 1) {
    const next = pointAt(segment, i / 10_000);
    sum += distance(last, next);
    last = next;
  }
  return sum;
}

describe('the length of a seam line', () => {
  it('is what a chain of ten thousand chords comes to', () => {
    fc.assert(
      fc.property(curve, (segment) => {
        expect(Math.abs(segmentLength(segment) - chordLength(segment))).toBeLessThan(1e-3);
      }),
      { numRuns: 60 },
    );
  });

  it('agrees with a general-purpose path library on a gentle curve', () => {
    // svg-path-properties integrates by its own Gauss-Legendre tables.
    const theirs = new svgPathProperties('M0 0 C 30 0 60 20 90 60').getTotalLength();
    const ours = segmentLength(cubic(point(0, 0), point(30, 0), point(60, 20), point(90, 60)));
    expect(Math.abs(ours - theirs)).toBeLessThan(1e-3);
  });

  it('is the sum of its two parts wherever it is cut', () => {
    fc.assert(
      fc.property(curve, fc.double({ min: 0.01, max: 0.99, noNaN: true }), (segment, t) => {
        const [before, after] = splitSegment(segment, t);
        const parts = segmentLength(before) + segmentLength(after);
        expect(Math.abs(parts - segmentLength(segment))).toBeLessThan(1e-6);
      }),
    );
  });

  it('is the same travelled backwards', () => {
    const path = [
      line(point(0, 0), point(10, 0)),
      cubic(point(10, 0), point(20, 0), point(30, 10), point(30, 40)),
    ];
    expect(pathLength(reverse(path))).toBeCloseTo(pathLength(path), 9);
    expect(reverse(path)[0]?.from).toEqual(point(30, 40));
  });
});

describe('a circular arc', () => {
  it('has the length and the radius of the circle', () => {
    const drawn = arc(point(3, 4), 250, 0.2, 2.9);
    expect(pathLength(drawn)).toBeCloseTo(250 * 2.7, 3);
    for (const at of flatten(drawn, 0.1)) {
      expect(Math.abs(distance(at, point(3, 4)) - 250)).toBeLessThan(1e-3);
    }
  });

  it('sets out downwards from its centre at angle zero', () => {
    expect(arc(point(0, 0), 100, 0, 1)[0]?.from).toEqual(point(0, 100));
  });
});

describe('places on a path', () => {
  const bow = [cubic(point(0, 0), point(0, 40), point(100, 40), point(100, 0))];

  it('are found by length', () => {
    const half = pathLength(bow) / 2;
    expect(stationAtLength(bow, half)?.at.x).toBeCloseTo(50, 6);
    expect(stationAtLength(bow, half)?.tangent.y).toBeCloseTo(0, 6);
  });

  it('are found where a straight line crosses, and nowhere else', () => {
    const level = pathCrossings(bow, point(0, 15), point(1, 15));
    expect(level).toHaveLength(2);
    for (const { at } of level) expect(at.y).toBeCloseTo(15, 9);
    expect(pathCrossings(bow, point(0, 31), point(1, 31))).toHaveLength(0);
  });

  it('stay within the tolerance of a flattened curve', () => {
    fc.assert(
      fc.property(curve, (segment) => {
        const chain = flatten([segment], 0.05);
        const mid = pointAt(segment, 0.37);
        const off = chain.slice(1).reduce((least, b, i) => {
          const a = chain[i] ?? b;
          const length = distance(a, b) || 1;
          const along = Math.max(
            0,
            Math.min(1, ((mid.x - a.x) * (b.x - a.x) + (mid.y - a.y) * (b.y - a.y)) / length ** 2),
          );
          return Math.min(
            least,
            distance(mid, point(a.x + along * (b.x - a.x), a.y + along * (b.y - a.y))),
          );
        }, Infinity);
        expect(off).toBeLessThan(0.051);
      }),
    );
  });
});
