import type { FinishedPiece } from '../drafting/piece.ts';
import { point } from '../geometry/point.ts';
import { arrange, fullSearch } from './arrange.ts';
import { drawnPieces } from './drawn-pieces.ts';
import { type Layout, type Shape, shapeOf } from './layout.ts';
import { type Paper, paperOf } from './papers.ts';
import { PlanCancelledError } from './plan-cancelled.ts';
import type { PlanProgress, PlanWatch, PrintOrder } from './print-order.ts';
import { type TilePlan, planTiles, printedTiles } from './tile-plan.ts';

/** How an order is printed: where the pieces lie, and on which sheets. */
export type SheetPlan = {
  readonly order: PrintOrder;
  /** Where each drawing lies on the one large drawing that the sheets show together; mm on paper. */
  readonly layout: Layout;
  /** The sheets with their names, places and neighbours, and the seams to glue. */
  readonly plan: TilePlan;
  /** A sheet of its own before all others, or a drawing called `coverDrawing` among the pieces of large paper. */
  readonly cover: 'own sheet' | 'among the pieces';
  /** Sheets of paper that are printed, the cover counted. */
  readonly sheets: number;
};

/** Name of the cover where it lies among the pieces. */
export const coverDrawing = 'cover';

/** The cover among pieces is as large as A4, and leaves its margins white; mm. */
export const coverSize = { width: 210, height: 297, white: 8 } as const;

/** From this length of the shorter side on a sheet is too good for a cover alone, mm. */
const largePaper = 500;

/** Up to so many outlines are moved as often as the search asks. */
const fullyMoved = 30;

const coverShape = ({ width, height, white }: typeof coverSize): Shape => ({
  piece: coverDrawing,
  chain: [
    point(white, white),
    point(width - white, white),
    point(width - white, height - white),
    point(white, height - white),
  ],
  upright: true,
});

const turned = (paper: Paper): Paper => ({ ...paper, width: paper.height, height: paper.width });

/** The papers to try, each as it lies. */
function papersFor({ paper, orientation }: PrintOrder): readonly Paper[] {
  const named = paperOf(paper);
  const upright = named.roll || named.height >= named.width ? named : turned(named);
  if (named.roll) return [named];
  if (orientation === 'portrait') return [upright];
  return orientation === 'landscape' ? [turned(upright)] : [upright, turned(upright)];
}

/** Of a roll no more is printed than the pieces reach; a sheet stays as it is. */
const asPrinted = (paper: Paper, layout: Layout, { margin }: PrintOrder): Paper =>
  paper.roll
    ? { ...paper, height: Math.min(paper.height, Math.ceil(layout.height + 2 * margin)) }
    : paper;

function shapesFor(pieces: readonly FinishedPiece[], order: PrintOrder, cover: boolean) {
  const shapes = drawnPieces(pieces, order).flatMap(({ drawing, piece, copies }) => {
    const shape = shapeOf(piece, order.lines, drawing);
    return Array.from({ length: copies }, () => shape);
  });
  return cover && shapes.length > 0 ? [...shapes, coverShape(coverSize)] : shapes;
}

/**
 * The sheets for an order, move by move, for a thread that must hear of other things meanwhile; `moves` is
 * how many the search makes. The same pieces, order and moves give the same plan.
 */
export function* planInSteps(
  pieces: readonly FinishedPiece[],
  order: PrintOrder,
  moves: number = fullSearch,
): Generator<PlanProgress, SheetPlan> {
  const papers = papersFor(order);
  const [first] = papers;
  const among = first !== undefined && Math.min(first.width, first.height) >= largePaper;
  const shapes = shapesFor(pieces, order, among);
  // A move costs more the more there is to move: very many outlines get fewer.
  const spent = Math.round(moves * Math.min(1, fullyMoved / Math.max(1, shapes.length)));
  let best: SheetPlan | undefined;
  for (const [which, paper] of papers.entries()) {
    const search = arrange(shapes, paper, order, spent);
    let step = search.next();
    while (!step.done) {
      const { moves: made, of, sheets } = step.value;
      yield { moves: which * of + made, of: papers.length * of, sheets };
      step = search.next();
    }
    const layout = step.value;
    const plan = planTiles(layout, asPrinted(paper, layout, order), order, order.leftOut);
    const cover = among && shapes.length > 0 ? 'among the pieces' : 'own sheet';
    const sheets = printedTiles(plan).length + (cover === 'own sheet' ? 1 : 0);
    if (!best || plan.tiles.length < best.plan.tiles.length) {
      best = { order, layout, plan, cover, sheets };
    }
  }
  if (!best) throw new Error('An order has at least one paper.');
  return best;
}

/**
 * The sheets for an order; no PDF is made. The same pieces and order give the same plan. Throws
 * `PlanCancelledError` where the watch says so.
 */
export function planSheets(
  pieces: readonly FinishedPiece[],
  order: PrintOrder,
  { onProgress, isCancelled, effort = 'full' }: PlanWatch = {},
): SheetPlan {
  const search = planInSteps(pieces, order, effort === 'quick' ? 0 : fullSearch);
  let step = search.next();
  while (!step.done) {
    if (isCancelled?.() === true) throw new PlanCancelledError();
    onProgress?.(step.value);
    step = search.next();
  }
  return step.value;
}

/** The same plan with other sheets left out, as `planSheets` would make it; nothing is arranged anew. */
export function leavingOut(sheets: SheetPlan, leftOut: readonly string[]): SheetPlan {
  const { order, layout, cover } = sheets;
  const plan = planTiles(layout, sheets.plan.paper, order, leftOut);
  const printed = printedTiles(plan).length + (cover === 'own sheet' ? 1 : 0);
  return { ...sheets, order: { ...order, leftOut }, plan, sheets: printed };
}
