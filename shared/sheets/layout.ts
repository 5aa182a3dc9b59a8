import { flatten } from '../geometry/curve.ts';
import { type Motion, moved } from '../geometry/motion.ts';
import type { Point } from '../geometry/point.ts';
import type { FinishedPiece } from '../drafting/piece.ts';

/** How far the chain of points may lie off a cutting line, mm: well inside a pencil line. */
const tolerance = 0.1;

/** A piece reduced to what arranging and tiling ask of it: its cutting line as a chain of points. */
export type Shape = { readonly piece: string; readonly chain: readonly Point[] };

export type Box = {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
};

/** A shape laid on the drawing by a rigid motion; never mirrored, never resized. */
export type Placement = { readonly shape: Shape; readonly motion: Motion };

/** Pieces laid out on one large drawing whose top left corner is 0, 0; mm. */
export type Layout = {
  readonly width: number;
  readonly height: number;
  readonly placements: readonly Placement[];
};

/** The shape of a finished piece. */
export const shapeOf = (piece: FinishedPiece): Shape => ({
  piece: piece.name,
  chain: flatten(piece.cutLine, tolerance),
});

/** The smallest upright box round some points; a box without size at 0, 0 round none. */
export function boxOf(points: readonly Point[]): Box {
  let [left, top, right, bottom] = [Infinity, Infinity, -Infinity, -Infinity];
  for (const { x, y } of points) {
    left = Math.min(left, x);
    top = Math.min(top, y);
    right = Math.max(right, x);
    bottom = Math.max(bottom, y);
  }
  if (left > right) return { x: 0, y: 0, width: 0, height: 0 };
  return { x: left, y: top, width: right - left, height: bottom - top };
}

/** The chain of a placed shape in the drawing's own coordinates. */
export const placedChain = ({ shape, motion }: Placement): readonly Point[] =>
  shape.chain.map((each) => moved(each, motion));
