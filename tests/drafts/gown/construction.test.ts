import { describe, expect, it } from 'vitest';
import { completeCard } from '#shared/body/complete-card.ts';
import { openTable } from '#shared/drafting/drafting-table.ts';
import { balanced, quarterRule } from '#shared/drafting/house-rule-presets.ts';
import { contours, princessAbove } from '#shared/drafts/gown/contour.ts';
import { gownLevels } from '#shared/drafts/gown/levels.ts';
import { longestStep } from '#shared/drafts/gown/walking.ts';
import { closedSeam, fallFor } from '#shared/drafts/gown/waist-seam.ts';
import { planFlare } from '#shared/drafts/gown/flare-plan.ts';
import { type StyleCard, topLineShapes } from '#shared/drafts/gown/style-card.ts';
import type { Draft } from '#shared/engine/draft.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { segmentLength, startTangent, tangentAt } from '#shared/geometry/curve.ts';
import { xAt } from '#shared/geometry/profile.ts';
import { speak } from '#shared/units/speak.ts';
import { middleBody } from '../../support/middle-body.ts';
import { plainLevels } from '../../support/plain-levels.ts';

describe('the levels of a gown', () => {
  const body = completeCard(middleBody);

  it('hang where method section 3 puts them, worked apart from the draft', () => {
    expect(gownLevels(openTable(), body)).toEqual(plainLevels(body));
  });

  it('set an underarm that falls on the bust point 20 mm above it, and say which measures to take again', () => {
    const table = openTable();
    const low = completeCard({ ...middleBody, underarmToWaist: 165 });
    const levels = gownLevels(table, low);
    expect(levels.bust - levels.underarm).toBeCloseTo(20, 9);
    expect(table.warnings[0]).toMatchObject({
      field: 'card.underarmToWaist',
      with: ['card.frontWaistLength'],
    });
  });
});

describe('walking', () => {
  // Check values 32 and 33 of the trade reference (derived, common practice), in cm.
  it('opens the knees as the hobble formula says: 75.0 at the knee allows a step of 40', () => {
    expect(longestStep(75.0, 36, 82, 40)).toBeCloseTo(40, 1);
  });

  it('knows the girth of both knees standing together: 58.9 for one of 36', () => {
    const { measures } = completeCard({ ...middleBody, kneeGirth: 360 });
    expect(measures.bothKneesGirth / 10).toBeCloseTo(58.9, 1);
  });

  it('is stated on every gown, with a caution under an easy step', () => {
    const walk = (kneeFinished: number): Draft['walking'] =>
      draftGown({ card: middleBody, style: { kneeFinished }, rules: balanced }).walking;
    expect(walk(700).caution).toBe(true);
    expect(speak(walk(700).said, 'cm')).toMatch(/lets her step about .* need care/);
    expect(walk(1000).caution).toBe(false);
    expect(walk(1000).step).toBeGreaterThan(600);
  });
});

describe('what is taken in above the bust', () => {
  it('is all of bust quarter less chest quarter, at least 60 % of it by the front opening', () => {
    const { front, back, moved } = contours(
      { bust: 240, chest: 221 },
      { bust: 220, chest: 214 },
      45,
      false,
    );
    expect(front.lean + front.opening).toBeCloseTo(240 - 221 + moved, 9);
    expect(front.opening).toBeGreaterThanOrEqual(0.6 * front.reduction - 1e-9);
    expect(back.lean + back.opening + moved).toBeCloseTo(6, 9);
    expect(back.opening).toBe(0);
  });

  it('moves to the front what the back side cannot lean', () => {
    const { back, moved } = contours(
      { bust: 240, chest: 221 },
      { bust: 240, chest: 214 },
      40,
      false,
    );
    expect(back.lean).toBeCloseTo(40 * Math.tan((8 * Math.PI) / 180), 9);
    expect(moved).toBeCloseTo(26 - back.lean, 9);
  });

  it('leans out where the upper chest is the larger', () => {
    const { front, back } = contours(
      { bust: 230, chest: 236 },
      { bust: 220, chest: 226 },
      40,
      false,
    );
    expect(front.lean + back.lean).toBeCloseTo(-12, 9);
    expect(front.opening + back.opening).toBe(0);
  });

  it('opens by a square over 30 mm, then straight, and reaches its amount at the peak', () => {
    const { intake, height } = princessAbove(95, 263, 20, 178);
    expect(height).toBe(178);
    expect(xAt(intake.gap, 178)).toBeCloseTo(20, 9);
    expect(xAt(intake.gap, 263)).toBeCloseTo(0, 9);
    const [at10, at20] = [xAt(intake.gap, 253), xAt(intake.gap, 243)];
    expect(at20 / at10).toBeCloseTo(4, 9);
  });
});

