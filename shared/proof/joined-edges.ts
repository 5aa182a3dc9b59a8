import type { Edge, EdgeRef, Piece } from '../drafting/piece.ts';
import { endTangent, startTangent } from '../geometry/curve.ts';
import { type Point, cross, dot } from '../geometry/point.ts';

/** An edge with its piece and its neighbours, in order round the outline. */
export type PlacedEdge = {
  readonly piece: Piece;
  readonly edge: Edge;
  readonly before: Edge;
  readonly after: Edge;
};

/** Two edges that are sewn to each other. */
export type JoinedPair = {
  readonly first: PlacedEdge;
  readonly second: PlacedEdge;
  /** Whether the end of the second edge meets the start of the first. */
  readonly opposite: boolean;
  /** Ends of the seam at which both pieces turn an outer corner. */
  readonly outerEnds: readonly SeamEnd[];
};

/** Every edge of a gown, by `piece:edge`. */
export type Placed = ReadonlyMap<string, PlacedEdge>;

export const keyOf = (ref: EdgeRef): string => `${ref.piece}:${ref.edge}`;

/** Finds each edge its piece and its neighbours. */
export function placeEdges(pieces: readonly Piece[]): Placed {
  const placed = new Map<string, PlacedEdge>();
  for (const piece of pieces) {
    piece.edges.forEach((edge, index) => {
      const before = piece.edges.at(index - 1) ?? edge;
      const after = piece.edges[(index + 1) % piece.edges.length] ?? edge;
      placed.set(keyOf({ piece: piece.name, edge: edge.name }), { piece, edge, before, after });
    });
  }
  return placed;
}

/** Degrees by which a walker turns right from one direction into another, -180 to 180. */
export const turnBetween = (from: Point, to: Point): number =>
  (Math.atan2(cross(from, to), dot(from, to)) * 180) / Math.PI;

/** Degrees inside the piece where one edge ends and the next starts. */
export const cornerBetween = (edge: Edge, next: Edge): number =>
  180 - turnBetween(endTangent(edge.path), startTangent(next.path));

/** One end of a seam: the corner of each piece there, and the edge each runs on into. */
export type SeamEnd = {
  readonly at: Point;
  readonly first: EndCorner;
  readonly second: EndCorner;
};

type EndCorner = {
  readonly degrees: number;
  readonly neighbour: Edge;
  /** It is given in degrees, as at the point of a godet, and proven by itself. */
  readonly given: boolean;
};

function cornerAt({ edge, before, after }: PlacedEdge, end: 'start' | 'end'): EndCorner {
  const [one, next] = end === 'start' ? [before, edge] : [edge, after];
  return {
    degrees: cornerBetween(one, next),
    neighbour: end === 'start' ? before : after,
    given: next.corner !== undefined,
  };
}

/**
 * Whether a piece turns an outer corner into this neighbour: not where a dart opens, not where the
 * same two pieces run on joined, and not where it runs on across a seam between two other pieces.
 */
function turnsCorner(neighbour: Edge, other: Piece, placed: Placed): boolean {
  if (neighbour.open === true) return false;
  if (neighbour.joins === undefined || neighbour.joins === 'self') return true;
  const beside = placed.get(keyOf(neighbour.joins))?.piece;
  if (beside === undefined) return true;
  return beside.part !== other.part || beside.side !== other.side;
}

/** The ends of a seam at which both pieces turn an outer corner, from the start of the first edge. */
function outerEnds(
  first: PlacedEdge,
  second: PlacedEdge,
  opposite: boolean,
  placed: Placed,
): readonly SeamEnd[] {
  const from = first.edge.path[0]?.from ?? { x: 0, y: 0 };
  const to = first.edge.path.at(-1)?.to ?? from;
  const ends: readonly SeamEnd[] = [
    {
      at: from,
      first: cornerAt(first, 'start'),
      second: cornerAt(second, opposite ? 'end' : 'start'),
    },
    { at: to, first: cornerAt(first, 'end'), second: cornerAt(second, opposite ? 'start' : 'end') },
  ];
  return ends.filter(
    (end) =>
      !end.first.given &&
      !end.second.given &&
      turnsCorner(end.first.neighbour, second.piece, placed) &&
      turnsCorner(end.second.neighbour, first.piece, placed),
  );
}

/** Whether one of two pieces is laid on the other, as a facing is: their edges then run alike. */
const isLaidOn = (one: Piece, other: Piece): boolean =>
  (one.part === 'inner') !== (other.part === 'inner');

/**
 * Each seam between two different edges once. Pieces of one side lie beside each other as they are
 * sewn, so their edges, both clockwise, run against each other; a front and a back lie mirrored, so
 * theirs run alike.
 */
export function joinedPairs(placed: Placed): readonly JoinedPair[] {
  const pairs: JoinedPair[] = [];
  const taken = new Set<PlacedEdge>();
  for (const first of placed.values()) {
    const { joins } = first.edge;
    if (joins === undefined || joins === 'self' || taken.has(first)) continue;
    const second = placed.get(keyOf(joins));
    if (second === undefined || second === first) continue;
    taken.add(first).add(second);
    const laidOn = isLaidOn(first.piece, second.piece);
    const opposite = first.piece.side === second.piece.side && !laidOn;
    const ends = laidOn ? [] : outerEnds(first, second, opposite, placed);
    pairs.push({ first, second, opposite, outerEnds: ends });
  }
  return pairs;
}

/** Whether the seam lies within one part of one side: princess seams, seams between flare panels. */
export const isPanelSeam = ({ first, second }: JoinedPair): boolean =>
  first.piece.side === second.piece.side && first.piece.part === second.piece.part;

/** An edge as it is spoken of: `waist seam a` for `waist-a`, `knee half` for `knee-half`. */
export const spoken = (name: string): string =>
  name.replace(/^waist-(?=[a-z]$)/, 'waist seam ').replaceAll('-', ' ');
