import { narrowestDart } from '../../drafting/suppression.ts';
import {
  type Knot,
  type Profile,
  clampedSpline,
  cubicProfile,
  steepest,
} from '../../geometry/profile.ts';

/** Steepest lean of a side seam between bust and hip, 25 degrees (method section 6). */
export const steepestLean = Math.tan((25 * Math.PI) / 180);
/** The side stays at least this inside the bust at the waist, where the bust is the larger. */
const insideBust = 3;

/** Heights of the levels at the side seam of one half, millimetres below the side neck. */
export type SideHeights = {
  readonly underarm: number;
  readonly bust: number;
  readonly underbust: number;
  readonly seam: number;
  readonly waist: number;
  readonly topHip: number;
  readonly hip: number;
  readonly knee: number;
};

/** Widths of the side seam line at the levels it is held to. */
export type SideWidths = {
  readonly bust: number;
  readonly waist: number;
  readonly topHip: number;
  readonly hip: number;
  readonly knee: number;
  /** Lean taken in above the bust, at underarm level. */
  readonly lean: number;
  /** Held only where a dart would turn negative there. */
  readonly underbust?: number;
  readonly seam?: number;
  readonly leans?: SideLeans;
};

/** Leans (dx/dy) of a side seam at bust and hip; upright where absent. */
export type SideLeans = { readonly bust?: number; readonly hip?: number };

/** Bust to hip: the curvature-continuous spline, upright at both ends where it has no lean of its own. */
export function bustToHip(heights: SideHeights, widths: SideWidths): Profile {
  const knots: Knot[] = [{ y: heights.bust, x: widths.bust }];
  if (widths.underbust !== undefined) knots.push({ y: heights.underbust, x: widths.underbust });
  if (widths.seam !== undefined) knots.push({ y: heights.seam, x: widths.seam });
  knots.push(
    { y: heights.waist, x: widths.waist },
    { y: heights.topHip, x: widths.topHip },
    { y: heights.hip, x: widths.hip },
  );
  return clampedSpline(knots, widths.leans?.bust ?? 0, widths.leans?.hip ?? 0);
}

/**
 * The whole side seam line from the underarm to the knee seam: leaning in above the bust by a
 * parabola, the spline from bust to hip, one cubic upright at both ends from hip to knee.
 */
export function sideLine(heights: SideHeights, widths: SideWidths): Profile {
  const rise = heights.bust - heights.underarm;
  const { bust: bustLean = 0, hip: hipLean = 0 } = widths.leans ?? {};
  return [
    ...cubicProfile(
      { y: heights.underarm, x: widths.bust - widths.lean },
      { y: heights.bust, x: widths.bust },
      (2 * widths.lean) / rise - bustLean,
      bustLean,
    ),
    ...bustToHip(heights, widths),
    ...cubicProfile(
      { y: heights.hip, x: widths.hip },
      { y: heights.knee, x: widths.knee },
      hipLean,
      0,
    ),
  ];
}

/** How the waist suppression of a quarter is shared. */
export type Suppression = {
  /** What has to go between the mean of bust and hip quarters and the waist quarter. */
  readonly whole: number;
  /** Width of the side seam line at the waist. */
  readonly side: number;
  /** Left to the dart or princess seam. */
  readonly dart: number;
  /** Even moved out it leans more. */
  readonly steep: boolean;
};

/**
 * Shares the suppression between side seam and dart (method section 6): the side takes its share,
 * stays inside the bust where the bust is larger, and is moved out by the least that keeps its lean
 * under 25 degrees between bust and hip.
 */
export function shareSuppression(
  quarters: { readonly bust: number; readonly waist: number; readonly hip: number },
  share: number,
  lineFor: (waist: number) => {
    readonly line: Profile;
    readonly top: number;
    readonly foot: number;
  },
): Suppression {
  const whole = (quarters.bust + quarters.hip) / 2 - quarters.waist;
  const inner = quarters.bust > quarters.waist ? quarters.bust - insideBust : Infinity;
  const leanAt = (waist: number): number => {
    const { line, top, foot } = lineFor(waist);
    return steepest(line, top, foot);
  };
  const wished = whole <= 0 ? quarters.waist : quarters.waist + (1 - share) * whole;
  let side = Math.max(quarters.waist, Math.min(wished, inner));
  if (whole > 0 && leanAt(side) > steepestLean) {
    const limit = Math.max(side, Math.min(inner, Math.max(quarters.bust, quarters.hip)));
    side = leastOutward(side, limit, leanAt);
  }
  if (side - quarters.waist < narrowestDart) side = quarters.waist;
  return {
    whole,
    side,
    dart: side - quarters.waist,
    steep: leanAt(side) > steepestLean + 1e-6,
  };
}

/** The suppression where the maker gives the dart outright: the side seam takes what it leaves, however it leans. */
export function outrightSuppression(
  quarters: { readonly bust: number; readonly waist: number; readonly hip: number },
  dart: number,
  lineFor: (waist: number) => {
    readonly line: Profile;
    readonly top: number;
    readonly foot: number;
  },
): Suppression {
  const side = quarters.waist + dart;
  const { line, top, foot } = lineFor(side);
  return {
    whole: (quarters.bust + quarters.hip) / 2 - quarters.waist,
    side,
    dart,
    steep: steepest(line, top, foot) > steepestLean + 1e-6,
  };
}

/** Least width from `side` out to `limit` at which the lean is small enough, else the least leaning. */
function leastOutward(side: number, limit: number, leanAt: (waist: number) => number): number {
  const steps = 12;
  let best = side;
  let least = leanAt(side);
  let low = side;
  for (let i = 1; i <= steps; i += 1) {
    const tried = side + ((limit - side) * i) / steps;
    const lean = leanAt(tried);
    if (lean <= steepestLean) {
      let high = tried;
      for (let k = 0; k < 24; k += 1) {
        const mid = (low + high) / 2;
        if (leanAt(mid) <= steepestLean) high = mid;
        else low = mid;
      }
      return high;
    }
    if (lean < least) {
      least = lean;
      best = tried;
    }
    low = tried;
  }
  return best;
}
