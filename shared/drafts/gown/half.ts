import { narrowestDart } from '../../drafting/suppression.ts';
import type { HouseRules } from '../../drafting/house-rules.ts';
import type { Side } from '../../drafting/piece.ts';
import type { Cubic } from '../../geometry/path.ts';
import { type Point, point } from '../../geometry/point.ts';
import { type Profile, slopeAt, xAt } from '../../geometry/profile.ts';
import { type Fading, heldBelow } from './fading.ts';
import { bustToHip, outrightSuppression, shareSuppression, sideLine } from './side-line.ts';
import type { SideHeights, SideLeans, SideWidths, Suppression } from './side-line.ts';
import type { GownStyle } from './style-card.ts';
import { type SideArcs, towards, truedHeights } from './truing.ts';
import { closedSeam, fallFor, seamAt } from './waist-seam.ts';

const sideLevels = ['underarm', 'bust', 'underbust', 'seam', 'topHip', 'hip', 'knee'] as const;

/** Quarter widths at the levels, millimetres. */
export type QuarterWidths = {
  readonly [L in keyof SideWidths as Exclude<L, 'lean' | 'leans'>]-?: number;
};

/** What a half is drawn from. */
export type HalfInputs = {
  readonly side: Side;
  readonly quarters: QuarterWidths;
  /** Heights at the centre line. */
  readonly levels: SideHeights;
  readonly rules: HouseRules;
  /** Width taken in above the bust by the lean of the side. */
  readonly lean: number;
  /** Half the gap of the princess or dart lies on each side of this distance from the centre. */
  readonly axis: number;
  /** Height at which the first dart of the middle ends; a second ends 20 higher. */
  readonly dartTip: number;
  /** Darts of the middle: one, or two sharing the intake. */
  readonly dartCount: 1 | 2;
  /** Where darts shape the top, the side seam helps them under the bust by its share. */
  readonly sideHelps: boolean;
  readonly waistSeam: GownStyle['waistSeam'];
  readonly fading: Fading;
  /** Leans of the side at bust and hip, where upright it would bend too often. */
  readonly leans?: SideLeans;
  /** Slope (dy/dx) at which the waist seam arrives at the side; the half's own square where absent. */
  readonly seamSlope?: number;
  /** An earlier drawing of the same half to start from. */
  readonly from?: Half;
  /** Lengths along the front's side seam from the waist: the back is trued to them. */
  readonly trueTo?: SideArcs;
};

/** Shares of the intake by dart. */
export const dartShares = (count: 1 | 2): readonly number[] => (count === 1 ? [1] : [0.6, 0.4]);

/** A half of the body in lines: everything the pieces of that side are cut from. */
export type Half = {
  readonly side: Side;
  readonly levels: SideHeights;
  /** Heights at the side seam: the levels themselves in front, trued to the front in the back. */
  readonly heights: SideHeights;
  readonly quarters: QuarterWidths;
  readonly suppression: Suppression;
  readonly line: Profile;
  /** The waist seam, drawn with its darts closed. */
  readonly seam: Cubic;
  /** Total intake at under-bust, waist seam and waist. */
  readonly gap: { readonly underbust: number; readonly seam: number; readonly waist: number };
  readonly axis: number;
  readonly dartCount: 1 | 2;
  /** Axes of the darts of the middle, from the centre out, and the heights of their tips. */
  readonly dartAxes: readonly number[];
  readonly dartTips: readonly number[];
  readonly fading: Fading;
  readonly held: Round['held'];
};

/** Height of a slanting level at a distance from the centre line. */
export const heightOn = (
  half: Pick<Half, 'levels' | 'heights' | 'line'>,
  level: keyof SideHeights,
  x: number,
): number => {
  const centre = half.levels[level];
  const side = half.heights[level];
  return centre + ((side - centre) * x) / xAt(half.line, side);
};

/** Where a level meets the side seam. */
export const atSide = (half: Pick<Half, 'line' | 'heights'>, level: keyof SideHeights): Point =>
  point(xAt(half.line, half.heights[level]), half.heights[level]);

/** What one round of drawing leaves for the next. */
type Round = {
  readonly heights: SideHeights;
  readonly axes: readonly number[];
  readonly line: Profile;
  readonly seam: Cubic;
  readonly gap: { readonly underbust: number; readonly seam: number };
  /** The side is held to the quarter there because a dart would turn negative (or not be worth sewing). */
  readonly held: { readonly underbust: boolean; readonly seam: boolean };
};

/** The darts of the middle: shares of the intake and heights of the tips. */
type DartPlan = { readonly shares: readonly number[]; readonly tips: readonly number[] };

const roundsAtMost = 80;
/** From this round on it moves half way only, which settles the few bodies that swing. */
const dampedFrom = 14;

