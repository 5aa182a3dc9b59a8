import type { HouseRules } from '../../drafting/house-rules.ts';
import type { Side } from '../../drafting/piece.ts';
import type { Cubic } from '../../geometry/path.ts';
import { type Point, point } from '../../geometry/point.ts';
import { type Profile, xAt } from '../../geometry/profile.ts';
import type { Fading } from './fading.ts';
import type { SideHeights, SideLeans, SideWidths, Suppression } from './side-line.ts';
import type { GownStyle } from './style-card.ts';
import type { SideArcs } from './truing.ts';

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

/** The side is held to the quarter there because a dart would turn negative (or not be worth sewing). */
export type Held = { readonly underbust: boolean; readonly seam: boolean };

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
  readonly held: Held;
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
