import { narrowestDart } from '../../drafting/suppression.ts';
import type { Cubic } from '../../geometry/path.ts';
import { type Profile, slopeAt, xAt } from '../../geometry/profile.ts';
import { type Half, type HalfInputs, type Held, dartShares, heightOn, mouthsOn } from './half.ts';
import {
  type DartPlan,
  helped,
  intakeAtSeam,
  plainWidths,
  suppressionOf,
  widthsAt,
} from './half-widths.ts';
import { bustToHip, sideLine } from './side-line.ts';
import type { SideHeights, SideWidths } from './side-line.ts';
import { towards, truedHeights } from './truing.ts';
import { closedSeam, fallFor, seamAt } from './waist-seam.ts';

const sideLevels = ['underarm', 'bust', 'underbust', 'seam', 'topHip', 'hip', 'knee'] as const;

/** What one round of drawing leaves for the next. */
type Round = {
  readonly heights: SideHeights;
  readonly axes: readonly number[];
  readonly line: Profile;
  readonly seam: Cubic;
  readonly gap: { readonly underbust: number; readonly seam: number };
  readonly held: Held;
};

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
