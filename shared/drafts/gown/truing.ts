import { type Profile, profileLength, slopeAt } from '../../geometry/profile.ts';
import type { SideHeights } from './side-line.ts';

/** Lengths along the side seam from the waist up (bust, …) or down (hip, …), all positive. */
export type SideArcs = Omit<SideHeights, 'waist'>;

/** A side seam line with the heights of its levels. */
type SideSeam = { readonly line: Profile; readonly heights: SideHeights };

/** A height moves by at most this in a round, so that a crooked start cannot run away. */
const farthestMove = 6;
/** Moves heights a share of the way, each by so much at most. */
export function towards(from: SideHeights, to: SideHeights, share: number): SideHeights {
  const step = (level: keyof SideHeights): number =>
    from[level] +
    Math.max(-farthestMove, Math.min(farthestMove, share * (to[level] - from[level])));
  return {
    underarm: step('underarm'),
    bust: step('bust'),
    underbust: step('underbust'),
    seam: step('seam'),
    waist: to.waist,
    topHip: step('topHip'),
    hip: step('hip'),
    knee: step('knee'),
  };
}

/** Scales each height's distance from the waist so that its length along the line becomes the front's. */
export function truedHeights(line: Profile, heights: SideHeights, arcs: SideArcs): SideHeights {
  const { waist } = heights;
  const above = (level: keyof SideArcs): number =>
    heights[level] === waist
      ? waist
      : waist -
        ((waist - heights[level]) * arcs[level]) / profileLength(line, heights[level], waist);
  const below = (level: keyof SideArcs): number =>
    waist + ((heights[level] - waist) * arcs[level]) / profileLength(line, waist, heights[level]);
  return {
    underarm: above('underarm'),
    bust: above('bust'),
    underbust: above('underbust'),
    seam: above('seam'),
    waist,
    topHip: below('topHip'),
    hip: below('hip'),
    knee: below('knee'),
  };
}

/** Lengths along a half's side seam from the waist to every level. */
export function sideArcs(seam: SideSeam): SideArcs {
  const { line, heights } = seam;
  const above = (level: keyof SideArcs): number =>
    profileLength(line, heights[level], heights.waist);
  const below = (level: keyof SideArcs): number =>
    profileLength(line, heights.waist, heights[level]);
  return {
    underarm: above('underarm'),
    bust: above('bust'),
    underbust: above('underbust'),
    seam: above('seam'),
    topHip: below('topHip'),
    hip: below('hip'),
    knee: below('knee'),
  };
}

/** Height on a half's side seam at a length from the waist upwards. */
export function heightAtArc(seam: SideSeam, arc: number): number {
  let y = seam.heights.waist - arc;
  for (let i = 0; i < 40; i += 1) {
    const off = profileLength(seam.line, y, seam.heights.waist) - arc;
    y += off / Math.hypot(1, slopeAt(seam.line, y));
    if (Math.abs(off) < 1e-9) break;
  }
  return y;
}
