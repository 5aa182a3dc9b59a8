import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { type MeasureKey, coreMeasures, furtherMeasures } from '#shared/body/card.ts';
import { completeCard } from '#shared/body/complete-card.ts';
import { measureGuide } from '#shared/body/measure-guide.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { houseRulePresets } from '#shared/drafting/house-rule-presets.ts';
import type { Step } from '#shared/drafting/step.ts';
import { type Drafted, type DraftedInputs, draftAny } from '#shared/engine/drafted.ts';
import { stepPicture } from '#shared/lesson/step-picture.ts';
import { type SpokenNumber, type SpokenPart, spoken } from '#shared/lesson/spoken.ts';
import { speak } from '#shared/units/speak.ts';
import { bodyArbitrary } from '../support/random-body.ts';
import { lawParameters, lawRuns } from './law-runs.ts';
import { bothShapings } from './random-gown.ts';

/** Gowns in both shapings, and both blocks of the same body. */
const drafts: fc.Arbitrary<readonly DraftedInputs[]> = fc
  .tuple(bothShapings, bodyArbitrary, fc.constantFrom(...Object.values(houseRulePresets)))
  .map(([gowns, card, rules]) => [
    ...gowns,
    { garment: 'bodice-block', card, style: {}, rules },
    { garment: 'skirt-block', card, style: {}, rules },
  ]);

function drawn(inputs: DraftedInputs): Drafted | undefined {
  try {
    return draftAny(inputs);
  } catch (error) {
    if (error instanceof DraftingError) return undefined;
    throw error;
  }
}

function onEveryDraft(
  law: string,
  holds: (draft: Drafted, inputs: DraftedInputs) => void,
  runs = Math.ceil(lawRuns / 4),
): void {
  fc.assert(
    fc.property(drafts, (all) => {
      for (const inputs of all) {
        const draft = drawn(inputs);
        if (draft) holds(draft, inputs);
      }
    }),
    // A body that breaks a law is as good as the smallest one, and is found much sooner.
    { ...lawParameters(law, runs), endOnFailure: true },
  );
}

const partsOf = (step: Step, { body }: Drafted): readonly SpokenPart[] =>
  spoken(step.said, step, body);
const numbersOf = (step: Step, draft: Drafted): readonly SpokenNumber[] =>
  partsOf(step, draft).filter((part) => typeof part !== 'string');

/** A step at a half or at the levels puts something on the paper; others may speak of what is drawn already. */
const draws = ({ side, part }: Step): boolean =>
  side === 'front' || side === 'back' || part === 'Levels';

