import { type Cubic, type Path, type Segment, cubic, line } from './path.ts';
import { type Point, add, between, distance, dot, scale, subtract, unit } from './point.ts';
import { gaussLegendre } from './quadrature.ts';

/** The place at share t (0 to 1) of a stretch. */
export function pointAt(segment: Segment, t: number): Point {
  if (segment.kind === 'line') return between(segment.from, segment.to, t);
  const s = 1 - t;
  const a = s * s * s;
  const b = 3 * s * s * t;
  const c = 3 * s * t * t;
  const d = t * t * t;
  const { from, c1, c2, to } = segment;
  return {
    x: a * from.x + b * c1.x + c * c2.x + d * to.x,
    y: a * from.y + b * c1.y + c * c2.y + d * to.y,
  };
}

/** Rate of travel at share t, not of length one; may be zero where a handle lies on its end. */
export function velocityAt(segment: Segment, t: number): Point {
  if (segment.kind === 'line') return subtract(segment.to, segment.from);
  const s = 1 - t;
  const a = 3 * s * s;
  const b = 6 * s * t;
  const c = 3 * t * t;
  const { from, c1, c2, to } = segment;
  return {
    x: a * (c1.x - from.x) + b * (c2.x - c1.x) + c * (to.x - c2.x),
    y: a * (c1.y - from.y) + b * (c2.y - c1.y) + c * (to.y - c2.y),
  };
}

/** Direction of travel at share t, length one; looks along to the next handle where one is missing. */
export function tangentAt(segment: Segment, t: number): Point {
  const here = velocityAt(segment, t);
  if (Math.hypot(here.x, here.y) > 1e-9) return unit(here);
  const aside =
    t < 0.5
      ? subtract(pointAt(segment, t + 1e-4), pointAt(segment, t))
      : subtract(pointAt(segment, t), pointAt(segment, t - 1e-4));
  return unit(aside);
}

/** The two parts of a stretch either side of share t. */
export function splitSegment(segment: Segment, t: number): readonly [Segment, Segment] {
  if (segment.kind === 'line') {
    const at = between(segment.from, segment.to, t);
    return [line(segment.from, at), line(at, segment.to)];
  }
  const { from, c1, c2, to } = segment;
  const a = between(from, c1, t);
  const m = between(c1, c2, t);
  const d = between(c2, to, t);
  const b = between(a, m, t);
  const c = between(m, d, t);
  const at = between(b, c, t);
  return [cubic(from, a, b, at), cubic(at, c, d, to)];
}

/** The same stretch travelled the other way. */
export const reverseSegment = (segment: Segment): Segment =>
  segment.kind === 'line'
    ? line(segment.to, segment.from)
    : cubic(segment.to, segment.c2, segment.c1, segment.from);

/** The same path travelled the other way. */
export const reverse = (path: Path): Path => path.map(reverseSegment).reverse();

function gauss(segment: Cubic, t0: number, t1: number): number {
  return gaussLegendre(
    (t) => {
      const speed = velocityAt(segment, t);
      return Math.sqrt(speed.x * speed.x + speed.y * speed.y);
    },
    t0,
    t1,
  );
}

function adaptive(segment: Cubic, t0: number, t1: number, whole: number, depth: number): number {
  const mid = (t0 + t1) / 2;
  const left = gauss(segment, t0, mid);
  const right = gauss(segment, mid, t1);
  if (depth === 0 || Math.abs(left + right - whole) < 1e-7) return left + right;
  return adaptive(segment, t0, mid, left, depth - 1) + adaptive(segment, mid, t1, right, depth - 1);
}

/** Length of a stretch, mm, within 1e-6 where it has no cusp: eight-point Gauss-Legendre, halved until two depths agree. */
export function segmentLength(segment: Segment): number {
  if (segment.kind === 'line') return distance(segment.from, segment.to);
  return adaptive(segment, 0, 1, gauss(segment, 0, 1), 12);
}

