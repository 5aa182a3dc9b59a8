import fc from 'fast-check';
import { agreements } from '#shared/body/agreements.ts';
import type { MeasureCard, MeasureKey } from '#shared/body/card.ts';
import { furtherMeasures } from '#shared/body/card.ts';
import { checkCard } from '#shared/body/check-card.ts';
import { completeCard } from '#shared/body/complete-card.ts';
import { proportions, slopes } from '#shared/body/shape-agreements.ts';
import { measureGuide } from '#shared/body/measure-guide.ts';

/** Part of the women who had a further measure taken. */
const takenShare = 0.3;

type Draw = { readonly at: number; readonly taken: number };

/** Where in its bounds a measure falls, to a tenth of a millimetre; nothing where they leave no room. */
function place(least: number, most: number, at: number): number | undefined {
  const first = Math.ceil(least * 10);
  const last = Math.floor(most * 10);
  return first > last ? undefined : Math.round(first + (last - first) * at) / 10;
}

/** Bounds of a measure: its own, and those its agreements with the measures already drawn leave it. */
function bounds(key: MeasureKey, drawn: ReadonlyMap<MeasureKey, number>): [number, number] {
  let { min, max } = measureGuide[key];
  for (const { larger, smaller, half, possible } of agreements) {
    const [least, most] = possible;
    const part = half === true ? 0.5 : 1;
    const other = drawn.get(key === larger ? smaller : larger);
    if (other === undefined) continue;
    if (key === larger) {
      min = Math.max(min, (other + least) / part);
      max = Math.min(max, (other + most) / part);
    } else if (key === smaller) {
      min = Math.max(min, other * part - most);
      max = Math.min(max, other * part - least);
    }
  }
  return [min, max];
}

/** Drawn in this order, each leaves room for those after it. */
const coreOrder = [
  'bustGirth',
  'waistGirth',
  'hipGirth',
  'underbustGirth',
  'bustSpan',
  'sideNeckToBustPoint',
  'sideNeckToUnderbust',
  'frontWaistLength',
  'waistToFloor',
  'waistToHip',
] as const;

/** A further measure is drawn about its estimate, by as much as this part of it. */
const spread = 0.12;
/** The top hip lies between waist and hip on the same body: it strays less from its estimate (common practice, no source). */
const topHipSpread = 0.05;

function cardFrom(draws: ReadonlyMap<MeasureKey, Draw>): MeasureCard {
  const drawn = new Map<MeasureKey, number>();
  const put = (key: MeasureKey, least: number, most: number): void => {
    const value = place(least, most, draws.get(key)?.at ?? 0.5);
    if (value !== undefined) drawn.set(key, value);
  };
  for (const key of coreOrder) put(key, ...narrowed(key, drawn));
  for (const key of furtherMeasures) {
    if ((draws.get(key)?.taken ?? 1) >= takenShare) continue;
    const estimate = completeCard(asCard(drawn)).measures[key];
    const [least, most] = narrowed(key, drawn);
    const by = key === 'topHipGirth' ? topHipSpread : spread;
    put(key, Math.max(least, estimate * (1 - by)), Math.min(most, estimate * (1 + by)));
  }
  return asCard(drawn);
}

type Bounds = readonly [least: number, most: number];
type Of = (measure: MeasureKey) => number;

/**
 * The bounds that hang on more than one other measure, beside proportions and slopes. How far bust, waist and
 * hip of one woman lie apart: least and most among 600 women of the Spanish sizing survey (R package
 * Anthropometry 1.20, read in a copy): bust less waist, hip less waist, hip less bust.
 */
