import { carriedPath, carriedPiece } from '../drafting/carried-piece.ts';
import type { Edge, FinishedPiece } from '../drafting/piece.ts';
import { endOf, reverse, startOf } from '../geometry/curve.ts';
import type { Path } from '../geometry/path.ts';
import { type Point, add, cross, dot, scale, subtract, unit } from '../geometry/point.ts';

/** Farther from the fold's line than this a stretch of the cutting line is no part of the fold, mm. */
const onFold = 0.01;

/** Mirrors places and directions in a line. */
function mirrorIn(from: Point, way: Point) {
  const turned = (v: Point): Point => subtract(scale(way, 2 * dot(v, way)), v);
  return { turned, to: (p: Point): Point => add(from, turned(subtract(p, from))) };
}

const reversedEdges = (edges: readonly Edge[]): readonly Edge[] =>
  edges.map((each) => ({ ...each, path: reverse(each.path) })).toReversed();

/** The mirror image of a piece, its edges clockwise again; its label stands mirrored and is to be set anew. */
export function turnedOver(piece: FinishedPiece): FinishedPiece {
  const { to, turned } = mirrorIn({ x: 0, y: 0 }, { x: 0, y: 1 });
  const image = carriedPiece(piece, to, turned);
  return { ...image, edges: reversedEdges(image.edges), cutLine: reverse(image.cutLine) };
}

/** The one fold of a piece; none where it has no fold, or several. */
export function foldOf({ edges }: FinishedPiece): Edge | undefined {
  const folds = edges.filter((each) => each.kind === 'fold');
  return folds.length === 1 ? folds[0] : undefined;
}

/** The stretches of a closed path that do not lie on a line, from where it leaves the line. */
function offLine(path: Path, from: Point, way: Point): Path {
  const on = (p: Point): boolean => Math.abs(cross(way, subtract(p, from))) <= onFold;
  const lies = path.map((each) => each.kind === 'line' && on(each.from) && on(each.to));
  const start = lies.findIndex(
    (each, i) => !each && (lies[(i + path.length - 1) % path.length] ?? false),
  );
  if (start < 0) return path;
  const turned = [...path.slice(start), ...path.slice(0, start)];
  const flags = [...lies.slice(start), ...lies.slice(0, start)];
  return turned.filter((_, i) => flags[i] === false);
}

/** A piece with a fold as it lies unfolded, both halves one; no answer where it has not exactly one fold. */
export function openedOut(piece: FinishedPiece): FinishedPiece | undefined {
  const fold = foldOf(piece);
  const [from, until] = [fold && startOf(fold.path), fold && endOf(fold.path)];
  if (!fold || !from || !until) return undefined;
  const way = unit(subtract(until, from));
  const { to, turned } = mirrorIn(from, way);
  const other = carriedPiece(piece, to, turned);
  const at = piece.edges.indexOf(fold);
  const own = [...piece.edges.slice(at + 1), ...piece.edges.slice(0, at)];
  const half = offLine(piece.cutLine, from, way);
  const mirrored = own.map((each) => ({ ...each, path: carriedPath(each.path, to) }));
  return {
    ...piece,
    cut: piece.cut.replace(' on fold', ', opened out'),
    edges: [...own, ...reversedEdges(mirrored)],
    darts: [...piece.darts, ...other.darts],
    levels: [...piece.levels, ...other.levels],
    notches: [...piece.notches, ...other.notches],
    notchMarks: [...piece.notchMarks, ...other.notchMarks],
    drills: [...piece.drills, ...other.drills],
    ...(piece.lines && { lines: [...piece.lines, ...(other.lines ?? [])] }),
    cutLine: [...half, ...reverse(carriedPath(half, to))],
  };
}

/** A piece drawn smaller; its label stands too small and is to be set anew. */
export const smaller = (piece: FinishedPiece, by: number): FinishedPiece =>
  by === 1
    ? piece
    : carriedPiece(
        piece,
        (at) => scale(at, by),
        (way) => way,
      );