/** Length of a gentle stretch in two halves, mm: within 1e-7 where it turns by less than 60 degrees. */
export const gentleLength = (segment: Cubic): number =>
  gauss(segment, 0, 0.5) + gauss(segment, 0.5, 1);

/** Length of a path, mm. */
export const pathLength = (path: Path): number =>
  path.reduce((sum, segment) => sum + segmentLength(segment), 0);

/** Where a path starts; no answer for an empty one. */
export const startOf = (path: Path): Point | undefined => path[0]?.from;

/** Where a path ends; no answer for an empty one. */
export const endOf = (path: Path): Point | undefined => path[path.length - 1]?.to;

/** Direction in which a path sets out. */
export const startTangent = (path: Path): Point => {
  const first = path[0];
  return first ? tangentAt(first, 0) : { x: 0, y: 0 };
};

/** Direction in which a path arrives. */
export const endTangent = (path: Path): Point => {
  const last = path[path.length - 1];
  return last ? tangentAt(last, 1) : { x: 0, y: 0 };
};

/** Share of a stretch at which `length` mm of it are behind. */
function shareAtLength(segment: Segment, length: number): number {
  const whole = segmentLength(segment);
  if (whole === 0) return 0;
  let t = Math.min(1, Math.max(0, length / whole));
  if (segment.kind === 'line') return t;
  for (let i = 0; i < 12; i += 1) {
    const off = segmentLength(splitSegment(segment, t)[0]) - length;
    if (Math.abs(off) < 1e-8) break;
    const speed = velocityAt(segment, t);
    t = Math.min(1, Math.max(0, t - off / Math.max(1e-9, Math.hypot(speed.x, speed.y))));
  }
  return t;
}

/** A place on a path, which stretch it is on and the direction of travel there. */
export type Station = {
  readonly index: number;
  readonly t: number;
  readonly at: Point;
  readonly tangent: Point;
};

/** The place `length` mm along a path, kept between its ends; no answer for an empty path. */
export function stationAtLength(path: Path, length: number): Station | undefined {
  let left = Math.max(0, length);
  for (let index = 0; index < path.length; index += 1) {
    const segment = path[index];
    if (!segment) break;
    const own = segmentLength(segment);
    if (left <= own || index === path.length - 1) {
      const t = shareAtLength(segment, Math.min(left, own));
      return { index, t, at: pointAt(segment, t), tangent: tangentAt(segment, t) };
    }
    left -= own;
  }
  return undefined;
}

/** Length of path before a station. */
export function lengthBefore(path: Path, station: { index: number; t: number }): number {
  let sum = 0;
  for (let index = 0; index < station.index; index += 1) {
    const segment = path[index];
    if (segment) sum += segmentLength(segment);
  }
  const last = path[station.index];
  return last ? sum + segmentLength(splitSegment(last, station.t)[0]) : sum;
}

/** The two parts of a path either side of a station; ends too short to matter are dropped. */
export function splitPath(
  path: Path,
  station: { index: number; t: number },
): readonly [Path, Path] {
  const { index, t } = station;
  const segment = path[index];
  if (!segment) return [path, []];
  const before = path.slice(0, index);
  const after = path.slice(index + 1);
  if (t <= 1e-9) return [before, [segment, ...after]];
  if (t >= 1 - 1e-9) return [[...before, segment], after];
  const [head, tail] = splitSegment(segment, t);
  return [
    [...before, head],
    [tail, ...after],
  ];
}

