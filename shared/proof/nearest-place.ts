import { pointAt, velocityAt } from '../geometry/curve.ts';
import type { Path, Segment } from '../geometry/path.ts';
import { type Point, distance, dot, subtract } from '../geometry/point.ts';

/** A place on a path by stretch and share, and how far from it the point asked about lies, mm. */
export type NearestPlace = { readonly index: number; readonly t: number; readonly off: number };

const starts: { readonly [K in Segment['kind']]: readonly number[] } = {
  line: [0.5],
  cubic: [0, 0.25, 0.5, 0.75, 1],
};

/** The place on a path nearest a point; no answer for an empty path. */
export function nearestPlace(path: Path, at: Point): NearestPlace | undefined {
  let best: NearestPlace | undefined;
  path.forEach((segment, index) => {
    let t = 0.5;
    let off = Infinity;
    for (const start of starts[segment.kind]) {
      const away = distance(pointAt(segment, start), at);
      if (away < off) [t, off] = [start, away];
    }
    for (let i = 0; i < 8; i += 1) {
      const speed = velocityAt(segment, t);
      const step =
        dot(subtract(at, pointAt(segment, t)), speed) / Math.max(1e-9, dot(speed, speed));
      t = Math.min(1, Math.max(0, t + step));
      if (Math.abs(step) < 1e-9) break;
    }
    off = distance(pointAt(segment, t), at);
    if (best === undefined || off < best.off) best = { index, t, off };
  });
  return best;
}
