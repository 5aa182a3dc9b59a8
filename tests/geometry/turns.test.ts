import { describe, expect, test } from 'vitest';
import { cubic, line } from '#shared/geometry/path.ts';
import { point } from '#shared/geometry/point.ts';
import { bendChanges, turnsAlong } from '#shared/geometry/turns.ts';

const seen = { least: 0.5, kink: 2 };

/** An S from left to right, its two bends as deep as asked. */
const ess = (deep: number) => [
  cubic(point(0, 0), point(50, -deep), point(50, -deep), point(100, 0)),
  cubic(point(100, 0), point(150, deep), point(150, deep), point(200, 0)),
];

describe('how a path bends', () => {
  test('a quarter of a circle turns ninety degrees and never changes its bend', () => {
    const k = 55.228475;
    const quarter = [cubic(point(100, 0), point(100, k), point(k, 100), point(0, 100))];
    const turns = turnsAlong(quarter);
    expect(turns.reduce((sum, { degrees }) => sum + degrees, 0)).toBeCloseTo(90, 6);
    expect(bendChanges(turns, seen)).toEqual([]);
  });

  test('an S changes once, in its middle', () => {
    const [at, ...others] = bendChanges(turnsAlong(ess(20)), seen);
    expect(others).toEqual([]);
    expect(at?.x).toBeCloseTo(100, 0);
  });

  test('a cubic with its inflection inside is split there', () => {
    const one = [cubic(point(0, 0), point(70, 60), point(30, -60), point(100, 0))];
    expect(bendChanges(turnsAlong(one), seen).map(({ x }) => Math.round(x))).toEqual([50]);
  });

  test('bends too slight to be seen are none, and do not part the bend they lie in', () => {
    expect(bendChanges(turnsAlong(ess(0.3)), seen)).toEqual([]);
    const deep = { least: 100, kink: 2 };
    expect(bendChanges(turnsAlong(ess(20)), deep)).toEqual([]);
  });

  test('a corner counts however short it is', () => {
    const step = [
      line(point(0, 0), point(100, 0)),
      line(point(100, 0), point(101, 1)),
      line(point(101, 1), point(200, 1)),
    ];
    expect(bendChanges(turnsAlong(step), seen)).toHaveLength(1);
  });
});
