import type { DraftedInputs } from '../engine/drafted.ts';

/**
 * The inputs of a draft as a class may see them: the measures that the drawing itself shows, and no
 * name, day or anything else of the person they belong to.
 */
export function classCopy(inputs: DraftedInputs): DraftedInputs {
  const { name: _name, date: _date, ...card } = inputs.card;
  return { ...inputs, card };
}

/** The same draft on another body's card: its style and house rules stay, its measures are the learner's. */
export const onCard = (inputs: DraftedInputs, card: DraftedInputs['card']): DraftedInputs => ({
  ...inputs,
  card,
});
