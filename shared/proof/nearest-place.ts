import { pointAt, velocityAt } from '../geometry/curve.ts';
import type { Line, Path, Segment } from '../geometry/path.ts';
import { type Point, distance, dot, subtract } from '../geometry/point.ts';

/** A place on a path by stretch and share, and how far from it the point asked about lies, mm. */
export type NearestPlace = { readonly index: number; readonly t: number; readonly off: number };

/** A curve is first looked at in this many equal shares. */
const shares = 8;
/** Then the place is closed in on at most this often. */
const roundsAtMost = 40;
/** Near enough: this share of a stretch. */
const enough = 1e-10;

const between0and1 = (t: number): number => Math.min(1, Math.max(0, t));

function onLine({ from, to }: Line, at: Point): number {
  const along = subtract(to, from);
  const size = dot(along, along);
  return size === 0 ? 0 : between0and1(dot(subtract(at, from), along) / size);
}

/** How fast the square of the distance grows at a share: zero at the nearest place. */
const growth = (segment: Segment, at: Point, t: number): number =>
  dot(subtract(pointAt(segment, t), at), velocityAt(segment, t));

/** Share nearest a point between two shares that hold one nearest place (regula falsi, Illinois). */
function narrowed(segment: Segment, at: Point, low: number, high: number): number {
  let [a, b] = [low, high];
  let [growthA, growthB] = [growth(segment, at, a), growth(segment, at, b)];
  if (growthA >= 0) return a;
  if (growthB <= 0) return b;
  let side = 0;
  let t = a;
  for (let i = 0; i < roundsAtMost && b - a > enough; i += 1) {
    const last = t;
    t = (growthB * a - growthA * b) / (growthB - growthA);
    const here = growth(segment, at, t);
    if (here === 0 || Math.abs(t - last) < enough) return t;
    if (here > 0) {
      [b, growthB] = [t, here];
      if (side === 1) growthA /= 2;
      side = 1;
    } else {
      [a, growthA] = [t, here];
      if (side === -1) growthB /= 2;
      side = -1;
    }
  }
  return t;
}

/** Shares of a curve between which a place nearer than `best` may lie. */
function candidates(
  segment: Segment,
  at: Point,
  best: number,
): readonly (readonly [number, number])[] {
  const looks = Array.from({ length: shares + 1 }, (_, i) => pointAt(segment, i / shares));
  const offs = looks.map((each) => distance(each, at));
  return looks.flatMap((here, i) => {
    const own = offs[i] ?? Infinity;
    const [before, after] = [looks[i - 1] ?? here, looks[i + 1] ?? here];
    if (own > (offs[i - 1] ?? Infinity) || own > (offs[i + 1] ?? Infinity)) return [];
    if (own - Math.max(distance(here, before), distance(here, after)) > best) return [];
    return [[between0and1((i - 1) / shares), between0and1((i + 1) / shares)] as const];
  });
}

/** The place on a path nearest a point; no answer for an empty path. */
export function nearestPlace(path: Path, at: Point): NearestPlace | undefined {
  let best: NearestPlace | undefined;
  const consider = (segment: Segment, index: number, t: number): void => {
    const off = distance(pointAt(segment, t), at);
    if (best === undefined || off < best.off) best = { index, t, off };
  };
  path.forEach((segment, index) => {
    if (segment.kind === 'line') {
      consider(segment, index, onLine(segment, at));
      return;
    }
    for (const [low, high] of candidates(segment, at, best?.off ?? Infinity)) {
      consider(segment, index, narrowed(segment, at, low, high));
    }
    consider(segment, index, 0);
    consider(segment, index, 1);
  });
  return best;
}
