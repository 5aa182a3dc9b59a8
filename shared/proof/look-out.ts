import type { FinishedPiece } from '../drafting/piece.ts';
import { crossingsOfLine, pointAt } from '../geometry/curve.ts';
import type { Segment } from '../geometry/path.ts';
import { type Point, add, dot, subtract } from '../geometry/point.ts';
import { boxOf } from './crossing-itself.ts';

/** How far inside the seam line a cutting line that has slipped would still be found, mm. */
export const inside = 5;

export type Boxed = { readonly segment: Segment; readonly box: ReturnType<typeof boxOf> };

/** The stretches of a cutting line, each with the box round it. */
export const boxedCut = (piece: FinishedPiece): readonly Boxed[] =>
  piece.cutLine.map((segment) => ({ segment, box: boxOf(segment) }));

/** A stretch that comes this near the line of sight may touch it, mm. */
const grazing = 1e-6;

/** Whether a stretch and its handles lie wholly on one side of the endless line through `at`. */
function besideLine(segment: Segment, at: Point, along: Point): boolean {
  const height = (p: Point): number => along.x * (p.y - at.y) - along.y * (p.x - at.x);
  const first = height(segment.from);
  if (Math.abs(first) < grazing) return false;
  const side = Math.sign(first);
  const beside = (p: Point): boolean => side * height(p) > grazing;
  if (!beside(segment.to)) return false;
  return segment.kind === 'line' || (beside(segment.c1) && beside(segment.c2));
}

/** Distance from a place to the cutting line along an outward direction; no answer within reach. */
export function reachCut(
  cut: readonly Boxed[],
  at: Point,
  out: Point,
  reach: number,
): number | undefined {
  const left = at.x + Math.min(-inside * out.x, reach * out.x);
  const right = at.x + Math.max(-inside * out.x, reach * out.x);
  const top = at.y + Math.min(-inside * out.y, reach * out.y);
  const bottom = at.y + Math.max(-inside * out.y, reach * out.y);
  let nearest: number | undefined;
  for (const { segment, box } of cut) {
    if (box.right < left || box.left > right || box.bottom < top || box.top > bottom) continue;
    if (besideLine(segment, at, out)) continue;
    for (const t of crossingsOfLine(segment, at, add(at, out))) {
      const away = dot(subtract(pointAt(segment, t), at), out);
      if (away < -inside || away > reach) continue;
      if (nearest === undefined || Math.abs(away) < Math.abs(nearest)) nearest = away;
    }
  }
  return nearest;
}
