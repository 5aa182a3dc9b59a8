import { mm, said } from '../units/said.ts';
import { warning, type Problem } from '../units/problem.ts';
import type { MeasureCard, MeasureKey } from './card.ts';
import { measureGuide } from './measure-guide.ts';

const label = (key: MeasureKey): string => measureGuide[key].label.toLowerCase();

/** One girth expected from another: a line and the spread of real people about it, millimetres. */
type Regression = {
  readonly of: 'waistGirth' | 'hipGirth' | 'kneeGirth';
  readonly from: 'bustGirth' | 'hipGirth';
  readonly slope: number;
  readonly start: number;
  readonly spread: number;
};

/** reference.md section 1: Spanish sizing survey, n = 600, and Heinz et al. 2003, n = 260 (seen). */
const regressions: readonly Regression[] = [
  { of: 'waistGirth', from: 'bustGirth', slope: 1.139, start: -237, spread: 41 },
  { of: 'hipGirth', from: 'bustGirth', slope: 0.743, start: 342, spread: 64 },
  { of: 'kneeGirth', from: 'hipGirth', slope: 0.283, start: 82, spread: 17 },
];

const unlikelyGirth = (card: MeasureCard, rule: Regression): readonly Problem[] => {
  const taken = card[rule.of];
  const from = card[rule.from];
  if (taken === undefined) return [];
  const expected = rule.start + rule.slope * from;
  if (Math.abs(taken - expected) <= 3 * rule.spread) return [];
  return [
    warning({
      code: 'unlikely-girth',
      field: `card.${rule.of}`,
      with: [`card.${rule.from}`],
      said: said`${measureGuide[rule.of].label} ${mm(taken)} is unusual beside ${label(rule.from)} ${mm(from)}: most people lie within ${mm(expected - 3 * rule.spread)} and ${mm(expected + 3 * rule.spread)}. Take both again; keep them if they are right.`,
    }),
  ];
};

/** A measure that is usually the larger of two, and is not on this body. */
const usuallyLarger = (
  card: MeasureCard,
  larger: 'bustGirth' | 'hipGirth',
  smaller: 'waistGirth' | 'upperChestGirth',
  code: string,
): readonly Problem[] => {
  const least = card[smaller];
  if (least === undefined || least < card[larger]) return [];
  return [
    warning({
      code,
      field: `card.${smaller}`,
      with: [`card.${larger}`],
      said: said`${measureGuide[smaller].label} ${mm(least)} is not smaller than ${label(larger)} ${mm(card[larger])}. There are such bodies and the gown is drawn so; take both again to be sure.`,
    }),
  ];
};

/** Girths that are unlikely beside each other: real bodies all the same, so warnings only. */
export const girthWarnings = (card: MeasureCard): readonly Problem[] => [
  ...usuallyLarger(card, 'bustGirth', 'waistGirth', 'waist-not-under-bust'),
  ...usuallyLarger(card, 'hipGirth', 'waistGirth', 'waist-not-under-hip'),
  ...usuallyLarger(card, 'bustGirth', 'upperChestGirth', 'upper-chest-not-under-bust'),
  ...regressions.flatMap((rule) => unlikelyGirth(card, rule)),
];