describe('on any body in any style, every draft can be taught from', () => {
  test('no step is without a sentence, each has an address of its own, and each draws something', () => {
    onEveryDraft('steps speak and draw', (draft) => {
      const ids = draft.steps.map(({ id }) => id);
      expect(new Set(ids).size).toBe(ids.length);
      for (const step of draft.steps) {
        for (const unit of ['cm', 'in'] as const) {
          expect(speak(step.said, unit)).toMatch(/^[A-Z0-9].{18,}[.]$/su);
          if (step.why) expect(speak(step.why, unit)).toMatch(/^[A-Z].{18,}[.]$/su);
        }
        if (!draws(step)) continue;
        const drew = step.lines.length + Object.keys(step.points).length;
        expect(drew, `${step.id} draws nothing`).toBeGreaterThan(0);
      }
    });
  });

  test('a sentence reads no length as nothing, nor says a unit twice', () => {
    onEveryDraft('sentences read well', (draft) => {
      for (const step of draft.steps) {
        const [cm, inches] = [speak(step.said, 'cm'), speak(step.said, 'in')];
        expect(cm, step.id).not.toMatch(/(?<![\d.])0\.0 cm|cm cm|undefined|NaN|\s\s|\.\./u);
        expect(inches, step.id).not.toMatch(
          /(?<![\d\u2044\u00a0.])0 in(?![a-z])|in in(?![a-z])|undefined|NaN|\s\s|\.\./u,
        );
      }
    });
  });

  test('each measure a step lists is named in its sentence, and spoken as an estimate where it is one', () => {
    onEveryDraft('measures are named', (draft) => {
      for (const step of draft.steps) {
        const sentence = speak(step.said, 'cm').toLowerCase();
        for (const key of step.measures) {
          const label = labelOf(key);
          expect(sentence, `${step.id} uses ${key}`).toContain(label);
        }
        partsOf(step, draft).forEach((part, at, all) => {
          if (typeof part === 'string' || part.from !== 'measure') return;
          if (part.sources[0]?.estimated === undefined) return;
          const next = all[at + 1];
          expect(typeof next === 'string' ? next : '', step.id).toMatch(/^ \(estimated\)/u);
        });
      }
    });
  });

  test('a measure that shapes a piece is spoken in a step by its name and value', () => {
    onEveryDraft(
      'no measure shapes in silence',
      (draft, inputs) => {
        const said = new Set(
          draft.steps.flatMap((step) =>
            numbersOf(step, draft)
              .filter(({ from }) => from === 'measure')
              .flatMap(({ sources }) => sources.map(({ key }) => key)),
          ),
        );
        const shape = JSON.stringify(draft.pieces.map(({ edges, darts }) => [edges, darts]));
        for (const key of [...coreMeasures, ...furtherMeasures]) {
          if (said.has(key)) continue;
          const moved = drawn({
            ...inputs,
            card: { ...fullCard(inputs), [key]: nudged(inputs, key) },
          });
          const still = drawn({ ...inputs, card: fullCard(inputs) });
          if (!moved || !still) continue;
          const same = (each: Drafted): string =>
            JSON.stringify(each.pieces.map(({ edges, darts }) => [edges, darts]));
          const wasSaid = still.steps.some((step) =>
            numbersOf(step, still).some(
              ({ from, sources }) => from === 'measure' && sources.some((each) => each.key === key),
            ),
          );
          expect(wasSaid || same(moved) === same(still), `${key} shapes in silence`).toBe(true);
        }
        expect(shape.length).toBeGreaterThan(0);
      },
      Math.ceil(lawRuns / 100),
    );
  });

  test('a number said to rest on a measure changes with it, and one that is a measure is that measure', () => {
    onEveryDraft(
      'numbers rest on what they say',
      (draft, inputs) => {
        for (const [place, step] of draft.steps.entries()) {
          for (const [at, number] of numbersOf(step, draft).entries()) {
            const { key } = number.sources[0] ?? {};
            if (key === undefined || key in draft.body.estimated) continue;
            const moved = drawn({
              ...inputs,
              card: { ...inputs.card, [key]: nudged(inputs, key) },
            });
            const again = moved?.steps[place];
            if (!moved || again?.id !== step.id) continue;
            const other = numbersOf(again, moved)[at];
            if (other === undefined || again.said.length !== step.said.length) continue;
            expect(
              valueOf(other) !== valueOf(number),
              `${step.id}: ${speak(step.said, 'cm')} number ${at} rests on ${key}`,
            ).toBe(true);
          }
        }
      },
      Math.ceil(lawRuns / 100),
    );
  });

  test('stepping forth and back gives the same picture, and all that is drawn is seen by the end', () => {
    onEveryDraft('pictures are the same both ways', (draft) => {
      const forth = draft.steps.map((_, place) => stepPicture(draft, place));
      const back = draft.steps.map((_, place) => place).reverse();
      for (const place of back) expect(stepPicture(draft, place)).toEqual(forth[place]);
      const lines = new Set(forth.flatMap((picture) => picture?.now ?? []));
      for (const path of draft.steps.flatMap((step) => step.lines))
        expect(lines.has(path)).toBe(true);
      for (const picture of forth) {
        if (!picture || picture.frame === 'pieces') continue;
        expect(picture.near.width).toBeGreaterThan(0);
        for (const { at, now } of picture.points) {
          if (!now) continue;
          expect(at.x).toBeGreaterThanOrEqual(picture.near.x);
          expect(at.x).toBeLessThanOrEqual(picture.near.x + picture.near.width);
          expect(at.y).toBeGreaterThanOrEqual(picture.near.y);
          expect(at.y).toBeLessThanOrEqual(picture.near.y + picture.near.height);
        }
      }
    });
  });
});

const labelOf = (key: string): string => {
  const found = [...coreMeasures, ...furtherMeasures].find((each) => each === key);
  if (found === undefined) throw new Error(`${key} is no measure`);
  return measureGuide[found].label.toLowerCase();
};

const valueOf = ({ quantity }: SpokenNumber): number =>
  'deg' in quantity ? quantity.deg : quantity.mm;

/** The card with every measure on it that would be estimated. */
const fullCard = ({ card }: DraftedInputs): DraftedInputs['card'] => ({
  ...card,
  ...completeCard(card).measures,
});

const nudged = (inputs: DraftedInputs, key: MeasureKey): number =>
  completeCard(inputs.card).measures[key] + (key === 'shoulderSlope' ? 0.2 : 1);
