import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { atCentreWaist } from '#shared/compare/alignment.ts';
import { figureRows } from '#shared/compare/figures.ts';
import { pieceChanges } from '#shared/compare/piece-changes.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { type EaseLevel, easeLevels, topLineShapes } from '#shared/drafts/gown/style-card.ts';
import { type Drafted, draftAny } from '#shared/engine/drafted.ts';
import { starterRules, stepCard } from '#shared/regrade/grade-rules.ts';
import { nestOf } from '#shared/regrade/nest.ts';
import { fixedDepths } from '#shared/regrade/style-depths.ts';
import { regradeTo } from '#shared/regrade/what-moved.ts';
import { bodyArbitrary } from '../support/random-body.ts';
import { lawParameters, lawRuns } from './law-runs.ts';
import { bothShapings, draftOrRefusal } from './random-gown.ts';

/** A case holds up to a dozen drafts. */
const runs = Math.ceil(lawRuns / 10);

const levelOf: { readonly [L in EaseLevel]: string } = {
  chest: 'chest',
  bust: 'bust',
  underbust: 'underbust',
  waist: 'waist',
  topHip: 'top-hip',
  hip: 'hip',
};

const noEase = Object.fromEntries(easeLevels.map((level) => [level, 0]));

/** The levels whose body girth a rule steps, with the measure it steps. */
const stepped = {
  chest: 'upperChestGirth',
  bust: 'bustGirth',
  underbust: 'underbustGirth',
  waist: 'waistGirth',
  'top-hip': 'topHipGirth',
  hip: 'hipGirth',
} as const;

const girthIn = ({ proof }: Drafted, level: string): number =>
  proof.girths.find((each) => each.level === level)?.pieces ?? Number.NaN;

/** Choices that any body may wear, so that a style fits both cards. */
const shapes = fc.record({
  shaping: fc.constantFrom('princess', 'darts'),
  topLine: fc.constantFrom(...topLineShapes),
});

function orRefusal<T>(make: () => T): T | DraftingError {
  try {
    return make();
  } catch (error) {
    if (error instanceof DraftingError) return error;
    throw error;
  }
}

describe('on any body, in any style', () => {
  test('the eased gown less the un-eased one is the ease on the card, at every level', () => {
    let compared = 0;
    fc.assert(
      fc.property(bothShapings, (gowns) => {
        for (const inputs of gowns) {
          const eased = draftOrRefusal(inputs);
          const bare = draftOrRefusal({ ...inputs, style: { ...inputs.style, ease: noEase } });
          if (eased instanceof DraftingError || bare instanceof DraftingError) continue;
          compared += 1;
          const rows = figureRows(bare, eased);
          for (const level of easeLevels) {
            // Where the waist seam lies at the waist, the waist is counted along it.
            const atWaist = level === 'waist' && inputs.style.waistSeam === 'natural';
            const key = `girth:${atWaist ? 'waist-seam' : levelOf[level]}`;
            const row = rows.find((each) => each.key === key);
            const apart = (row?.second ?? Number.NaN) - (row?.first ?? Number.NaN);
            // Each of the two girths is proven to half a millimetre on the pieces, and promised exactly.
            expect(Math.abs(apart - eased.style.ease[level]), level).toBeLessThan(1);
            const promised = [eased, bare].map(
              ({ proof }) => proof.girths.find((each) => key === `girth:${each.level}`)?.wanted,
            );
            expect((promised[0] ?? Number.NaN) - (promised[1] ?? Number.NaN)).toBeCloseTo(
              eased.style.ease[level],
              6,
            );
          }
        }
      }),
      lawParameters('eased less un-eased', Math.ceil(runs / 2)),
    );
    expect(compared).toBeGreaterThan(runs / 4);
  });

  test('finished girths of a nest differ by the summed steps, and every size proves', () => {
    let sizes = 0;
    fc.assert(
      fc.property(bodyArbitrary, fc.integer({ min: 1, max: 3 }), (card, larger) => {
        const base = orRefusal(() => draftAny({ card, style: {}, rules: balanced }));
        if (base instanceof DraftingError) return;
        const order = { rules: starterRules, smaller: 1, larger, depths: fixedDepths };
        const nest = nestOf(base, order);
        for (const size of nest.sizes) {
          sizes += 1;
          expect(size.draft.proof.holds).toBe(true);
          for (const [level, measure] of Object.entries(stepped)) {
            const summed = size.step * (starterRules[measure] ?? Number.NaN);
            const grown = girthIn(size.draft, level) - girthIn(base, level);
            expect(Math.abs(grown - summed), `${level}, ${size.step} steps`).toBeLessThan(0.5);
          }
        }
        expect(nest.sizes.length + nest.refused.length).toBe(larger + 2);
      }),
      lawParameters('girths of a nest', Math.ceil(runs / 2)),
    );
    expect(sizes).toBeGreaterThan(runs / 2);
  });

  test('stepping forth and back gives the same pieces again', () => {
    fc.assert(
      fc.property(bodyArbitrary, fc.integer({ min: 1, max: 11 }), (card, steps) => {
        const base = orRefusal(() => draftAny({ card, style: {}, rules: balanced }));
        if (base instanceof DraftingError) return;
        // Only what is on the card: a step back cannot take away what nobody measured.
        const forth = stepCard(card, starterRules, steps);
        const back = stepCard(forth, starterRules, -steps);
        expect(back).toEqual(card);
        const again = draftAny({ card: back, style: {}, rules: balanced });
        expect(pieceChanges(base.pieces, again.pieces)).toEqual([]);
        expect(again.pieces).toEqual(base.pieces);
      }),
      lawParameters('forth and back', runs),
    );
  });

  test('a regraded gown equals a fresh draft of the same card', () => {
    let regraded = 0;
    fc.assert(
      fc.property(bodyArbitrary, bodyArbitrary, shapes, (earlier, card, style) => {
        const before = orRefusal(() => draftAny({ card: earlier, style, rules: balanced }));
        if (before instanceof DraftingError) return;
        const fresh = orRefusal(() => draftAny({ ...before.inputs, card }));
        const redrawn = orRefusal(() => regradeTo(before, card, {}, atCentreWaist));
        if (fresh instanceof DraftingError || redrawn instanceof DraftingError) {
          expect(fresh instanceof DraftingError).toBe(redrawn instanceof DraftingError);
          return;
        }
        regraded += 1;
        expect(redrawn.after).toEqual(fresh);
        const { figures } = redrawn;
        for (const { first, second, by, interplay } of figures) {
          const told = by.reduce((sum, { change }) => sum + change, interplay);
          expect(told).toBeCloseTo(second - first, 6);
        }
      }),
      lawParameters('regraded is fresh', Math.ceil(runs / 4)),
    );
    expect(regraded).toBeGreaterThan(runs / 10);
  });
});
