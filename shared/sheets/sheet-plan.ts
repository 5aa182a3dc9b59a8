import type { FinishedPiece } from '../drafting/piece.ts';
import { arrange } from './arrange.ts';
import { type Layout, shapeOf } from './layout.ts';
import { type PaperName, papers } from './papers.ts';
import { type Selection, choosePieces } from './selection.ts';
import { type TilePlan, planTiles } from './tile-plan.ts';

/** How a choice of pieces is printed: where they lie, and on which sheets. */
export type SheetPlan = {
  readonly layout: Layout;
  readonly plan: TilePlan;
  /** Sheets of paper, the cover page counted. */
  readonly sheets: number;
};

/** The sheets for a choice of pieces on a paper; no PDF is made, so it is quick enough to stand beside a button. */
export function planSheets(
  pieces: readonly FinishedPiece[],
  { paper, selection }: { readonly paper: PaperName; readonly selection: Selection },
): SheetPlan {
  const sheet = papers[paper];
  const layout = arrange(choosePieces(pieces, selection).map(shapeOf), sheet);
  const plan = planTiles(layout, sheet);
  return { layout, plan, sheets: plan.tiles.length + 1 };
}
