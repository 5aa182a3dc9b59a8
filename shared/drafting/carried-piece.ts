import type { Path } from '../geometry/path.ts';
import type { Point } from '../geometry/point.ts';
import type { FinishedPiece } from './piece.ts';

/** A path with every point of it, handles too, taken elsewhere by a map that keeps straight lines straight. */
export const carriedPath = (path: Path, to: (at: Point) => Point): Path =>
  path.map((each) =>
    each.kind === 'line'
      ? { kind: 'line', from: to(each.from), to: to(each.to) }
      : { kind: 'cubic', from: to(each.from), c1: to(each.c1), c2: to(each.c2), to: to(each.to) },
  );

/**
 * A piece carried elsewhere whole, lines, darts, levels, marks and lettering: `to` takes places, `turned`
 * takes directions. The map must keep straight lines straight; one that mirrors leaves the edges running
 * the other way round.
 */
export function carriedPiece(
  piece: FinishedPiece,
  to: (at: Point) => Point,
  turned: (way: Point) => Point,
): FinishedPiece {
  const path = (each: Path): Path => carriedPath(each, to);
  return {
    ...piece,
    edges: piece.edges.map((edge) => ({ ...edge, path: path(edge.path) })),
    darts: piece.darts.map((dart) => ({
      ...dart,
      centreLeg: path(dart.centreLeg),
      sideLeg: path(dart.sideLeg),
    })),
    levels: piece.levels.map((each) => ({ ...each, from: to(each.from), to: to(each.to) })),
    notches: piece.notches.map((notch) => ({
      ...notch,
      at: to(notch.at),
      outward: turned(notch.outward),
    })),
    grain: { from: to(piece.grain.from), to: to(piece.grain.to) },
    drills: piece.drills.map(to),
    ...(piece.lines && { lines: piece.lines.map((each) => ({ ...each, path: path(each.path) })) }),
    cutLine: path(piece.cutLine),
    notchMarks: piece.notchMarks.map((mark) => ({
      ...mark,
      strokes: mark.strokes.map((each) => ({
        kind: 'line',
        from: to(each.from),
        to: to(each.to),
      })),
    })),
    lettering: piece.lettering.map((each) => ({ ...each, at: to(each.at) })),
  };
}
