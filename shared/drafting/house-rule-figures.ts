import {
  type AllowanceKind,
  type BalanceLevel,
  type HouseRules,
  allowanceFor,
  balanceLevels,
} from './house-rules.ts';

type Single =
  'cupShare' | 'sideShare' | 'dartWidest' | 'dartClearance' | 'peakOverBust' | 'shoulderDrop';

/** Keys of the house rules' figures as the contract writes them. */
export type HouseRuleKey = `balance.${BalanceLevel}` | Single | `allowance.${AllowanceKind}`;

/** One figure of the house rules: its name, what it does, and its bounds (both allowed). */
export type HouseRuleFigure = {
  readonly key: HouseRuleKey;
  readonly label: string;
  /** One sentence beside the field. */
  readonly hint: string;
  readonly min: number;
  readonly max: number;
  /** A share of one and no length. */
  readonly share?: true;
  readonly value: (rules: HouseRules) => number;
  /** The rules with another value for it. */
  readonly put: (rules: HouseRules, value: number) => HouseRules;
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

const balanceAt = (level: BalanceLevel): HouseRuleFigure => ({
  key: `balance.${level}`,
  label: `Balance at the ${levelWords[level]}`,
  hint: 'What the front quarter has more than the plain one, and the back one less.',
  min: -30,
  max: 30,
  value: (rules) => rules.balance[level],
  put: (rules, value) => ({ ...rules, balance: { ...rules.balance, [level]: value } }),
});

const single = (
  key: Single,
  figure: Pick<HouseRuleFigure, 'label' | 'hint' | 'min' | 'max' | 'share'>,
): HouseRuleFigure => ({
  key,
  ...figure,
  value: (rules) => rules[key],
  put: (rules, value) => ({ ...rules, [key]: value }),
});

const allowance = (
  kind: AllowanceKind,
  figure: Pick<HouseRuleFigure, 'label' | 'hint' | 'min' | 'max'>,
): HouseRuleFigure => ({
  key: `allowance.${kind}`,
  ...figure,
  value: (rules) => allowanceFor(kind, rules),
  put: (rules, value) => ({ ...rules, allowance: { ...rules.allowance, [kind]: value } }),
});

/** Every figure of the house rules. Bounds: common practice, no source; a let-out allowance may be wide, an enclosed edge may not. */
export const houseRuleFigures: readonly HouseRuleFigure[] = [
  ...balanceLevels.map(balanceAt),
  single('cupShare', {
    label: 'Share of a full cup',
    hint: 'Part of the bust’s fullness beyond a middle cup that the front gains over the back.',
    min: 0,
    max: 0.5,
    share: true,
  }),
  single('sideShare', {
    label: 'Share of the side seam',
    hint: 'Part of what goes between bust, waist and hip that the side seam takes; darts take the rest.',
    min: 0,
    max: 1,
    share: true,
  }),
  single('dartWidest', {
    label: 'Widest dart',
    hint: 'A wider intake is sewn in two darts.',
    min: 15,
    max: 60,
  }),
  single('dartClearance', {
    label: 'Dart clearance',
    hint: 'Darts stop this short of the bust point.',
    min: 10,
    max: 40,
  }),
  single('peakOverBust', {
    label: 'Drop of a strapless gown',
    hint: 'How high its peak stands over the bust where the style card leaves it open.',
    min: 60,
    max: 110,
  }),
  single('shoulderDrop', {
    label: 'Drop off the shoulder',
    hint: 'From the side neck level down to the peak where the style card leaves it open.',
    min: 90,
    max: 200,
  }),
  allowance('seam', {
    label: 'Seam allowance',
    hint: 'Outside every seam that has no allowance of its own.',
    min: 6,
    max: 30,
  }),
  allowance('side', {
    label: 'Side seam allowance',
    hint: 'Wide enough that the gown can be let out.',
    min: 6,
    max: 50,
  }),
  allowance('zip', {
    label: 'Zip allowance',
    hint: 'Where the zip is set in, never counted in a girth.',
    min: 10,
    max: 60,
  }),
  allowance('top', {
    label: 'Top edge allowance',
    hint: 'Enclosed by lining or facing.',
    min: 5,
    max: 20,
  }),
  allowance('armhole', {
    label: 'Armhole allowance',
    hint: 'Of an armhole edge off the shoulder, enclosed like the top edge.',
    min: 5,
    max: 20,
  }),
  allowance('waist', {
    label: 'Waist seam allowance',
    hint: 'Of the seam between top and skirt.',
    min: 6,
    max: 30,
  }),
  allowance('princess', {
    label: 'Princess seam allowance',
    hint: 'Wider, the bodice can be let out over the bust.',
    min: 6,
    max: 40,
  }),
  allowance('hem', {
    label: 'Circular hem allowance',
    hint: 'What is turned up of a hem that bends; it takes little.',
    min: 6,
    max: 20,
  }),
  allowance('straightHem', {
    label: 'Straight hem allowance',
    hint: 'What is turned up of a hem that hardly bends.',
    min: 10,
    max: 80,
  }),
  allowance('facing', {
    label: 'Facing edge allowance',
    hint: 'Beyond the free edge of a facing, neatened and not sewn down.',
    min: 0,
    max: 20,
  }),
];
