import { pointAt } from '../geometry/curve.ts';
import type { Line, Path, Segment } from '../geometry/path.ts';
import { type Point, distance, dot, subtract } from '../geometry/point.ts';

/** A place on a path by stretch and share, and how far from it the point asked about lies, mm. */
export type NearestPlace = { readonly index: number; readonly t: number; readonly off: number };

/** A curve is first looked at in this many equal shares. */
const shares = 8;
/** Then the nearest share is narrowed down this often, each time to less than two thirds. */
const narrowings = 26;
const golden = (Math.sqrt(5) - 1) / 2;

const between0and1 = (t: number): number => Math.min(1, Math.max(0, t));

function onLine({ from, to }: Line, at: Point): number {
  const along = subtract(to, from);
  const size = dot(along, along);
  return size === 0 ? 0 : between0and1(dot(subtract(at, from), along) / size);
}

/** Share nearest a point between two shares that hold one nearest place. */
function narrowed(segment: Segment, at: Point, low: number, high: number): number {
  const off = (t: number): number => distance(pointAt(segment, t), at);
  let [a, b] = [low, high];
  let [c, d] = [b - golden * (b - a), a + golden * (b - a)];
  let [offC, offD] = [off(c), off(d)];
  for (let i = 0; i < narrowings; i += 1) {
    if (offC < offD) {
      [b, d, offD] = [d, c, offC];
      c = b - golden * (b - a);
      offC = off(c);
    } else {
      [a, c, offC] = [c, d, offD];
      d = a + golden * (b - a);
      offD = off(d);
    }
  }
  return (a + b) / 2;
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
