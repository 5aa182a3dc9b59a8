/** The levels at which the side seam may stand off the plain quarter. */
export const balanceLevels = [
  'chest',
  'bust',
  'underbust',
  'waist',
  'topHip',
  'hip',
  'knee',
] as const;
export type BalanceLevel = (typeof balanceLevels)[number];

/** What the edge of a piece becomes, which decides its allowance. */
export const edgeKinds = [
  'seam',
  'side',
  'zip',
  'top',
  'hem',
  'armhole',
  'facing',
  'fold',
  'mouth',
] as const;
export type EdgeKind = (typeof edgeKinds)[number];

/** The allowances every workroom has, and those it may give beside them, each with the one it else follows. */
const plainAllowances = ['seam', 'side', 'zip', 'top', 'hem'] as const;
export const allowanceFollows = {
  waist: 'seam',
  princess: 'seam',
  armhole: 'top',
  facing: 'top',
  straightHem: 'hem',
} as const;
type PlainAllowance = (typeof plainAllowances)[number];
type OwnAllowance = keyof typeof allowanceFollows;
export type AllowanceKind = PlainAllowance | OwnAllowance;

/** Lines of a piece's label that a workroom may leave out; its name and what to cut stand on every piece. */
export const labelLines = ['card', 'size', 'draft', 'lines', 'scale'] as const;
export type LabelLine = (typeof labelLines)[number];

/** How many darts or gores a half has, for each half that is not to decide by its own measures. */
type Counts<N extends number> = { readonly front?: N; readonly back?: N };

/** The places at which a maker may give the intake of dart or princess outright, from the top down. */
export const intakePlaces = ['topLine', 'underbust', 'waistSeam', 'waist'] as const;
export type IntakePlace = (typeof intakePlaces)[number];

/** Where a gown off the shoulder ends: at the width across front and back, or at the shoulder width. */
export const armholePlaces = ['across', 'shoulder'] as const;
export type ArmholePlace = (typeof armholePlaces)[number];

/** How a workroom drafts (method sections 4, 6, 7), millimetres; they travel with the draft. */
export type HouseRules = {
  /** Added to the front quarter and taken from the back one, by level. */
  readonly balance: { readonly [L in BalanceLevel]: number };
  /** Part of the bust's fullness beyond a middle cup that the front gains over the back, 0 to 0.5. */
  readonly cupShare: number;
  /** Part of the waist suppression that the side seam takes, 0 to 1. */
  readonly sideShare: number;
  /** Widest intake sewn in one dart. */
  readonly dartWidest: number;
  /** Darts stop this short of the bust point. */
  readonly dartClearance: number;
  /** Height of a strapless top line's peak over the bust, where the style leaves it open. */
  readonly peakOverBust: number;
  /** Side-neck level down to the peak of a gown off the shoulder, where the style leaves it open. */
  readonly shoulderDrop: number;
  readonly armholeAt: ArmholePlace;
  /** Intakes given outright, front and back alike: the side seam takes the rest. Absent, they are derived. */
  readonly intakes?: { readonly [P in IntakePlace]: number };
  /** Allowance beyond the seam line by kind of edge; a fold has none. */
  readonly allowance: { readonly [K in PlainAllowance]: number } & {
    readonly [K in OwnAllowance]?: number;
  };
  /** What the label of a piece says; all of it where the rules say nothing. */
  readonly label?: readonly LabelLine[];
  /** Numbers settled beforehand, as the sizes of a nest have them from the largest; absent, each draft decides. */
  readonly counts?: { readonly darts?: Counts<1 | 2>; readonly gores?: Counts<number> };
};

const isPlain = (kind: AllowanceKind): kind is PlainAllowance =>
  plainAllowances.some((plain) => plain === kind);

/** Cloth beyond the seam line by kind of edge, mm; an edge the rules do not name takes what it follows. */
export const allowanceFor = (kind: AllowanceKind, { allowance }: HouseRules): number =>
  isPlain(kind) ? allowance[kind] : (allowance[kind] ?? allowance[allowanceFollows[kind]]);