const closer: { readonly [K in MeasureKey]?: (of: Of) => Bounds } = {
  waistGirth: (of) => [of('bustGirth') - 228, of('bustGirth') + 62],
  hipGirth: (of) => [
    Math.max(of('waistGirth') - 43, of('bustGirth') - 115),
    Math.min(of('waistGirth') + 418, of('bustGirth') + 350),
  ],
  sideNeckToUnderbust: (of) => [
    of('sideNeckToBustPoint') + (of('bustGirth') - of('underbustGirth')) / steepest('bustGirth'),
    Infinity,
  ],
  frontWaistLength: (of) => [
    of('sideNeckToUnderbust') +
      (of('underbustGirth') - of('waistGirth')) / steepest('underbustGirth'),
    Infinity,
  ],
  waistToHip: (of) => [
    (of('hipGirth') - of('waistGirth')) / steepest('hipGirth'),
    of('waistToFloor') * 0.5625 - 200,
  ],
  waistSeamGirth: (of) => beside(of('underbustGirth'), of('waistGirth')),
  topHipGirth: (of) => beside(of('waistGirth'), of('hipGirth')),
  underarmToWaist: (of) => [0, of('frontWaistLength') - of('sideNeckToBustPoint') + 160],
};

const steepest = (larger: MeasureKey): number =>
  slopes.find((slope) => slope.larger === larger)?.steepest ?? Number.NaN;

/** A girth between two others, at most 60 outside both. */
const beside = (a: number, b: number): Bounds => [Math.min(a, b) - 60, Math.max(a, b) + 60];

function proportioned(key: MeasureKey, bustGirth: number | undefined): Bounds {
  const rule = proportions.find(({ of }) => of === key);
  return rule === undefined || bustGirth === undefined ? [0, Infinity] : rule.bounds(bustGirth);
}

function narrowed(key: MeasureKey, drawn: ReadonlyMap<MeasureKey, number>): Bounds {
  const all: readonly Bounds[] = [
    bounds(key, drawn),
    proportioned(key, drawn.get('bustGirth')),
    closer[key]?.((other) => drawn.get(other) ?? Number.NaN) ?? [0, Infinity],
  ];
  return [Math.max(...all.map(([least]) => least)), Math.min(...all.map(([, most]) => most))];
}

/** Every core measure is drawn first, or `checkCard` says which is missing. */
function asCard(drawn: ReadonlyMap<MeasureKey, number>): MeasureCard {
  return partCard(drawn) as MeasureCard;
}

const partCard = (drawn: ReadonlyMap<MeasureKey, number>): Partial<MeasureCard> =>
  Object.fromEntries(drawn);

/** From 0 to 1, evenly: `fc.double` would draw nearly everything next to nothing. */
const share = fc.integer({ min: 0, max: 10_000 }).map((part) => part / 10_000);

const draw = fc.record({
  at: share,
  taken: share,
});

const draws = fc.record(
  Object.fromEntries([...coreOrder, ...furtherMeasures].map((key) => [key, draw])),
);

const drawsByKey = (drawn: Record<string, Draw>): ReadonlyMap<MeasureKey, Draw> =>
  new Map(Object.entries(drawn)) as ReadonlyMap<MeasureKey, Draw>;

/**
 * Cards over the whole of the limits that `checkCard` sets, waists over busts and hips among them, each further measure
 * taken on about three in ten. Every one of them is free of errors.
 */
export const bodyArbitrary: fc.Arbitrary<MeasureCard> = draws
  .map((drawn) => cardFrom(drawsByKey(drawn)))
  .filter((card) => checkCard(card).every(({ severity }) => severity === 'warning'));

/** How many of the drawn cards the filter throws away, of a sample: a test watches it. */
export const cardLoss = (count: number, seed: number): number =>
  fc
    .sample(draws, { numRuns: count, seed })
    .filter((drawn) =>
      checkCard(cardFrom(drawsByKey(drawn))).some((each) => each.severity === 'error'),
    ).length / count;

/** Which problems the thrown-away ones have. */
export const cardErrors = (count: number, seed: number): readonly string[] =>
  fc
    .sample(draws, { numRuns: count, seed })
    .flatMap((drawn) => checkCard(cardFrom(drawsByKey(drawn))))
    .filter((each) => each.severity === 'error')
    .map(({ field, with: others }) => `${field} ${(others ?? []).join()}`);
