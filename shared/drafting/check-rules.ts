import { readingGrace } from '../units/format-length.ts';
import { error, type Problem } from '../units/problem.ts';
import { mm, said, type Said } from '../units/said.ts';
import { balanceLevels, type BalanceLevel, type HouseRules } from './house-rules.ts';

/** One house rule: its key in the contract, its name, bounds (both allowed), and how to read it. */
type Rule = {
  readonly key: string;
  readonly label: string;
  readonly min: number;
  readonly max: number;
  /** A share of one and no length. */
  readonly share?: true;
  readonly value: (rules: HouseRules) => number;
};

const levelWords: { readonly [L in BalanceLevel]: string } = {
  chest: 'chest',
  bust: 'bust',
  underbust: 'under-bust',
  waist: 'waist',
  topHip: 'top hip',
  hip: 'hip',
  knee: 'knee',
};

/** Bounds: common practice, no source; a let-out allowance may be wide, an enclosed edge may not. */
const limits: readonly Rule[] = [
  ...balanceLevels.map((level): Rule => ({
    key: `balance.${level}`,
    label: `Balance at the ${levelWords[level]}`,
    min: -30,
    max: 30,
    value: (rules) => rules.balance[level],
  })),
  {
    key: 'cupShare',
    label: 'Share of a full cup',
    min: 0,
    max: 0.5,
    share: true,
    value: (rules) => rules.cupShare,
  },
  {
    key: 'sideShare',
    label: 'Share of the side seam',
    min: 0,
    max: 1,
    share: true,
    value: (rules) => rules.sideShare,
  },
  { key: 'dartWidest', label: 'Widest dart', min: 15, max: 60, value: (rules) => rules.dartWidest },
  {
    key: 'dartClearance',
    label: 'Dart clearance',
    min: 10,
    max: 40,
    value: (rules) => rules.dartClearance,
  },
  {
    key: 'allowance.seam',
    label: 'Seam allowance',
    min: 6,
    max: 30,
    value: (rules) => rules.allowance.seam,
  },
  {
    key: 'allowance.side',
    label: 'Side seam allowance',
    min: 6,
    max: 50,
    value: (rules) => rules.allowance.side,
  },
  {
    key: 'allowance.zip',
    label: 'Zip allowance',
    min: 10,
    max: 50,
    value: (rules) => rules.allowance.zip,
  },
  {
    key: 'allowance.top',
    label: 'Top edge allowance',
    min: 5,
    max: 20,
    value: (rules) => rules.allowance.top,
  },
  {
    key: 'allowance.hem',
    label: 'Hem allowance',
    min: 6,
    max: 60,
    value: (rules) => rules.allowance.hem,
  },
];

const worded = ({ share }: Rule, value: number): Said =>
  share === true ? [String(value)] : [mm(value)];

const holds = ({ min, max, share }: Rule, value: number): boolean => {
  const grace = share === true ? 0 : readingGrace;
  return value >= min - grace && value <= max + grace;
};

function problemOf(rule: Rule, value: number): Problem {
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

/** What is wrong in a workroom's house rules: every value outside its bounds, with both of them. */
export const checkRules = (rules: HouseRules): readonly Problem[] =>
  limits
    .map((rule) => ({ rule, value: rule.value(rules) }))
    .filter(({ rule, value }) => !holds(rule, value))
    .map(({ rule, value }) => problemOf(rule, value));
