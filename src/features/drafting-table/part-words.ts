import { coreMeasures, furtherMeasures } from '#shared/body/card.ts';
import { measureGuide } from '#shared/body/measure-guide.ts';
import { styleLabels } from '#shared/drafts/gown/style-labels.ts';
import { styleKeys } from '#shared/drafts/gown/style-limits.ts';
import type { Unit } from '#shared/units/said.ts';

import { rewritten, type FieldKey } from './fields.ts';
import type { Change } from './history.ts';
import { partKeys, type Part, type PartKey } from './parts.ts';

const choiceWords = {
  name: 'Whose card',
  date: 'Day of the card',
  topLine: 'Top line',
  shaping: 'Shaping',
  preset: 'House rule for the side seam',
} as const;

const words = new Map<string, string>([
  ...Object.entries(choiceWords),
  ...[...coreMeasures, ...furtherMeasures].map(
    (key) => [`card.${key}`, measureGuide[key].label] as const,
  ),
  ...styleKeys.map((key) => [`style.${key}`, styleLabels[key]] as const),
]);

/** The trade's word for a part of the table. */
export const partLabel = (key: PartKey): string => words.get(key) ?? key;

/** A part as the reader writes it; what is left open says so. */
export function partWords(key: PartKey, part: Part, unit: Unit): string {
  if (part === null || part === '') return 'left open';
  if (typeof part === 'string') return part === 'quarterRule' ? 'quarter rule' : part;
  return isField(key) ? rewritten(key, part, unit).text : part.text;
}

const isField = (key: PartKey): key is FieldKey => key.includes('.');

/** What a change was about: `neck depth`, or how many things at once. */
export function changeWords({ before, after }: Change): string {
  const keys = partKeys.filter((key) => key in before || key in after);
  const [only] = keys;
  return keys.length === 1 && only !== undefined
    ? partLabel(only).toLowerCase()
    : `${keys.length} changes at once`;
}
