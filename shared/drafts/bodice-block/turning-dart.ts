import { moveDart } from '../../drafting/move-dart.ts';
import type { Piece } from '../../drafting/piece.ts';
import { seamOf } from '../../drafting/seam-stretches.ts';
import { endOf, pathLength } from '../../geometry/curve.ts';
import type { Point } from '../../geometry/point.ts';
import { divideDart, secondBustDart } from './divide-dart.ts';
import { bustDart } from './pieces.ts';

/** Where a front has its bust dart, told for a front that has it elsewhere. */
function placeIn(front: Piece): { readonly edge: string; readonly at: number } | undefined {
  const dart = front.darts.find(({ name }) => name === bustDart);
  const index = front.edges.findIndex(({ name }) => name === dart?.mouth);
  const before = front.edges[index - 1];
  return before && { edge: seamOf(before.name), at: pathLength(before.path) };
}

/**
 * A front on the way from one place of its bust dart to another: `part` of the angle has been turned, from 0 to 1.
 * No answer where the two share a seam, or where neither has the dart apart from its waist dart.
 */
export function turningFront(
  from: Piece,
  to: Piece,
  bustPoint: Point,
  part: number,
): Piece | undefined {
  const own = from.darts.find(({ name }) => name === bustDart);
  if (!own) {
    const back = to.darts.some(({ name }) => name === bustDart);
    return back ? turningFront(to, from, bustPoint, 1 - part) : undefined;
  }
  if (part <= 0) return from;
  const place = placeIn(to);
  const waist = from.darts.find(({ name, centreLeg }) => {
    const tip = endOf(centreLeg);
    return name === 'waist' && tip?.x === bustPoint.x && tip.y === bustPoint.y;
  });
  const target = place ?? (waist && { dart: waist.name });
  const share = Math.max(0.001, 1 - part);
  return target && moveDart(divideDart(from, bustDart, share), secondBustDart, bustPoint, target);
}
