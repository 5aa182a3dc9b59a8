import type { Edge, FinishedPiece } from '../drafting/piece.ts';
import { endTangent, startOf, startTangent } from '../geometry/curve.ts';
import { type Point, add, distance, dot, scale, turnLeft } from '../geometry/point.ts';
import { cornerBetween } from './joined-edges.ts';
import { inside } from './look-out.ts';

/** Corners blunter than this may have the end of an allowance folded back over the seam, degrees. */
const blunt = 98;
/** Corners sharper than this may be squared off instead of mitred, degrees. */
const sharp = 60;
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
  const [leg] = [...legs].sort(
    (a, b) => distance(startOf(a) ?? end, end) - distance(startOf(b) ?? end, end),
  );
  if (!leg) return 0;
  const lean = -dot(startTangent(leg), along);
  return lean <= 0 ? 0 : lean / Math.sqrt(Math.max(1e-6, 1 - lean * lean));
}

/** Near a sharp corner at a fold the cutting line along the fold lies within sight behind the edge. */
const besideFold = (neighbour: Edge, degrees: number): number =>
  neighbour.kind === 'fold' && degrees < sharp ? (1.1 * inside) / Math.tan(degrees * deg) : 0;

/** A place to look from, and the direction away from the piece. */
export type Look = { readonly at: Point; readonly out: Point };

/** One end of an edge: how much of it is left to the corner (mm), and where its mitre is looked at. */
export type EdgeEnd = {
  readonly at: Point;
  readonly left: number;
  readonly mitre: Look | undefined;
};

/** What stands beyond an end: the edge there, its allowance, the corner the two make. */
type Beyond = { readonly neighbour: Edge; readonly allowance: number; readonly degrees: number };

function edgeEnd(
  piece: FinishedPiece,
  own: number,
  { neighbour, allowance, degrees }: Beyond,
  { at, outwards, out }: { readonly at: Point; readonly outwards: Point; readonly out: Point },
): EdgeEnd {
  const share = neighbour.open
    ? underCap(piece, neighbour, at, scale(outwards, -1))
    : foldedBack(degrees);
  const mitred = !neighbour.open && degrees >= sharp && degrees <= blunt && allowance > 0;
  return {
    at,
    left: Math.max(1.1 * Math.max(own, allowance) * share, besideFold(neighbour, degrees)),
    mitre: mitred ? { at: add(at, scale(outwards, 0.5 * allowance)), out } : undefined,
  };
}

/** Both ends of the edge at this place round the piece, whose edges have these allowances. */
export function edgeEnds(
  piece: FinishedPiece,
  index: number,
  allowances: readonly (number | undefined)[],
): readonly EdgeEnd[] {
  const next = (index + 1) % piece.edges.length;
  const edge = piece.edges[index];
  const before = piece.edges.at(index - 1);
  const after = piece.edges[next];
  const from = edge?.path[0]?.from;
  const to = edge?.path.at(-1)?.to;
  if (!edge || !before || !after || !from || !to) return [];
  const own = allowances[index] ?? 0;
  const start = startTangent(edge.path);
  const end = endTangent(edge.path);
  return [
    edgeEnd(
      piece,
      own,
      {
        neighbour: before,
        allowance: allowances.at(index - 1) ?? 0,
        degrees: cornerBetween(before, edge),
      },
      { at: from, outwards: scale(start, -1), out: turnLeft(start) },
    ),
    edgeEnd(
      piece,
      own,
      { neighbour: after, allowance: allowances[next] ?? 0, degrees: cornerBetween(edge, after) },
      { at: to, outwards: end, out: turnLeft(end) },
    ),
  ];
}
