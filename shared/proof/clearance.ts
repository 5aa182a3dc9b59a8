import type { Edge, FinishedPiece } from '../drafting/piece.ts';
import { edgeAllowance } from '../drafting/edge-allowance.ts';
import type { HouseRules } from '../drafting/house-rules.ts';
import { endOf, endTangent, pointAt, startOf, startTangent, tangentAt } from '../geometry/curve.ts';
import {
  type Point,
  add,
  cross,
  distance,
  dot,
  scale,
  subtract,
  turnLeft,
} from '../geometry/point.ts';
import { type EdgeEnd, type Look, edgeEnds } from './edge-ends.ts';
import { type Boxed, boxedCut, inside, reachCut } from './look-out.ts';
import { nearestPlace } from './nearest-place.ts';

/** Shares of a stretch at which its clearance is taken. */
const lookOut = {
  line: [0.02, 0.5, 0.98],
  cubic: [0.02, 0.125, 0.25, 0.375, 0.5, 0.625, 0.75, 0.875, 0.98],
} as const;

/** As near as the proof asks, mm. */
export const clearBound = 0.2;

/** What the house rules ask beyond an edge; a fold is cut on the line, a mouth follows its cap. */
export const allowanceOf = (edge: Edge, rules: HouseRules): number | undefined =>
  edge.kind === 'fold' ? 0 : edgeAllowance(edge, rules);

/** Where the cutting line stands off an edge least rightly: measured square to the seam line. */
export type Clearance = {
  readonly edge: Edge;
  readonly wanted: number;
  readonly found: number;
  readonly at: Point;
};

/** Everything a look from an edge to the cutting line needs of the piece. */
type Sight = {
  readonly piece: FinishedPiece;
  readonly cut: readonly Boxed[];
  readonly allowances: readonly (number | undefined)[];
};

/** Whether a place lies at the allowance from an edge, or from an end of it carried on straight. */
export function follows({ path }: Edge, wanted: number | undefined, at: Point): boolean {
  if (wanted === undefined) return false;
  const off = nearestPlace(path, at, wanted + clearBound)?.off;
  if (off !== undefined && off >= wanted - clearBound) return true;
  const beyond = (end: Point | undefined, away: Point): boolean => {
    const out = end && subtract(at, end);
    return (
      out !== undefined &&
      dot(out, away) > 0 &&
      Math.abs(Math.abs(cross(away, out)) - wanted) <= clearBound
    );
  };
  return (
    beyond(startOf(path), scale(startTangent(path), -1)) || beyond(endOf(path), endTangent(path))
  );
}

/** Places asked about between the allowance and the cutting line found beyond it. */
const asked = [0.1, 0.3, 0.5, 0.7, 0.9, 1];

/** Whether a place lies beyond an edge's end, no farther aside of the edge carried on than allowed. */
function carriedOn(corner: Point, away: Point, out: Point, allowance: number, at: Point): boolean {
  const from = subtract(at, corner);
  return dot(from, away) >= 0 && dot(from, out) <= allowance + clearBound;
}

/** Whether a place lies where two allowances meet beyond a corner. */
const inCorner = ({ piece, allowances }: Sight, at: Point): boolean =>
  piece.edges.some((edge, index) => {
    const next = (index + 1) % piece.edges.length;
    const corner = endOf(edge.path);
    const follower = piece.edges[next];
    if (!corner || !follower) return false;
    const arriving = endTangent(edge.path);
    const leaving = startTangent(follower.path);
    return (
      carriedOn(corner, arriving, turnLeft(arriving), allowances[index] ?? 0, at) &&
      carriedOn(corner, scale(leaving, -1), turnLeft(leaving), allowances[next] ?? 0, at)
    );
  });

/** Whether all that a look passes between two distances belongs to the allowances of seam lines. */
const filled = (sight: Sight, { at, out }: Look, from: number, until: number): boolean =>
  asked.every((share) => {
    const here = add(at, scale(out, from + share * (until - from)));
    const within = sight.piece.edges.some(
      ({ path }, k) =>
        nearestPlace(path, here, (sight.allowances[k] ?? 0) + clearBound) !== undefined,
    );
    return within || inCorner(sight, here);
  });

/**
 * How far the cutting line stands off at one place. Where the seam line bends inwards more tightly
 * than the allowance is wide, no parallel can follow it: there the cutting line is rightly farther
 * out where allowances of the seam lines beside, and of corners between them, fill all that lies
 * between, and where it runs along the end of another edge that is carried on.
 */
function standOff(sight: Sight, index: number, look: Look): number {
  const { piece, cut, allowances } = sight;
  const wanted = allowances[index] ?? 0;
  const reach = 2 * wanted + 20;
  const away = reachCut(cut, look.at, look.out, reach);
  if (away !== undefined && away <= wanted + clearBound) return away;
  if (filled(sight, look, wanted, away ?? reach)) return wanted;
  if (away === undefined) return -inside;
  const hit = add(look.at, scale(look.out, away));
  const own = nearestPlace(piece.edges[index]?.path ?? [], hit, wanted - clearBound);
  const followed = piece.edges.some((edge, k) => follows(edge, allowances[k], hit));
  return own === undefined && followed ? wanted : away;
}

/** Looks from places along an edge, leaving out what belongs to its corners, and past its mitres. */
function lookAlong(edge: Edge, ends: readonly EdgeEnd[], look: (from: Look) => void): void {
  for (const segment of edge.path) {
    for (const t of lookOut[segment.kind]) {
      const at = pointAt(segment, t);
      if (ends.some((end) => end.left > 0 && distance(at, end.at) < end.left)) continue;
      look({ at, out: turnLeft(tangentAt(segment, t)) });
    }
  }
  for (const { mitre } of ends) if (mitre) look(mitre);
}

/** For each edge that has an allowance, the place where the cutting line stands off least rightly. */
export function worstClearances(piece: FinishedPiece, rules: HouseRules): readonly Clearance[] {
  const allowances = piece.edges.map((edge) => allowanceOf(edge, rules));
  const sight = { piece, cut: boxedCut(piece), allowances };
  return piece.edges.flatMap((edge, index) => {
    const wanted = allowances[index];
    if (wanted === undefined) return [];
    let worst: Clearance | undefined;
    lookAlong(edge, edgeEnds(piece, index, allowances), (look) => {
      const found = standOff(sight, index, look);
      if (worst && Math.abs(found - wanted) <= Math.abs(worst.found - wanted)) return;
      worst = { edge, wanted, found, at: look.at };
    });
    return worst ? [worst] : [];
  });
}
