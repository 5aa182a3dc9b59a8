import { type MeasureCard, type MeasureKey, coreMeasures, furtherMeasures } from '../body/card.ts';
import type { DraftedInputs } from '../engine/drafted.ts';

/** Some of a card's measures, and nothing else that stands on it. */
function only<K extends MeasureKey>(card: MeasureCard, keys: readonly K[]): Pick<MeasureCard, K> {
  const given = keys.flatMap((key) => (card[key] === undefined ? [] : [[key, card[key]] as const]));
  return Object.fromEntries(given) as Pick<MeasureCard, K>;
}

/**
 * The inputs of a draft as a class may see them: the measures, which the drawing shows in any case,
 * and no name, day, remark or anything else of the person they belong to.
 */
export const classCopy = (inputs: DraftedInputs): DraftedInputs => ({
  ...inputs,
  card: { ...only(inputs.card, coreMeasures), ...only(inputs.card, furtherMeasures) },
});

/** The same draft on another body's card: its style and house rules stay, its measures are the learner's. */
export const onCard = (inputs: DraftedInputs, card: MeasureCard): DraftedInputs => ({
  ...inputs,
  card,
});
