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
import { piecesSvg } from '#shared/exports/svg.ts';
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
  seat: fc.option(fc.integer({ min: 0, max: 30 }), { nil: undefined }),
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

/** How far the girths taken from the SVG with a tape of its own lie from body and ease, mm. */
function girthsOff(draft: Drafted): readonly number[] {
  const { girths } = remeasure(piecesSvg(draft, 'cm'));
  const found = (level: string): number =>
    girths.filter((each) => each.level === level).reduce((sum, { girth }) => sum + girth, 0);
  return draft.wanted.map(({ level, wanted }) =>
    Math.abs(found(level === 'waist' ? 'waist edges' : level) - wanted),
  );
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
      lawParameters(`${name} block: every line holds`, 2 * lawRuns),
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
    const refused = [...reasons.values()].reduce((sum, count) => sum + count, 0);
    expect(refused / asked).toBeLessThanOrEqual(0.05);
  });

  test('what a level or the waist holds is body and ease, measured anew from the SVG', () => {
    fc.assert(
      fc.property(given, (from) => {
        const draft = draw(from);
        if (draft instanceof DraftingError) return;
        for (const off of girthsOff(draft)) expect(off).toBeLessThanOrEqual(0.5);
      }),
      lawParameters(`${name} block: girths measured anew`, Math.min(200, lawRuns)),
    );
  });
});

/** Every choice of the blocks' style cards. */
const bodiceChoices: readonly BodiceBlockCard[] = [
  ...dartPlaces.map((bustDart) => ({ bustDart })),
  ...bustDartRules.map((bustDartRule) => ({ bustDartRule })),
];
const skirtChoices: readonly SkirtBlockCard[] = [
  {},
  { seat: 0 },
  { seat: 30 },
  { ease: { hip: 100 } },
];

/** How many of the women get what is drawn, with every line of the proof holding. */
function sewnFor(what: string, draw: (card: MeasureCard) => Drafted): number {
  const ends = women().map((card) => orRefusal(() => draw(card)));
  const sewn = ends.filter((end) => !(end instanceof DraftingError) && end.proof.holds).length;
  process.stdout.write(`women with ${what}: ${sewn} of ${ends.length} sewn\n`);
  return sewn;
}

describe.each(Object.values(houseRulePresets))(
  'of 130 measured women, by either preset',
  (house) => {
    test.each(bodiceChoices)('at least 125 get a bodice block that sews together: %j', (style) => {
      const sewn = sewnFor(JSON.stringify(style), (card) =>
        draftBodiceBlock({ card, style, rules: house }),
      );
      expect(sewn).toBeGreaterThanOrEqual(125);
    });

    test.each(skirtChoices)('at least 125 get a skirt block that sews together: %j', (style) => {
      const sewn = sewnFor(JSON.stringify(style), (card) =>
        draftSkirtBlock({ card, style, rules: house }),
      );
      expect(sewn).toBeGreaterThanOrEqual(125);
    });
  },
);
