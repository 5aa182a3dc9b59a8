import { overruledWith, longestReason } from '#shared/api/card.ts';
import { keptText } from '#shared/api/kept-text.ts';
import { houseRules } from '#shared/api/rules.ts';

import { fieldKeys, readEntry, rewritten, type Entry, type FieldKey } from './fields.ts';
import type { Unit } from '#shared/units/said.ts';
import { isRecord } from './is-record.ts';
import { choicesFrom, tableChoiceKeys, type TableChoice } from './style-choices.ts';
import type { Choices } from './table-inputs.ts';

/** Kept as JSON: they are compared and put back whole. */
const writtenKeys = ['overruled', 'rules'] as const;
type WrittenKey = (typeof writtenKeys)[number];
type ChoiceKey = 'name' | 'date' | TableChoice | WrittenKey;
const choiceKeys: readonly ChoiceKey[] = ['name', 'date', ...tableChoiceKeys, ...writtenKeys];
export type PartKey = FieldKey | ChoiceKey;

/** One part of what lies on the table: a figure's entry or a choice's word; null where it is left open. */
export type Part = Entry | string | null;

/** Some of the parts of a table, each under its key. */
export type Parts = { readonly [K in PartKey]?: Part };

export const partKeys: readonly PartKey[] = [...choiceKeys, ...fieldKeys];

const isChoice = (key: PartKey): key is ChoiceKey => choiceKeys.some((each) => each === key);

const isWritten = (key: PartKey): key is WrittenKey => writtenKeys.some((each) => each === key);

export function partOf(choices: Choices, key: PartKey): Part {
  if (isWritten(key)) return JSON.stringify(choices[key]);
  return (isChoice(key) ? choices[key] : choices.entries[key]) ?? null;
}

/** Whether two parts mean the same; how a figure was written does not matter where it could be read. */
export function samePart(a: Part, b: Part): boolean {
  if (a === b) return true;
  if (a === null || b === null || typeof a === 'string' || typeof b === 'string') return false;
  return 'value' in a && 'value' in b ? a.value === b.value : !('value' in a) && a.text === b.text;
}

/** The keys of the parts in which two tables differ, in the order of the cards. */
export const differingParts = (a: Choices, b: Choices): readonly PartKey[] =>
  a === b ? [] : partKeys.filter((key) => !samePart(partOf(a, key), partOf(b, key)));

/** The table with some parts put in place; figures are written in the reader's unit. */
export function withParts(choices: Choices, parts: Parts, unit: Unit): Choices {
  const word = (key: ChoiceKey): string | undefined => {
    const part = key in parts ? (parts[key] ?? null) : partOf(choices, key);
    return typeof part === 'string' ? part : undefined;
  };
  const entries = fieldKeys.flatMap((field) => {
    const part = field in parts ? parts[field] : choices.entries[field];
    if (part === undefined || part === null || typeof part === 'string') return [];
    return [[field, field in parts ? rewritten(field, part, unit) : part] as const];
  });
  return {
    name: word('name') ?? '',
    date: word('date'),
    ...choicesFrom(word),
    overruled: readOverruled(jsonIn(word('overruled'))) ?? choices.overruled,
    rules: readRules(jsonIn(word('rules'))) ?? choices.rules,
    entries: Object.fromEntries(entries),
  };
}

function jsonIn(text: string | undefined): unknown {
  try {
    return JSON.parse(text ?? 'null');
  } catch {
    return undefined;
  }
}

/** House rules as they were kept; no answer where they cannot be trusted. */
export const readRules = (kept: unknown) => houseRules.safeParse(kept).data;

/** Overruled warnings as they were kept; no answer where they cannot be trusted. */
export const readOverruled = (kept: unknown) =>
  overruledWith(keptText(longestReason)).safeParse(kept).data;

/** Parts as a browser kept them: a value is trusted as a number, other text is read again. */
export function keptParts(kept: unknown, unit: Unit): Parts {
  if (!isRecord(kept)) return {};
  return Object.fromEntries(
    partKeys.flatMap((key): (readonly [PartKey, Part])[] => {
      const part = kept[key];
      if (part === null) return [[key, null]];
      if (isChoice(key)) return typeof part === 'string' ? [[key, part]] : [];
      if (!isRecord(part) || typeof part['text'] !== 'string') return [];
      const { text, value } = part;
      const isValue = typeof value === 'number' && Number.isFinite(value);
      return [[key, isValue ? { text, value } : readEntry(key, text, unit)]];
    }),
  );
}
