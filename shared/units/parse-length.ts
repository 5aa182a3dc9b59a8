import { millimetresPerInch } from './format-length.ts';
import { said, type Said, type Unit } from './said.ts';

/** What was typed, as millimetres, or a sentence saying why it is no length and what to type. */
export type ParsedLength = { readonly mm: number } | { readonly said: Said };

const refuse = (sentence: Said): ParsedLength => ({ said: sentence });

const vulgarFractions: Readonly<Record<string, string>> = {
  '½': '1/2',
  '¼': '1/4',
  '¾': '3/4',
  '⅛': '1/8',
  '⅜': '3/8',
  '⅝': '5/8',
  '⅞': '7/8',
  '⅓': '1/3',
  '⅔': '2/3',
};

const millimetresPer: Readonly<Record<string, number>> = {
  '"': millimetresPerInch,
  in: millimetresPerInch,
  inch: millimetresPerInch,
  inches: millimetresPerInch,
  cm: 10,
  centimetre: 10,
  centimetres: 10,
  centimeter: 10,
  centimeters: 10,
  mm: 1,
  millimetre: 1,
  millimetres: 1,
  millimeter: 1,
  millimeters: 1,
  m: 1000,
  metre: 1000,
  metres: 1000,
  meter: 1000,
  meters: 1000,
};

/** Brings the many ways of typing the same thing (curly quotes, built fractions, odd spaces) to one. */
const plain = (typed: string): string =>
  typed
    .replace(/[½¼¾⅛⅜⅝⅞⅓⅔]/gu, (glyph) => ` ${vulgarFractions[glyph] ?? ''}`)
    .replace(/[\s\u00a0\u2009\u202f]+/gu, ' ')
    .replace(/[\u2044\u2215]/gu, '/')
    .replace(/[\u2212\u2013]/gu, '-')
    .replace(/''|[\u2033\u201c\u201d]|\u2019\u2019/gu, '"')
    .replace(/ ?\/ ?/gu, '/')
    .trim()
    .toLowerCase();

/** A comma or space before three digits (`1,050`, `1 050`), or both marks in one number. */
const hasThousands = (text: string): boolean =>
  /^-?[1-9]\d{0,2}(?:,\d{3})+$/u.test(text) ||
  /^-?\d{1,3}(?: \d{3})+(?:[.,]\d+)?$/u.test(text) ||
  /\d[.,]\d+[.,]\d/u.test(text);

const example = (unit: Unit): string => (unit === 'in' ? '36 1/2' : '92.7');

/** An o for a nought or an l for a one slips in easily; the maker is shown what was read. */
const lettersIn = (text: string, unit: Unit): Said =>
  said`Letters in the figure: “${text.slice(0, 24)}”. Type it in figures only, such as ${example(unit)}, with in, cm or mm after it if you like.`;

const fractionNumber = /^(-?)(?:(\d{1,9})[ -])?(\d{1,9})\/(\d{1,9})$/u;
const decimalNumber = /^-?(?:\d{1,9}(?:[.,]\d{0,9})?|[.,]\d{1,9})$/u;

function readNumber(
  text: string,
  unit: Unit,
): { readonly value: number } | { readonly said: Said } {
  if (hasThousands(text)) {
    return {
      said: said`Leave out the mark between thousands: type 1050, not 1,050 or 1 050. A decimal comma takes one or two figures, such as 92,7.`,
    };
  }
  const fraction = fractionNumber.exec(text);
  if (fraction !== null) {
    const [, sign, whole, numerator, denominator] = fraction;
    const part = Number(numerator) / Number(denominator);
    if (Number(denominator) === 0)
      return { said: said`A fraction cannot be divided by zero: type it as 1/2, 3/8 or 5/16.` };
    if (whole !== undefined && part >= 1) {
      return {
        said: said`The fraction after a whole number must be less than one: type it as ${example('in')}.`,
      };
    }
    return { value: (sign === '-' ? -1 : 1) * (Number(whole ?? 0) + part) };
  }
  if (decimalNumber.test(text)) return { value: Number(text.replace(',', '.')) };
  if (/\d/u.test(text) && /\p{L}/u.test(text)) return { said: lettersIn(text, unit) };
  return {
    said: said`This is not a length: type a number such as ${example(unit)}, with in, cm or mm after it if you like.`,
  };
}

/**
 * Reads a length as people type it: `36 1/2`, `36½`, `36.5 in`, `36 1/2"`, `92,7`, `92.7 cm`, `927 mm`, `-1/2`.
 * A bare number is in the reader's unit. Gives millimetres (exact to 0.000001), or a sentence with the remedy.
 */
export function parseLength(typed: string, unit: Unit): ParsedLength {
  const text = plain(typed);
  if (text === '')
    return refuse(said`Nothing is typed here yet: type a length such as ${example(unit)}.`);
  if (/\d ?(?:'|\u2019|ft|feet|foot)/u.test(text)) {
    return refuse(
      said`Feet are not read here: type the whole length in inches, such as 64 1/2, or in cm.`,
    );
  }
  const parts = /^(.*?) ?("|[a-z]+\.?)?$/u.exec(text);
  const suffix = parts?.[2]?.replace(/\.$/u, '') ?? unit;
  const factor = millimetresPer[suffix];
  if (factor === undefined) {
    // No unit is so short and set so close: `39o` was meant as a figure throughout.
    if (/\d[a-z]{1,2}$/u.test(text) && suffix.length < 3) return refuse(lettersIn(text, unit));
    return refuse(
      said`“${suffix.slice(0, 12)}” is not a unit known here: use in, cm or mm, such as ${example(unit)} ${unit}.`,
    );
  }
  const number = readNumber(parts?.[1] ?? '', unit);
  if ('said' in number) return refuse(number.said);
  return { mm: Math.round(number.value * factor * 1e6) / 1e6 };
}
