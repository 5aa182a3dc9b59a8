import type { Pair, SegmentParts } from 'paper/dist/paper-core.js';

import type { Path } from '#shared/geometry/path.ts';
import { add, distance, scale as times, subtract, type Point } from '#shared/geometry/point.ts';

/** A line as paper takes it. */
export type Line = { readonly segments: readonly SegmentParts[]; readonly closed: boolean };

/** A path as paper takes it: places, each with its incoming and outgoing handle. */
export function traced(path: Path, by: Point, closed: boolean): Line {
  const pair = (p: Point): Pair => [p.x + by.x, p.y + by.y];
  const handle = (from: Point, to: Point): Pair => [to.x - from.x, to.y - from.y];
  const none: Pair = [0, 0];
  const segments = path.map((each, index): SegmentParts => {
    const before = index > 0 ? path[index - 1] : closed ? path.at(-1) : undefined;
    const incoming = before?.kind === 'cubic' ? handle(each.from, before.c2) : none;
    return [pair(each.from), incoming, each.kind === 'cubic' ? handle(each.from, each.c1) : none];
  });
  const last = path.at(-1);
  if (!closed && last !== undefined) {
    segments.push([pair(last.to), last.kind === 'cubic' ? handle(last.to, last.c2) : none, none]);
  }
  return { segments, closed };
}

/** A straight line from one place to another. */
export const straight = (from: Point, to: Point): Line => ({
  segments: [[[from.x, from.y]], [[to.x, to.y]]],
  closed: false,
});

/** Length of an arrowhead on screen, pixels, and the longest it may become on the paper, mm. */
const head = { shown: 9, longest: 45 };

/** An arrowhead drawn out or in about its tip, so that it is plain to see at every zoom and never large. */
export function resized(corners: readonly Point[], scale: number): readonly Point[] {
  const [tip, wing] = corners;
  if (tip === undefined || wing === undefined) return corners;
  const long = Math.min(head.shown / scale, head.longest);
  return corners.map((each) => add(tip, times(subtract(each, tip), long / distance(tip, wing))));
}
