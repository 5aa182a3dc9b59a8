import { houseRuleFigures } from '#shared/drafting/house-rule-figures.ts';
import type { Drafted } from '#shared/engine/drafted.ts';
import { garmentTitles } from '#shared/exports/garment-titles.ts';
import { formatWithUnit } from '#shared/units/format-length.ts';

import { cardFields, kindOf, marked, styleFields, valueOf, type FieldKey } from './fields.ts';
import { partLabel, partWords } from './part-words.ts';
import { applies, tableChoiceKeys } from './style-choices.ts';
import { givenFor, rulesOf } from './table-inputs.ts';
import type { TableState } from './table-state.ts';

/** Nearer than this two figures are one: a field may hold what reading rounded, mm. */
const same = 0.01;

/**
 * While the last good draft stands, what it was drawn with wherever the fields now say something else:
 * `Waist: prints with 28 1⁄2 in, the last good figure`.
 */
export function lastGoodFigures(state: TableState, draft: Drafted): readonly string[] {
  if (draft.garment !== state.garment) return [`${garmentTitles[draft.garment]}, as last drawn`];
  const { card, style, rules } = draft.inputs;
  const figures = [...cardFields, ...styleFields].flatMap((field) => {
    const was = givenFor(field, card, style);
    const now = valueOf(state.entries[field]);
    const unchanged = was === undefined ? state.entries[field] === undefined : near(was, now);
    if (unchanged || !applies(field, state)) return [];
    return [
      `${partLabel(field)}: prints ${was === undefined ? 'as left open' : `with ${worded(field, was, state)}`}, the last good figure`,
    ];
  });
  const choices = tableChoiceKeys.flatMap((key) => {
    const was: unknown = Reflect.get(draft.style, key);
    if (typeof was !== 'string' || was === state[key]) return [];
    return [`${partLabel(key)}: prints ${partWords(key, was, state.unit)}, the last that held`];
  });
  const now = rulesOf(state);
  const ruled = houseRuleFigures.flatMap(({ key, label, value }) =>
    near(value(rules), value(now))
      ? []
      : [
          `${label}: prints with ${worded(`rules.${key}`, value(rules), state)}, the last good figure`,
        ],
  );
  return [...figures, ...choices, ...ruled];
}

const near = (was: number, now: number | undefined): boolean =>
  now !== undefined && Math.abs(was - now) < same;

const worded = (field: FieldKey, value: number, { unit }: TableState): string =>
  kindOf(field) === 'length' ? formatWithUnit(value, unit) : marked(field, value, unit);
