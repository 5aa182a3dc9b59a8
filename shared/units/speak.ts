import { formatAngle, formatFine, formatInches, formatWithUnit } from './format-length.ts';
import type { Said, SaidAngle, SaidLength, Unit } from './said.ts';

/** A length that is something, however little, is not read as nothing, mm. */
const leastRead = 0.4;

/** A length (mm) in inches to a sixteenth, without the unit; what is less but not nothing as the next smaller mark. */
export function readInches(lengthMm: number): string {
  const read = formatInches(lengthMm);
  return read === '0' && Math.abs(lengthMm) >= leastRead ? '1\u204432' : read;
}

/** Words one quantity of a sentence in the reader's unit; every length carries its unit. */
export function speakQuantity(quantity: SaidLength | SaidAngle, unit: Unit): string {
  if ('deg' in quantity) return formatAngle(quantity.deg);
  if (quantity.fine === true) return `${formatFine(quantity.mm, unit)} ${unit}`;
  return unit === 'in' ? `${readInches(quantity.mm)} in` : formatWithUnit(quantity.mm, unit);
}

/** Words a sentence in the reader's unit. */
export const speak = (sentence: Said, unit: Unit): string =>
  sentence.map((part) => (typeof part === 'string' ? part : speakQuantity(part, unit))).join('');
