import { DraftingError } from '../../drafting/drafting-error.ts';
import { mostSideChanges } from '../../drafting/fair-bends.ts';
import type { HouseRules } from '../../drafting/house-rules.ts';
import { slopeAt } from '../../geometry/profile.ts';
import { said } from '../../units/said.ts';
import { type Contour, contours, outrightContours } from './contour.ts';
import { fadingOf } from './fading.ts';
import { fairSide, isFair } from './fair-side.ts';
import { drawHalf } from './draw-half.ts';
import type { Half, HalfInputs, QuarterWidths } from './half.ts';
import { refuseCrowdedIntakes } from './intakes.ts';
import type { Quarters } from './quarters.ts';
import { sideArcs } from './truing.ts';
import type { SideHeights, SideLeans } from './side-line.ts';
import type { GownStyle } from './style-card.ts';

/** Both halves of the body in lines, the back trued to the front, with what each takes above the bust. */
export type PairedHalves = {
  readonly front: Half;
  readonly back: Half;
  /** Share of the suppression that the side seams took; the house's own but where it would not do. */
  readonly sideShare: number;
  readonly contour: { readonly front: Contour; readonly back: Contour; readonly moved: number };
};

/** The dart of the middle ends at least this far above the hip; the back's is longer by `backLonger`. */
const aboveHip = 25;
const backLonger = 20;
const roundsAtMost = 12;
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
  // One princess seam from the top edge to the knee takes whatever there is; so does an intake given outright.
  if (half.fading === 'seam' || rules.intakes) return 1;
  const settled = rules.counts?.darts?.[half.side];
  if (settled !== undefined) return settled;
  const widest = Math.max(half.gap.seam, half.gap.waist);
  if (widest > rules.dartWidest) return 2;
  if (style.shaping === 'princess') return 1;
  const run = half.levels.underbust - half.levels.bust - rules.dartClearance;
  const blunt = half.gap.underbust > 2 * run * Math.tan((15 * Math.PI) / 180);
  return blunt || half.gap.underbust > rules.dartWidest ? 2 : 1;
}

/** The slope (dy/dx) at which both ends of the waist seam arrive: the mean of their squares. */
const meanSlope = ({ front, back }: Drawn): number =>
  Math.tan(
    -(
      Math.atan(slopeAt(front.line, front.heights.seam)) +
      Math.atan(slopeAt(back.line, back.heights.seam))
    ) / 2,
  );

/** Girths so far apart over so little height that no side seam of equal length joins front and back. */
const cannotBeDrawn = (): DraftingError =>
  new DraftingError([
    {
      code: 'sides-do-not-meet',
      severity: 'error',
      field: 'card.waistGirth',
      with: ['card.underbustGirth', 'card.hipGirth', 'card.waistToHip'],
      said: said`These girths change so much over so little height that the back's side seam cannot be made as long as the front's. Measure under-bust, waist, hip and waist to hip again.`,
    },
  ]);

/**
 * Draws front and back together: the front's side seam is master, their waist seams share a slope. The side
 * seams bend no oftener than their girths ask, by the house's share of the suppression or the nearest of a
 * few that will do. Intakes given outright are drawn as they come.
 * @throws DraftingError where no side seams of equal length join them, the side bends too often whatever
 * its share, or intakes leave no cloth.
 */
export function pairHalves(inputs: PairInputs): PairedHalves {
  // Where the side cannot help the darts and still be trued, the darts take all of it.
  const helping = inputs.style.shaping === 'darts' ? [true, false] : [false];
  const outright = inputs.rules.intakes !== undefined;
  const most = outright ? Infinity : mostSideChanges(finishedGirths(inputs.quarters));
  let refusal: DraftingError | undefined;
  for (const sideShare of [inputs.rules.sideShare, ...(outright ? [] : otherShares)]) {
    const shared = { ...inputs, rules: { ...inputs.rules, sideShare } };
    for (const helps of helping) {
      const pair = fairPair(shared, helps, most);
      const why = pair ? whyNot(pair, inputs, most) : cannotBeDrawn();
      if (pair && !why) return { ...pair, sideShare };
      refusal ??= why;
    }
  }
  throw refusal ?? cannotBeDrawn();
}

/** Why two halves cannot be cut; nothing where they can. */
function whyNot(
  pair: PairedHalves,
  { style }: PairInputs,
  most: number,
): DraftingError | undefined {
  if (style.waistSeam !== 'none' && cornersAtSeam(pair) > crookedCorner) return cannotBeDrawn();
  if (!isFair(pair.front, most) || !isFair(pair.back, most)) return bendsTooOften(most);
  try {
    refuseCrowdedIntakes(pair.front);
    refuseCrowdedIntakes(pair.back);
    return undefined;
  } catch (error) {
    if (error instanceof DraftingError) return error;
    throw error;
  }
}

/** Finished girths from the chest to the knee seam, mm. */
const finishedGirths = ({ front, back }: PairInputs['quarters']): readonly number[] =>
  (['chest', 'bust', 'underbust', 'seam', 'waist', 'topHip', 'hip', 'knee'] as const).map(
    (level) => 2 * (front[level].value + back[level].value),
  );

