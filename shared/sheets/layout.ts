import { flatten } from '../geometry/curve.ts';
import { type Motion, moved } from '../geometry/motion.ts';
import type { Point } from '../geometry/point.ts';
import type { FinishedPiece } from '../drafting/piece.ts';
import type { LineChoice } from './print-order.ts';

/** How far the chain of points may lie off a cutting line, mm: well inside a pencil line. */
const tolerance = 0.1;

/** Room between pieces, so that scissors get round each; mm. */
export const gap = 6;

/** A short line that no seam between sheets should part: a notch. */
export type Spot = readonly [Point, Point];

/** A piece reduced to what arranging and tiling ask of it: its outermost line as a chain of points. */
export type Shape = {
  /** Name of its drawing. */
  readonly piece: string;
  readonly chain: readonly Point[];
  readonly spots?: readonly Spot[];
  /** Never turned: it is read, not cut. */
  readonly upright?: true;
};

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

/** The shape of a finished piece: its cutting line, or its finished line where that alone is drawn. */
export const shapeOf = (
  piece: FinishedPiece,
  lines: LineChoice = 'both',
  name = piece.name,
): Shape => ({
  piece: name,
  chain: flatten(
    lines === 'finished' ? piece.edges.flatMap((each) => each.path) : piece.cutLine,
    tolerance,
  ),
  spots: piece.notchMarks.flatMap(({ strokes }) =>
    strokes.map((each): Spot => [each.from, each.to]),
  ),
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
