import type { Edge, FinishedPiece } from '../drafting/piece.ts';
import type { HouseRules } from '../drafting/house-rules.ts';
import {
  crossingsOfLine,
  endOf,
  endTangent,
  pointAt,
  startOf,
  startTangent,
  tangentAt,
} from '../geometry/curve.ts';
import type { Segment } from '../geometry/path.ts';
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
import { boxOf } from './crossing-itself.ts';
import { cornerBetween } from './joined-edges.ts';
import { nearestPlace } from './nearest-place.ts';

/** Shares of a stretch at which its clearance is taken. */
const lookOut = {
  line: [0.02, 0.5, 0.98],
  cubic: [0.02, 0.125, 0.25, 0.375, 0.5, 0.625, 0.75, 0.875, 0.98],
} as const;

/** As near as the proof asks, mm. */
export const clearBound = 0.2;

/** How far inside the seam line a cutting line that has slipped would still be found, mm. */
const inside = 5;

/** What the house rules ask beyond an edge; a fold is cut on the line, a mouth follows its cap. */
export const allowanceOf = (edge: Edge, rules: HouseRules): number | undefined => {
  if (edge.kind === 'mouth' || edge.open === true) return undefined;
  return edge.kind === 'fold' ? 0 : rules.allowance[edge.kind];
};

/** Where the cutting line stands off an edge least rightly: measured square to the seam line. */
export type Clearance = {
  readonly edge: Edge;
  readonly wanted: number;
  readonly found: number;
  readonly at: Point;
};

type Boxed = { readonly segment: Segment; readonly box: ReturnType<typeof boxOf> };

/** The stretches of a cutting line, each with the box round it. */
export const boxedCut = (piece: FinishedPiece): readonly Boxed[] =>
  piece.cutLine.map((segment) => ({ segment, box: boxOf(segment) }));

/** A stretch that comes this near the line of sight may touch it, mm. */
const grazing = 1e-6;

/** Whether a stretch and its handles lie wholly on one side of the endless line through `at`. */
function besideLine(segment: Segment, at: Point, along: Point): boolean {
  const height = (p: Point): number => along.x * (p.y - at.y) - along.y * (p.x - at.x);
  const first = height(segment.from);
  if (Math.abs(first) < grazing) return false;
  const side = Math.sign(first);
  const beside = (p: Point): boolean => side * height(p) > grazing;
  if (!beside(segment.to)) return false;
  return segment.kind === 'line' || (beside(segment.c1) && beside(segment.c2));
}

/** Distance from a place to the cutting line along an outward direction; no answer within reach. */
export function reachCut(
  cut: readonly Boxed[],
  at: Point,
  out: Point,
  reach: number,
): number | undefined {
  const end = add(at, scale(out, reach));
  const start = add(at, scale(out, -inside));
  const left = Math.min(start.x, end.x);
  const right = Math.max(start.x, end.x);
  const top = Math.min(start.y, end.y);
  const bottom = Math.max(start.y, end.y);
  let nearest: number | undefined;
  for (const { segment, box } of cut) {
    if (box.right < left || box.left > right || box.bottom < top || box.top > bottom) continue;
    if (besideLine(segment, at, out)) continue;
    for (const t of crossingsOfLine(segment, at, end)) {
      const away = dot(subtract(pointAt(segment, t), at), out);
      if (away < -inside || away > reach) continue;
      if (nearest === undefined || Math.abs(away) < Math.abs(nearest)) nearest = away;
    }
  }
  return nearest;
}

/** Corners blunter than this may have the end of an allowance folded back over the seam, degrees. */
const blunt = 98;
const deg = Math.PI / 180;

/** How much of an edge's end a corner takes that is shaped for pressing, as a share of the allowance. */
const foldedBack = (degrees: number): number => (degrees > blunt ? 1 / Math.tan(40 * deg) : 0);

/**
 * The same beside a dart: its leg, carried on outwards, leans over the edge where the two meet at
 * more than a square corner, and the cap begins there.
 */
