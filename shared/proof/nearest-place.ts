import { pointAt, velocityAt } from '../geometry/curve.ts';
import type { Line, Path, Segment } from '../geometry/path.ts';
import { type Point, distance, dot, subtract } from '../geometry/point.ts';
import { boxOf } from './crossing-itself.ts';

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

/** How far a point lies from the box round a stretch, and so at least from the stretch. */
function fromBox(segment: Segment, at: Point): number {
  const { left, right, top, bottom } = boxOf(segment);
  const across = Math.max(left - at.x, 0, at.x - right);
  const down = Math.max(top - at.y, 0, at.y - bottom);
  return Math.hypot(across, down);
}

/**
 * The place on a path nearest a point; no answer where none lies within the distance asked about.
 */
export function nearestPlace(path: Path, at: Point, within = Infinity): NearestPlace | undefined {
  let best: NearestPlace | undefined;
  let least = within;
  const consider = (segment: Segment, index: number, t: number): void => {
    const off = distance(pointAt(segment, t), at);
    if (off > least || (best && off >= least)) return;
    best = { index, t, off };
    least = off;
  };
  for (const [index, segment] of path.entries()) {
    if (fromBox(segment, at) > least) continue;
    if (segment.kind === 'line') {
      consider(segment, index, onLine(segment, at));
      continue;
    }
    let before = growth(segment, at, 0);
    for (let i = 1; i <= shares; i += 1) {
      const after = growth(segment, at, i / shares);
      // The distance falls and then grows: a nearest place lies between.
      if (before < 0 && after >= 0) {
        consider(segment, index, narrowed(segment, at, (i - 1) / shares, i / shares));
      }
      before = after;
    }
    consider(segment, index, 0);
    consider(segment, index, 1);
  }
  return best;
}
