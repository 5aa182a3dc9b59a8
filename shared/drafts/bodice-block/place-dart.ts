import { type DartPlace, moveDart } from '../../drafting/move-dart.ts';
import type { Piece } from '../../drafting/piece.ts';
import { seamInStretches, seamOf } from '../../drafting/seam-stretches.ts';
import { pathLength } from '../../geometry/curve.ts';
import type { Point } from '../../geometry/point.ts';
import { bustDart } from './pieces.ts';
import type { BustDartPlace } from './style-card.ts';

/** A side dart opens this far under the bust line, so that it points up to the bust (common practice, no source). */
const sideBelowBust = 40;
/** At most this part of the side seam down. */
const lowestOnSide = 0.6;

const lengthOf = (piece: Piece, name: string): number =>
  pathLength(piece.edges.find((edge) => edge.name === name)?.path ?? []);

/** Where on the front a place named on the style card lies. */
function placeOn(
  front: Piece,
  place: BustDartPlace,
  figures: { readonly upright: number; readonly bustNotch: number; readonly bustPoint: Point },
): DartPlace {
  if (place === 'armhole') return { edge: 'armhole', at: figures.upright };
  if (place === 'side') {
    const most = lowestOnSide * lengthOf(front, 'side');
    return { edge: 'side', at: Math.min(most, figures.bustNotch + sideBelowBust) };
  }
  if (place === 'neck') return { edge: 'neck', at: lengthOf(front, 'neck') / 2 };
  if (front.darts.some((dart) => dart.name === 'waist')) return { dart: 'waist' };
  const waist = front.edges.find((edge) => edge.name === 'waist');
  const reach = (waist?.path[0]?.from.x ?? 0) - figures.bustPoint.x;
  return { edge: 'waist', at: Math.max(1, reach) };
}

/** The bust dart turned from the shoulder to the seam chosen. */
export function placeBustDart(
  front: Piece,
  place: BustDartPlace,
  figures: { readonly upright: number; readonly bustNotch: number; readonly bustPoint: Point },
): Piece {
  if (place === 'shoulder') return front;
  const moved = moveDart(front, bustDart, figures.bustPoint, placeOn(front, place, figures));
  if (!moved) throw new Error(`the bust dart finds no place in the ${place}`);
  return moved;
}

/** The back with its seams in as many stretches as the front's beside them. */
export function backToMatch(back: Piece, front: Piece): Piece {
  return ['shoulder', 'side'].reduce((piece, seam) => {
    const shares = front.edges
      .filter((edge) => edge.open !== true && seamOf(edge.name) === seam)
      .map((edge) => pathLength(edge.path));
    return shares.length < 2 ? piece : seamInStretches(piece, seam, shares);
  }, back);
}
