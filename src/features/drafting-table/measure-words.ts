import { agreements } from '#shared/body/agreements.ts';
import type { MeasureKey } from '#shared/body/card.ts';
import { measureGuide } from '#shared/body/measure-guide.ts';
import { formatLength, formatWithUnit } from '#shared/units/format-length.ts';
import type { Unit } from '#shared/units/said.ts';

/** Within what a measure is believed, and how far two takings of it may differ. */
export function boundsWords(key: MeasureKey, unit: Unit): string {
  const { min, max, tolerance, kind } = measureGuide[key];
  if (kind === 'angle') return `${min} to ${max}°; two takings agree within ${tolerance}°.`;
  // Tolerances are finer than a tape in inches reads, so they stand in millimetres.
  return `${formatLength(min, unit)} to ${formatWithUnit(max, unit)}; two takings agree within ${tolerance} mm.`;
}

/** The measures it must agree with, each in a sentence. */
export const companyWords = (key: MeasureKey, unit: Unit): readonly string[] =>
  agreements.flatMap(({ larger, smaller, half, possible, usual }) => {
    if (larger !== key && smaller !== key) return [];
    const [least, most] = usual ?? possible;
    const name = (each: MeasureKey) => measureGuide[each].label.toLowerCase();
    const other = half === true ? `half of ${name(larger)}` : name(larger);
    // Where no end is set the bound is far out of any body's reach.
    if (most >= 1000) return [`${capital(other)} is more than ${name(smaller)}.`];
    return [
      `${capital(other)} less ${name(smaller)} is ${usual === undefined ? '' : 'usually '}${formatLength(least, unit)} to ${formatWithUnit(most, unit)}.`,
    ];
  });

const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);
