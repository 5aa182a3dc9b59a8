import { describe, expect, it } from 'vitest';
import {
  type MeasuredSquare,
  meantInstead,
  scaleCheck,
  squareSides,
} from '#shared/sheets/scale-check.ts';
import { speak } from '#shared/units/speak.ts';

/** What is found where the metric square came out this much larger or smaller, both ways alike. */
const found = (ratio: number, paper: MeasuredSquare['paper'], down = ratio) =>
  scaleCheck({
    square: 'metric',
    across: squareSides.metric * ratio,
    down: squareSides.metric * down,
    paper,
  });

const words = (finding: ReturnType<typeof scaleCheck>): string =>
  finding ? `${speak(finding.what, 'cm')} ${speak(finding.again, 'cm')}` : '';

describe('a square that was measured', () => {
  it('is true within half a millimetre, in either unit', () => {
    expect(found(1, 'A4')?.kind).toBe('true');
    expect(found(1.004, 'A4')?.kind).toBe('true');
    expect(found(1.007, 'A4')?.kind).not.toBe('true');
    const inch = {
      square: 'inch',
      across: 4 * 25.4,
      down: 4 * 25.4 - 0.4,
      paper: 'Letter',
    } as const;
    expect(scaleCheck(inch)?.kind).toBe('true');
  });

  it('tells nothing where nothing was measured', () => {
    expect(found(0, 'A4')).toBeUndefined();
    expect(found(1, 'A4', -1)).toBeUndefined();
    expect(found(Number.NaN, 'A4')).toBeUndefined();
  });

  // Plane geometry of ISO 216 A4 (210 x 297) and Letter (215.9 x 279.4).
  it('tells A4 pages fitted onto Letter paper', () => {
    const finding = found(279.4 / 297, 'A4');
    expect(finding?.kind).toBe('wrong paper');
    expect(words(finding)).toContain('fitted onto Letter');
    expect(words(finding)).toContain('Load A4');
  });

  it('tells A4 pages fitted inside the margins of Letter paper', () => {
    expect(found((279.4 - 2 * 6.35) / 297, 'A4')?.kind).toBe('wrong paper');
  });

  it('tells Letter pages fitted onto A4 paper, and that they may have been shrunk', () => {
    const finding = found(210 / 215.9, 'Letter');
    expect(finding?.kind).toBe('wrong paper');
    expect(words(finding)).toContain('fitted onto A4');
    expect(words(finding)).toContain('margins');
  });

  it.each([0.947, 0.955, 0.96, 0.97])(
    'tells A4 pages shrunk to %f inside the printer’s margins',
    (ratio) => {
      const finding = found(ratio, 'A4');
      expect(finding?.kind).toBe('fit to page');
      expect(words(finding)).toContain('actual size');
    },
  );

  it('says no such thing of a roll, which has no length to fit on', () => {
    expect(found(0.96, 'roll-36in')?.kind).toBe('scaled');
  });

  it('tells paper drawn through unevenly, and which way', () => {
    const along = found(1, 'A4', 1.012);
    expect(along?.kind).toBe('stretched');
    expect(words(along)).toContain('down the page it is 101.2 %');
    expect(words(found(0.985, 'A4', 1))).toContain('across the page it is 98.5 %');
  });

  it('tells a number typed in another unit', () => {
    for (const ratio of [2.54, 0.1, 10, 0.394]) expect(found(ratio, 'A4')?.kind).toBe('wrong unit');
    const fourTypedAsCentimetres = { square: 'inch', across: 40, down: 40, paper: 'A4' } as const;
    expect(scaleCheck(fourTypedAsCentimetres)?.kind).toBe('wrong unit');
  });

  it('tells several pages on a sheet, and pages enlarged onto the next size', () => {
    expect(words(found(0.7, 'A4'))).toContain('Several pages were put on one sheet');
    expect(words(found(1.41, 'A4'))).toContain('enlarged');
  });

  it('names the percentage to undo where nothing else fits', () => {
    const finding = found(0.88, 'A3');
    expect(finding?.kind).toBe('scaled');
    expect(words(finding)).toContain('88.0 %');
  });
});

describe('a figure typed without its unit', () => {
  it.each([
    ['97', 'cm', 'metric', '97 mm'],
    [' 97,5 ', 'cm', 'metric', '97,5 mm'],
    ['101', 'in', 'inch', '101 mm'],
    ['10', 'in', 'metric', '10 cm'],
    ['4', 'cm', 'inch', '4 in'],
    ['3 7/8', 'cm', 'inch', '3 7/8 in'],
  ] as const)(
    '“%s” for a reader of %s at the %s square is asked about',
    (typed, unit, square, meant) => {
      expect(meantInstead(typed, unit, square)).toBe(meant);
    },
  );

  it.each([
    ['9.7', 'cm', 'metric'],
    ['97 mm', 'cm', 'metric'],
    ['97 cm', 'cm', 'metric'],
    ['38 in', 'cm', 'metric'],
    ['4"', 'cm', 'inch'],
    ['6', 'cm', 'metric'],
    ['79', 'cm', 'metric'],
    ['121', 'cm', 'metric'],
    ['', 'cm', 'metric'],
    ['a lot', 'cm', 'metric'],
  ] as const)('“%s” for a reader of %s at the %s square is not', (typed, unit, square) => {
    expect(meantInstead(typed, unit, square)).toBeUndefined();
  });
});