/**
 * Draws a half: side seam, waist seam and intakes, so that every level holds its quarter. The back
 * is trued: its heights at the side are moved until its lengths from the waist are the front's. No
 * answer where the girths change so fast that they do not settle.
 */
export function drawHalf(inputs: HalfInputs): Half | undefined {
  const { quarters, levels } = inputs;
  const shares = dartShares(inputs.dartCount);
  const darts: DartPlan = {
    shares,
    tips: shares.map((_, k) => Math.max(levels.waist, inputs.dartTip - 20 * k)),
  };
  const suppression = suppressionOf(inputs, (waist) => ({
    line: bustToHip(levels, plainWidths(inputs, darts, waist)),
    top: levels.bust,
    foot: levels.hip,
  }));
  let round = firstRound(inputs, darts, suppression.side);
  let settled = false;
  for (let count = 0; count < roundsAtMost && !settled; count += 1) {
    const next = nextRound(inputs, darts, suppression.side, round, count < dampedFrom ? 1 : 0.5);
    const change = Math.max(
      Math.abs(next.gap.seam - round.gap.seam),
      Math.abs(next.seam.to.x - round.seam.to.x),
      Math.abs(next.seam.to.y - round.seam.to.y),
      ...sideLevels.map((level) => Math.abs(next.heights[level] - round.heights[level])),
    );
    settled =
      change < 1e-7 &&
      next.held.underbust === round.held.underbust &&
      next.held.seam === round.held.seam;
    round = next;
  }
  if (!settled) return undefined;
  return {
    side: inputs.side,
    levels,
    heights: round.heights,
    quarters,
    suppression,
    line: round.line,
    seam: round.seam,
    gap: {
      ...round.gap,
      waist: inputs.waistSeam === 'raised' ? suppression.dart : round.gap.seam,
    },
    axis: inputs.axis,
    dartCount: inputs.dartCount,
    dartAxes: round.axes,
    dartTips: darts.tips,
    fading: inputs.fading,
    held: round.held,
  };
}

/** Who takes the waist suppression: shared by the house, or as the maker gives the dart outright. */
function suppressionOf(
  { quarters, rules }: HalfInputs,
  lineFor: Parameters<typeof shareSuppression>[2],
): Suppression {
  if (!rules.intakes) return shareSuppression(quarters, rules.sideShare, lineFor);
  return outrightSuppression(quarters, rules.intakes.waist, lineFor);
}

/** Where a dart begins to run out and where the top hip lies on its axis. */
type DartRun = { readonly from: number; readonly topHip: number };

/**
 * Side widths for a width at the waist, `intake` of it taken in by darts: the top hip carries what
 * they still hold there.
 */
function widthsAt(
  { quarters, lean, leans, fading }: HalfInputs,
  darts: DartPlan,
  waist: number,
  intake: number,
  runOf: (dart: number) => DartRun,
): SideWidths {
  const held = darts.shares.reduce((sum, share, k) => {
    const { from, topHip } = runOf(k);
    return sum + share * heldBelow(fading, from, darts.tips[k] ?? 0, topHip);
  }, 0);
  return {
    bust: quarters.bust,
    waist,
    topHip: quarters.topHip + intake * held,
    hip: quarters.hip,
    knee: quarters.knee,
    lean,
    ...(leans && { leans }),
  };
}

/** Side widths before the lines are drawn: levels level, darts from the waist down. */
const plainWidths = (inputs: HalfInputs, darts: DartPlan, waist: number): SideWidths =>
  widthsAt(inputs, darts, waist, waist - inputs.quarters.waist, () => ({
    from: inputs.levels.waist,
    topHip: inputs.levels.topHip,
  }));

function firstRound(inputs: HalfInputs, darts: DartPlan, waist: number): Round {
  const { levels, quarters, from } = inputs;
  if (from && from.dartCount === inputs.dartCount) {
    const { heights, dartAxes: axes, line, seam, gap, held } = from;
    return { heights, axes, line, seam, gap, held };
  }
  return {
    heights: levels,
    axes: darts.shares.map(() => inputs.axis),
    line: sideLine(levels, plainWidths(inputs, darts, waist)),
    seam: closedSeam(quarters.seam, levels.seam, 0, 0),
    gap: { underbust: 0, seam: 0 },
    held: { underbust: false, seam: false },
  };
}

