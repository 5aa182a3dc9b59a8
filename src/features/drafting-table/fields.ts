import { coreMeasures, furtherMeasures, type MeasureKey } from '#shared/body/card.ts';
import { houseRuleFigures, type HouseRuleKey } from '#shared/drafting/house-rule-figures.ts';
import type { IntakePlace } from '#shared/drafting/house-rules.ts';
import { intakeFigures } from '#shared/drafting/intake-figures.ts';
import {
  easeLevels,
  plainNumbers,
  styleLengths,
  type EaseLevel,
  type StyleLength,
} from '#shared/drafts/gown/style-card.ts';
import type { Garment } from '#shared/engine/drafted.ts';
import { formatLength } from '#shared/units/format-length.ts';
import { parseAngle } from '#shared/units/parse-angle.ts';
import { parseLength } from '#shared/units/parse-length.ts';
import type { Said, Unit } from '#shared/units/said.ts';

import { parseNumber } from './parse-number.ts';

/** Figures of the blocks' style cards that no gown has. */
export const blockLengths = ['armholeDrop', 'shoulderEase', 'seat', 'length'] as const;
export type BlockLength = (typeof blockLengths)[number];

/** The dotted key of a figure, the same as in the contract's problems. */
export type FieldKey =
  | `card.${MeasureKey}`
  | `style.${StyleLength}`
  | `style.ease.${EaseLevel}`
  | `style.${BlockLength}`
  | `rules.${HouseRuleKey}`
  | `rules.intakes.${IntakePlace}`;

export const cardFields = [...coreMeasures, ...furtherMeasures].map(
  (key) => `card.${key}` as const,
);
const gownFields = [
  ...styleLengths.map((key) => `style.${key}` as const),
  ...easeLevels.map((level) => `style.ease.${level}` as const),
];
export const styleFields = [...gownFields, ...blockLengths.map((key) => `style.${key}` as const)];

/** The figures of each garment's style card. */
export const fieldsOf: { readonly [G in Garment]: ReadonlySet<FieldKey> } = {
  gown: new Set(gownFields),
  'bodice-block': new Set([
    'style.ease.bust',
    'style.ease.waist',
    'style.armholeDrop',
    'style.shoulderEase',
  ]),
  'skirt-block': new Set(['style.ease.waist', 'style.ease.hip', 'style.seat', 'style.length']),
};
export const intakeFields = intakeFigures.map(({ place }) => `rules.intakes.${place}` as const);
export const ruleFields = [
  ...houseRuleFigures.map(({ key }) => `rules.${key}` as const),
  ...intakeFields,
];

export const fieldKeys: readonly FieldKey[] = [...cardFields, ...styleFields, ...ruleFields];

/** What stands in a field: the text as typed, and what it means where it can be read. */
export type Entry =
  | { readonly text: string; readonly value: number }
  | { readonly text: string; readonly unread: Said };

export type Entries = { readonly [K in FieldKey]?: Entry };

type Kind = 'length' | 'angle' | 'number' | 'share';

const kinds = new Map<FieldKey, Kind>([
  ['card.shoulderSlope', 'angle'],
  ...plainNumbers.map((key): [FieldKey, Kind] => [`style.${key}`, 'number']),
  ...houseRuleFigures
    .filter(({ share }) => share)
    .map(({ key }): [FieldKey, Kind] => [`rules.${key}`, 'share']),
]);

/** What a figure is; most are lengths. */
export const kindOf = (field: FieldKey): Kind => kinds.get(field) ?? 'length';

/** Reads a field's text: millimetres, degrees for the shoulder slope, plain numbers and shares of one. */
export function readEntry(field: FieldKey, text: string, unit: Unit): Entry {
  const kind = kindOf(field);
  if (kind === 'length' || kind === 'angle') {
    const read = kind === 'angle' ? parseAngle(text) : parseLength(text, unit);
    if ('said' in read) return { text, unread: read.said };
    return { text, value: 'mm' in read ? read.mm : read.deg };
  }
  const read = parseNumber(text);
  if (typeof read !== 'number') return { text, unread: read.said };
  return { text, value: kind === 'share' ? read / 100 : read };
}

/** A value as it stands in its field, without the unit; shares as per cents. */
export function writeValue(field: FieldKey, value: number, unit: Unit): string {
  switch (kindOf(field)) {
    case 'length':
      return formatLength(value, unit);
    case 'angle':
      return String(Math.round(value * 10) / 10);
    case 'number':
      return String(Math.round(value * 1000) / 1000);
    case 'share':
      return String(Math.round(value * 10_000) / 100);
  }
}

const marks: { readonly [K in Kind]: string } = { length: '', angle: '°', number: '', share: ' %' };

/** A value with the sign of what it is, where that is no length. */
export const marked = (field: FieldKey, value: number, unit: Unit): string =>
  writeValue(field, value, unit) + marks[kindOf(field)];

export const valueOf = (entry: Entry | undefined): number | undefined =>
  entry !== undefined && 'value' in entry ? entry.value : undefined;

/** The same entry for another reader: a value is written anew, what could not be read stays as typed. */
export const rewritten = (field: FieldKey, entry: Entry, unit: Unit): Entry =>
  'value' in entry ? { text: writeValue(field, entry.value, unit), value: entry.value } : entry;
