import type { FinishedPiece } from '../drafting/piece.ts';
import { endOf, startOf } from '../geometry/curve.ts';
import { moved } from '../geometry/motion.ts';
import type { Point } from '../geometry/point.ts';
import { type Alignment, motionFor } from './alignment.ts';
import type { Comparable } from './comparable.ts';

/** A point of a piece that has a name: the corner of two edges, or the tip of a dart. */
export type NamedPoint = {
  /** The same in every draft: `corner:front-middle:side:knee`. */
  readonly key: string;
  readonly piece: string;
  /** As a maker would say it: `corner of side and knee`. */
  readonly title: string;
  readonly at: Point;
};

const spoken = (name: string): string => name.replaceAll('-', ' ');

/** Corners and dart tips of a piece, in order round its outline. */
export function pointsOf(piece: FinishedPiece): readonly NamedPoint[] {
  const { name, edges, darts } = piece;
  const corners = edges.flatMap((edge, index): readonly NamedPoint[] => {
    const before = edges.at(index - 1) ?? edge;
    const at = startOf(edge.path);
    if (!at) return [];
    return [
      {
        key: `corner:${name}:${before.name}:${edge.name}`,
        piece: name,
        title: `corner of ${spoken(before.name)} and ${spoken(edge.name)}`,
        at,
      },
    ];
  });
  const tips = darts.flatMap((dart): readonly NamedPoint[] => {
    const at = endOf(dart.centreLeg);
    if (!at) return [];
    const title = `tip of the ${spoken(dart.name)} dart`;
    return [{ key: `tip:${name}:${dart.name}`, piece: name, title, at }];
  });
  return [...corners, ...tips];
}

/** A named point in both drafts, the second's laid on the first's. */
export type PointMove = {
  readonly key: string;
  readonly piece: string;
  readonly title: string;
  readonly from: Point;
  readonly to: Point;
};

/** Where the named points of one draft lie in another one, laid together; points both drafts have. */
export function pointMoves(
  first: Comparable,
  second: Comparable,
  align: Alignment,
): readonly PointMove[] {
  const later = new Map(second.pieces.map((each) => [each.name, each]));
  return first.pieces.flatMap((piece) => {
    const other = later.get(piece.name);
    if (!other) return [];
    const motion = motionFor({ first, second }, { first: piece, second: other }, align);
    const there = new Map(pointsOf(other).map((each) => [each.key, moved(each.at, motion)]));
    return pointsOf(piece).flatMap(({ key, title, at }): readonly PointMove[] => {
      const to = there.get(key);
      return to ? [{ key, piece: piece.name, title, from: at, to }] : [];
    });
  });
}
