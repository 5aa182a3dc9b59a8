import type { Point } from '../../geometry/point.ts';
import { type Profile, straightProfile } from '../../geometry/profile.ts';
import type { HouseRules } from '../../drafting/house-rules.ts';
import type { Half } from './half.ts';
import type { Intake } from './intakes.ts';
import type { GownStyle } from './style-card.ts';

/** Share of the front's reduction that the princess or dart takes at least. */
const openingShare = 0.6;
/** The side leans in above the bust by at most this, 8 degrees. */
const leanIn = Math.tan((8 * Math.PI) / 180);
/** Where the upper chest is the larger, each side leans out by this, 3 degrees, before the other helps. */
const leanOut = Math.tan((3 * Math.PI) / 180);
/** Above the bust point the opening widens by a square over this height, then straight. */
const rounding = 30;
/** Where the straight legs of an opening would meet, so far above the bust point. */
const legsMeet = (axis: number, bust: number, above: number): Point => ({
  x: axis,
  y: bust - above,
});

/** What the cloth outside turns about as the opening above the bust closes. */
export const openingTurns = (
  { axis, heights: { bust } }: Pick<Half, 'axis' | 'heights'>,
  shaping: GownStyle['shaping'],
  { dartClearance }: HouseRules,
): Point => legsMeet(axis, bust, shaping === 'darts' ? dartClearance : rounding / 2);

/** The opening reaches its amount at least this high above the bust point. */
const lowestPeak = 60;
/** A narrower opening is not worth sewing: the side takes it. */
const narrowestOpening = 2;

/** What one half takes in above the bust, at chest level: by the lean of its side, by its opening. */
export type Contour = {
  readonly reduction: number;
  readonly lean: number;
  readonly opening: number;
};

/**
 * Shares R = bust quarter - chest quarter between side and opening (method section 6). The back
 * leans first, and opens only where its edge stands high enough; what it cannot take without leaning
 * more than 8 degrees goes to the front, where the fullness of the bust lies [our rule].
 */
export function contours(
  front: { readonly bust: number; readonly chest: number },
  back: { readonly bust: number; readonly chest: number },
  rise: number,
  backOpens: boolean,
): { readonly front: Contour; readonly back: Contour; readonly moved: number } {
  const backR = back.bust - back.chest;
  const backLean = Math.max(-rise * leanOut, Math.min(backR, rise * leanIn));
  const left = backR - backLean;
  const backOpening = backOpens && left >= narrowestOpening ? left : 0;
  const moved = left - backOpening;
  const frontR = front.bust - front.chest + moved;
  if (frontR < -rise * leanOut) return bothLeanOut(frontR, backR - moved, moved);
  const frontLean =
    frontR * openingShare < narrowestOpening
      ? frontR
      : Math.min((1 - openingShare) * frontR, rise * leanIn);
  return {
    front: { reduction: frontR, lean: frontLean, opening: frontR - frontLean },
    back: { reduction: backR - moved, lean: backLean, opening: backOpening },
    moved,
  };
}

/**
 * Where the maker gives the opening outright, front and back take it alike and the side leans by what it
 * may of the rest; what neither takes is left, and the chest is not held.
 */
export const outrightContours =
  (opening: number) =>
  (...[front, back, rise]: Parameters<typeof contours>): ReturnType<typeof contours> => {
    const half = ({ bust, chest }: typeof front): Contour => ({
      reduction: bust - chest,
      lean: Math.max(-rise * leanOut, Math.min(bust - chest - opening, rise * leanIn)),
      opening,
    });
    return { front: half(front), back: half(back), moved: 0 };
  };

/** An upper chest larger than both can hold at 3 degrees: the sides lean out alike. */
function bothLeanOut(frontR: number, backR: number, moved: number): ReturnType<typeof contours> {
  const each = (frontR + backR) / 2;
  const half = { reduction: each, lean: each, opening: 0 };
  return { front: half, back: half, moved: moved + each - frontR };
}

/** The straight upper parts of two legs: they would meet at the pivot, each this far off upright. */
export type StraightLegs = { readonly pivot: Point; readonly angle: number };

/** The princess gap above the bust point, and the straight run of its legs. */
export function princessAbove(
  axis: number,
  bust: number,
  opening: number,
  peak: number,
): { readonly intake: Intake; readonly legs: StraightLegs; readonly height: number } {
  const height = Math.max(lowestPeak, bust - peak);
  const square = opening / (rounding * (2 * height - rounding));
  const knee = { y: bust - rounding, x: square * rounding * rounding };
  const top = { y: bust - 2 * height, x: knee.x + 2 * square * rounding * (2 * height - rounding) };
  const gap: Profile = [
    ...straightProfile(top, knee),
    { from: knee.y, to: bust, a: knee.x, b: -2 * square * rounding, c: square, d: 0 },
  ];
  return {
    intake: { axis, gap, top: top.y, foot: bust },
    legs: { pivot: legsMeet(axis, bust, rounding / 2), angle: Math.atan(square * rounding) },
    height: bust - height,
  };
}

/** A top dart: straight legs from its tip, short of the bust point, wide enough at the peak. */
export function topDart(
  axis: number,
  bust: number,
  opening: number,
  peak: number,
  clearance: number,
): { readonly legs: StraightLegs; readonly height: number } {
  const height = Math.max(lowestPeak, bust - peak);
  return {
    legs: {
      pivot: legsMeet(axis, bust, clearance),
      angle: Math.atan(opening / 2 / (height - clearance)),
    },
    height: bust - height,
  };
}
