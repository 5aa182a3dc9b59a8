import { describe, expect, test } from 'vitest';
import {
  type PlannedWaist,
  evenSideHeight,
  intakeFor,
  waistLength,
  waistLine,
} from '#shared/drafting/waist-line.ts';
import { endTangent, startTangent } from '#shared/geometry/curve.ts';
import { type Point, dot, point, subtract, unit } from '#shared/geometry/point.ts';

const skirtWaist: PlannedWaist = {
  centre: 0,
  darts: [
    { axis: 75, tip: 140, share: 0.5 },
    { axis: 150, tip: 125, share: 0.5 },
  ],
  side: point(222, -9),
  sideSlope: -0.2,
};

const squareTo = (along: Point, leg: Point): number => Math.abs(dot(along, unit(leg)));

describe('a waist line with straight darts', () => {
  test('sewn, it is as long as was asked, whatever the darts take', () => {
    for (const length of [170, 180, 190, 200]) {
      const waist = waistLine(skirtWaist, intakeFor(skirtWaist, length));
      expect(waistLength(waist)).toBeCloseTo(length, 8);
    }
  });

  test('it sets out level and meets both legs of every dart squarely, so it closes without a kink', () => {
    const waist = waistLine(skirtWaist, 40);
    expect(startTangent(waist.stretches[0] ?? []).y).toBeCloseTo(0, 9);
    waist.mouths.forEach(({ centre, side }, k) => {
      const tip = point((centre.x + side.x) / 2, skirtWaist.darts[k]?.tip ?? 0);
      expect(centre.y).toBe(side.y);
      expect(squareTo(endTangent(waist.stretches[k] ?? []), subtract(tip, centre))).toBeLessThan(
        1e-6,
      );
      expect(
        squareTo(startTangent(waist.stretches[k + 1] ?? []), subtract(tip, side)),
      ).toBeLessThan(1e-6);
    });
  });

  test('it rises to a side that slants, by half the slope, and by 20 at most', () => {
    const plain: PlannedWaist = { ...skirtWaist, darts: [], sideSlope: -0.1 };
    expect(evenSideHeight(plain, 0)).toBeCloseTo(-11.1, 9);
    expect(evenSideHeight({ ...plain, sideSlope: -0.9 }, 0)).toBe(-20);
    expect(evenSideHeight({ ...plain, sideSlope: 0.9 }, 0)).toBe(20);
  });

  test('where the rise is held back it never turns back on itself', () => {
    const steep: PlannedWaist = {
      ...skirtWaist,
      darts: [],
      side: point(222, -20),
      sideSlope: -0.5,
    };
    const [curve] = waistLine(steep, 0).stretches[0] ?? [];
    if (curve?.kind !== 'cubic') throw new Error('a waist line is a curve');
    expect(curve.c2.y).toBeLessThanOrEqual(0);
    expect(curve.c2.y).toBeGreaterThanOrEqual(-20);
  });
});
