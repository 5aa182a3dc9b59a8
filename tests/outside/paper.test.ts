import { describe, expect, test } from 'vitest';
import { testSquares } from '#shared/exports/cover.ts';
import { isoA, papers, toPoints } from '#shared/sheets/papers.ts';
import { tileGrid } from '#shared/sheets/tile-grid.ts';
import { millimetresPerInch } from '#shared/units/format-length.ts';
import { parseLength } from '#shared/units/parse-length.ts';

describe('the inch and what is measured in it', () => {
  // International yard and pound agreement, 1959 (from memory).
  test('one inch is 25.4 mm, exactly', () => {
    expect(millimetresPerInch).toBe(25.4);
    expect(parseLength('1 in', 'cm')).toEqual({ mm: 25.4 });
  });

  // ISO 32000, default user space unit 1/72 in (from memory).
  test('one PDF unit is 0.352778 mm (± 0.000001)', () => {
    expect(Math.abs(1 / toPoints(1) - 0.352778)).toBeLessThanOrEqual(1e-6);
  });
});

describe('paper', () => {
  // ISO 216 (from memory): A4 is 210 x 297 mm.
  test('A4 is 595.276 by 841.890 points (± 0.001)', () => {
    expect(Math.abs(toPoints(papers.A4.width) - 595.276)).toBeLessThanOrEqual(0.001);
    expect(Math.abs(toPoints(papers.A4.height) - 841.89)).toBeLessThanOrEqual(0.001);
  });

  // ANSI/ASME Y14.1 (from memory): Letter is 8 1/2 x 11 in.
  test('Letter is 612 by 792 points, 215.9 by 279.4 mm', () => {
    expect([papers.Letter.width, papers.Letter.height]).toEqual([215.9, 279.4]);
    expect(toPoints(papers.Letter.width)).toBeCloseTo(612, 9);
    expect(toPoints(papers.Letter.height)).toBeCloseTo(792, 9);
  });

  // ISO 216 (from memory).
  test.each([
    [0, 841, 1189],
    [1, 594, 841],
    [2, 420, 594],
    [3, 297, 420],
  ])('A%i is %i by %i mm, exactly', (size, width, height) => {
    expect(isoA(size)).toEqual({ width, height });
  });

  // Common practice: a printed square of 10 cm is measured before anything is cut, ± 0.5 mm.
  test('the test square of the cover is 100 mm, and the other 4 in', () => {
    const squares = testSquares({ ...papers.A4, margin: 10 });
    expect(squares.metric.side).toBe(100);
    expect(squares.inch.side).toBeCloseTo(4 * 25.4, 9);
  });
});

describe('tiling', () => {
  // Derived from ceil((side - overlap) / (printed - overlap)); common practice of home printing.
  test('a drawing of 100 by 160 cm on A4, margins and overlap 10 mm, takes 6 by 6 = 36 sheets', () => {
    const { use, rows, columns } = tileGrid({ width: 1000, height: 1600 }, papers.A4);
    expect(use).toEqual({ width: 190, height: 277 });
    expect([columns, rows, columns * rows]).toEqual([6, 6, 36]);
  });
});
