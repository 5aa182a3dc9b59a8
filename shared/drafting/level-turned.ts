import { type Motion, moved } from '../geometry/motion.ts';
import { type Point, between, cross, distance, dot, subtract, unit } from '../geometry/point.ts';
import type { LevelLine } from './piece.ts';

/** Nearer than this two places are one, mm. */
const same = 1e-4;

/** The part of a piece that is turned about a point: what lies between two lines from that point. */
export type TurnedPart = {
  readonly pivot: Point;
  readonly motion: Motion;
  /** Far ends of the lines from the pivot: of the part that stays, and of the part that turns. */
  readonly staying: readonly [Point, Point];
  readonly turning: readonly [Point, Point];
  /** Whether a place on the outline turns. */
  readonly turns: (place: Point) => boolean;
};

/** Where two straight stretches cross; no answer where they do not. */
function crossing(a: Point, b: Point, c: Point, d: Point): Point | undefined {
  const along = subtract(b, a);
  const other = subtract(d, c);
  const slope = cross(along, other);
  if (Math.abs(slope) < 1e-9) return undefined;
  const s = cross(subtract(c, a), other) / slope;
  const t = cross(subtract(c, a), along) / slope;
  return s >= -1e-9 && s <= 1 + 1e-9 && t >= -1e-9 && t <= 1 + 1e-9 ? between(a, b, s) : undefined;
}

const offLine = ({ from, to }: LevelLine, at: Point): number =>
  Math.abs(cross(unit(subtract(to, from)), subtract(at, from)));

/** A level as it lies after part of the piece was turned: whole, or in two stretches where it bends. */
function turned(level: LevelLine, part: TurnedPart): readonly LevelLine[] {
  const { pivot, motion } = part;
  const atPivot = (at: Point): boolean => distance(at, pivot) < same;
  const turns = (at: Point): boolean | undefined => (atPivot(at) ? undefined : part.turns(at));
  const from = turns(level.from);
  const to = turns(level.to);
  const laid = (at: Point, turning: boolean): Point => (turning ? moved(at, motion) : at);
  if (from === undefined || to === undefined || from === to) {
    const turning = from ?? to ?? false;
    return [{ ...level, from: laid(level.from, turning), to: laid(level.to, turning) }];
  }
  const met = (far: readonly [Point, Point]): readonly Point[] =>
    offLine(level, pivot) < same
      ? [pivot]
      : far.flatMap((end) => crossing(level.from, level.to, pivot, end) ?? []);
  const nearest = (among: readonly Point[], end: Point): Point =>
    [...among].sort((a, b) => distance(a, end) - distance(b, end))[0] ?? pivot;
  const first = nearest(met(from ? part.turning : part.staying), level.from);
  const second = nearest(met(to ? part.turning : part.staying), level.to);
  return [
    { ...level, from: laid(level.from, from), to: laid(first, from) },
    { ...level, from: laid(second, to), to: laid(level.to, to) },
  ];
}

/** Stretches of one level that lie in one straight line again are one. */
function straightened(levels: readonly LevelLine[]): readonly LevelLine[] {
  const kept: LevelLine[] = [];
  for (const level of levels) {
    const last = kept.at(-1);
    const runsOn =
      last?.level === level.level &&
      distance(last.to, level.from) < same &&
      offLine(level, last.from) < same &&
      dot(subtract(last.to, last.from), subtract(level.to, level.from)) > 0;
    if (runsOn) kept[kept.length - 1] = { ...level, from: last.from };
    else kept.push(level);
  }
  return kept;
}

/** The levels of a piece after part of it was turned; a level that bends is drawn in two stretches. */
export const turnedLevels = (
  levels: readonly LevelLine[],
  part: TurnedPart,
): readonly LevelLine[] => straightened(levels.flatMap((level) => turned(level, part)));
