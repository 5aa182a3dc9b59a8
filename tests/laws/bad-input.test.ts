import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { readInputs } from '#shared/api/read-body.ts';
import { coreMeasures, furtherMeasures } from '#shared/body/card.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import {
  bodiceBlockLengths,
  bustDartRules,
  dartPlaces,
} from '#shared/drafts/bodice-block/style-card.ts';
import { easeLevels, styleChoices, styleLengths } from '#shared/drafts/gown/style-card.ts';
import { skirtLengthKeys } from '#shared/drafts/skirt-block/style-card.ts';
import { draftAny, type DraftedInputs } from '#shared/engine/drafted.ts';
import type { Problem } from '#shared/units/problem.ts';
import { speak } from '#shared/units/speak.ts';
import { middleBody } from '../support/middle-body.ts';
import { lawParameters, lawRuns } from './law-runs.ts';

/*
 * What people and programs send by mistake: nothing, zero, the wrong sign, centimetres or inches for
 * millimetres, two measures exchanged, figures beyond all bodies, words. Whatever comes, the answer is
 * a draft or a typed refusal with a sentence.
 */

const wrongNumbers = [
  0,
  -0,
  -1,
  1e-9,
  0.5,
  1e6,
  1e15,
  1e308,
  -1e308,
  5e-324,
  NaN,
  Infinity,
  -Infinity,
];

/** What may happen to one figure. */
const mishap = fc.oneof(
  fc.constantFrom(...wrongNumbers).map((value) => () => value),
  fc
    .constantFrom(0.1, 1 / 25.4, 10, 25.4, -1, 0.5, 2, 1.2, 0.8)
    .map((by) => (old: number) => old * by),
  fc.double({ min: -3000, max: 3000, noNaN: true }).map((value) => () => value),
);

const measureKeys = [...coreMeasures, ...furtherMeasures];
const styleKeys: readonly string[] = [
  ...styleLengths,
  ...easeLevels.map((level) => `ease.${level}`),
];
const rulesKeys = [
  'sideShare',
  'dartWidest',
  'dartClearance',
  'balance.bust',
  'balance.waist',
  'allowance.seam',
  'allowance.hem',
  'allowance.top',
];

type Figures = Record<string, unknown>;

const numberOr = (value: unknown, otherwise: number): number =>
  typeof value === 'number' ? value : otherwise;

const figuresIn = (value: unknown): Figures =>
  typeof value === 'object' && value !== null ? Object.fromEntries(Object.entries(value)) : {};

/** A copy with the figure at a dotted key changed. */
function altered(figures: Figures, key: string, change: (old: number) => unknown): Figures {
  const [first = '', second] = key.split('.');
  if (second === undefined) return { ...figures, [first]: change(numberOr(figures[first], 300)) };
  const inner = figuresIn(figures[first]);
  return { ...figures, [first]: altered(inner, second, change) };
}

const mishaps = (keys: readonly string[], most: number): fc.Arbitrary<(old: Figures) => Figures> =>
  fc
    .array(fc.tuple(fc.constantFrom(...keys), mishap), { maxLength: most })
    .map((list) => (old) => list.reduce((at, [key, change]) => altered(at, key, change), old));

const exchanged = fc
  .tuple(fc.constantFrom(...coreMeasures), fc.constantFrom(...coreMeasures))
  .map(([a, b]) => (old: Figures): Figures => ({ ...old, [a]: old[b], [b]: old[a] }));

const spoiledCards = fc
  .tuple(
    mishaps(measureKeys, 4),
    fc.oneof(
      exchanged,
      fc.constant((old: Figures) => old),
    ),
  )
  .map(([spoil, exchange]) => spoil(exchange({ ...middleBody })));

/** As often a card without fault, so that what is wrong with the style is reached. */
const cards = fc.oneof(fc.constant<Figures>({ ...middleBody }), spoiledCards);

/** Rules that may be hit, each of them. */
const rules = mishaps(rulesKeys, 2).map((spoil) => spoil({ ...balanced }));

