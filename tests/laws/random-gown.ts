import fc from 'fast-check';
import { completeCard } from '#shared/body/complete-card.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { openTable } from '#shared/drafting/drafting-table.ts';
import { houseRulePresets } from '#shared/drafting/house-rule-presets.ts';
import { gownLevels } from '#shared/drafts/gown/levels.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import type { Draft, DraftInputs } from '#shared/engine/draft.ts';
import { bodyArbitrary } from '../support/random-body.ts';
import { styleDraws, styleOn } from '../support/random-style.ts';

/**
 * One random body in one random style under either preset, in both shapings: always with princess
 * seams, and with darts where darts can shape this bust.
 */
export const bothShapings: fc.Arbitrary<readonly DraftInputs[]> = fc
  .tuple(bodyArbitrary, styleDraws, fc.constantFrom(...Object.values(houseRulePresets)))
  .map(([card, draws, rules]) => {
    const body = completeCard(card);
    const levels = gownLevels(openTable(), body);
    const styles = (['princess', 'darts'] as const)
      .map((shaping) => styleOn({ ...draws, named: { ...draws.named, shaping } }, body, levels))
      .filter((style, index) => index === 0 || style.shaping === 'darts');
    return styles.map((style) => ({ card, style, rules }));
  });

/** A draft, or the typed refusal; anything else that is thrown is a bug and passes through. */
export function draftOrRefusal(inputs: DraftInputs): Draft | DraftingError {
  try {
    return draftGown(inputs);
  } catch (error) {
    if (error instanceof DraftingError) return error;
    throw error;
  }
}

/** What a refusal is counted under: the fields and the codes of its problems. */
export const reasonOf = (refusal: DraftingError): string =>
  refusal.problems.map((problem) => `${problem.field} ${problem.code}`).join(', ');