describe('the waist seam', () => {
  it('is as long as its quarter, level at the centre, and arrives at its slope', () => {
    const seam = closedSeam(187, 364, fallFor(0.15, 187), 0.15);
    expect(segmentLength(seam)).toBeCloseTo(187, 8);
    expect(tangentAt(seam, 0).y).toBeCloseTo(0, 9);
    const end = tangentAt(seam, 1);
    expect(end.y / end.x).toBeCloseTo(0.15, 9);
  });

  it('falls by a third of slope times width', () => {
    expect(fallFor(0.15, 180)).toBeCloseTo(9, 9);
    expect(fallFor(2, 180)).toBe(15);
  });
});

describe('the flare', () => {
  it('is divided until each gore fits the cloth, all gores alike', () => {
    const wide = planFlare({ seam: 190, inner: 120, depth: 600, room: 900 });
    expect(wide.gores).toBeGreaterThan(1);
    expect(2 * wide.outer * Math.sin(wide.halfGore)).toBeLessThanOrEqual(900);
    expect(wide.halfGore * (2 * wide.gores - 1)).toBeCloseTo(wide.angle, 9);
  });

  it('of several gores still sews together', () => {
    const narrow = draftGown({
      card: middleBody,
      style: { flareFraction: 1, clothWidth: 900 },
      rules: balanced,
    });
    expect(narrow.pieces.filter((piece) => piece.part === 'flare').length).toBeGreaterThan(2);
    expect(speak(narrow.proof.verdict, 'cm')).toBe('These pieces sew together.');
  });
});

describe('the house presets', () => {
  // 47 of the trade reference: twice back and front widths is girth and ease (derived).
  it.each([
    ['balanced', balanced],
    ['quarter rule', quarterRule],
  ])('%s: twice the quarters is girth and ease at every level', (_, rules) => {
    const { proof } = draftGown({ card: middleBody, style: {}, rules });
    const rows = proof.girths.filter(({ body, ease }) => body !== undefined && ease !== undefined);
    expect(rows.length).toBeGreaterThanOrEqual(6);
    for (const { body = 0, ease = 0, pieces } of rows) {
      expect(Math.abs(pieces - body - ease)).toBeLessThan(0.5);
    }
  });

  it('quarter rule: front and back quarters are alike at the hip', () => {
    const { pieces } = draftGown({ card: middleBody, style: {}, rules: quarterRule });
    const hip = (name: string): number | undefined =>
      pieces.find((piece) => piece.name === name)?.levels.find(({ level }) => level === 'hip')?.to
        .x;
    expect(hip('front-middle')).toBeCloseTo((990 + 20) / 4, 6);
    expect(hip('back-middle')).toBeCloseTo((990 + 20) / 4, 6);
  });
});

describe('the top line', () => {
  const drawn = (style: StyleCard): Draft =>
    draftGown({ card: middleBody, style, rules: balanced });

  it.each(topLineShapes)(
    '%s: the pieces sew together, with princess seams and with darts',
    (topLine) => {
      for (const shaping of ['princess', 'darts'] as const) {
        expect(speak(drawn({ topLine, shaping }).proof.verdict, 'cm')).toBe(
          'These pieces sew together.',
        );
      }
    },
  );

  it('notched leaves the centre at the angle its edge declares', () => {
    const edge = drawn({ topLine: 'notched' }).pieces[0]?.edges.find(({ kind }) => kind === 'top');
    expect(edge?.corner).toBe(135);
    const out = startTangent(edge?.path ?? []);
    expect(out.y / out.x).toBeCloseTo(-1, 9);
  });

  it('straight lies level with its peak, and has no dip to move', () => {
    const { handles, style } = drawn({ topLine: 'straight' });
    expect(style.neckDepth).toBe(style.topDrop);
    const keys = handles.map(({ key }) => key);
    expect(keys).toContain('kneeFinished');
    expect(keys).not.toContain('neckDepth');
    expect(keys).not.toContain('neckWidth');
  });
});
