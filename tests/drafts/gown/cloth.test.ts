import { describe, expect, test } from 'vitest';
import { completeCard } from '#shared/body/complete-card.ts';
import { openTable } from '#shared/drafting/drafting-table.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { moreForShrinking } from '#shared/drafts/gown/cloth-check.ts';
import { easeLimits, stretchedEase } from '#shared/drafts/gown/ease-limits.ts';
import { gownLevels } from '#shared/drafts/gown/levels.ts';
import { checkStyle } from '#shared/drafts/gown/style-check.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { speak } from '#shared/units/speak.ts';
import { middleBody } from '../../support/middle-body.ts';

const body = completeCard(middleBody);
const check = (style: Parameters<typeof checkStyle>[0]) =>
  checkStyle(style, body, gownLevels(openTable(), body));

describe('a stretch cloth', () => {
  test('fully taut is the body over 1 + S/100 (reference.md 3k, derived: 25 to 80.0 %, 50 to 66.7 %, 100 to 50.0 %)', () => {
    expect(stretchedEase(1000, 25, 1)).toBe(-200);
    expect(stretchedEase(1000, 50, 1)).toBe(-333);
    expect(stretchedEase(1000, 100, 1)).toBe(-500);
  });

  test('is drawn with a third of its stretch, and half of it at most (common practice)', () => {
    const limits = easeLimits(body, { cloth: 'stretch', stretch: 30 });
    expect(limits['ease.bust'].initial).toBe(Math.round(920 / 1.1 - 920));
    expect(limits['ease.bust'].min).toBe(Math.round(920 / 1.15 - 920));
    const draft = draftGown({
      card: middleBody,
      style: { cloth: 'stretch', stretch: 30 },
      rules: balanced,
    });
    const bust = draft.proof.girths.find(({ level }) => level === 'bust');
    expect(bust?.pieces).toBeCloseTo(920 + limits['ease.bust'].initial, 3);
    expect(draft.proof.holds).toBe(true);
  });

  test('stretches over the hips where a woven one of that size would not', () => {
    const { opening } = draftGown({
      card: middleBody,
      style: { cloth: 'stretch', stretch: 40 },
      rules: balanced,
    }).construction;
    expect(opening.give).toBeCloseTo(0.2, 9);
    const codes = check({ ease: { hip: -5 } }).map(({ field, code }) => `${field} ${code}`);
    expect(codes).toContain('style.ease.hip out-of-range');
  });
});

describe('a cloth that shrinks', () => {
  test('is bought longer by 1/(1 - s) and washed before it is cut; the pieces stay as they are', () => {
    expect(moreForShrinking(3)).toBeCloseTo(3.0928, 4);
    expect(moreForShrinking(0)).toBe(0);
    const [note] = check({ shrinkage: 3 }).filter(({ code }) => code === 'shrinks');
    expect(note?.severity).toBe('warning');
    expect(speak(note?.said ?? [], 'cm')).toContain('buy 3.1 % more');
    const [one, other] = [0, 3].map((shrinkage) =>
      draftGown({ card: middleBody, style: { shrinkage }, rules: balanced }),
    );
    const lines = (draft: typeof one) => draft?.pieces.map(({ edges }) => edges);
    expect(lines(other)).toEqual(lines(one));
  });
});