/** Options of a style card by name, now and then one that does not exist. */
const named = (choices: Readonly<Record<string, readonly string[]>>): fc.Arbitrary<Figures> =>
  fc
    .array(
      fc
        .constantFrom(...Object.entries(choices))
        .chain(([key, options]) =>
          fc
            .oneof({ weight: 9, arbitrary: fc.constantFrom(...options) }, fc.constant('none such'))
            .map((option) => [key, option] as const),
        ),
      { maxLength: 4 },
    )
    .map((pairs) => Object.fromEntries(pairs));

const styled = (
  choices: Readonly<Record<string, readonly string[]>>,
  keys: readonly string[],
): fc.Arbitrary<Figures> =>
  fc.tuple(named(choices), mishaps(keys, 3)).map(([chosen, spoil]) => spoil(chosen));

const blockEase = ['ease.bust', 'ease.waist', 'ease.hip'];
const bodiceStyle = styled({ bustDart: dartPlaces, bustDartRule: bustDartRules }, [
  ...Object.keys(bodiceBlockLengths),
  ...blockEase,
]);
const skirtStyle = mishaps([...skirtLengthKeys, ...blockEase], 3).map((spoil) => spoil({}));

const sent = fc.oneof(
  {
    weight: 4,
    arbitrary: fc.record({ card: cards, style: styled(styleChoices, styleKeys), rules }),
  },
  {
    weight: 1,
    arbitrary: fc.record({
      garment: fc.constant('bodice-block'),
      card: cards,
      style: bodiceStyle,
      rules,
    }),
  },
  {
    weight: 1,
    arbitrary: fc.record({
      garment: fc.constantFrom('skirt-block', 'skirt-block', 'cape'),
      card: cards,
      style: skirtStyle,
      rules,
    }),
  },
);

function expectSentences(problems: readonly Problem[]): void {
  expect(problems.length).toBeGreaterThan(0);
  for (const { said, code } of problems) {
    expect(code).toMatch(/^[a-z-]+$/);
    for (const unit of ['cm', 'in'] as const) {
      expect(speak(said, unit)).not.toMatch(/NaN|undefined|Infinity|\[object/);
      expect(speak(said, unit).length).toBeGreaterThan(20);
    }
  }
}

/** Drafts whatever came through; the refusal is the only thing that may be thrown. */
function expectDraftOrRefusal(inputs: DraftedInputs): 'drafted' | 'refused' {
  try {
    const draft = draftAny(inputs);
    expect(JSON.stringify(draft.pieces)).not.toContain('null');
    return 'drafted';
  } catch (error) {
    if (!(error instanceof DraftingError)) throw error;
    expectSentences(error.problems);
    return 'refused';
  }
}

const runs = 20 * lawRuns;

describe('whatever figures are sent', () => {
  test('they are drafted or refused with sentences, never answered with a fault of ours', () => {
    const ends = { drafted: 0, refused: 0, unreadable: 0 };
    fc.assert(
      fc.property(sent, (body) => {
        const read = readInputs(body);
        if ('problems' in read) {
          expectSentences(read.problems);
          ends.unreadable += 1;
        } else ends[expectDraftOrRefusal(read.inputs)] += 1;
      }),
      lawParameters('whatever figures are sent', runs),
    );
    process.stdout.write(`  ${JSON.stringify(ends)}\n`);
    expect(ends.drafted).toBeGreaterThan(0);
    expect(ends.refused).toBeGreaterThan(0);
    expect(ends.unreadable).toBeGreaterThan(0);
  });

  test('the engine itself refuses figures that are no numbers, should they pass the reading', () => {
    for (const key of coreMeasures) {
      for (const value of wrongNumbers) {
        const inputs = { card: { ...middleBody, [key]: value }, style: {}, rules: balanced };
        expect(expectDraftOrRefusal(inputs), `${key} ${value}`).toBe('refused');
      }
    }
    for (const key of styleLengths) {
      for (const value of [NaN, Infinity, -Infinity]) {
        const inputs = { card: middleBody, style: { [key]: value }, rules: balanced };
        expect(expectDraftOrRefusal(inputs), `${key} ${value}`).toBe('refused');
      }
    }
  });

  test('what is no card at all is refused with sentences', () => {
    fc.assert(
      fc.property(fc.anything(), (body) => {
        const read = readInputs(body);
        if ('problems' in read) expectSentences(read.problems);
        else expectDraftOrRefusal(read.inputs);
      }),
      lawParameters('what is no card at all', lawRuns),
    );
  });
});
