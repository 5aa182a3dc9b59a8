import { flatten } from '../geometry/curve.ts';
import type { Path, Segment } from '../geometry/path.ts';
import type { Point } from '../geometry/point.ts';

/** Chords this near the curve show whether two stretches cross. */
const flatness = 0.1;

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

/** First place at which two chains of chords cross; `skip` leaves out the chords at a shared end. */
function crossing(
  one: readonly Point[],
  other: readonly Point[],
  skip: (i: number, j: number) => boolean,
): Point | undefined {
  for (let i = 1; i < one.length; i += 1) {
    const a = one[i - 1];
    const b = one[i];
    if (!a || !b) continue;
    for (let j = 1; j < other.length; j += 1) {
      const c = other[j - 1];
      const d = other[j];
      if (c && d && !skip(i, j) && cross(a, b, c, d)) return b;
    }
  }
  return undefined;
}

/** A stretch shorter than this is a point of the outline, mm. */
const shortest = 1e-6;

const hasLength = (segment: Segment): boolean => {
  const { left, right, top, bottom } = boxOf(segment);
  return right - left > shortest || bottom - top > shortest;
};

/** Where a closed outline crosses itself, near enough to point at; no answer where it never does. */
export function crossesItself(closed: Path): Point | undefined {
  const outline = closed.filter(hasLength);
  const boxes = outline.map(boxOf);
  const chains: (readonly Point[] | undefined)[] = [];
  const chainOf = (index: number): readonly Point[] => {
    const segment = outline[index];
    return (chains[index] ??= segment ? flatten([segment], flatness) : []);
  };
  const count = outline.length;
  for (let i = 0; i < count; i += 1) {
    for (let j = i; j < count; j += 1) {
      const a = boxes[i];
      const b = boxes[j];
      if (!a || !b || apart(a, b) || (i === j && outline[i]?.kind === 'line')) continue;
      const one = chainOf(i);
      const other = chainOf(j);
      const found = crossing(one, other, (k, l) => {
        if (i === j) return l <= k + 1;
        const follows = j === i + 1 && k === one.length - 1 && l === 1;
        const closes = i === 0 && j === count - 1 && k === 1 && l === other.length - 1;
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
