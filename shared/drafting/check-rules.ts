import { readingGrace } from '../units/format-length.ts';
import { error, type Problem } from '../units/problem.ts';
import { mm, said, type Said } from '../units/said.ts';
import { houseRuleFigures, type HouseRuleFigure } from './house-rule-figures.ts';
import type { HouseRules } from './house-rules.ts';
import { intakeFigures } from './intake-figures.ts';

/** What a figure is checked by. */
type Bounded = Pick<HouseRuleFigure, 'label' | 'min' | 'max' | 'share'> & { readonly key: string };

const worded = ({ share }: Bounded, value: number): Said =>
  share === true ? [String(value)] : [mm(value)];

const holds = ({ min, max, share }: Bounded, value: number): boolean => {
  const grace = share === true ? 0 : readingGrace;
  return value >= min - grace && value <= max + grace;
};

function problemOf(rule: Bounded, value: number): Problem {
  const field = `rules.${rule.key}`;
  if (!Number.isFinite(value)) {
    return error({
      code: 'not-a-number',
      field,
      said: said`${rule.label} is not a number: type it again in the house rules.`,
    });
  }
  return error({
    code: 'out-of-range',
    field,
    said: said`${rule.label} ${worded(rule, value)} must lie between ${worded(rule, rule.min)} and ${worded(rule, rule.max)}: change it in the house rules.`,
  });
}

/** A figure with its value in these rules. */
type Given = { readonly rule: Bounded; readonly value: number };

const intakesGiven = ({ intakes }: HouseRules): readonly Given[] =>
  intakes === undefined
    ? []
    : intakeFigures.map(({ place, label, min, max }) => ({
        rule: { key: `intakes.${place}`, label, min, max },
        value: intakes[place],
      }));

/** What is wrong in a workroom's house rules: every value outside its bounds, with both of them. */
export const checkRules = (rules: HouseRules): readonly Problem[] =>
  [
    ...houseRuleFigures.map((rule): Given => ({ rule, value: rule.value(rules) })),
    ...intakesGiven(rules),
  ]
    .filter(({ rule, value }) => !holds(rule, value))
    .map(({ rule, value }) => problemOf(rule, value));
