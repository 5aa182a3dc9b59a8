import { endOf, pathCrossings, stationAtLength, type Station } from '../geometry/curve.ts';
import { type Path, line } from '../geometry/path.ts';
import { type Point, point, turnLeft } from '../geometry/point.ts';
import type { EdgeKind } from './house-rules.ts';
import type { Dart, Edge, EdgeRef, LevelLine, LevelName, Notch } from './piece.ts';

/** Where an edge goes: the piece and edge it is sewn to. */
export const to = (piece: string, edge: string): EdgeRef => ({ piece, edge });

/** An edge of the finished outline. */
export const edge = (name: string, kind: EdgeKind, path: Path, joins?: EdgeRef | 'self'): Edge => ({
  name,
  kind,
  path,
  ...(joins ? { joins } : {}),
});

/** The mouth of a dart, straight across. */
export const mouth = (name: string, from: Point, until: Point): Edge => ({
  name,
  kind: 'mouth',
  path: [line(from, until)],
  open: true,
});

const notchAt = (name: string, on: string, strokes: 1 | 2, station: Station): Notch => ({
  name,
  edge: on,
  at: station.at,
  outward: turnLeft(station.tangent),
  strokes,
});

/** A notch where an edge passes a height; none where it does not reach it. */
export function notchAtHeight(name: string, on: Edge, y: number, strokes: 1 | 2): readonly Notch[] {
  const station = pathCrossings(on.path, point(0, y), point(1, y))[0];
  return station ? [notchAt(name, on.name, strokes, station)] : [];
}

/** A notch at a length along an edge. */
export function notchAtLength(
  name: string,
  on: Edge,
  length: number,
  strokes: 1 | 2,
): readonly Notch[] {
  const station = stationAtLength(on.path, length);
  return station ? [notchAt(name, on.name, strokes, station)] : [];
}

/** Drill points stand this far inside a dart tip (common practice, no source: 10 to 15). */
const drillInside = 12;

/** Where to drill for each dart: on its axis, short of the tip. */
export const drillPoints = (darts: readonly Dart[]): readonly Point[] =>
  darts.flatMap((dart) => {
    const tip = endOf(dart.centreLeg);
    const inwards = dart.tip === 'above' ? drillInside : -drillInside;
    return tip ? [point(tip.x, tip.y + inwards)] : [];
  });

/** A level across a piece. */
export const levelLine = (level: LevelName, from: Point, until: Point): LevelLine => ({
  level,
  from,
  to: until,
});
