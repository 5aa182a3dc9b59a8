import type { FinishedPiece } from '../drafting/piece.ts';
import { type PrintOrder, type PrintScale, presetOrder } from '../sheets/print-order.ts';
import { type PaperName, papers } from '../sheets/papers.ts';
import { refuseTooManySheets } from '../sheets/sheet-limit.ts';
import { planSheets } from '../sheets/sheet-plan.ts';
import { smaller } from '../sheets/turned-over.ts';
import type { Drawing, Mark, PrintJob } from './drawing.ts';
import { type Stack, stackOutline } from './overlaid.ts';
import { tileFurniture } from './tile-furniture.ts';
import { drawTiles } from './tile-pages.ts';

/** How pieces over each other are printed: on home paper, at true scale or a quarter of it. */
export type StackPaper = { readonly paper: PaperName; readonly scale: PrintScale };

/** What goes before the sheets, and what every sheet says at its foot. */
export type StackPages = {
  readonly title: string;
  readonly legend: string;
  readonly before: readonly (readonly Mark[])[];
  readonly layers?: readonly string[];
};

const orderFor = ({ paper, scale }: StackPaper): PrintOrder => ({
  ...presetOrder(paper, 'whole-gown'),
  scale,
});

/** How many sheets stacks take at a scale, without what goes before them. */
export const stackSheets = (stacks: readonly Stack[], on: StackPaper): number =>
  planSheets(stacks.map(stackOutline), orderFor(on), { effort: 'quick' }).plan.tiles.length;

/**
 * Pieces over each other as pages of home paper: the pages before them, then sheets to glue, row by
 * row. `draw` draws one stack already at its scale. Throws `SheetLimitError` where it takes too many sheets.
 */
export function stackPages<S extends Stack>(
  stacks: readonly S[],
  on: StackPaper,
  draw: (stack: S, scaled: (piece: FinishedPiece) => FinishedPiece) => readonly Mark[],
  { title, legend, before, layers }: StackPages,
): PrintJob {
  const order = orderFor(on);
  const sheets = planSheets(stacks.map(stackOutline), order, { effort: 'quick' });
  refuseTooManySheets(sheets);
  const titles = new Map(stacks.map((stack) => [stack.name, stack.pieces[0]?.title ?? stack.name]));
  const scaled = (piece: FinishedPiece): FinishedPiece =>
    on.scale === 1 ? piece : smaller(piece, on.scale);
  const drawings = stacks.map((stack): Drawing => ({
    name: stack.name,
    marks: draw(stack, scaled),
  }));
  return {
    title,
    paper: papers[on.paper],
    drawings: [...drawings, ...tileFurniture(sheets.plan, order)],
    ...(layers === undefined ? {} : { layers }),
    pages: [...before, ...drawTiles(sheets, titles, [], legend)],
  };
}

/** The scale in words, and whether one may cut from it. */
export const scaleWords = (scale: PrintScale): string =>
  scale === 1 ? 'at true scale' : `at scale 1 to ${1 / scale}: do not cut from this`;
