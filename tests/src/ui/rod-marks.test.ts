import { describe, expect, test } from 'vitest';

import { rodMarks } from '../../../src/ui/rod-marks.ts';

describe.each(['in', 'cm'] as const)('the rod in %s', (unit) => {
  test.each([0.05, 0.2, 0.7, 2, 8])('is true to the drawing at %d pixels a millimetre', (scale) => {
    const millimetres = unit === 'in' ? 25.4 : 10;
    const figures = rodMarks(unit, scale, 130, 1200).filter(({ figure }) => figure !== undefined);
    expect(figures.length).toBeGreaterThan(0);
    for (const { at, figure } of figures) {
      const value = Number(figure?.replace('−', '-'));
      expect(at).toBeCloseTo(130 + value * millimetres * scale, 6);
    }
  });

  test.each([0.05, 0.2, 0.7, 2])('keeps its figures apart at %d pixels a millimetre', (scale) => {
    const places = rodMarks(unit, scale, 0, 4000)
      .filter(({ figure }) => figure !== undefined)
      .map(({ at }) => at);
    const gaps = places.slice(1).map((at, index) => at - (places[index] ?? 0));
    expect(Math.min(...gaps)).toBeGreaterThanOrEqual(46 - 1e-9);
  });
});