function underCap(piece: FinishedPiece, mouth: Edge, end: Point, along: Point): number {
  const dart = piece.darts.find((each) => each.mouth === mouth.name);
  const legs = dart ? [dart.centreLeg, dart.sideLeg] : [];
  const leg = legs.find((each) => distance(startOf(each) ?? end, end) < clearBound);
  if (!leg) return 0;
  const lean = -dot(startTangent(leg), along);
  return lean <= 0 ? 0 : lean / Math.sqrt(Math.max(1e-6, 1 - lean * lean));
}

type EdgeSpan = {
  readonly from: Point;
  readonly to: Point;
  readonly head: number;
  readonly tail: number;
};

/** The ends of an edge, and how much of each is left to the corners, mm. */
function spanOf(
  piece: FinishedPiece,
  index: number,
  wanted: readonly (number | undefined)[],
): EdgeSpan | undefined {
  const count = piece.edges.length;
  const edge = piece.edges[index];
  const before = piece.edges.at(index - 1);
  const after = piece.edges[(index + 1) % count];
  const from = edge?.path[0]?.from;
  const to = edge?.path.at(-1)?.to;
  if (!edge || !before || !after || !from || !to) return undefined;
  const own = wanted[index] ?? 0;
  const last = wanted.at(index - 1) ?? 0;
  const next = wanted[(index + 1) % count] ?? 0;
  const head = before.open
    ? underCap(piece, before, from, startTangent(edge.path))
    : foldedBack(cornerBetween(before, edge));
  const tail = after.open
    ? underCap(piece, after, to, scale(endTangent(edge.path), -1))
    : foldedBack(cornerBetween(edge, after));
  return {
    from,
    to,
    head: 1.1 * Math.max(own, last) * head,
    tail: 1.1 * Math.max(own, next) * tail,
  };
}

/** Everything a look from an edge to the cutting line needs of the piece. */
type Sight = {
  readonly piece: FinishedPiece;
  readonly cut: readonly Boxed[];
  readonly allowances: readonly (number | undefined)[];
};

/** Whether a place lies at the allowance from an edge, or from an end of it carried on straight. */
export function follows({ path }: Edge, wanted: number | undefined, at: Point): boolean {
  if (wanted === undefined) return false;
  const off = nearestPlace(path, at)?.off ?? Infinity;
  if (Math.abs(off - wanted) <= clearBound) return true;
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

/**
 * How far the cutting line stands off at one place. Where the seam line bends inwards more tightly
 * than the allowance is wide, no parallel can follow it: there the cutting line found farther out is
 * rightly placed when it lies at the allowance from the nearest seam line.
 */
function standOff({ piece, cut, allowances }: Sight, index: number, at: Point, out: Point): number {
  const wanted = allowances[index] ?? 0;
  const away = reachCut(cut, at, out, 2 * wanted + 20);
  if (away === undefined) return -inside;
  if (away <= wanted + clearBound) return away;
  const hit = add(at, scale(out, away));
  const followed = piece.edges.some((edge, k) => follows(edge, allowances[k], hit));
  const own = nearestPlace(piece.edges[index]?.path ?? [], hit)?.off ?? 0;
  return own >= wanted - clearBound && followed ? wanted : away;
}

/** For each edge that has an allowance, the place where the cutting line stands off least rightly. */
export function worstClearances(piece: FinishedPiece, rules: HouseRules): readonly Clearance[] {
  const allowances = piece.edges.map((edge) => allowanceOf(edge, rules));
  const sight = { piece, cut: boxedCut(piece), allowances };
  return piece.edges.flatMap((edge, index) => {
    const wanted = allowances[index];
    const span = spanOf(piece, index, allowances);
    if (wanted === undefined || !span) return [];
    let worst: Clearance | undefined;
    for (const segment of edge.path) {
      for (const t of lookOut[segment.kind]) {
        const at = pointAt(segment, t);
        if (distance(at, span.from) < span.head || distance(at, span.to) < span.tail) continue;
        const found = standOff(sight, index, at, turnLeft(tangentAt(segment, t)));
        if (worst && Math.abs(found - wanted) <= Math.abs(worst.found - wanted)) continue;
        worst = { edge, wanted, found, at };
      }
    }
    return worst ? [worst] : [];
  });
}
