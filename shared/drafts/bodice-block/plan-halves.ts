import type { BodyLevels } from '../../body/levels.ts';
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
import { type Point, point } from '../../geometry/point.ts';
import { mm, said } from '../../units/said.ts';
import { withEvenSides } from '../even-sides.ts';
import { isCrowded } from '../waist-edges.ts';

/** Heights of a bodice block, mm below the side neck point in front. */
export type BlockHeights = Pick<BodyLevels, 'bust' | 'waist' | 'nape'> & {
  /** Where the armhole meets the side seam. */
  readonly underarm: number;
};

/** What one half is planned from: its quarters and the axis of its first waist dart. */
export type HalfFigures = {
  readonly bust: number;
  readonly waist: number;
  readonly axis: number;
  /** Heights at which the first and the second waist dart end. */
  readonly tip: number;
  readonly secondTip: number;
};

/** A half below the arm: its side seam is straight, its waist line closes to one smooth curve. */
export type HalfPlan = {
  readonly side: Side;
  readonly figures: HalfFigures;
  readonly intake: QuarterIntake;
  /** How far the side runs in for each millimetre down. */
  readonly lean: number;
  readonly underarm: Point;
  readonly waistEnd: Point;
  readonly waist: WaistLine;
  readonly tips: readonly number[];
};

/** Steepest side seam, as a lean: 25 degrees (method section 6). */
const steepestSide = Math.tan((25 * Math.PI) / 180);

type Round = { readonly intake: QuarterIntake; readonly length: number };

const placeOnSide = (figures: HalfFigures, heights: BlockHeights, lean: number) => {
  const top = point(figures.bust + lean * (heights.bust - heights.underarm), heights.underarm);
  const unit = Math.hypot(1, lean);
  return {
    top,
    at: (length: number): Point => point(top.x - (lean * length) / unit, top.y + length / unit),
    lengthAt: (y: number): number => (y - top.y) * unit,
  };
};

/** Widest single dart, mm, and how many darts there are where that is settled beforehand. */
type DartRule = { readonly most: number; readonly settled: 1 | 2 | undefined };

function dartsOf(
  figures: HalfFigures,
  intake: number,
  sideX: number,
  { most, settled }: DartRule,
): readonly PlannedDart[] {
  if (intake === 0) return [];
  const first = { axis: figures.axis, tip: figures.tip };
  if ((settled ?? (intake <= most ? 1 : 2)) === 1) return [{ ...first, share: 1 }];
  return [
    { ...first, share: 0.6 },
    { axis: (figures.axis + sideX) / 2, tip: figures.secondTip, share: 0.4 },
  ];
}

type Shape = HalfPlan & { readonly wish: number };

/** One half with a side seam this long: the darts (or, without any, the lean) make the waist its length. */
function shape(
  side: Side,
  figures: HalfFigures,
  heights: BlockHeights,
  { intake, length }: Round,
  rule: DartRule,
): Shape {
  const drop = heights.waist - heights.bust;
  const planWith = (run: number) => {
    const lean = run / drop;
    const line = placeOnSide(figures, heights, lean);
    const end = line.at(length);
    const darts = dartsOf(figures, intake.darts, end.x, rule);
    const plan: PlannedWaist = { centre: heights.waist, darts, side: end, sideSlope: lean };
    return { lean, line, end, plan };
  };
  let run = intake.side;
  let planned = planWith(run);
  let taken = 0;
  if (intake.darts > 0) taken = intakeFor(planned.plan, figures.waist);
  else {
    for (let i = 0; i < 40; i += 1) {
      const over = waistLength(waistLine(planned.plan, 0)) - figures.waist;
      if (Math.abs(over) < 1e-9) break;
      run += (over * drop) / (heights.waist - heights.underarm);
      planned = planWith(run);
    }
  }
  const { lean, line, end, plan } = planned;
  return {
    side,
    figures,
    intake: { side: run, darts: taken },
    lean,
    underarm: line.top,
    waistEnd: end,
    waist: waistLine(plan, taken),
    tips: plan.darts.map((dart) => dart.tip),
    wish: line.lengthAt(evenSideHeight(plan, taken)),
  };
}

function refuseCrowded({ side, waist }: HalfPlan): void {
  if (!isCrowded(waist)) return;
  const taken = waist.mouths.reduce((sum, mouth) => sum + mouth.side.x - mouth.centre.x, 0);
  throw new DraftingError([
    {
      code: 'intake-too-wide',
      severity: 'error',
      field: 'card.waistGirth',
      with: ['card.bustGirth', 'card.bustSpan', 'style.ease.waist'],
      said: said`The ${side} would have to take ${mm(taken)} in waist darts and no cloth is left beside them. Measure bust, waist and bust span again, or give the waist more ease.`,
    },
  ]);
}

/**
 * Front and back below the arm. Both side seams are equally long, as long as lets both waist lines bend
 * evenly on the mean.
 */
export function planHalves(
  figures: { readonly front: HalfFigures; readonly back: HalfFigures },
  heights: BlockHeights,
  rules: HouseRules,
): { readonly front: HalfPlan; readonly back: HalfPlan } {
  const { front, back } = figures;
  const shares = shareIntake(
    front.bust - front.waist,
    back.bust - back.waist,
    rules.sideShare,
    steepestSide * (heights.waist - heights.bust),
  );
  const draw = (side: Side, length: number): Shape =>
    shape(
      side,
      figures[side],
      heights,
      { intake: shares[side], length },
      { most: rules.dartWidest, settled: rules.counts?.darts?.[side] },
    );
  const halves = withEvenSides(heights.waist - heights.underarm, (length) => ({
    front: draw('front', length),
    back: draw('back', length),
  }));
  refuseCrowded(halves.front);
  refuseCrowded(halves.back);
  return halves;
}
