import {
  coreMeasures,
  furtherMeasures,
  type FurtherMeasure,
  type CoreMeasure,
  type MeasureKey,
} from '#shared/body/card.ts';
import { checkMeasure, type CardInProgress } from '#shared/body/check-card.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { draftAny, type Drafted, type DraftedInputs } from '#shared/engine/drafted.ts';
import { onCard } from '#shared/lesson/class-copy.ts';
import { formatLength } from '#shared/units/format-length.ts';
import { parseLength } from '#shared/units/parse-length.ts';
import type { Unit } from '#shared/units/said.ts';
import { speak } from '#shared/units/speak.ts';

import { browserStorage } from '../../lib/browser-storage.ts';

/** What a learner typed, letter for letter, and further measures of a card that was picked. */
export type OwnCard = {
  readonly unit: Unit;
  readonly texts: { readonly [K in MeasureKey]?: string };
  readonly further: { readonly [K in FurtherMeasure]?: number };
};

const key = 'ellwand.own-measures';
const emptyCard = (unit: Unit): OwnCard => ({ unit, texts: {}, further: {} });

/** The measures this browser kept of a learner; they are never sent anywhere. */
export function keptOwnCard(unit: Unit): OwnCard {
  try {
    const kept: unknown = JSON.parse(browserStorage('local')?.getItem(key) ?? 'null');
    if (typeof kept !== 'object' || kept === null || !('texts' in kept)) return emptyCard(unit);
    const { texts } = kept;
    if (typeof texts !== 'object' || texts === null) return emptyCard(unit);
    const entries = Object.entries(texts).filter(([, text]) => typeof text === 'string');
    const was: Unit = 'unit' in kept && kept.unit === 'in' ? 'in' : 'cm';
    return inUnit({ unit: was, texts: Object.fromEntries(entries), further: {} }, unit);
  } catch {
    return emptyCard(unit);
  }
}

export function keepOwnCard({ unit, texts }: OwnCard): void {
  try {
    browserStorage('local')?.setItem(key, JSON.stringify({ unit, texts }));
  } catch {
    // A browser that keeps nothing: the measures last as long as the page.
  }
}

/** The same card written for a reader of another unit; what cannot be read stays as typed. */
export function inUnit(card: OwnCard, unit: Unit): OwnCard {
  if (card.unit === unit) return card;
  const texts = Object.fromEntries(
    Object.entries(card.texts).map(([measure, text]) => {
      const read = parseLength(text, card.unit);
      return [measure, 'mm' in read ? formatLength(read.mm, unit) : text];
    }),
  );
  return { ...card, unit, texts };
}

/** A card that was picked, as if it had been typed. */
export const ownFrom = (card: CardInProgress, unit: Unit): OwnCard => ({
  unit,
  texts: Object.fromEntries(
    coreMeasures.flatMap((measure) => {
      const value = card[measure];
      return value === undefined ? [] : [[measure, formatLength(value, unit)]];
    }),
  ),
  further: Object.fromEntries(
    furtherMeasures.flatMap((measure) => {
      const value = card[measure];
      return value === undefined ? [] : [[measure, value]];
    }),
  ),
});

/** What a field needs, in words; none while it is empty. */
export function faultOf({ unit, texts }: OwnCard, measure: MeasureKey): string | undefined {
  const text = texts[measure] ?? '';
  if (text.trim() === '') return undefined;
  const read = parseLength(text, unit);
  if ('said' in read) return speak(read.said, unit);
  const problem = checkMeasure(measure, read.mm).find(({ severity }) => severity === 'error');
  return problem && speak(problem.said, unit);
}

/** The learner's draft in the tutor's style, or why there is none; neither while measures are missing. */
export type OwnDraft = { readonly draft: Drafted } | { readonly refused: string } | undefined;

export function ownDraft(inputs: DraftedInputs, { unit, texts, further }: OwnCard): OwnDraft {
  const read = coreMeasures.flatMap((measure): [string, number][] => {
    const found = parseLength(texts[measure] ?? '', unit);
    return 'mm' in found ? [[measure, found.mm]] : [];
  });
  if (read.length < coreMeasures.length) return undefined;
  try {
    return { draft: draftAny(onCard(inputs, { ...further, ...coreIn(read) })) };
  } catch (error) {
    if (!(error instanceof DraftingError)) throw error;
    return { refused: error.problems.map(({ said }) => speak(said, unit)).join(' ') };
  }
}

/** Every core measure was found above. */
function coreIn(read: readonly [string, number][]): { readonly [K in CoreMeasure]: number } {
  return Object.fromEntries(read) as { [K in CoreMeasure]: number };
}
