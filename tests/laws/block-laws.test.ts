import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import type { MeasureCard } from '#shared/body/card.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import type { HouseRules } from '#shared/drafting/house-rules.ts';
import { houseRulePresets } from '#shared/drafting/house-rule-presets.ts';
import {
  type BodiceBlockCard,
  bodiceBlockLengths,
  bustDartRules,
  dartPlaces,
} from '#shared/drafts/bodice-block/style-card.ts';
import type { SkirtBlockCard } from '#shared/drafts/skirt-block/style-card.ts';
import { type BodiceBlockDraft, draftBodiceBlock } from '#shared/engine/draft-bodice-block.ts';
import { type SkirtBlockDraft, draftSkirtBlock } from '#shared/engine/draft-skirt-block.ts';
import { pieceSvg } from '#shared/exports/piece-svg.ts';
import { speak } from '#shared/units/speak.ts';
import { remeasure } from '../exports/remeasure.ts';
import { bodyArbitrary } from '../support/random-body.ts';
import { women } from '../support/women.ts';
import { lawParameters, lawRuns } from './law-runs.ts';
import { reasonOf } from './random-gown.ts';

type Drafted = BodiceBlockDraft | SkirtBlockDraft;

/** A body, a style for either block, and the rules of a workroom. */
type Given = {
  readonly card: MeasureCard;
  readonly bodice: BodiceBlockCard;
  readonly skirt: SkirtBlockCard;
  readonly rules: HouseRules;
};

const between = ({ min, max }: { readonly min: number; readonly max: number }) =>
  fc.integer({ min, max });

const bodiceCards: fc.Arbitrary<BodiceBlockCard> = fc.record({
  ease: fc.record({
    bust: between(bodiceBlockLengths['ease.bust']),
    waist: between(bodiceBlockLengths['ease.waist']),
  }),
  armholeDrop: between(bodiceBlockLengths.armholeDrop),
  shoulderEase: between(bodiceBlockLengths.shoulderEase),
  bustDartRule: fc.constantFrom(...bustDartRules),
  bustDart: fc.constantFrom(...dartPlaces),
});

const skirtCards: fc.Arbitrary<SkirtBlockCard> = fc.record({
  ease: fc.record({
    waist: fc.integer({ min: 0, max: 60 }),
    hip: fc.integer({ min: 10, max: 120 }),
  }),
});

const rules = fc.constantFrom(...Object.values(houseRulePresets));

/** A draft, or the typed refusal; anything else that is thrown is a bug and passes through. */
function orRefusal(draw: () => Drafted): Drafted | DraftingError {
  try {
    return draw();
  } catch (error) {
    if (error instanceof DraftingError) return error;
    throw error;
  }
}

const given: fc.Arbitrary<Given> = fc.record({
  card: bodyArbitrary,
  bodice: bodiceCards,
  skirt: skirtCards,
  rules,
});

/** Both kinds, and what becomes of what they are drawn from. */
const kinds = [
  {
    name: 'bodice',
    draw: ({ card, bodice, rules: house }: Given) =>
      orRefusal(() => draftBodiceBlock({ card, style: bodice, rules: house })),
  },
  {
    name: 'skirt',
    draw: ({ card, skirt, rules: house }: Given) =>
      orRefusal(() => draftSkirtBlock({ card, style: skirt, rules: house })),
  },
] as const;

const faults = (draft: Drafted): readonly string[] =>
  draft.proof.lines.flatMap((line) =>
    line.findings
      .filter((each) => !each.holds)
      .map((each) => `line ${line.number}: ${speak(each.said, 'cm')} (${each.value})`),
  );

function lostNumbers(value: unknown, path = ''): readonly string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [path];
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, inner]) => lostNumbers(inner, `${path}.${key}`));
}

/** The seam lines, measured by a path library that shares nothing with the engine. */
function measuredAnew(draft: Drafted): readonly number[] {
  const shapes = draft.pieces.map((piece) => pieceSvg(piece, { x: 0, y: 0 })).join('');
  const svg = `<svg xmlns="http://www.w3.org/2000/svg">${shapes}</svg>`;
  return remeasure(svg).edges.map((each) => Math.abs(each.difference));
}

describe.each(kinds)('a $name block on any body within the limits', ({ name, draw }) => {
  test('every line of the proof holds, no number is lost, and its seams agree when measured anew', () => {
    fc.assert(
      fc.property(given, (from) => {
        const draft = draw(from);
        if (draft instanceof DraftingError) return;
        expect(faults(draft)).toEqual([]);
        expect(draft.proof.holds).toBe(true);
        expect(draft.proof.lines.map((line) => line.number)).toEqual([1, 2, 3, 4, 5]);
        expect(lostNumbers(draft)).toEqual([]);
        for (const off of measuredAnew(draft)) expect(off).toBeLessThanOrEqual(0.5);
      }),
      lawParameters(`${name} block: every line holds`),
    );
  });

  test('few are refused, each for a reason that names its fields', () => {
    const reasons = new Map<string, number>();
    let asked = 0;
    fc.assert(
      fc.property(given, (from) => {
        const draft = draw(from);
        asked += 1;
        if (!(draft instanceof DraftingError)) return;
        const reason = reasonOf(draft);
        reasons.set(reason, (reasons.get(reason) ?? 0) + 1);
        for (const { field, said } of draft.problems) {
          expect(field).toMatch(/^(card|style)\.\w+/);
          expect(speak(said, 'in').length).toBeGreaterThan(20);
        }
      }),
      lawParameters(`${name} block: few are refused`, Math.max(400, lawRuns)),
    );
    for (const [reason, count] of reasons)
      process.stdout.write(`  ${count} of ${asked}: ${reason}\n`);
    // A wide dart cannot be folded in a round armhole, whoever wears it: that choice is counted apart.
    const body = [...reasons].filter(([reason]) => !reason.includes('dart-too-wide-for-armhole'));
    const share = body.reduce((sum, [, count]) => sum + count, 0) / asked;
    expect(share).toBeLessThanOrEqual(0.05);
  });
});

test('of 130 measured women every one gets both blocks, and they sew together', () => {
  const ends = women().flatMap((card) => [
    orRefusal(() => draftBodiceBlock({ card, style: {}, rules: houseRulePresets.balanced })),
    orRefusal(() => draftSkirtBlock({ card, style: {}, rules: houseRulePresets.balanced })),
  ]);
  const sewn = ends.filter((end) => !(end instanceof DraftingError) && end.proof.holds);
  process.stdout.write(`women with blocks: ${sewn.length} of ${ends.length} sewn\n`);
  expect(sewn).toHaveLength(260);
});
