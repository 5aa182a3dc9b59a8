import { describe, expect, it } from 'vitest';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { speak } from '#shared/units/speak.ts';
import type { MeasureCard } from '#shared/body/card.ts';
import { middleBody } from '../../support/middle-body.ts';

function refusal(card: MeasureCard, shaping: 'darts' | 'princess'): DraftingError | undefined {
  try {
    draftGown({ card, style: { shaping }, rules: balanced });
    return undefined;
  } catch (error) {
    if (error instanceof DraftingError) return error;
    throw error;
  }
}

describe('a top shaped by darts', () => {
  const full = {
    ...middleBody,
    underbustGirth: 740,
    sideNeckToUnderbust: 322,
    upperChestGirth: 860,
  };

  it('is drawn where no tip opens wider than a dart sews flat', () => {
    expect(refusal(middleBody, 'darts')).toBeUndefined();
  });

  it('is refused on a bust that would stand up in a cone, and the princess seam is named', () => {
    const [problem] = refusal(full, 'darts')?.problems ?? [];
    expect(problem).toMatchObject({ code: 'darts-too-wide', field: 'style.shaping' });
    expect(speak(problem?.said ?? [], 'cm')).toMatch(/Choose the princess seam\.$/);
  });

  it('takes the princess seam on that same bust', () => {
    expect(refusal(full, 'princess')).toBeUndefined();
  });
});
