import type { MeasureCard, MeasureKey } from '../body/card.ts';
import { coreMeasures, furtherMeasures } from '../body/card.ts';
import { measureGuide } from '../body/measure-guide.ts';
import { type Problem, error } from '../units/problem.ts';
import { mm, said } from '../units/said.ts';

/** What each measure grows by from one size to the next, mm; one left out follows its estimate or stays. */
export type GradeRules = { readonly [K in MeasureKey]?: number | undefined };

/**
 * The starter set, to be edited: our own, for a step of 40 round the body.
 *
 * Bust, waist and hip: the step between the class mid-values 76 to 104 of EN 13402-3 (from memory; its
 * class limits 74 to 102 in fours, seen). Under-bust with the bust, so that the cup stays one cup; EN 13402
 * labels bands in fives (seen). Across back and front, neck, shoulder, armscye depth, back waist length, top
 * arm, waist to hip: the size step of a published table (ALD, from memory). Bust span: twice the growth of the half between centre front and bust
 * point found by drafting two sizes of it (from memory, 4.5). The others: our rule. No size is taller: lengths to knee
 * and floor stay (EN 13402-3 keeps height apart from girth, from memory).
 */
export const starterRules: GradeRules = {
  bustGirth: 40,
  underbustGirth: 40,
  waistGirth: 40,
  hipGirth: 40,
  bustSpan: 9,
  sideNeckToBustPoint: 5,
  sideNeckToUnderbust: 6,
  frontWaistLength: 6,
  waistToHip: 3,
  waistToFloor: 0,
  upperChestGirth: 34,
  topHipGirth: 40,
  backWaistLength: 5,
  armscyeDepth: 5,
  shoulderLength: 2.5,
  acrossBack: 10,
  acrossFront: 12,
  neckGirth: 10,
  upperArmGirth: 12,
};

/** The most sizes one nest holds (issue: up to 12). */
export const mostSizes = 12;

/** A step this large is a slip of the pen, mm. */
const largestStep = 100;

const everyMeasure: readonly MeasureKey[] = [...coreMeasures, ...furtherMeasures];

/** What is wrong in a set of grade rules: steps that are no number or larger than a size could be. */
export const checkGradeRules = (rules: GradeRules): readonly Problem[] =>
  everyMeasure.flatMap((key) => {
    const step = rules[key];
    if (step === undefined) return [];
    const field = `gradeRules.${key}`;
    const { label } = measureGuide[key];
    if (!Number.isFinite(step)) {
      return [
        error({
          code: 'not-a-number',
          field,
          said: said`The step of ${label.toLowerCase()} is not a number: type it again, or leave it open.`,
        }),
      ];
    }
    if (Math.abs(step) <= largestStep) return [];
    return [
      error({
        code: 'out-of-range',
        field,
        said: said`The step of ${label.toLowerCase()} ${mm(step)} must lie between ${mm(-largestStep)} and ${mm(largestStep)}: one size is seldom more than ${mm(60)} from the next.`,
      }),
    ];
  });

/** Kept to a thousandth, so that stepping forth and back gives the very same number. */
const tidy = (value: number): number => Math.round(value * 1000) / 1000;

/**
 * A card so many sizes on: each measure by its rule. A measure nobody took is stepped from `estimated`
 * where there is a rule for it, so that girths grow by their rule and not by an estimate's.
 */
export function stepCard(
  card: MeasureCard,
  rules: GradeRules,
  steps: number,
  estimated: { readonly [K in MeasureKey]?: number | undefined } = {},
): MeasureCard {
  if (steps === 0) return card;
  const stepped = everyMeasure.flatMap((key) => {
    const [step, value] = [rules[key], card[key] ?? estimated[key]];
    if (step === undefined || value === undefined) return [];
    return [[key, tidy(value + steps * step)] as const];
  });
  return { ...card, ...Object.fromEntries(stepped) };
}
