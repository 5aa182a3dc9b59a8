import type { Pair, SegmentParts } from 'paper/dist/paper-core.js';

import type { Path } from '#shared/geometry/path.ts';
import { add, scale, subtract, type Point } from '#shared/geometry/point.ts';

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

/** An arrowhead grown about its tip: 5 mm is plain to see on paper and lost on a screen. */
export function enlarged(corners: readonly Point[]): readonly Point[] {
  const tip = corners[0];
  if (tip === undefined) return corners;
  return corners.map((each) => add(tip, scale(subtract(each, tip), 2.4)));
}
