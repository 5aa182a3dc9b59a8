import { pointAt } from '#shared/geometry/curve.ts';
import type { Path } from '#shared/geometry/path.ts';
import type { Point } from '#shared/geometry/point.ts';

/** A path as a chain of points, so many to a curve: plain sampling, unlike the engine's flattening. */
export const sampled = (path: Path, each = 24): readonly Point[] =>
  path.flatMap((segment) =>
    segment.kind === 'line'
      ? [segment.from]
      : Array.from({ length: each }, (_, i) => pointAt(segment, i / each)),
  );

const side = (a: Point, b: Point, p: Point): number =>
  (b.x - a.x) * (p.y - a.y) - (b.y - a.y) * (p.x - a.x);

/** Whether no two sides of a closed chain cross: every pair is tried. */
export function isSimple(chain: readonly Point[]): boolean {
  const next = (i: number): Point => chain[(i + 1) % chain.length] ?? { x: 0, y: 0 };
  return chain.every((a, i) =>
    chain.every((c, j) => {
      const [b, d] = [next(i), next(j)];
      if (j <= i + 1 || (i === 0 && j === chain.length - 1)) return true;
      return !(side(a, b, c) * side(a, b, d) < 0 && side(c, d, a) * side(c, d, b) < 0);
    }),
  );
}

/** Area inside a closed chain, mm²; positive when it runs clockwise on the page. */
export const clockwiseArea = (chain: readonly Point[]): number =>
  chain.reduce((sum, a, i) => {
    const b = chain[(i + 1) % chain.length] ?? a;
    return sum + (a.x * b.y - b.x * a.y) / 2;
  }, 0);

/** A path as an open chain with its end, finely sampled. */
export const finely = (path: Path): readonly Point[] => [
  ...sampled(path, 100),
  ...path.slice(-1).map(({ to }) => to),
];

/** How far a point is from an open chain, and whether the nearest place is not one of its two ends. */
export function nearest(chain: readonly Point[], from: Point): { away: number; inside: boolean } {
  let away = Infinity;
  let inside = false;
  chain.forEach((b, i) => {
    const a = chain[i - 1];
    if (!a) return;
    const size = (b.x - a.x) ** 2 + (b.y - a.y) ** 2;
    const raw = ((from.x - a.x) * (b.x - a.x) + (from.y - a.y) * (b.y - a.y)) / size;
    const t = Math.max(0, Math.min(1, raw));
    const own = Math.hypot(a.x + t * (b.x - a.x) - from.x, a.y + t * (b.y - a.y) - from.y);
    if (own >= away) return;
    away = own;
    inside = !(i === 1 && raw <= 0) && !(i === chain.length - 1 && raw >= 1);
  });
  return { away, inside };
}

/** Whether a place lies inside a closed chain. */
export function isInside(chain: readonly Point[], p: Point): boolean {
  let inside = false;
  chain.forEach((a, i) => {
    const b = chain[(i + 1) % chain.length] ?? a;
    if (a.y > p.y !== b.y > p.y && p.x < a.x + ((p.y - a.y) / (b.y - a.y)) * (b.x - a.x)) {
      inside = !inside;
    }
  });
  return inside;
}
