import type { Drafted } from '../engine/drafted.ts';
import { labelFacts } from '../engine/label-facts.ts';
import { between } from '../geometry/point.ts';
import { type DrawnPiece, drawnPieces } from '../sheets/drawn-pieces.ts';
import type { PrintOrder } from '../sheets/print-order.ts';
import { refuseTooManySheets } from '../sheets/sheet-limit.ts';
import { type SheetPlan, coverDrawing, coverSize, planSheets } from '../sheets/sheet-plan.ts';
import type { Unit } from '../units/said.ts';
import { coverMarks, printTitle } from './cover.ts';
import type { Drawing, PrintJob } from './drawing.ts';
import { penIn } from './line-style.ts';
import { pens, stroke, strokes } from './marks.ts';
import { lettersAlong, pieceLines } from './piece-drawing.ts';
import { placedLabels } from './placed-labels.ts';
import { tileFurniture } from './tile-furniture.ts';
import { drawTiles } from './tile-pages.ts';

/** Margin of the cover where it lies among the pieces, mm. */
const coverMargin = 10;

function drawingOf({ drawing, piece, foldLine }: DrawnPiece, order: PrintOrder): Drawing {
  const style = { lines: order.lines, inkSaving: order.inkSaving, scale: order.scale };
  const fold = foldLine && [
    strokes(
      penIn({ ...pens.hairline, dash: [10, 2, 2, 2] }, style),
      stroke(foldLine.from.x, foldLine.from.y, foldLine.to.x, foldLine.to.y),
    ),
    lettersAlong('centre', foldLine.from, between(foldLine.from, foldLine.to, 0.4), 3, 1.2),
  ];
  return { name: drawing, marks: [...pieceLines(piece, style), ...(fold ?? [])] };
}

/** A plan as pages, for a draft and the pieces the plan was made of. */
function pagesOf(draft: Drafted, sheets: SheetPlan, unit: Unit): PrintJob {
  const { order, plan, cover } = sheets;
  const { card } = draft.inputs;
  const drawn = drawnPieces(draft.pieces, order);
  const byName = new Map(drawn.map((each) => [each.drawing, each]));
  const titles = new Map(drawn.map(({ drawing, piece }) => [drawing, piece.title]));
  const labels = placedLabels(
    sheets,
    byName,
    labelFacts(draft.garment, card, draft.number, draft.inputs.rules),
  );
  const coverOn = (page: Parameters<typeof coverMarks>[4]) =>
    coverMarks(draft, sheets, drawn, unit, page);
  const among: readonly Drawing[] =
    cover === 'among the pieces'
      ? [{ name: coverDrawing, marks: coverOn({ ...coverSize, margin: coverMargin }) }]
      : [];
  return {
    title: `Ellwand ${printTitle(draft, sheets).toLowerCase()}, draft ${draft.number}`,
    ...(card.date === undefined ? {} : { date: card.date }),
    paper: plan.paper,
    drawings: [
      ...drawn.map((each) => drawingOf(each, order)),
      ...among,
      ...tileFurniture(plan, order),
    ],
    pages: [
      ...(cover === 'own sheet' ? [coverOn({ ...plan.paper, margin: order.margin })] : []),
      ...drawTiles(sheets, titles, labels, `draft ${draft.number}`, byName),
    ],
  };
}

/**
 * An order as pages: the cover, then the sheets row by row. Throws `SheetLimitError` before a page is drawn
 * where that takes more sheets than anybody would glue.
 */
export function tilesJob(draft: Drafted, order: PrintOrder, unit: Unit): PrintJob {
  const sheets = planSheets(draft.pieces, order);
  refuseTooManySheets(sheets);
  return pagesOf(draft, sheets, unit);
}
