import fc from 'fast-check';
import { agreements } from '#shared/body/agreements.ts';
import type { MeasureCard, MeasureKey } from '#shared/body/card.ts';
import { furtherMeasures } from '#shared/body/card.ts';
import { checkCard } from '#shared/body/check-card.ts';
import { completeCard } from '#shared/body/complete-card.ts';
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
    put(key, Math.max(least, estimate * (1 - spread)), Math.min(most, estimate * (1 + spread)));
  }
  return asCard(drawn);
}

type Bounds = readonly [least: number, most: number];
type Of = (measure: MeasureKey) => number;

/** The bounds that hang on more than one other measure: those of shape-agreements.ts. */
const closer: { readonly [K in MeasureKey]?: (of: Of) => Bounds } = {
  bustSpan: (of) => about(13.7 + 0.2045 * of('bustGirth'), 75),
  sideNeckToBustPoint: (of) => about(32.2 + 0.2494 * of('bustGirth'), 115),
  sideNeckToUnderbust: (of) => [
    of('sideNeckToBustPoint') + (of('bustGirth') - of('underbustGirth')) / 3.5,
    Infinity,
  ],
  frontWaistLength: (of) => [
    of('sideNeckToUnderbust') + (of('underbustGirth') - of('waistGirth')) / 2.4,
    Infinity,
  ],
  waistToHip: (of) => [0, of('waistToFloor') * 0.5625 - 200],
  waistSeamGirth: (of) => beside(of('underbustGirth'), of('waistGirth')),
  topHipGirth: (of) => beside(of('waistGirth'), of('hipGirth')),
  underarmToWaist: (of) => [0, of('frontWaistLength') - of('sideNeckToBustPoint') + 160],
};

const about = (middle: number, within: number): Bounds => [middle - within, middle + within];

/** A girth between two others, at most 60 outside both. */
const beside = (a: number, b: number): Bounds => [Math.min(a, b) - 60, Math.max(a, b) + 60];

function narrowed(key: MeasureKey, drawn: ReadonlyMap<MeasureKey, number>): Bounds {
  const [least, most] = bounds(key, drawn);
  const [closerLeast, closerMost] = closer[key]?.((other) => drawn.get(other) ?? Number.NaN) ?? [
    least,
    most,
  ];
  return [Math.max(least, closerLeast), Math.min(most, closerMost)];
}

/** Every core measure is drawn first, or `checkCard` says which is missing. */
function asCard(drawn: ReadonlyMap<MeasureKey, number>): MeasureCard {
  return partCard(drawn) as MeasureCard;
}

const partCard = (drawn: ReadonlyMap<MeasureKey, number>): Partial<MeasureCard> =>
  Object.fromEntries(drawn);

const draw = fc.record({
  at: fc.double({ min: 0, max: 1, noNaN: true }),
  taken: fc.double({ min: 0, max: 1, noNaN: true }),
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