/** Girths that no fair side seam passes, whatever its share and its leans. */
const bendsTooOften = (most: number): DraftingError =>
  new DraftingError([
    {
      code: 'side-bends',
      severity: 'error',
      field: 'card.waistGirth',
      with: ['card.bustGirth', 'card.topHipGirth', 'card.hipGirth', 'style.ease.waist'],
      said: said`A side seam through these finished girths would change its bend more than ${most} times between arm and knee, and show it. Bring the eases at bust, waist, top hip and hip nearer to each other, or measure these girths again.`,
    },
  ]);

/** Shares of the suppression that are tried where a side seam bends too often with the house's own. */
const otherShares = [0.7, 1, 0.25, 0];

/** A waist seam may meet a side seam this far from square, degrees: more, and the corner cannot be sewn fair. */
const crookedCorner = 25;

/** How far from square the waist seam meets the side seams: half the angle between front and back there. */
const cornersAtSeam = ({ front, back }: Drawn): number => {
  const leanOf = (half: Half): number => Math.atan(slopeAt(half.line, half.heights.seam));
  return (Math.abs(leanOf(front) - leanOf(back)) / 2) * (180 / Math.PI);
};

type DartCounts = { readonly front: 1 | 2; readonly back: 1 | 2 };
type Drawn = { readonly front: Half; readonly back: Half };

/** Both halves, with sides that lean at bust or hip where upright they would bend too often. */
function fairPair(inputs: PairInputs, sideHelps: boolean, most: number): PairedHalves | undefined {
  const upright = pairWith(inputs, sideHelps, {});
  const leans = upright && fairLeans(upright, most);
  return (leans && pairWith(inputs, sideHelps, leans)) ?? upright;
}

/** Leans of the two sides where upright they would bend too often. */
type Leans = { readonly front?: SideLeans; readonly back?: SideLeans };

function fairLeans({ front, back }: Drawn, most: number): Leans | undefined {
  const leans = { front: fairSide(front, most), back: fairSide(back, most) };
  if (!leans.front && !leans.back) return undefined;
  return { ...(leans.front && { front: leans.front }), ...(leans.back && { back: leans.back }) };
}

function pairWith(inputs: PairInputs, sideHelps: boolean, leans: Leans): PairedHalves | undefined {
  const { levels, style, rules, quarters } = inputs;
  const widths = { front: widthsOf(quarters.front), back: widthsOf(quarters.back) };
  const contour = (rules.intakes ? outrightContours(rules.intakes.topLine) : contours)(
    { bust: quarters.front.bust.value, chest: quarters.front.chest.value },
    { bust: quarters.back.bust.value, chest: quarters.back.chest.value },
    levels.bust - levels.underarm,
    inputs.backOpens,
  );
  const tip = (longer: number): number =>
    Math.min(levels.waist + style.dartLength + longer, levels.hip - aboveHip);
  const fading = fadingOf(style);
  const { waistSeam } = style;
  const base = { levels, rules, dartCount: 1, sideHelps, waistSeam, fading } as const;
  const frontInputs: HalfInputs = {
    ...base,
    side: 'front',
    quarters: widths.front,
    lean: contour.front.lean,
    axis: inputs.frontAxis,
    dartTip: tip(0),
    ...(leans.front && { leans: leans.front }),
  };
  const backInputs: HalfInputs = {
    ...base,
    side: 'back',
    quarters: widths.back,
    lean: contour.back.lean,
    axis: widths.back.underbust / 2,
    dartTip: tip(backLonger),
    ...(leans.back && { leans: leans.back }),
  };
  const draw = (count: DartCounts, last?: Drawn, seamSlope?: number): Drawn | undefined => {
    const slope = seamSlope === undefined ? {} : { seamSlope };
    const from = (half: Half | undefined): Pick<HalfInputs, 'from'> => (half ? { from: half } : {});
    const front = drawHalf({
      ...frontInputs,
      dartCount: count.front,
      ...slope,
      ...from(last?.front),
    });
    const back =
      front &&
      drawHalf({
        ...backInputs,
        dartCount: count.back,
        ...slope,
        ...from(last?.back),
        trueTo: sideArcs(front),
      });
    return front && back ? { front, back } : undefined;
  };
  const first = draw({ front: 1, back: 1 });
  if (!first) return undefined;
  const count = { front: dartCount(first.front, inputs), back: dartCount(first.back, inputs) };
  const seamed = style.waistSeam !== 'none';
  let slope = seamed ? meanSlope(first) : 0;
  let last = first;
  for (let round = 0; round < roundsAtMost; round += 1) {
    const drawn = draw(count, last, slope);
    if (!drawn) return undefined;
    last = drawn;
    const next = seamed ? meanSlope(drawn) : 0;
    // A hundredth of a degree: the corners of the seam are proven to two degrees.
    if (Math.abs(next - slope) < 1.7e-4)
      return { ...drawn, contour, sideShare: inputs.rules.sideShare };
    slope = round < dampedFrom ? next : (slope + next) / 2;
  }
  return undefined;
}
