import { formatAngle, formatFine, formatWithUnit } from './format-length.ts';
import type { Said, Unit } from './said.ts';

/** Words a sentence in the reader's unit; every length carries its unit. */
export const speak = (sentence: Said, unit: Unit): string =>
  sentence
    .map((part) => {
      if (typeof part === 'string') return part;
      if ('deg' in part) return formatAngle(part.deg);
      return part.fine === true
        ? `${formatFine(part.mm, unit)} ${unit}`
        : formatWithUnit(part.mm, unit);
    })
    .join('');
