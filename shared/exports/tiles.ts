import type { Draft } from '../engine/draft.ts';
import { type PaperName, papers } from '../sheets/papers.ts';
import { type Selection, choosePieces } from '../sheets/selection.ts';
import { refuseTooManySheets } from '../sheets/sheet-limit.ts';
import { planSheets } from '../sheets/sheet-plan.ts';
import type { Unit } from '../units/said.ts';
import { coverPage, selectionTitles } from './cover.ts';
import type { PrintJob } from './drawing.ts';
import { drawPiece } from './piece-drawing.ts';
import { tileFurniture } from './tile-furniture.ts';
import { drawTiles } from './tile-pages.ts';

export type TileChoice = {
  readonly paper: PaperName;
  readonly selection: Selection;
  readonly unit: Unit;
};

/**
 * A choice of pieces as pages of home paper at true scale: the cover, then the tiles row by row.
 * Throws `SheetLimitError` before a page is drawn where that takes more sheets than anybody would glue.
 */
export function tilesJob(draft: Draft, choice: TileChoice): PrintJob {
  const pieces = choosePieces(draft.pieces, choice.selection);
  const sheets = planSheets(draft.pieces, choice);
  refuseTooManySheets(sheets);
  const titles = new Map(pieces.map((each) => [each.name, each.title]));
  return {
    title: `Ellwand ${selectionTitles[choice.selection].toLowerCase()}, draft ${draft.number}`,
    ...(draft.inputs.card.date === undefined ? {} : { date: draft.inputs.card.date }),
    paper: papers[choice.paper],
    drawings: [...pieces.map(drawPiece), ...tileFurniture(sheets.plan)],
    pages: [
      coverPage(draft, sheets, pieces, choice),
      ...drawTiles(sheets, titles, `draft ${draft.number}`),
    ],
  };
}
