import { coreMeasures, furtherMeasures, type MeasureKey } from '#shared/body/card.ts';
import {
  easeLevels,
  styleLengths,
  type EaseLevel,
  type StyleLength,
} from '#shared/drafts/gown/style-card.ts';
import { formatLength } from '#shared/units/format-length.ts';
import { parseAngle } from '#shared/units/parse-angle.ts';
import { parseLength } from '#shared/units/parse-length.ts';
import type { Said, Unit } from '#shared/units/said.ts';

/** The dotted key of a figure, the same as in the contract's problems. */
export type FieldKey = `card.${MeasureKey}` | `style.${StyleLength}` | `style.ease.${EaseLevel}`;

export const fieldKeys: readonly FieldKey[] = [
  ...[...coreMeasures, ...furtherMeasures].map((key) => `card.${key}` as const),
  ...styleLengths.map((key) => `style.${key}` as const),
  ...easeLevels.map((level) => `style.ease.${level}` as const),
];

/** What stands in a field: the text as typed, and what it means where it can be read. */
export type Entry =
  | { readonly text: string; readonly value: number }
  | { readonly text: string; readonly unread: Said };

export type Entries = { readonly [K in FieldKey]?: Entry };

const degrees: readonly FieldKey[] = ['card.shoulderSlope'];
const plainNumbers: readonly FieldKey[] = ['style.flareFraction'];

/** Reads a field's text: millimetres, degrees for the shoulder slope, parts of a circle for the flare. */
export function readEntry(field: FieldKey, text: string, unit: Unit): Entry {
  if (plainNumbers.includes(field)) return { text, value: Number(text) };
  const read = degrees.includes(field) ? parseAngle(text) : parseLength(text, unit);
  if ('said' in read) return { text, unread: read.said };
  return { text, value: 'mm' in read ? read.mm : read.deg };
}

/** A value as it stands in its field, without the unit. */
export function writeValue(field: FieldKey, value: number, unit: Unit): string {
  if (plainNumbers.includes(field)) return String(value);
  if (degrees.includes(field)) return String(Math.round(value * 10) / 10);
  return formatLength(value, unit);
}

/** A value with the sign of what it is, where that is no length. */
export const marked = (field: FieldKey, value: number, unit: Unit): string =>
  writeValue(field, value, unit) + (degrees.includes(field) ? '°' : '');

export const valueOf = (entry: Entry | undefined): number | undefined =>
  entry !== undefined && 'value' in entry ? entry.value : undefined;

/** The same entry for another reader: a value is written anew, what could not be read stays as typed. */
export const rewritten = (field: FieldKey, entry: Entry, unit: Unit): Entry =>
  'value' in entry ? { text: writeValue(field, entry.value, unit), value: entry.value } : entry;
