import type { GownContent } from '#shared/api/gowns.ts';
import type { Unit } from '#shared/units/said.ts';

import {
  fieldKeys,
  readEntry,
  rewritten,
  writeValue,
  type Entry,
  type FieldKey,
} from './fields.ts';
import {
  applies,
  cardOf,
  givenFor,
  presetOf,
  rulesOf,
  styleOf,
  type Choices,
} from './table-inputs.ts';

/** The key the name of a card goes under in the letters typed. */
const nameKey = 'card.name';

/** What lies on the table as a gown keeps it: the letters in the fields, and what they mean. */
export function contentOf(choices: Choices, unit: Unit): GownContent {
  const texts = fieldKeys.flatMap((field) => {
    const entry = choices.entries[field];
    return entry === undefined ? [] : [[field, entry.text] as const];
  });
  return {
    typed: {
      unit,
      fields: {
        ...(choices.name === '' ? {} : { [nameKey]: choices.name }),
        ...Object.fromEntries(texts),
      },
    },
    unread: fieldKeys.filter((field) => {
      const entry = choices.entries[field];
      return entry !== undefined && 'unread' in entry && applies(field, choices);
    }),
    inputs: { card: cardOf(choices), style: styleOf(choices), rules: rulesOf(choices) },
  };
}

/** What a gown keeps, laid on the table again. */
export function choicesOf({ typed, inputs }: GownContent): {
  readonly choices: Choices;
  readonly unit: Unit;
} {
  const { card, style, rules } = inputs;
  const { unit, fields } = typed;
  const entry = (field: FieldKey): Entry | undefined => {
    const text = fields[field];
    const value = givenFor(field, card, style);
    if (value !== undefined) return { text: text ?? writeValue(field, value, unit), value };
    return text === undefined ? undefined : readEntry(field, text, unit);
  };
  const entries = fieldKeys.flatMap((field) => {
    const found = entry(field);
    return found === undefined ? [] : [[field, found] as const];
  });
  return {
    unit,
    choices: {
      name: fields[nameKey] ?? card.name ?? '',
      date: card.date,
      topLine: style.topLine ?? 'sweetheart',
      shaping: style.shaping ?? 'princess',
      preset: presetOf(rules),
      entries: Object.fromEntries(entries),
    },
  };
}

/** What a gown keeps, with its figures written in the reader's unit. */
export function choicesIn(content: GownContent, unit: Unit): Choices {
  const { choices } = choicesOf(content);
  const entries = fieldKeys.flatMap((field) => {
    const entry = choices.entries[field];
    return entry === undefined ? [] : [[field, rewritten(field, entry, unit)] as const];
  });
  return { ...choices, entries: Object.fromEntries(entries) };
}

/** Whether two contents are one gown, however its figures were written. */
export const sameWork = (a: GownContent, b: GownContent): boolean =>
  a.unread.length + b.unread.length === 0 && sorted(a.inputs) === sorted(b.inputs);

/** JSON with keys in one order: the server's own order says nothing. */
const sorted = (value: unknown): string =>
  JSON.stringify(value, (_key, each: unknown) =>
    typeof each === 'object' && each !== null && !Array.isArray(each)
      ? Object.fromEntries(Object.entries(each).sort(([a], [b]) => (a < b ? -1 : 1)))
      : each,
  );
