import type { Point } from '../geometry/point.ts';

/** A stretch along a line, mm: from, to. */
export type Run = readonly [number, number];

/** Runs in order, those that touch made one. */
export function merged(runs: readonly Run[]): readonly Run[] {
  const sorted = [...runs].sort((a, b) => a[0] - b[0]);
  const out: Run[] = [];
  let last: Run | undefined;
  for (const [from, to] of sorted) {
    if (last && from <= last[1]) {
      last = [last[0], Math.max(last[1], to)];
      out[out.length - 1] = last;
    } else {
      last = [from, to];
      out.push(last);
    }
  }
  return out;
}

/**
 * Where a closed chain lies between two heights, as stretches of x: the stretches its edges pass there,
 * and what lies inside it halfway. No part of it between the heights is left out.
 */
export function runsBetween(chain: readonly Point[], top: number, bottom: number): readonly Run[] {
  const middle = (top + bottom) / 2;
  const runs: Run[] = [];
  const crossings: number[] = [];
  let before = chain[chain.length - 1];
  for (const here of chain) {
    if (before) {
      const [high, low] = before.y < here.y ? [before, here] : [here, before];
      if (low.y >= top && high.y <= bottom) {
        const slope = low.y > high.y ? (low.x - high.x) / (low.y - high.y) : 0;
        const a = high.y < top ? high.x + slope * (top - high.y) : high.x;
        const b = low.y > bottom ? high.x + slope * (bottom - high.y) : low.x;
        runs.push(a < b ? [a, b] : [b, a]);
        if (high.y <= middle && low.y > middle) crossings.push(high.x + slope * (middle - high.y));
      }
    }
    before = here;
  }
  crossings.sort((a, b) => a - b);
  for (let i = 0; i + 1 < crossings.length; i += 2) {
    runs.push([crossings[i] ?? 0, crossings[i + 1] ?? 0]);
  }
  return merged(runs);
}
