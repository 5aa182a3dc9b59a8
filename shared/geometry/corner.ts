import { pathCrossings, splitPath } from './curve.ts';
import type { Station } from './curve.ts';
import { type Path, type Segment, line } from './path.ts';
import {
  type Point,
  add,
  cross,
  distance as apart,
  dot,
  scale,
  subtract,
  turnLeft,
  unit,
} from './point.ts';

/**
 * A parallel that comes to a corner of the line it accompanies (or leaves it): the parallel, its
 * distance to the left, and the direction of the accompanied line at that corner.
 */
export type Run = { readonly path: Path; readonly distance: number; readonly along: Point };

/** Two parallels brought together: the first, straight pieces between, the second. */
export type Joined = {
  readonly before: Path;
  readonly between: Path;
  readonly after: Path;
  /** They could not be brought together without lying over each other. */
  readonly folded: boolean;
};

/** Turns gentler than this run on as one curve, radians (2 degrees). */
const straight = 0.035;

/** Outward corners sharper than this are squared off, radians of turn (an inner angle of 54 degrees). */
const acute = 2.2;

/** Straight pieces through the given points, those without length left out. */
export function lines(points: readonly Point[]): Path {
  const path: Segment[] = [];
  points.forEach((to, index) => {
    const from = points[index - 1];
    if (from && apart(from, to) > 1e-6) path.push(line(from, to));
  });
  return path;
}

/** The path with its start (or end) shifted to a place beside it, keeping its direction. */
function movedEnd(path: Path, end: 'from' | 'to', at: Point): Path {
  const index = end === 'from' ? 0 : path.length - 1;
  const segment = path[index];
  if (!segment) return path;
  const by = subtract(at, segment[end]);
  const own =
    segment.kind === 'line'
      ? { ...segment, [end]: at }
      : end === 'from'
        ? { ...segment, from: at, c1: add(segment.c1, by) }
        : { ...segment, to: at, c2: add(segment.c2, by) };
  return path.with(index, own);
}

const endOf = (run: Run, corner: Point): Point =>
  add(corner, scale(turnLeft(run.along), run.distance));

/** Cuts (or lengthens straight on) the end of a run at an endless line; `undefined` without a crossing. */
export function endAtLine(run: Run, corner: Point, from: Point, along: Point): Path | undefined {
  const end = endOf(run, corner);
  const slope = cross(run.along, along);
  const reach = Math.abs(slope) < 1e-9 ? 0 : cross(subtract(from, end), along) / slope;
  if (reach >= -1e-6) return [...run.path, ...lines([end, add(end, scale(run.along, reach))])];
  const met = pathCrossings(run.path, from, add(from, along)).at(-1);
  return met && splitPath(run.path, met)[0];
}

/** Cuts (or lengthens straight back) the start of a run at an endless line. */
export function startAtLine(run: Run, corner: Point, from: Point, along: Point): Path | undefined {
  const start = endOf(run, corner);
  const slope = cross(run.along, along);
  const reach = Math.abs(slope) < 1e-9 ? 0 : cross(subtract(from, start), along) / slope;
  if (reach <= 1e-6) return [...lines([add(start, scale(run.along, reach)), start]), ...run.path];
  const met = pathCrossings(run.path, from, add(from, along))[0];
  return met && splitPath(run.path, met)[1];
}

/** Where two parallels cross before an inward corner: each in turn is cut by the other's tangent. */
function meeting(
  a: Path,
  b: Path,
  start: Point,
  along: Point,
): readonly [Station, Station] | undefined {
  let from = start;
  let direction = along;
  for (let i = 0; i < 12; i += 1) {
    const onA = pathCrossings(a, from, add(from, direction)).at(-1);
    if (!onA) return undefined;
    const onB = pathCrossings(b, onA.at, add(onA.at, onA.tangent))[0];
    if (!onB) return undefined;
    if (apart(onA.at, onB.at) < 1e-5) return [onA, onB];
    from = onB.at;
    direction = onB.tangent;
  }
  return undefined;
}

const whole = (a: Run, b: Run, between: Path, folded = false): Joined => ({
  before: a.path,
  between,
  after: b.path,
  folded,
});

