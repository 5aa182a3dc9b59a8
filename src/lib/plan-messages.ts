import type { FinishedPiece } from '#shared/drafting/piece.ts';
import type { PlanProgress, PrintOrder } from '#shared/sheets/print-order.ts';
import type { SheetPlan } from '#shared/sheets/sheet-plan.ts';
import type { Problem } from '#shared/units/problem.ts';

/** What the planning thread is asked for. */
export type PlanTask = {
  readonly pieces: readonly FinishedPiece[];
  readonly order: PrintOrder;
};

/** What it tells: how far it is, the plan, or why there is none. */
export type PlanNews =
  | { readonly kind: 'progress'; readonly progress: PlanProgress }
  | { readonly kind: 'plan'; readonly plan: SheetPlan }
  | { readonly kind: 'refused'; readonly problem: Problem };
