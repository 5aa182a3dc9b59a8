import { pointAt, splitSegment, tangentAt, velocityAt } from './curve.ts';
import { joinRuns } from './corner.ts';
import { type Cubic, type Line, type Path, type Segment, cubic, line } from './path.ts';
import { type Point, add, cross, dot, scale, subtract, turnLeft } from './point.ts';

/** A parallel curve, and whether it folds over itself because the path bends too tightly for it. */
export type Parallel = { readonly path: Path; readonly folded: boolean };

/** Farthest a fitted parallel may lie from the true one where it is looked at, mm. */
const fit = 0.02;

/** A curve is halved at most this often. */
const deepest = 7;

const looks = [0.25, 0.5, 0.75] as const;

/**
 * How a handle grows on the parallel: one plus curvature times distance. Zero or less where the
 * curve bends too tightly for the parallel to follow.
 */
function growth(a: Point, b: Point, c: Point, distance: number): number {
  const handle = subtract(b, a);
  const size = dot(handle, handle);
  if (size < 1e-12) return 1;
  return 1 + (((2 / 3) * cross(handle, subtract(c, b))) / (size * Math.sqrt(size))) * distance;
}

const beside = (segment: Segment, t: 0 | 1, distance: number): Point =>
  add(t === 0 ? segment.from : segment.to, scale(turnLeft(tangentAt(segment, t)), distance));

/** Whether the fitted cubic lies on the true parallel, seen square to the curve. */
function fits(segment: Cubic, fitted: Cubic, distance: number): boolean {
  for (const t of looks) {
    const along = velocityAt(segment, t);
    const size = Math.sqrt(dot(along, along));
    if (size < 1e-9) continue;
    const off = cross(along, subtract(pointAt(fitted, t), pointAt(segment, t))) / size;
    if (Math.abs(off + distance) > fit) return false;
  }
  return true;
}

/** Adds the fitted stretches of a cubic's parallel; says whether it folds. */
function offsetCubic(segment: Cubic, distance: number, depth: number, into: Segment[]): boolean {
  const { from, c1, c2, to } = segment;
  const start = growth(from, c1, c2, distance);
  const end = growth(to, c2, c1, -distance);
  const first = beside(segment, 0, distance);
  const last = beside(segment, 1, distance);
  const fitted = cubic(
    first,
    add(first, scale(subtract(c1, from), start)),
    add(last, scale(subtract(c2, to), end)),
    last,
  );
  if (depth === 0 || fits(segment, fitted, distance)) {
    into.push(fitted);
    return start <= 0 || end <= 0;
  }
  let folded = false;
  for (const half of splitSegment(segment, 0.5)) {
    if (half.kind === 'cubic' && offsetCubic(half, distance, depth - 1, into)) folded = true;
  }
  return folded;
}

/** A stretch smaller than this is a speck: its direction means nothing, mm. */
const speck = 0.02;

const small = ({ x, y }: Point): boolean => Math.abs(x) < speck && Math.abs(y) < speck;

function isSpeck(segment: Segment): boolean {
  if (!small(subtract(segment.to, segment.from))) return false;
  if (segment.kind === 'line') return true;
  return small(subtract(segment.c1, segment.from)) && small(subtract(segment.c2, segment.from));
}

/** The path without the specks that cutting curves at their very ends leaves behind. */
export const withoutSpecks = (path: Path): Path =>
  path.some(isSpeck) && !path.every(isSpeck) ? path.filter((each) => !isSpeck(each)) : path;

function offsetLine(segment: Line, distance: number): Line {
  return line(beside(segment, 0, distance), beside(segment, 1, distance));
}

/**
 * The curve `distance` mm to the left of a path (to its right where negative), as smooth cubics
 * within 0.03 mm of the true one; lines exactly; corners mitred. After W. Tiller and E. Hanson,
 * "Offsets of Two-Dimensional Profiles", 1984 (from memory): each cubic keeps its end directions,
 * its handles grow with the curvature, and it is halved until it fits.
 */
export function parallel(path: Path, distance: number): Parallel {
  if (distance === 0) return { path, folded: false };
  let folded = false;
  let done: Path = [];
  let before: Segment | undefined;
  for (const segment of path) {
    const run: Segment[] = [];
    if (segment.kind === 'line') run.push(offsetLine(segment, distance));
    else if (offsetCubic(segment, distance, deepest, run)) folded = true;
    if (before) {
      const joined = joinRuns(
        { path: done, distance, along: tangentAt(before, 1) },
        { path: run, distance, along: tangentAt(segment, 0) },
        segment.from,
      );
      if (joined.folded) folded = true;
      done = [...joined.before, ...joined.between, ...joined.after];
    } else done = run;
    before = segment;
  }
  return { path: done, folded };
}
