import { formatAngle, formatFine, formatWithUnit } from './format-length.ts';
import type { Said, SaidAngle, SaidLength, Unit } from './said.ts';

/** A length that is something, however little, is not read as nothing, mm. */
const leastRead = 0.4;

/** A length in inches to a sixteenth; what is less but not nothing as the next smaller mark. */
function inches(lengthMm: number): string {
  const read = formatWithUnit(lengthMm, 'in');
  return read === '0 in' && Math.abs(lengthMm) >= leastRead ? '1\u204432 in' : read;
}

/** Words one quantity of a sentence in the reader's unit; every length carries its unit. */
export function speakQuantity(quantity: SaidLength | SaidAngle, unit: Unit): string {
  if ('deg' in quantity) return formatAngle(quantity.deg);
  if (quantity.fine === true) return `${formatFine(quantity.mm, unit)} ${unit}`;
  return unit === 'in' ? inches(quantity.mm) : formatWithUnit(quantity.mm, unit);
}

/** Words a sentence in the reader's unit. */
export const speak = (sentence: Said, unit: Unit): string =>
  sentence.map((part) => (typeof part === 'string' ? part : speakQuantity(part, unit))).join('');
