import { flatten } from '../geometry/curve.ts';
import type { Path, Segment } from '../geometry/path.ts';
import type { Point } from '../geometry/point.ts';

/** Chords this near the curve show whether two stretches cross. */
const flatness = 0.2;

type Box = {
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
};

/** Box round a stretch and its handles, so round all of it. */
export function boxOf(segment: Segment): Box {
  const { from, to } = segment;
  const c1 = segment.kind === 'cubic' ? segment.c1 : from;
  const c2 = segment.kind === 'cubic' ? segment.c2 : to;
  return {
    left: Math.min(from.x, c1.x, c2.x, to.x),
    right: Math.max(from.x, c1.x, c2.x, to.x),
    top: Math.min(from.y, c1.y, c2.y, to.y),
    bottom: Math.max(from.y, c1.y, c2.y, to.y),
  };
}

const apart = (a: Box, b: Box): boolean =>
  a.right < b.left || b.right < a.left || a.bottom < b.top || b.bottom < a.top;

const side = (a: Point, b: Point, p: Point): number =>
  (b.x - a.x) * (p.y - a.y) - (b.y - a.y) * (p.x - a.x);

const cross = (a: Point, b: Point, c: Point, d: Point): boolean =>
  side(a, b, c) * side(a, b, d) < 0 && side(c, d, a) * side(c, d, b) < 0;

/** A stretch as chords, with the box round it. */
type Chain = { readonly points: readonly Point[]; readonly box: Box };

const outside = (a: Point, b: Point, { left, right, top, bottom }: Box): boolean =>
  (a.x < left && b.x < left) ||
  (a.x > right && b.x > right) ||
  (a.y < top && b.y < top) ||
  (a.y > bottom && b.y > bottom);

/** First place at which two chains cross; `skip` leaves out the chords at a shared end. */
function crossing(
  one: Chain,
  other: Chain,
  skip: (i: number, j: number) => boolean,
): Point | undefined {
  for (let i = 1; i < one.points.length; i += 1) {
    const a = one.points[i - 1];
    const b = one.points[i];
    if (!a || !b || outside(a, b, other.box)) continue;
    for (let j = 1; j < other.points.length; j += 1) {
      const c = other.points[j - 1];
      const d = other.points[j];
      if (c && d && cross(a, b, c, d) && !skip(i, j)) return b;
    }
  }
  return undefined;
}

/** A stretch shorter than this is a point of the outline, mm. */
const shortest = 1e-6;

/** Whether a stretch is more than a point. */
export const hasLength = (segment: Segment): boolean => {
  const { left, right, top, bottom } = boxOf(segment);
  return right - left > shortest || bottom - top > shortest;
};

/** Where a closed outline crosses itself, near enough to point at; no answer where it never does. */
export function crossesItself(closed: Path): Point | undefined {
  const outline = closed.filter(hasLength);
  const boxes = outline.map(boxOf);
  const chains: (Chain | undefined)[] = [];
  const chainOf = (index: number, segment: Segment, box: Box): Chain =>
    (chains[index] ??= { points: flatten([segment], flatness), box });
  const count = outline.length;
  for (let i = 0; i < count; i += 1) {
    const [first, a] = [outline[i], boxes[i]];
    if (!first || !a) continue;
    for (let j = first.kind === 'line' ? i + 1 : i; j < count; j += 1) {
      const [second, b] = [outline[j], boxes[j]];
      if (!second || !b || apart(a, b)) continue;
      const one = chainOf(i, first, a);
      const other = chainOf(j, second, b);
      const found = crossing(one, other, (k, l) => {
        if (i === j) return l <= k + 1;
        const follows = j === i + 1 && k === one.points.length - 1 && l === 1;
        const closes = i === 0 && j === count - 1 && k === 1 && l === other.points.length - 1;
        return follows || closes;
      });
      if (found) return found;
    }
  }
  return undefined;
}

/** Area inside a closed outline, mm²; positive where it runs clockwise on the page. */
export function areaInside(outline: Path): number {
  const chain = flatten(outline, 1);
  let twice = 0;
  for (let i = 1; i < chain.length; i += 1) {
    const a = chain[i - 1];
    const b = chain[i];
    if (a && b) twice += a.x * b.y - b.x * a.y;
  }
  return twice / 2;
}
