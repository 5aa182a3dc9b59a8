import type { Draft } from '../engine/draft.ts';
import type { PrintOrder } from '../sheets/print-order.ts';
import { choosePieces } from '../sheets/selection.ts';
import { refuseTooManySheets } from '../sheets/sheet-limit.ts';
import { planSheets } from '../sheets/sheet-plan.ts';
import type { Unit } from '../units/said.ts';
import { coverPage, selectionTitles } from './cover.ts';
import type { PrintJob } from './drawing.ts';
import { drawPiece } from './piece-drawing.ts';
import { tileFurniture } from './tile-furniture.ts';
import { drawTiles } from './tile-pages.ts';

/**
 * A choice of pieces as pages of home paper at true scale: the cover, then the tiles row by row.
 * Throws `SheetLimitError` before a page is drawn where that takes more sheets than anybody would glue.
 */
export function tilesJob(draft: Draft, order: PrintOrder, unit: Unit): PrintJob {
  const selection = typeof order.pieces === 'string' ? order.pieces : 'whole-gown';
  const pieces = choosePieces(draft.pieces, selection);
  const sheets = planSheets(draft.pieces, order);
  refuseTooManySheets(sheets);
  const titles = new Map(pieces.map((each) => [each.name, each.title]));
  return {
    title: `Ellwand ${selectionTitles[selection].toLowerCase()}, draft ${draft.number}`,
    ...(draft.inputs.card.date === undefined ? {} : { date: draft.inputs.card.date }),
    paper: sheets.plan.paper,
    drawings: [...pieces.map(drawPiece), ...tileFurniture(sheets.plan)],
    pages: [
      coverPage(draft, sheets, pieces, { selection, unit }),
      ...drawTiles(sheets, titles, `draft ${draft.number}`),
    ],
  };
}
