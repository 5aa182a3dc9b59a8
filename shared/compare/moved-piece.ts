import type { FinishedPiece } from '../drafting/piece.ts';
import { type Motion, moved, movedPath } from '../geometry/motion.ts';
import type { Path } from '../geometry/path.ts';

/** A piece carried elsewhere whole: lines, darts, levels, marks and lettering. */
export function movedPiece(piece: FinishedPiece, by: Motion): FinishedPiece {
  const path = (each: Path): Path => movedPath(each, by);
  const turned = (each: { readonly x: number; readonly y: number }) =>
    moved(each, { ...by, dx: 0, dy: 0 });
  return {
    ...piece,
    edges: piece.edges.map((edge) => ({ ...edge, path: path(edge.path) })),
    darts: piece.darts.map((dart) => ({
      ...dart,
      centreLeg: path(dart.centreLeg),
      sideLeg: path(dart.sideLeg),
    })),
    levels: piece.levels.map(({ level, from, to }) => ({
      level,
      from: moved(from, by),
      to: moved(to, by),
    })),
    notches: piece.notches.map((notch) => ({
      ...notch,
      at: moved(notch.at, by),
      outward: turned(notch.outward),
    })),
    grain: { from: moved(piece.grain.from, by), to: moved(piece.grain.to, by) },
    drills: piece.drills.map((each) => moved(each, by)),
    ...(piece.lines && {
      lines: piece.lines.map((each) => ({ ...each, path: path(each.path) })),
    }),
    cutLine: path(piece.cutLine),
    notchMarks: piece.notchMarks.map((mark) => ({
      ...mark,
      strokes: mark.strokes.map(({ from, to }) => ({
        kind: 'line',
        from: moved(from, by),
        to: moved(to, by),
      })),
    })),
    lettering: piece.lettering.map((each) => ({ ...each, at: moved(each.at, by) })),
  };
}

/** The finished outline of a piece: its edges one after the other. */
export const seamOutline = ({ edges }: Pick<FinishedPiece, 'edges'>): Path =>
  edges.flatMap((edge) => edge.path);
