import type { Edge, FinishedPiece } from '#shared/drafting/piece.ts';
import type { Path, Segment } from '#shared/geometry/path.ts';
import { type Point, add, distance } from '#shared/geometry/point.ts';

const movedSegment = (segment: Segment, move: (at: Point) => Point): Segment =>
  segment.kind === 'line'
    ? { ...segment, from: move(segment.from), to: move(segment.to) }
    : {
        ...segment,
        from: move(segment.from),
        c1: move(segment.c1),
        c2: move(segment.c2),
        to: move(segment.to),
      };

const movedPath = (path: Path, move: (at: Point) => Point): Path =>
  path.map((segment) => movedSegment(segment, move));

/** Moves what lies at one place, and only that. */
const mover =
  (place: Point, by: Point) =>
  (at: Point): Point =>
    distance(at, place) < 1e-6 ? add(at, by) : at;

/** A piece in which one point of the seam line, wherever edges, dart legs and notches use it, has moved. */
export function moveSeamPoint(piece: FinishedPiece, place: Point, by: Point): FinishedPiece {
  const move = mover(place, by);
  return {
    ...piece,
    edges: piece.edges.map((edge: Edge) => ({ ...edge, path: movedPath(edge.path, move) })),
    darts: piece.darts.map((dart) => ({
      ...dart,
      centreLeg: movedPath(dart.centreLeg, move),
      sideLeg: movedPath(dart.sideLeg, move),
    })),
    notches: piece.notches.map((notch) => ({ ...notch, at: move(notch.at) })),
  };
}

/** A piece in which one point of the cutting line has moved. */
export const moveCutPoint = (piece: FinishedPiece, place: Point, by: Point): FinishedPiece => ({
  ...piece,
  cutLine: movedPath(piece.cutLine, mover(place, by)),
});

/** The pieces with one of them changed. */
export const withPiece = (
  pieces: readonly FinishedPiece[],
  name: string,
  change: (piece: FinishedPiece) => FinishedPiece,
): readonly FinishedPiece[] => {
  if (!pieces.some((piece) => piece.name === name)) throw new Error(`no piece ${name}`);
  return pieces.map((piece) => (piece.name === name ? change(piece) : piece));
};
