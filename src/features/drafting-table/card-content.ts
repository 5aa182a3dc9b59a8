import type { CardContent } from '#shared/api/measure-cards.ts';
import type { Unit } from '#shared/units/said.ts';

import { fieldKeys, rewritten } from './fields.ts';
import { choicesFrom } from './style-choices.ts';
import { choicesOf, contentOf, sameWork } from './gown-content.ts';
import type { Choices } from './table-inputs.ts';

/** What a measure card of its own keeps of the table: the measures, whose they are and of which day. */
export function cardContentOf(choices: Choices, unit: Unit): CardContent {
  const { typed, inputs } = contentOf(choices, unit);
  const fields = Object.entries(typed.fields).filter(([key]) => key.startsWith('card.'));
  return { typed: { unit, fields: Object.fromEntries(fields) }, card: inputs.card };
}

/** The table with a kept card laid on it: every measure is the card's, the style stays. */
export function cardChoices(
  choices: Choices & { readonly unit: Unit },
  card: CardContent,
): Choices {
  const { choices: laid } = choicesOf(asGown(choices, card));
  const entries = fieldKeys.flatMap((field) => {
    const entry = (field.startsWith('card.') ? laid : choices).entries[field];
    return entry === undefined ? [] : [[field, rewritten(field, entry, choices.unit)] as const];
  });
  const { name, date, overruled } = laid;
  return {
    ...choicesFrom((choice) => choices[choice]),
    ...{ name, date, overruled, rules: choices.rules },
    entries: Object.fromEntries(entries),
  };
}

/** The gown a card alone would be. */
const asGown = (choices: Choices, { typed, card }: CardContent) => {
  const { inputs } = contentOf(choices, typed.unit);
  return { typed, unread: [], inputs: { card, style: {}, rules: inputs.rules } };
};

/** Whether two cards hold the same measures, however they were written. */
export const sameCard = (choices: Choices, a: CardContent, b: CardContent): boolean =>
  sameWork(asGown(choices, a), asGown(choices, b));
