import type { HouseRules } from '../../drafting/house-rules.ts';
import { xAt } from '../../geometry/profile.ts';
import { heldBelow } from './fading.ts';
import type { HalfInputs } from './half.ts';
import { outrightSuppression, shareSuppression, sideLine } from './side-line.ts';
import type { SideHeights, SideWidths, Suppression } from './side-line.ts';

/** The darts of the middle: shares of the intake and heights of the tips. */
export type DartPlan = { readonly shares: readonly number[]; readonly tips: readonly number[] };

/** Who takes the waist suppression: shared by the house, or as the maker gives the dart outright. */
export function suppressionOf(
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
export function widthsAt(
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
export const plainWidths = (inputs: HalfInputs, darts: DartPlan, waist: number): SideWidths =>
  widthsAt(inputs, darts, waist, waist - inputs.quarters.waist, () => ({
    from: inputs.levels.waist,
    topHip: inputs.levels.topHip,
  }));

/** What the maker takes in where top and skirt meet. */
export const intakeAtSeam = (given: NonNullable<HouseRules['intakes']>, raised: boolean): number =>
  raised ? given.waistSeam : given.waist;

/** Leanest the side is pulled in between bust and under-bust to help the darts, 14 degrees [our rule]. */
const helpingLean = Math.tan((14 * Math.PI) / 180);

/** The side pulled in at the under-bust by its share of what must go there, where it lies farther out. */
export function helped(inputs: HalfInputs, widths: SideWidths, heights: SideHeights): SideWidths {
  const { bust, underbust } = inputs.quarters;
  if (!inputs.sideHelps || widths.underbust !== undefined) return widths;
  const pulled = Math.max(
    bust - inputs.rules.sideShare * (bust - underbust),
    bust - helpingLean * (heights.underbust - heights.bust),
  );
  const free = xAt(sideLine(heights, widths), heights.underbust);
  return free > pulled ? { ...widths, underbust: pulled } : widths;
}
