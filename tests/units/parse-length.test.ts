import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatFine, formatInches, formatLength } from '#shared/units/format-length.ts';
import { parseAngle } from '#shared/units/parse-angle.ts';
import { parseLength } from '#shared/units/parse-length.ts';
import type { Unit } from '#shared/units/said.ts';
import { speak } from '#shared/units/speak.ts';

const read = (typed: string, unit: Unit): number | string => {
  const parsed = parseLength(typed, unit);
  return 'mm' in parsed ? parsed.mm : speak(parsed.said, unit);
};

describe('a length as people type it', () => {
  it.each<[string, Unit, number]>([
    // 1 in = 25.4 mm exactly: international inch 1959 (reference.md section 5 no. 1, from memory)
    ['1', 'in', 25.4],
    ['1 in', 'cm', 25.4],
    ['36 1/2', 'in', 927.1],
    ['36½', 'in', 927.1],
    ['36 ½"', 'cm', 927.1],
    ['36-1/2', 'in', 927.1],
    ['36 1⁄2', 'in', 927.1],
    ['36.5 in', 'cm', 927.1],
    ['36 1/2"', 'cm', 927.1],
    ['36 1/2”', 'cm', 927.1],
    ["36 1/2''", 'cm', 927.1],
    ['36.5 Inches', 'cm', 927.1],
    ['92,7', 'cm', 927],
    ['92.7 cm', 'in', 927],
    ['92.7cm', 'in', 927],
    ['927 mm', 'in', 927],
    ['1.65 m', 'cm', 1650],
    ['  92.7  ', 'cm', 927],
    ['5/16', 'in', 7.9375],
    ['.5', 'in', 12.7],
    ['0,125', 'in', 3.175],
    ['36.125', 'in', 917.575],
    ['-1/2', 'in', -12.7],
    ['−1 1/4', 'in', -31.75],
    ['-2', 'cm', -20],
    ['0', 'cm', 0],
  ])('%s read by a maker in %s is %d mm', (typed, unit, expected) => {
    expect(read(typed, unit)).toBe(expected);
  });

  it.each<[string, Unit, RegExp]>([
    ['', 'cm', /Nothing is typed/],
    ['   ', 'in', /Nothing is typed/],
    ['abc', 'cm', /not a unit/],
    ['12 parsecs', 'cm', /not a unit known here: use in, cm or mm/],
    ['36 1/0', 'in', /divided by zero/],
    ['36 5/4', 'in', /less than one/],
    ['36 1/2 1/4', 'in', /not a length/],
    ['36.5 1/2', 'in', /not a length/],
    ['1,050', 'cm', /type 1050/],
    ['1 050', 'cm', /type 1050/],
    ['1.050,5', 'cm', /type 1050/],
    ['1,050.5 mm', 'cm', /type 1050/],
    ["5' 4", 'in', /Feet are not read/],
    ['5 ft 4 in', 'in', /Feet are not read/],
    ['cm', 'cm', /not a length/],
    ['--3', 'cm', /not a length/],
    ['9'.repeat(40), 'cm', /not a length/],
    ['1e5', 'cm', /Letters in the figure: “1e5”/],
    ['39o', 'in', /Letters in the figure: “39o”.*36 1\/2/],
    ['36 l/2', 'in', /Letters in the figure/],
    ['o.5', 'cm', /Letters in the figure/],
    ['NaN', 'cm', /not a unit/],
  ])('%j is refused with the remedy', (typed, unit, message) => {
    expect(read(typed, unit)).toMatch(message);
  });

  it('never throws and never gives anything but a finite length, whatever is typed', () => {
    fc.assert(
      fc.property(
        fc.string({ unit: 'binary' }),
        fc.constantFrom<Unit>('cm', 'in'),
        (typed, unit) => {
          const parsed = parseLength(typed, unit);
          return 'mm' in parsed ? Number.isFinite(parsed.mm) : parsed.said.length > 0;
        },
      ),
    );
  });
});

describe('a length as it is written', () => {
  it.each<[number, string]>([
    [927.1, '36 1⁄2'],
    [0, '0'],
    [0.5, '0'],
    [-0.5, '0'],
    [7.9375, '5⁄16'],
    [25.4, '1'],
    [25.3, '1'],
    [-12.7, '−1⁄2'],
    [231.775, '9 1⁄8'],
  ])('%d mm reads in inches as %s', (lengthMm, expected) => {
    expect(formatInches(lengthMm).replace('\u00a0', ' ')).toBe(expected);
  });

  it('reads to eighths where the chalk sheet asks for them, to tenths of a centimetre otherwise', () => {
    expect(formatInches(7.9375, 8)).toBe('3⁄8');
    expect(formatLength(927.04, 'cm')).toBe('92.7');
    expect(formatLength(-0.4, 'cm')).toBe('0.0');
    expect(formatFine(565.2, 'cm')).toBe('56.52');
    expect(formatFine(565.2, 'in')).toBe('22.252');
  });

  it('read back gives the length again within half a sixteenth of an inch or half a millimetre', () => {
    fc.assert(
      fc.property(fc.double({ min: -500, max: 3000, noNaN: true }), (lengthMm) => {
        const inches = parseLength(formatLength(lengthMm, 'in'), 'in');
        const centimetres = parseLength(formatLength(lengthMm, 'cm'), 'cm');
        expect('mm' in inches && Math.abs(inches.mm - lengthMm)).toBeLessThanOrEqual(
          25.4 / 32 + 1e-6,
        );
        expect('mm' in centimetres && Math.abs(centimetres.mm - lengthMm)).toBeLessThanOrEqual(
          0.5 + 1e-6,
        );
      }),
    );
  });

  it('typed to a sixteenth is written back as it was typed', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 2000 }), (sixteenths) => {
        const parsed = parseLength(`${String(sixteenths)}/16 in`, 'cm');
        expect('mm' in parsed && read(formatLength(parsed.mm, 'in'), 'in')).toBe(
          'mm' in parsed && parsed.mm,
        );
      }),
    );
  });
});

describe('an angle as people type it', () => {
  it('takes degrees with a point or a comma, and explains anything else', () => {
    expect(parseAngle('22,5°')).toEqual({ deg: 22.5 });
    expect(parseAngle('20 deg')).toEqual({ deg: 20 });
    expect(parseAngle('steep')).toHaveProperty('said');
  });
});
