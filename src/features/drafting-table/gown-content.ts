import type { GownContent } from '#shared/api/gowns.ts';
import { houseRuleFigures } from '#shared/drafting/house-rule-figures.ts';
import { houseRulePresets } from '#shared/drafting/house-rule-presets.ts';
import { intakePlaces, type HouseRules } from '#shared/drafting/house-rules.ts';
import { sortedJson } from '#shared/engine/sorted-json.ts';
import type { Unit } from '#shared/units/said.ts';

import {
  fieldKeys,
  readEntry,
  rewritten,
  ruleFields,
  writeValue,
  type Entry,
  type FieldKey,
} from './fields.ts';
import { applies, choicesFrom } from './style-choices.ts';
import { cardOf, givenFor, inputsOf, type Choices } from './table-inputs.ts';

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
    inputs: inputsOf(choices, cardOf(choices)),
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
    const read = text === undefined ? undefined : readEntry(field, text, unit);
    const isRule = ruleFields.some((each) => each === field);
    // A figure of the house rules is somebody's own where it was typed.
    if (isRule && (read === undefined || 'unread' in read)) return read;
    const value = isRule ? ruleIn(rules, field) : givenFor(field, card, style);
    return value === undefined ? read : { text: text ?? writeValue(field, value, unit), value };
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
      overruled: card.overruled ?? [],
      rules: begunWith(rules, (rule) => rule in fields),
      ...choicesFrom((choice): unknown =>
        choice === 'garment' ? inputs.garment : Reflect.get(style, choice),
      ),
      entries: Object.fromEntries(entries),
    },
  };
}

/** The value of a rule's field in these rules. */
function ruleIn(rules: HouseRules, field: FieldKey): number | undefined {
  const place = intakePlaces.find((each) => field === `rules.intakes.${each}`);
  if (place !== undefined) return rules.intakes?.[place];
  return houseRuleFigures.find(({ key }) => field === `rules.${key}`)?.value(rules);
}

/** The rules that figures were typed over: those of a preset, where the others are its own. */
function begunWith(rules: HouseRules, isTyped: (field: FieldKey) => boolean): HouseRules {
  const untyped = houseRuleFigures.filter(({ key }) => !isTyped(`rules.${key}`));
  const preset = Object.values(houseRulePresets).find((each) =>
    untyped.every(({ value }) => value(each) === value(rules)),
  );
  return preset === undefined
    ? rules
    : houseRuleFigures.reduce((now, { value, put }) => put(now, value(preset)), rules);
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
  a.unread.length + b.unread.length === 0 && sortedJson(a.inputs) === sortedJson(b.inputs);
