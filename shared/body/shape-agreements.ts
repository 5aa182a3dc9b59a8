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

/** A core measure that must stand in proportion to the bust: its bounds beside a bust girth, millimetres. */
export type Proportion = {
  readonly of: 'bustSpan' | 'sideNeckToBustPoint' | 'underbustGirth';
  readonly bounds: (bustGirth: number) => readonly [least: number, most: number];
};

/**
 * The lines of bust span and neck to bust point are fits to ASTM D5585-95 (from memory), within 3 mm of its rows; how far
 * from them a body may lie, and the fullest cup a front can shape (0.68), is our rule.
 */
export const proportions: readonly Proportion[] = [
  { of: 'bustSpan', bounds: (bust) => around(13.7 + 0.2045 * bust, 60) },
  { of: 'sideNeckToBustPoint', bounds: (bust) => around(32.2 + 0.2494 * bust, 90) },
  { of: 'underbustGirth', bounds: (bust) => [0.68 * bust, bust - 10] },
];

const around = (middle: number, within: number) => [middle - within, middle + within] as const;

function proportion(body: Body, { of, bounds }: Proportion): readonly Problem[] {
  const { bustGirth } = body.measures;
  const value = body.measures[of];
  const [least, most] = bounds(bustGirth);
  if (value >= least && value <= most) return [];
  return [
    error({
      code: 'disagree',
      field: `card.${of}`,
      with: ['card.bustGirth'],
      said: said`${measureGuide[of].label} ${mm(value)} does not go with bust ${mm(bustGirth)}: beside it, it must lie between ${mm(least)} and ${mm(most)}. Measure both again.`,
    }),
  ];
}

/** A girth that changes to another within a height: by more than `steepest` of it no piece can be drawn (our rule). */
export type Slope = {
  readonly larger: 'bustGirth' | 'underbustGirth' | 'hipGirth';
  readonly smaller: 'underbustGirth' | 'waistGirth';
  readonly steepest: number;
  /** The lengths the height comes from, and how it is called. */
  readonly along: readonly MeasureKey[];
  readonly called: string;
  readonly height: (measures: Body['measures']) => number;
};

export const slopes: readonly Slope[] = [
  {
    larger: 'bustGirth',
    smaller: 'underbustGirth',
    steepest: 3.5,
    along: ['sideNeckToBustPoint', 'sideNeckToUnderbust'],
    called: 'side neck to under-bust less side neck to bust point',
    height: (measures) => measures.sideNeckToUnderbust - measures.sideNeckToBustPoint,
  },
  {
    larger: 'underbustGirth',
    smaller: 'waistGirth',
    steepest: 2.2,
    along: ['sideNeckToUnderbust', 'frontWaistLength'],
    called: 'front waist length less side neck to under-bust',
    height: (measures) => measures.frontWaistLength - measures.sideNeckToUnderbust,
  },
  {
    larger: 'hipGirth',
    smaller: 'waistGirth',
    steepest: 2.6,
    along: ['waistToHip'],
    called: 'waist to hip',
    height: (measures) => measures.waistToHip,
  },
];

function slope(body: Body, rule: Slope): readonly Problem[] {
  const { larger, smaller, steepest, along, called } = rule;
  const apart = body.measures[larger] - body.measures[smaller];
  const height = rule.height(body.measures);
  if (apart <= steepest * height) return [];
  return [
    error({
      code: 'too-steep',
      field: `card.${smaller}`,
      with: [larger, ...along].map((key) => `card.${key}`),
      said: said`${measureGuide[smaller].label} ${mm(body.measures[smaller])} is ${mm(apart)} less than ${label(larger)} ${mm(body.measures[larger])} within a height of ${mm(height)} (${called}): over that height it may be at most ${mm(steepest * height)} less. Measure them all again.`,
    }),
  ];
}

/** Agreements that hang on more than a difference of two measures, errors only. */
export const shapeProblems = (body: Body): readonly Problem[] => [
  ...between(body, 'waistSeamGirth', 'underbustGirth', 'waistGirth'),
  ...between(body, 'topHipGirth', 'waistGirth', 'hipGirth'),
  ...underarm(body),
  ...proportions.flatMap((each) => proportion(body, each)),
  ...slopes.flatMap((each) => slope(body, each)),
];
