import { DraftingError } from '../../drafting/drafting-error.ts';
import type { HouseRules } from '../../drafting/house-rules.ts';
import type { Side } from '../../drafting/piece.ts';
import { type QuarterIntake, shareIntake } from '../../drafting/suppression.ts';
import {
  type PlannedDart,
  type PlannedWaist,
  type WaistLine,
  evenSideHeight,
  intakeFor,
  waistLength,
  waistLine,
} from '../../drafting/waist-line.ts';
import { point } from '../../geometry/point.ts';
import { type Profile, cubicProfile, profileLength, xAt } from '../../geometry/profile.ts';
import { mm, said } from '../../units/said.ts';
import { withEvenSides } from '../even-sides.ts';
import { isCrowded } from '../waist-edges.ts';
import { dartCount, dartPlans, widestSkirtDart } from './dart-count.ts';

/** Heights of a skirt block, mm below the side neck point in front. */
export type SkirtHeights = { readonly waist: number; readonly hip: number; readonly hem: number };

/** Finished quarters of one side, mm. */
export type SkirtFigures = { readonly waist: number; readonly hip: number };

/** A quarter of the skirt from the waist to the hip; below it the side hangs straight. */
export type QuarterPlan = {
  readonly side: Side;
  readonly figures: SkirtFigures;
  readonly intake: QuarterIntake;
  /** The side from the waist to the hip. */
  readonly curve: Profile;
  /** Height at which the waist meets the side. */
  readonly sideTop: number;
  readonly waist: WaistLine;
  readonly tips: readonly number[];
};

/** Darts end at least this far above the hip (common practice, no source: 20 to 30). */
const aboveHip = 25;
/** Steepest mean run of the side seam from waist to hip: 25 degrees (method section 6). */
const steepestSide = Math.tan((25 * Math.PI) / 180);
/** Lean of the side at the waist over its mean lean: 2 would be a parabola; 1.5 bows it out by 5 mm on a middle body. */
const leanAtWaist = 1.5;

/** The side curve from a waist `run` narrower than the hip, upright where it reaches the hip. */
const hipCurve = (figures: SkirtFigures, { waist, hip }: SkirtHeights, run: number): Profile =>
  cubicProfile(
    { y: waist, x: figures.hip - run },
    { y: hip, x: figures.hip },
    (leanAtWaist * run) / (hip - waist),
    0,
  );

/** Height above the hip from which the curve is this long. */
function topFor(curve: Profile, hip: number, length: number): number {
  let top = hip - length;
  for (let i = 0; i < 40; i += 1) {
    const over = profileLength(curve, top, hip) - length;
    if (Math.abs(over) < 1e-10) break;
    top += over;
  }
  return top;
}

/** Lean (dx/dy) of the curve just at a height, by its own cubic. */
const leanAt = (curve: Profile, y: number): number => {
  const step = 1e-4;
  return (xAt(curve, y + step) - xAt(curve, y - step)) / (2 * step);
};

type Shape = QuarterPlan & { readonly wish: number };

function shape(
  side: Side,
  figures: SkirtFigures,
  heights: SkirtHeights,
  round: { readonly intake: QuarterIntake; readonly length: number; readonly count: 0 | 1 | 2 },
): Shape {
  const planned = dartPlans(side, round.count);
  const planWith = (run: number) => {
    const curve = hipCurve(figures, heights, run);
    const top = topFor(curve, heights.hip, round.length);
    const end = point(xAt(curve, top), top);
    const darts: readonly PlannedDart[] = planned.map(({ at, length }) => ({
      axis: at * end.x,
      tip: Math.min(heights.waist + length, heights.hip - aboveHip),
      share: 1 / planned.length,
    }));
    const plan: PlannedWaist = {
      centre: heights.waist,
      darts,
      side: end,
      sideSlope: -leanAt(curve, top),
    };
    return { curve, top, plan };
  };
  let run = round.intake.side;
  let made = planWith(run);
  let taken = 0;
  if (planned.length > 0) taken = intakeFor(made.plan, figures.waist);
  else {
    for (let i = 0; i < 40; i += 1) {
      const over = waistLength(waistLine(made.plan, 0)) - figures.waist;
      if (Math.abs(over) < 1e-9) break;
      run += over;
      made = planWith(run);
    }
  }
  const { curve, top, plan } = made;
  return {
    side,
    figures,
    intake: { side: run, darts: taken },
    curve,
    sideTop: top,
    waist: waistLine(plan, taken),
    tips: plan.darts.map((dart) => dart.tip),
    wish: profileLength(curve, evenSideHeight(plan, taken), heights.hip),
  };
}

function refuseCrowded({ side, waist, intake }: QuarterPlan): void {
  if (!isCrowded(waist)) return;
  throw new DraftingError([
    {
      code: 'intake-too-wide',
      severity: 'error',
      field: 'card.waistGirth',
      with: ['card.hipGirth', 'style.ease.waist', 'style.ease.hip'],
      said: said`The ${side} would have to take ${mm(intake.darts)} in waist darts and no cloth is left beside them. Measure waist and hip again, or change the ease.`,
    },
  ]);
}

/**
 * Front and back quarters. Both sides are equally long from the hip up, as long as lets both waist lines
 * bend evenly on the mean; so the waist rises at the side and is square to it.
 */
export function planQuarters(
  figures: { readonly front: SkirtFigures; readonly back: SkirtFigures },
  heights: SkirtHeights,
  rules: HouseRules,
): { readonly front: QuarterPlan; readonly back: QuarterPlan; readonly half: number } {
  const wanted = {
    front: figures.front.hip - figures.front.waist,
    back: figures.back.hip - figures.back.waist,
  };
  const half = wanted.front + wanted.back;
  const most = steepestSide * (heights.hip - heights.waist);
  const shares = shareIntake(wanted.front, wanted.back, rules.sideShare, most);
  const widest = Math.min(widestSkirtDart, rules.dartWidest);
  const draw = (side: Side, length: number): Shape => {
    const intake = shares[side];
    const own = dartCount(side, half, intake.darts, widest);
    const count = own === 0 ? own : (rules.counts?.darts?.[side] ?? own);
    return shape(side, figures[side], heights, { intake, length, count });
  };
  const quarters = withEvenSides(heights.hip - heights.waist, (length) => ({
    front: draw('front', length),
    back: draw('back', length),
  }));
  refuseCrowded(quarters.front);
  refuseCrowded(quarters.back);
  return { ...quarters, half };
}