/** A corner too sharp to mitre is cut square to its bisector, no nearer than the wider distance. */
function squared(a: Run, b: Run, corner: Point, ends: readonly [Point, Point]): Joined {
  const out = unit(subtract(a.along, b.along));
  const wide = Math.max(Math.abs(a.distance), Math.abs(b.distance));
  const reachA = (wide - dot(subtract(ends[0], corner), out)) / dot(a.along, out);
  const reachB = (wide - dot(subtract(ends[1], corner), out)) / dot(b.along, out);
  const p = add(ends[0], scale(a.along, reachA));
  const q = add(ends[1], scale(b.along, reachB));
  return whole(a, b, lines([ends[0], p, q, ends[1]]));
}

/**
 * Brings a parallel to a corner in which one of the two runs is a fold, whose own distance is nothing: the
 * corner is half of one that lies across the fold. Sharp ones are cut square across it.
 */
export function joinAtFold(a: Run, b: Run, corner: Point): Joined {
  const foldFirst = a.distance === 0;
  const [fold, seam] = foldFirst ? [a, b] : [b, a];
  const out = foldFirst ? fold.along : scale(fold.along, -1);
  const away = foldFirst ? scale(seam.along, -1) : seam.along;
  const end = endOf(seam, corner);
  const angle = Math.acos(Math.min(1, Math.max(-1, dot(out, away))));
  const mitred = 2 * angle >= Math.PI - acute;
  const reach = mitred ? seam.distance / Math.sin(angle) : seam.distance;
  const onSeam = add(end, scale(away, (reach - dot(subtract(end, corner), out)) / dot(away, out)));
  const between = [corner, add(corner, scale(out, reach)), onSeam, end];
  return whole(a, b, lines(foldFirst ? between : between.toReversed()));
}

/**
 * Brings two parallels together at a corner of the line they accompany: lengthened straight to a
 * mitre where they part, cut where they cross, squared off where the corner is very sharp, stepped
 * where the distance changes on a straight run.
 */
export function joinRuns(a: Run, b: Run, corner: Point): Joined {
  const ends = [endOf(a, corner), endOf(b, corner)] as const;
  const turn = Math.atan2(cross(a.along, b.along), dot(a.along, b.along));
  if (Math.abs(turn) < straight) {
    if (Math.abs(a.distance - b.distance) > 1e-9) return whole(a, b, lines(ends));
    if (apart(ends[0], ends[1]) < 1e-9) return whole(a, b, []);
    const at = add(ends[0], scale(a.along, a.distance * Math.tan(turn / 2)));
    return {
      before: movedEnd(a.path, 'to', at),
      between: [],
      after: movedEnd(b.path, 'from', at),
      folded: false,
    };
  }
  if (turn * Math.sign(a.distance + b.distance) > acute) return squared(a, b, corner, ends);
  const reachA = (b.distance - a.distance * Math.cos(turn)) / Math.sin(turn);
  const reachB = (a.distance - b.distance * Math.cos(turn)) / Math.sin(turn);
  if (reachA >= -1e-6 && reachB >= -1e-6) {
    return whole(a, b, lines([ends[0], add(ends[0], scale(a.along, reachA)), ends[1]]));
  }
  if (reachA < 0 && reachB < 0) {
    const met = meeting(a.path, b.path, ends[1], b.along);
    if (!met) return whole(a, b, lines(ends), true);
    return {
      before: splitPath(a.path, met[0])[0],
      between: [],
      after: movedEnd(splitPath(b.path, met[1])[1], 'from', met[0].at),
      folded: false,
    };
  }
  if (reachA < 0) {
    const before = endAtLine(a, corner, ends[1], b.along);
    if (!before) return whole(a, b, lines(ends), true);
    return {
      before,
      between: lines([before.at(-1)?.to ?? ends[0], ends[1]]),
      after: b.path,
      folded: false,
    };
  }
  const after = startAtLine(b, corner, ends[0], a.along);
  if (!after) return whole(a, b, lines(ends), true);
  return {
    before: a.path,
    between: lines([ends[0], after[0]?.from ?? ends[1]]),
    after,
    folded: false,
  };
}
