import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import type { Draft } from '#shared/engine/draft.ts';
import { piecesSvg } from '#shared/exports/svg.ts';
import { speak } from '#shared/units/speak.ts';
import { remeasure } from '../exports/remeasure.ts';
import { lawParameters, lawRuns } from './law-runs.ts';
import { bothShapings, draftOrRefusal, reasonOf } from './random-gown.ts';

type Tried = {
  readonly asked: number;
  readonly drawn: number;
  /** Refusals by the fields and codes of their problems. */
  readonly refused: ReadonlyMap<string, number>;
};

/** Tries a law on every draft, and checks that what is refused is refused in words that name fields. */
function onEveryDraft(law: string, holds: (draft: Draft) => void, runs: number): Tried {
  const refused = new Map<string, number>();
  let asked = 0;
  let drawn = 0;
  fc.assert(
    fc.property(bothShapings, (gowns) => {
      for (const inputs of gowns) {
        asked += 1;
        const draft = draftOrRefusal(inputs);
        if (draft instanceof DraftingError) {
          refused.set(reasonOf(draft), (refused.get(reasonOf(draft)) ?? 0) + 1);
          speaksPlainly(draft);
          continue;
        }
        drawn += 1;
        holds(draft);
      }
    }),
    lawParameters(law, runs),
  );
  return { asked, drawn, refused };
}

function speaksPlainly({ problems }: DraftingError): void {
  expect(problems.length).toBeGreaterThan(0);
  for (const { field, said } of problems) {
    expect(field).toMatch(/^(card|style|rules)\.\w+/);
    expect(speak(said, 'in').length).toBeGreaterThan(20);
  }
}

/** What a draft's proof finds wrong, in its own words. */
const faults = (draft: Draft): readonly string[] =>
  draft.proof.lines.flatMap((line) =>
    line.findings
      .filter((each) => !each.holds)
      .map((each) => `line ${line.number}: ${speak(each.said, 'cm')} (${each.value})`),
  );

/** Paths to numbers that are no numbers. */
function lostNumbers(value: unknown, path = ''): readonly string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [path];
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, inner]) => lostNumbers(inner, `${path}.${key}`));
}

/** Laws that look again at what the first has proven need fewer cases. */
const fewer = Math.ceil(lawRuns / 4);

describe('on any body within the limits, in any style within its limits', () => {
  test('every line of the proof holds, and at most one gown in twenty is refused', () => {
    const { asked, drawn, refused } = onEveryDraft(
      'every line holds',
      (draft) => {
        expect(faults(draft)).toEqual([]);
        expect(draft.proof.lines.map((line) => line.number)).toEqual([1, 2, 3, 4, 5, 6, 7, 8]);
        expect(draft.proof.holds).toBe(true);
      },
      // About three gowns to two bodies: two thousand gowns in a whole run. A share needs many, even in a quick check.
      Math.max(400, Math.ceil(1.45 * lawRuns)),
    );
    const share = (asked - drawn) / asked;
    process.stdout.write(
      `every line holds on ${drawn} gowns; refused ${asked - drawn} of ${asked} (${(100 * share).toFixed(1)} %)\n`,
    );
    for (const [reason, count] of refused) process.stdout.write(`  ${count} x ${reason}\n`);
    expect(drawn).toBeGreaterThanOrEqual(2 * lawRuns);
    expect(share).toBeLessThanOrEqual(0.05);
  });

  test('the same card and style give the same draft, byte for byte, and no number is lost', () => {
    const { drawn } = onEveryDraft(
      'same input, same bytes',
      (draft) => {
        const again = draftOrRefusal(structuredClone(draft.inputs));
        expect(JSON.stringify(again) === JSON.stringify(draft)).toBe(true);
        expect(lostNumbers(draft)).toEqual([]);
      },
      fewer,
    );
    expect(drawn).toBeGreaterThanOrEqual(fewer);
  });

  test('edges and girths measured anew from the exported SVG agree within half a millimetre', () => {
    const { drawn } = onEveryDraft(
      'measured anew from the SVG',
      (draft) => {
        const { edges, girths } = remeasure(piecesSvg(draft, 'cm'));
        // One piece a half, its seams run on to the hem: side, centre back and nothing else.
        expect(edges.length).toBeGreaterThan(2);
        expect(edges.filter((each) => !(Math.abs(each.difference) <= 0.5))).toEqual([]);
        for (const { level, wanted } of draft.construction.wanted) {
          if (level === 'chest') continue;
          const name =
            level === 'waist-seam' ? 'waist edges' : level === 'hem' ? 'hem edges' : level;
          const found = girths.filter((each) => each.level === name);
          expect(found.length, level).toBeGreaterThan(0);
          const gap = draft.construction.gaps?.[level] ?? 0;
          for (const { girth } of found)
            expect(Math.abs(girth + gap - wanted)).toBeLessThanOrEqual(0.5);
        }
      },
      fewer,
    );
    expect(drawn).toBeGreaterThanOrEqual(fewer);
  });
});
