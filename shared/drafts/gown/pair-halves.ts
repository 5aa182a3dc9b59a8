import type { HouseRules } from '../../drafting/house-rules.ts';
import { slopeAt } from '../../geometry/profile.ts';
import { type Contour, contours } from './contour.ts';
import { type Half, type HalfInputs, type QuarterWidths, cannotBeDrawn, drawHalf } from './half.ts';
import { refuseCrowdedIntakes } from './intakes.ts';
import type { Quarters } from './quarters.ts';
import { sideArcs } from './truing.ts';
import type { SideHeights } from './side-line.ts';
import type { GownStyle } from './style-card.ts';

/** Both halves of the body in lines, the back trued to the front, with what each takes above the bust. */
export type PairedHalves = {
  readonly front: Half;
  readonly back: Half;
  readonly contour: { readonly front: Contour; readonly back: Contour; readonly moved: number };
};

/** The dart of the middle ends at least this far above the hip; the back's is longer by `backLonger`. */
const aboveHip = 25;
const backLonger = 20;
const roundsAtMost = 24;
/** From this round on the slope moves half way only, which settles the few bodies that swing. */
const dampedFrom = 4;

const widthsOf = (quarters: Quarters): QuarterWidths => ({
  bust: quarters.bust.value,
  underbust: quarters.underbust.value,
  seam: quarters.seam.value,
  waist: quarters.waist.value,
  topHip: quarters.topHip.value,
  hip: quarters.hip.value,
  knee: quarters.knee.value,
});

/** What both halves are drawn from. */
export type PairInputs = {
  readonly quarters: { readonly front: Quarters; readonly back: Quarters };
  readonly levels: SideHeights;
  readonly style: GownStyle;
  readonly rules: HouseRules;
  /** Distance of the front's princess or dart from the centre: half the bust span. */
  readonly frontAxis: number;
  /** Whether the back may open above the bust: only where its edge stands high enough over bust level. */
  readonly backOpens: boolean;
};

/** One dart, or two where one would be wider than the house sews (or, in a top, too blunt at its tip). */
function dartCount(half: Half, inputs: PairInputs): 1 | 2 {
  const { rules, style } = inputs;
  const widest = Math.max(half.gap.seam, half.gap.waist);
  if (widest > rules.dartWidest) return 2;
  if (style.shaping === 'princess') return 1;
  const run = half.levels.underbust - half.levels.bust - rules.dartClearance;
  const blunt = half.gap.underbust > 2 * run * Math.tan((15 * Math.PI) / 180);
  return blunt || half.gap.underbust > rules.dartWidest ? 2 : 1;
}

/** The slope (dy/dx) at which both ends of the waist seam arrive: the mean of their squares. */
const meanSlope = (front: Half, back: Half): number =>
  Math.tan(
    -(
      Math.atan(slopeAt(front.line, front.heights.seam)) +
      Math.atan(slopeAt(back.line, back.heights.seam))
    ) / 2,
  );

/** Draws front and back together: the front's side seam is master, their waist seams share a slope. */
export function pairHalves(inputs: PairInputs): PairedHalves {
  const { levels, style, rules, quarters } = inputs;
  const widths = { front: widthsOf(quarters.front), back: widthsOf(quarters.back) };
  const contour = contours(
    { bust: quarters.front.bust.value, chest: quarters.front.chest.value },
    { bust: quarters.back.bust.value, chest: quarters.back.chest.value },
    levels.bust - levels.underarm,
    inputs.backOpens,
  );
  const tip = (longer: number): number =>
    Math.min(levels.waist + style.dartLength + longer, levels.hip - aboveHip);
  const base = { levels, rules, dartCount: 1 } as const;
  const frontInputs: HalfInputs = {
    ...base,
    side: 'front',
    quarters: widths.front,
    lean: contour.front.lean,
    axis: inputs.frontAxis,
    dartTip: tip(0),
  };
  const backInputs: HalfInputs = {
    ...base,
    side: 'back',
    quarters: widths.back,
    lean: contour.back.lean,
    axis: widths.back.underbust / 2,
    dartTip: tip(backLonger),
  };
  let front = drawHalf(frontInputs);
  let back = drawHalf({ ...backInputs, trueTo: sideArcs(front) });
  const counts = { front: dartCount(front, inputs), back: dartCount(back, inputs) };
  let slope = meanSlope(front, back);
  let settled = false;
  for (let round = 0; round < roundsAtMost && !settled; round += 1) {
    front = drawHalf({ ...frontInputs, dartCount: counts.front, seamSlope: slope });
    back = drawHalf({
      ...backInputs,
      dartCount: counts.back,
      seamSlope: slope,
      trueTo: sideArcs(front),
    });
    const next = meanSlope(front, back);
    const change = Math.abs(next - slope);
    slope = round < dampedFrom ? next : (slope + next) / 2;
    // A hundredth of a degree: the corners of the seam are proven to two degrees.
    settled = change < 1.7e-4;
  }
  if (!settled) throw cannotBeDrawn();
  refuseCrowdedIntakes(front);
  refuseCrowdedIntakes(back);
  return { front, back, contour };
}
