import {
  coreMeasures,
  furtherMeasures,
  type Body,
  type FurtherMeasure,
  type MeasureCard,
  type MeasureKey,
} from './card.ts';
import { estimates } from './estimates.ts';

/**
 * Completes a card: every measure nobody took is estimated by its named rule (`estimated` says which). Gives a body
 * for any card of numbers; whether it can be drawn is `checkCard`'s to say.
 */
export function completeCard(card: MeasureCard): Body {
  const found = new Map<MeasureKey, number>();
  for (const key of coreMeasures) found.set(key, card[key]);
  for (const key of furtherMeasures) {
    const taken = card[key];
    if (taken !== undefined) found.set(key, taken);
  }
  const sofar = (measure: FurtherMeasure): number => found.get(measure) ?? Number.NaN;
  const estimated: { [K in FurtherMeasure]?: string } = {};
  for (const { measure, rule, value } of estimates) {
    if (found.has(measure)) continue;
    found.set(measure, value(card, sofar));
    estimated[measure] = rule;
  }
  return { measures: everyMeasure(found), estimated };
}

/** The map holds every key by now: the core ones are taken, each further one has an estimate. */
const everyMeasure = (found: ReadonlyMap<MeasureKey, number>): Body['measures'] =>
  Object.fromEntries(found) as Body['measures'];
