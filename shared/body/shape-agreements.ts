import { mm, said } from '../units/said.ts';
import { error, type Problem } from '../units/problem.ts';
import type { Body, MeasureKey } from './card.ts';
import { measureGuide } from './measure-guide.ts';

/** How far a girth between two others may stand outside both before the outline would turn back on itself (our rule). */
const outside = 60;

const label = (key: MeasureKey): string => measureGuide[key].label.toLowerCase();

/** A measured girth that lies between two levels must lie between their girths, near enough. */
function between(
  body: Body,
  key: 'topHipGirth' | 'waistSeamGirth',
  above: 'waistGirth' | 'underbustGirth',
  below: 'waistGirth' | 'hipGirth',
): readonly Problem[] {
  const girth = body.measures[key];
  const least = Math.min(body.measures[above], body.measures[below]) - outside;
  const most = Math.max(body.measures[above], body.measures[below]) + outside;
  if (key in body.estimated || (girth >= least && girth <= most)) return [];
  return [
    error({
      code: 'disagree',
      field: `card.${key}`,
      with: [`card.${above}`, `card.${below}`],
      said: said`${measureGuide[key].label} ${mm(girth)} does not fit between ${label(above)} ${mm(body.measures[above])} and ${label(below)} ${mm(body.measures[below])}: it must lie between ${mm(least)} and ${mm(most)}. Measure all three again.`,
    }),
  ];
}

/** The armpit line, taken from the waist up, may not lie far above the bust point (160: our rule). */
function underarm(body: Body): readonly Problem[] {
  const { underarmToWaist, frontWaistLength, sideNeckToBustPoint } = body.measures;
  const most = frontWaistLength - sideNeckToBustPoint + 160;
  if (underarmToWaist <= most || 'underarmToWaist' in body.estimated) return [];
  return [
    error({
      code: 'disagree',
      field: 'card.underarmToWaist',
      with: ['card.frontWaistLength', 'card.sideNeckToBustPoint'],
      said: said`Underarm to waist ${mm(underarmToWaist)} is too long beside front waist length ${mm(frontWaistLength)} and side neck to bust point ${mm(sideNeckToBustPoint)}: it may be at most ${mm(most)}. Measure all three again.`,
    }),
  ];
}

/** A core measure expected from the bust: a line, and how far from it a body can be and still be drawn. */
type Proportion = {
  readonly of: 'bustSpan' | 'sideNeckToBustPoint';
  readonly slope: number;
  readonly start: number;
  readonly within: number;
};

/** Lines: fits to ASTM D5585-95 (from memory), within 3 mm of its rows; the distances are our rule. */
const proportions: readonly Proportion[] = [
  { of: 'bustSpan', slope: 0.2045, start: 13.7, within: 75 },
  { of: 'sideNeckToBustPoint', slope: 0.2494, start: 32.2, within: 115 },
];

function proportion(body: Body, { of, slope, start, within }: Proportion): readonly Problem[] {
  const { bustGirth } = body.measures;
  const value = body.measures[of];
  const expected = start + slope * bustGirth;
  if (Math.abs(value - expected) <= within) return [];
  return [
    error({
      code: 'disagree',
      field: `card.${of}`,
      with: ['card.bustGirth'],
      said: said`${measureGuide[of].label} ${mm(value)} does not go with bust ${mm(bustGirth)}: beside it, it must lie between ${mm(expected - within)} and ${mm(expected + within)}. Measure both again.`,
    }),
  ];
}

/** A girth that falls to the next within a height: steeper than `steepest` a front cannot be drawn (our rule). */
type Fall = {
  readonly upper: 'bustGirth' | 'underbustGirth';
  readonly lower: 'underbustGirth' | 'waistGirth';
  readonly from: 'sideNeckToBustPoint' | 'sideNeckToUnderbust';
  readonly to: 'sideNeckToUnderbust' | 'frontWaistLength';
  readonly steepest: number;
};

const falls: readonly Fall[] = [
  {
    upper: 'bustGirth',
    lower: 'underbustGirth',
    from: 'sideNeckToBustPoint',
    to: 'sideNeckToUnderbust',
    steepest: 3.5,
  },
  {
    upper: 'underbustGirth',
    lower: 'waistGirth',
    from: 'sideNeckToUnderbust',
    to: 'frontWaistLength',
    steepest: 2.4,
  },
];

function fall(body: Body, { upper, lower, from, to, steepest }: Fall): readonly Problem[] {
  const apart = body.measures[upper] - body.measures[lower];
  const height = body.measures[to] - body.measures[from];
  if (apart <= steepest * height) return [];
  return [
    error({
      code: 'too-steep',
      field: `card.${lower}`,
      with: [`card.${upper}`, `card.${from}`, `card.${to}`],
      said: said`${measureGuide[lower].label} ${mm(body.measures[lower])} is ${mm(apart)} less than ${label(upper)} ${mm(body.measures[upper])} within a height of ${mm(height)} (${label(to)} less ${label(from)}): over that height it may be at most ${mm(steepest * height)} less. Measure both girths and both lengths again.`,
    }),
  ];
}

/** Agreements that hang on more than a difference of two measures, errors only. */
export const shapeProblems = (body: Body): readonly Problem[] => [
  ...between(body, 'waistSeamGirth', 'underbustGirth', 'waistGirth'),
  ...between(body, 'topHipGirth', 'waistGirth', 'hipGirth'),
  ...underarm(body),
  ...proportions.flatMap((each) => proportion(body, each)),
  ...falls.flatMap((each) => fall(body, each)),
];