function nextRound(
  inputs: HalfInputs,
  darts: DartPlan,
  waist: number,
  last: Round,
  share: number,
): Round {
  const { levels, quarters } = inputs;
  const raised = inputs.waistSeam === 'raised';
  const given = inputs.rules.intakes;
  const mouths = mouthsOn(last.axes, darts.shares, last.gap.seam);
  // A seam in the waist itself is held by the waist's own width, where it is held or its intake given.
  const onSeam = last.seam.to.x + (given ? intakeAtSeam(given, raised) : 0);
  const atWaist = !raised && (last.held.seam || given) ? onSeam : waist;
  const widths: SideWidths = {
    ...widthsAt(inputs, darts, atWaist, raised ? waist - quarters.waist : last.gap.seam, (k) => ({
      from: raised ? levels.waist : seamAt(last.seam, mouths[k] ?? inputs.axis).y,
      topHip: heightOn({ levels, ...last }, 'topHip', last.axes[k] ?? inputs.axis),
    })),
    ...(last.held.underbust || given
      ? { underbust: quarters.underbust + (given?.underbust ?? 0) }
      : {}),
    ...(raised && (last.held.seam || given) ? { seam: onSeam } : {}),
  };
  const line = sideLine(last.heights, helped(inputs, widths, last.heights));
  const slope = inputs.seamSlope ?? -slopeAt(line, last.heights.seam);
  const fall = fallOf(inputs, last.heights, slope);
  const seam = closedSeam(quarters.seam, levels.seam, fall, slope);
  const underbust = xAt(line, last.heights.underbust) - quarters.underbust;
  const opening = xAt(line, last.heights.seam) - seam.to.x;
  const held = {
    underbust: last.held.underbust || (given ? given.underbust === 0 : underbust < 0),
    seam: last.held.seam || (given ? intakeAtSeam(given, raised) === 0 : opening < narrowestDart),
  };
  const gap = {
    underbust: held.underbust ? 0 : underbust,
    seam: held.seam ? 0 : opening,
  };
  return {
    heights: heightsNext(inputs, last.heights, line, fall, share),
    axes: dartAxes(inputs.axis, gap.seam, darts.shares, line, last.heights),
    line,
    seam,
    gap,
    held,
  };
}

/** What the maker takes in where top and skirt meet. */
const intakeAtSeam = (given: NonNullable<HouseRules['intakes']>, raised: boolean): number =>
  raised ? given.waistSeam : given.waist;

/** How far the seam falls at the side: the back's raised seam is trued to the front's, a seam in the waist is its own. */
function fallOf(inputs: HalfInputs, heights: SideHeights, slope: number): number {
  if (inputs.waistSeam === 'none') return 0;
  return inputs.trueTo && inputs.waistSeam === 'raised'
    ? heights.seam - inputs.levels.seam
    : fallFor(slope, inputs.quarters.seam);
}

/** Heights at the side: the levels themselves in front, trued in the back; from a seam in the waist lengths count from it. */
function heightsNext(
  { levels, trueTo, waistSeam }: HalfInputs,
  last: SideHeights,
  line: Profile,
  fall: number,
  share: number,
): SideHeights {
  const seam = levels.seam + fall;
  if (waistSeam === 'raised')
    return trueTo ? towards(last, truedHeights(line, last, trueTo), share) : { ...levels, seam };
  const own = { waist: seam, seam };
  if (!trueTo) return { ...levels, ...own };
  return { ...towards(last, truedHeights(line, { ...last, ...own }, trueTo), share), ...own };
}

/** Leanest the side is pulled in between bust and under-bust to help the darts, 14 degrees [our rule]. */
const helpingLean = Math.tan((14 * Math.PI) / 180);

/** The side pulled in at the under-bust by its share of what must go there, where it lies farther out. */
function helped(inputs: HalfInputs, widths: SideWidths, heights: SideHeights): SideWidths {
  const { bust, underbust } = inputs.quarters;
  if (!inputs.sideHelps || widths.underbust !== undefined) return widths;
  const pulled = Math.max(
    bust - inputs.rules.sideShare * (bust - underbust),
    bust - helpingLean * (heights.underbust - heights.bust),
  );
  const free = xAt(sideLine(heights, widths), heights.underbust);
  return free > pulled ? { ...widths, underbust: pulled } : widths;
}

/** Places along the closed waist seam at which darts on these axes open, from the centre out. */
export function mouthsOn(
  axes: readonly number[],
  shares: readonly number[],
  gap: number,
): readonly number[] {
  let before = 0;
  return shares.map((share, k) => {
    const at = (axes[k] ?? 0) - before - (share * gap) / 2;
    before += share * gap;
    return at;
  });
}

/** The first dart's centre leg continues the princess seam above; a second stands midway to the side. */
function dartAxes(
  axis: number,
  gap: number,
  shares: readonly number[],
  line: Profile,
  heights: SideHeights,
): readonly number[] {
  const first = axis - gap / 2 + ((shares[0] ?? 1) * gap) / 2;
  if (shares.length === 1) return [first];
  const side = Math.min(xAt(line, heights.seam), xAt(line, heights.waist));
  return [first, (first + side) / 2];
}
