import { type Body, type MeasureKey, coreMeasures, furtherMeasures } from '../body/card.ts';
import { measureGuide } from '../body/measure-guide.ts';
import type { Step } from '../drafting/step.ts';
import { type Said, type SaidAngle, type SaidLength, deg, mm, said } from '../units/said.ts';

/** A measure a number comes from, as the body has it. */
export type Source = {
  readonly key: MeasureKey;
  readonly label: string;
  readonly value: SaidLength | SaidAngle;
  /** Rule by which it was estimated; absent where it was taken. */
  readonly estimated?: string;
};

/** A number of a sentence and where it comes from: it is a measure, is worked out from some, or from none. */
export type SpokenNumber = {
  readonly quantity: SaidLength | SaidAngle;
  readonly from: 'measure' | 'measures' | 'elsewhere';
  readonly sources: readonly Source[];
};

export type SpokenPart = string | SpokenNumber;

const keys: readonly MeasureKey[] = [...coreMeasures, ...furtherMeasures];
const isMeasure = (key: string): key is MeasureKey => keys.some((each) => each === key);

const sourceOf = (body: Body, key: MeasureKey): Source => {
  const { label, kind } = measureGuide[key];
  const value = body.measures[key];
  const rule = key in body.estimated ? ruleOf(body, key) : undefined;
  return {
    key,
    label,
    value: kind === 'angle' ? deg(value) : mm(value),
    ...(rule === undefined ? {} : { estimated: rule }),
  };
};

const ruleOf = ({ estimated }: Body, key: MeasureKey): string | undefined =>
  Object.entries(estimated).find(([name]) => name === key)?.[1];

const valueOf = (quantity: SaidLength | SaidAngle): number =>
  'deg' in quantity ? quantity.deg : quantity.mm;

/** How near a number of a sentence must be to a measure named in the step to be that measure, mm. */
const same = 1e-9;

/** Keys a number rests on: those it says itself, else the measure of its step that it is. */
function restsOn(quantity: SaidLength | SaidAngle, step: Step, body: Body): readonly MeasureKey[] {
  if (quantity.of) return quantity.of.filter(isMeasure);
  const is = step.measures
    .filter(isMeasure)
    .find((key) => Math.abs(body.measures[key] - valueOf(quantity)) < same);
  return is === undefined ? [] : [is];
}

/** The sentence of a step (or its reason) in parts, every number with the measures it comes from. */
export const spoken = (sentence: Said, step: Step, body: Body): readonly SpokenPart[] =>
  sentence.map((part) => {
    if (typeof part === 'string') return part;
    const sources = restsOn(part, step, body).map((key) => sourceOf(body, key));
    const [only] = sources;
    const isIt =
      sources.length === 1 &&
      only !== undefined &&
      Math.abs(body.measures[only.key] - valueOf(part)) < same;
    return {
      quantity: part,
      from: isIt ? 'measure' : only === undefined ? 'elsewhere' : 'measures',
      sources,
    };
  });

const worded = ({ label, value, estimated }: Source): Said =>
  said`${label} ${value}${estimated === undefined ? ' (taken)' : said` (estimated: ${estimated})`}`;

/** Where a number comes from, in a sentence. */
export function sourceSaid({ from, sources }: SpokenNumber): Said {
  const list = sources.map(worded).flatMap((each, index) => (index === 0 ? each : ['; ', ...each]));
  if (from === 'measure') return said`${list}`;
  if (from === 'measures') return said`Worked out from ${list}`;
  return said`Not a measure of the body: worked out on the paper, chosen on the style card, or a figure of the method or the house`;
}
