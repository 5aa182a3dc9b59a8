import {
  endOf,
  lengthBefore,
  pathCrossings,
  pathLength,
  pointAt,
  startOf,
  stationAtLength,
} from '../geometry/curve.ts';
import type { Path } from '../geometry/path.ts';
import { type Point, distance, dot, point, subtract, turnRight, unit } from '../geometry/point.ts';
import { type Edge, type LevelName, type Piece, levelNames } from '../drafting/piece.ts';

export type Levels = { readonly [L in LevelName]?: number };

/** A place to chalk: how far from the centre line, and how far from a level (positive below it); mm. */
export type ChalkPoint = {
  readonly number: number;
  readonly what: string;
  readonly at: Point;
  readonly level: LevelName;
  readonly offLevel: number;
  /** Strokes of the notch to make there, where there is one: one in front, two at the back. */
  readonly notch?: 1 | 2;
  /** Direction from the point in which its number stands clear of the line. */
  readonly aside: Point;
};

/** Points nearer than this are one place to a piece of chalk, mm. */
const same = 2;

/** A notch is marked on a point as near as this: chalk lines are two millimetres wide, mm. */
const onNotch = 4;

/** A curve that leaves the straight line between two points by more than this gets one more point, mm. */
const hollow = 4;

/** Points along one line stand at least so far from each other, mm. */
const apart = 15;

/** Levels that are lines on the table with their heights: the chest and the hem are not struck. */
export const struckLevels = (levels: Levels): readonly (readonly [LevelName, number])[] =>
  levelNames.flatMap((level) => {
    const y = levels[level];
    return y === undefined || level === 'chest' || level === 'hem' ? [] : [[level, y] as const];
  });

const spoken = (name: string): string => name.replaceAll('-', ' ');

/** The level nearest to a height, with its own. */
const nearestLevel = (y: number, levels: Levels): readonly [LevelName, number] =>
  struckLevels(levels).reduce((best, each) =>
    Math.abs(each[1] - y) < Math.abs(best[1] - y) - 1e-9 ? each : best,
  );

type Found = {
  readonly what: string;
  readonly at: Point;
  readonly aside: Point;
  readonly notch?: 1 | 2;
};

/** Clear of a line that runs in `tangent`, to its right, and lifted off the level it may stand on. */
const beside = (tangent: Point): Point => {
  const right = turnRight(tangent);
  return unit({ x: right.x, y: right.y - 0.7 });
};

/** Lengths along a path at which it crosses the levels. */
const onLevels = (path: Path, levels: Levels): readonly number[] =>
  struckLevels(levels).flatMap(([, y]) =>
    pathCrossings(path, point(0, y), point(1, y))
      .slice(0, 1)
      .map((each) => lengthBefore(path, each)),
  );

/** The length at which a stretch of path stands farthest off its chord, where it stands off enough. */
function hollowOf(path: Path, from: number, to: number): number | undefined {
  const [start, end] = [stationAtLength(path, from), stationAtLength(path, to)];
  if (!start || !end || to - from < 2 * apart) return undefined;
  const square = turnRight(unit(subtract(end.at, start.at)));
  let widest: { length: number; off: number } | undefined;
  for (const share of [0.25, 0.35, 0.5, 0.65, 0.75]) {
    const length = from + (to - from) * share;
    const at = stationAtLength(path, length)?.at;
    const off = at ? Math.abs(dot(subtract(at, start.at), square)) : 0;
    if (!widest || off > widest.off + 1e-6) widest = { length, off };
  }
  return widest && widest.off > hollow ? widest.length : undefined;
}

/** Lengths that a curve needs between two known ones, to be joined fairly. */
function hollowsOf(path: Path, from: number, to: number): readonly number[] {
  const length = hollowOf(path, from, to);
  if (length === undefined) return [];
  const halves = [hollowOf(path, from, length), hollowOf(path, length, to)];
  return [length, ...halves.flatMap((each) => (each === undefined ? [] : [each]))];
}