/** Real roots in [0, 1] of a t^3 + b t^2 + c t + d, a little beyond the ends forgiven. */
function rootsInUnit(a: number, b: number, c: number, d: number): readonly number[] {
  const found: number[] = [];
  const keep = (t: number): void => {
    if (t > -1e-9 && t < 1 + 1e-9) found.push(Math.min(1, Math.max(0, t)));
  };
  const size = Math.max(Math.abs(a), Math.abs(b), Math.abs(c), Math.abs(d));
  if (size === 0) return found;
  if (Math.abs(a) < 1e-12 * size) {
    if (Math.abs(b) < 1e-12 * size) {
      if (Math.abs(c) > 1e-12 * size) keep(-d / c);
      return found;
    }
    const under = c * c - 4 * b * d;
    if (under < 0) return found;
    const q = -0.5 * (c + Math.sign(c || 1) * Math.sqrt(under));
    keep(q / b);
    if (q !== 0) keep(d / q);
    return found;
  }
  const p = b / a;
  const q = c / a;
  const r = d / a;
  const third = p / 3;
  const m = (p * p - 3 * q) / 9;
  const n = (2 * p * p * p - 9 * p * q + 27 * r) / 54;
  const polish = (t: number): number => {
    let root = t;
    for (let i = 0; i < 3; i += 1) {
      const slope = (3 * root + 2 * p) * root + q;
      if (slope === 0) break;
      root -= (((root + p) * root + q) * root + r) / slope;
    }
    return root;
  };
  if (n * n < m * m * m) {
    const angle = Math.acos(Math.max(-1, Math.min(1, n / Math.sqrt(m * m * m))));
    const reach = -2 * Math.sqrt(m);
    for (let k = -1; k <= 1; k += 1)
      keep(polish(reach * Math.cos((angle + k * 2 * Math.PI) / 3) - third));
    return found;
  }
  const big = -Math.sign(n) * Math.cbrt(Math.abs(n) + Math.sqrt(Math.max(0, n * n - m * m * m)));
  keep(polish(big + (big === 0 ? 0 : m / big) - third));
  return found;
}

/** Shares at which a stretch crosses the endless line through `from` and `to`. */
export function crossingsOfLine(segment: Segment, from: Point, to: Point): readonly number[] {
  const along = subtract(to, from);
  const height = (p: Point): number => along.x * (p.y - from.y) - along.y * (p.x - from.x);
  const h0 = height(segment.from);
  const h3 = height(segment.to);
  if (segment.kind === 'line') return rootsInUnit(0, 0, h3 - h0, h0);
  const h1 = height(segment.c1);
  const h2 = height(segment.c2);
  // A curve lies within its handles: all on one side, it crosses nowhere.
  if (Math.min(h0, h1, h2, h3) > 0 || Math.max(h0, h1, h2, h3) < 0) return [];
  return rootsInUnit(h3 - 3 * h2 + 3 * h1 - h0, 3 * (h2 - 2 * h1 + h0), 3 * (h1 - h0), h0);
}

/** Places at which a path crosses the endless line through `from` and `to`, in order of travel. */
export function pathCrossings(path: Path, from: Point, to: Point): readonly Station[] {
  return path.flatMap((segment, index) =>
    [...crossingsOfLine(segment, from, to)]
      .sort((a, b) => a - b)
      .map((t) => ({ index, t, at: pointAt(segment, t), tangent: tangentAt(segment, t) })),
  );
}

/** A path as a chain of points no farther than `tolerance` mm from it, both ends included. */
export function flatten(path: Path, tolerance: number): readonly Point[] {
  const first = path[0];
  if (!first) return [];
  const chain: Point[] = [first.from];
  for (const segment of path) {
    if (segment.kind === 'cubic') {
      const bend1 = subtract(add(segment.from, segment.c2), scale(segment.c1, 2));
      const bend2 = subtract(add(segment.c1, segment.to), scale(segment.c2, 2));
      const bend = Math.sqrt(Math.max(dot(bend1, bend1), dot(bend2, bend2)));
      // Chord error of n equal shares is at most 6 bend / (8 n^2): the second derivative's bound.
      const n = Math.max(1, Math.ceil(Math.sqrt((0.75 * bend) / tolerance)));
      for (let i = 1; i < n; i += 1) chain.push(pointAt(segment, i / n));
    }
    chain.push(segment.to);
  }
  return chain;
}
