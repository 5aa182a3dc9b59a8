import type { FinishedPiece } from '../drafting/piece.ts';
import { arrange } from './arrange.ts';
import { type Layout, shapeOf } from './layout.ts';
import { paperOf } from './papers.ts';
import type { PlanWatch, PrintOrder } from './print-order.ts';
import { choosePieces } from './selection.ts';
import { type TilePlan, planTiles } from './tile-plan.ts';

/** How an order is printed: where the pieces lie, and on which sheets. */
export type SheetPlan = {
  readonly order: PrintOrder;
  /** Where each piece lies on the one large drawing that the sheets show together; mm on paper. */
  readonly layout: Layout;
  /** The sheets with their names, places and neighbours, and the seams to glue. */
  readonly plan: TilePlan;
  /** Sheets of paper, the cover page counted. */
  readonly sheets: number;
};

/**
 * The sheets for an order; no PDF is made. The same pieces and order give the same plan. Throws
 * `PlanCancelledError` where the watch says so.
 */
export function planSheets(
  pieces: readonly FinishedPiece[],
  order: PrintOrder,
  _watch: PlanWatch = {},
): SheetPlan {
  const sheet = paperOf(order.paper);
  const chosen = typeof order.pieces === 'string' ? choosePieces(pieces, order.pieces) : pieces;
  const layout = arrange(chosen.map(shapeOf), sheet);
  const plan = planTiles(layout, sheet);
  return { order, layout, plan, sheets: plan.tiles.length + 1 };
}
