import type { PrintRequest } from '#shared/api/requests.ts';
import { piecesSvg } from '#shared/exports/svg.ts';
import { presetOrder } from '#shared/sheets/print-order.ts';
import { choosePieces } from '#shared/sheets/selection.ts';
import { SheetLimitError } from '#shared/sheets/sheet-limit.ts';
import { draftOrRefuse } from '../../drafting/draft-or-refuse.ts';
import { refusalFor } from '../../http/refusal.ts';
import { chalkSheetPdf } from './chalk-sheet-pdf.ts';
import { tilesPdf } from './tiles-pdf.ts';

/** The pieces asked for as pages to glue together. */
export async function tilesOf({
  unit,
  paper,
  pieces,
  ...inputs
}: PrintRequest): Promise<Uint8Array> {
  const draft = draftOrRefuse(inputs, unit);
  try {
    return await tilesPdf(draft, presetOrder(paper, pieces), unit);
  } catch (error) {
    if (error instanceof SheetLimitError) throw refusalFor('not-drawable', [error.problem], unit);
    throw error;
  }
}

/** One page at quarter scale. */
export function chalkSheetOf({
  unit,
  paper,
  pieces: _,
  ...inputs
}: PrintRequest): Promise<Uint8Array> {
  return chalkSheetPdf(draftOrRefuse(inputs, unit), { paper, unit });
}

/** The pieces asked for as SVG. */
export async function piecesOf({
  unit,
  paper: _,
  pieces: selection,
  ...inputs
}: PrintRequest): Promise<Uint8Array> {
  const draft = draftOrRefuse(inputs, unit);
  const chosen = { ...draft, pieces: choosePieces(draft.pieces, selection) };
  return Promise.resolve(new TextEncoder().encode(piecesSvg(chosen, unit)));
}
