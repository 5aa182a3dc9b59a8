import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { pathLength } from '#shared/geometry/curve.ts';
import { layOn, moved, turnAbout, undo } from '#shared/geometry/motion.ts';
import { distance, point } from '#shared/geometry/point.ts';
import {
  clampedSpline,
  monotoneProfile,
  positiveSpline,
  profileLength,
  profilePath,
  slopeAt,
  steepest,
  xAt,
} from '#shared/geometry/profile.ts';

const knots = [
  { y: 0, x: 240 },
  { y: 170, x: 215 },
  { y: 270, x: 240 },
  { y: 375, x: 250 },
];

describe('a clamped spline', () => {
  const side = clampedSpline(knots, 0, 0);

  it('passes its knots, upright at both ends', () => {
    for (const { y, x } of knots) expect(xAt(side, y)).toBeCloseTo(x, 9);
    expect(slopeAt(side, 0)).toBeCloseTo(0, 9);
    expect(slopeAt(side, 375)).toBeCloseTo(0, 9);
  });

  it('bends without a jump in curvature', () => {
    for (const { y } of knots.slice(1, -1)) {
      const bend = (at: number): number => (slopeAt(side, at + 1e-4) - slopeAt(side, at)) / 1e-4;
      expect(Math.abs(bend(y - 2e-4) - bend(y + 1e-4))).toBeLessThan(1e-4);
    }
  });

  // Burden and Faires, Numerical Analysis, clamped spline of e^x on 0, 1, 2, 3 (from memory).
  it('gives the handbook example of e^x', () => {
    const exponential = clampedSpline(
      [0, 1, 2, 3].map((y) => ({ y, x: Math.exp(y) })),
      1,
      Math.exp(3),
    );
    expect(exponential[0]?.c).toBeCloseTo(0.44468, 4);
    expect(exponential[0]?.d).toBeCloseTo(0.2736, 4);
    expect(exponential[2]?.c).toBeCloseTo(3.35087, 4);
  });

  it('is the same line as a path', () => {
    expect(pathLength(profilePath(side, 20, 300))).toBeCloseTo(profileLength(side, 20, 300), 5);
    expect(profilePath(side, 20, 300)[0]?.from).toEqual(point(xAt(side, 20), 20));
  });

  it('knows its steepest lean', () => {
    const most = steepest(side, 0, 375);
    for (let y = 0; y <= 375; y += 1)
      expect(Math.abs(slopeAt(side, y))).toBeLessThanOrEqual(most + 1e-9);
  });
});

describe('a monotone profile', () => {
  it('never leaves the range between two knots', () => {
    fc.assert(
      fc.property(
        fc.array(fc.integer({ min: 100, max: 300 }), { minLength: 3, maxLength: 7 }),
        (widths) => {
          const rows = widths.map((x, i) => ({ y: 60 * i, x }));
          const profile = monotoneProfile(rows);
          rows.slice(1).forEach((to, i) => {
            const from = rows[i] ?? to;
            for (let t = 0; t <= 1; t += 0.1) {
              const x = xAt(profile, from.y + t * 60);
              expect(x).toBeGreaterThanOrEqual(Math.min(from.x, to.x) - 1e-9);
              expect(x).toBeLessThanOrEqual(Math.max(from.x, to.x) + 1e-9);
            }
          });
        },
      ),
    );
  });
});

describe('an intake between two ends', () => {
  it('never turns negative', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 60 }),
        fc.integer({ min: 0, max: 60 }),
        (underbust, seam) => {
          const gap = positiveSpline(
            [
              { y: 0, x: 0 },
              { y: 75, x: underbust },
              { y: 97, x: seam },
            ],
            0,
            0,
          );
          for (let y = 0; y <= 97; y += 1) expect(xAt(gap, y)).toBeGreaterThan(-1e-3);
        },
      ),
    );
  });
});

describe('a rigid motion', () => {
  it('keeps lengths and can be undone', () => {
    fc.assert(
      fc.property(fc.double({ min: -3, max: 3, noNaN: true }), (angle) => {
        const by = turnAbout(point(95, 250), angle);
        const [a, b] = [point(240, 230), point(100, 180)];
        expect(distance(moved(a, by), moved(b, by))).toBeCloseTo(distance(a, b), 9);
        expect(distance(moved(moved(a, by), undo(by)), a)).toBeLessThan(1e-9);
      }),
    );
  });

  it('lays one leg of a dart on the other', () => {
    const by = layOn(point(10, 0), point(0, 1), point(30, 5), point(1, 0));
    expect(distance(moved(point(10, 0), by), point(30, 5))).toBeLessThan(1e-9);
    expect(distance(moved(point(10, 7), by), point(37, 5))).toBeLessThan(1e-9);
  });
});
