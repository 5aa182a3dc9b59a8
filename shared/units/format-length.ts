import type { Unit } from './said.ts';

/** Millimetres in an inch, exact since the international inch of 1959. */
export const millimetresPerInch = 25.4;

/**
 * Half a sixteenth of an inch: as far as a bound may lie from how it reads. Checks allow it, so that a bound typed as it
 * was shown is taken.
 */
export const readingGrace = millimetresPerInch / 32;

const minus = '\u2212';
/** Keeps the whole and its fraction on one line: parted, they would be read as two numbers. */
const join = '\u00a0';
/** Digits on both sides of it are set as a built fraction by the font. */
const fractionSlash = '\u2044';

const signed = (negative: boolean, text: string): string => (negative ? minus + text : text);

const decimal = (value: number, digits: number): string => {
  const text = Math.abs(value).toFixed(digits);
  return signed(value < 0 && Number(text) !== 0, text);
};

/**
 * Inches as a tape reads them, to the nearest sixteenth (or eighth): `36 1⁄2`, `5⁄16`, `0`. Built with the
 * fraction slash throughout: Source Sans 3 as shipped has ½ ¼ ¾ but no glyphs for the eighths.
 */
export function formatInches(lengthMm: number, denominator: 8 | 16 = 16): string {
  const parts = Math.round((Math.abs(lengthMm) / millimetresPerInch) * denominator);
  // Nobody reads a fraction of a length beyond all bodies; it only has to be shown in a refusal.
  if (parts > Number.MAX_SAFE_INTEGER) return decimal(lengthMm / millimetresPerInch, 0);
  const whole = Math.floor(parts / denominator);
  let numerator = parts % denominator;
  let divisor: number = denominator;
  while (numerator > 0 && numerator % 2 === 0) {
    numerator /= 2;
    divisor /= 2;
  }
  const fraction = numerator === 0 ? '' : `${String(numerator)}${fractionSlash}${String(divisor)}`;
  const text =
    whole === 0 && fraction !== ''
      ? fraction
      : [String(whole), fraction].filter(Boolean).join(join);
  return signed(lengthMm < 0 && parts > 0, text);
}

/** A length (mm) as the maker reads it, without the unit: cm to one decimal, inches to a sixteenth. */
export const formatLength = (lengthMm: number, unit: Unit): string =>
  unit === 'cm' ? decimal(lengthMm / 10, 1) : formatInches(lengthMm);

/** A length (mm) for the proof, without the unit: cm to two decimals, inches to three. */
export const formatFine = (lengthMm: number, unit: Unit): string =>
  unit === 'cm' ? decimal(lengthMm / 10, 2) : decimal(lengthMm / millimetresPerInch, 3);

/** A length (mm) with its unit: `92.7 cm`, `36 1⁄2 in`. */
export const formatWithUnit = (lengthMm: number, unit: Unit): string =>
  `${formatLength(lengthMm, unit)} ${unit}`;

/** Degrees to one decimal: `12.5°`. */
export const formatAngle = (degrees: number): string => `${decimal(degrees, 1)}°`;