/** Places along an edge or leg between its ends: at the levels, and where it is hollow between them. */
function alongPath(path: Path, what: string, levels: Levels): readonly Found[] {
  const whole = pathLength(path);
  const known = onLevels(path, levels)
    .filter((each) => each > apart && each < whole - apart)
    .sort((a, b) => a - b);
  const stops = [0, ...known, whole];
  const hollows = stops.slice(1).flatMap((to, i) => hollowsOf(path, stops[i] ?? 0, to));
  return [...known, ...hollows]
    .sort((a, b) => a - b)
    .flatMap((length) => stationAtLength(path, length) ?? [])
    .map(({ at, tangent }) => ({ what, at, aside: beside(tangent) }));
}

const cornerName = (edge: Edge): string => (edge.open === true ? 'dart' : spoken(edge.name));

/** The centre line itself needs no points but its ends. */
const isCentre = (edge: Edge): boolean =>
  edge.path.every((each) => Math.abs(each.from.x) < same && Math.abs(each.to.x) < same);

/** Corners of the finished outline, its edges at the levels, the hollows of its curves, its darts. */
function pointsOf(piece: Piece, levels: Levels): readonly Found[] {
  const corners = piece.edges.flatMap((edge, i): readonly Found[] => {
    const before = piece.edges[(i + piece.edges.length - 1) % piece.edges.length];
    const at = startOf(edge.path);
    const first = edge.path[0];
    const last = before?.path.at(-1);
    if (!at || !first || !before || !last) return [];
    const ahead = unit(subtract(pointAt(first, 0.05), at));
    const behind = unit(subtract(pointAt(last, 0.95), at));
    const middle = { x: ahead.x + behind.x, y: ahead.y + behind.y };
    const inward = turnRight(ahead);
    const flat = Math.hypot(middle.x, middle.y) < 0.3 || dot(middle, inward) < 0;
    const aside = flat ? beside(ahead) : unit(middle);
    return [{ what: `${cornerName(before)} / ${cornerName(edge)}`, at, aside }];
  });
  const along = piece.edges
    .filter((each) => each.open !== true && !isCentre(each))
    .flatMap((each) => alongPath(each.path, spoken(each.name), levels));
  const darts = piece.darts.flatMap((dart) => {
    const name = `${spoken(dart.name)} dart`;
    const tip = endOf(dart.centreLeg);
    const leg = (path: Path, aside: Point): readonly Found[] =>
      alongPath(path, name, levels).map((each) => ({ ...each, aside }));
    return [
      ...(tip ? [{ what: `${name}, tip`, at: tip, aside: point(1, 0) }] : []),
      ...leg(dart.centreLeg, unit(point(-1, -0.7))),
      ...leg(dart.sideLeg, unit(point(1, -0.7))),
    ];
  });
  const notches = piece.notches.map(({ name, at, outward, strokes }): Found => ({
    what: name === 'zip-end' ? 'zip ends' : spoken(name),
    at,
    aside: unit(subtract(point(0, 0), outward)),
    notch: strokes,
  }));
  return [...corners, ...along, ...darts, ...notches];
}

/**
 * Every point of some pieces that stand in one half-body frame, numbered from `first` in reading order
 * round each piece; a place that two pieces share is named once, and a notch on a place that has a name
 * is marked there.
 */
export function chalkPoints(
  pieces: readonly Piece[],
  levels: Levels,
  first: number,
): readonly ChalkPoint[] {
  const kept: ChalkPoint[] = [];
  for (const { what, at, aside, notch } of pieces.flatMap((each) => pointsOf(each, levels))) {
    const near = notch ? onNotch : same;
    const there = kept.findIndex((each) => distance(each.at, at) < near);
    const known = kept[there];
    if (known) {
      if (notch) kept[there] = { ...known, notch };
      continue;
    }
    const [level, height] = nearestLevel(at.y, levels);
    kept.push({
      number: first + kept.length,
      what,
      at,
      level,
      offLevel: at.y - height,
      aside,
      ...(notch ? { notch } : {}),
    });
  }
  return kept;
}
