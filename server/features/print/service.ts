import type { PrintRequest, SheetsRequest } from '#shared/api/requests.ts';
import type { Drafted } from '#shared/engine/drafted.ts';
import { piecesSvg } from '#shared/exports/svg.ts';
import { checkOrder } from '#shared/sheets/check-order.ts';
import { type PrintOrder, presetOrder } from '#shared/sheets/print-order.ts';
import { type Selection, choosePieces } from '#shared/sheets/selection.ts';
import { SheetLimitError } from '#shared/sheets/sheet-limit.ts';
import type { Unit } from '#shared/units/said.ts';
import { draftAnyOrRefuse } from '../../drafting/draft-or-refuse.ts';
import { refusalFor } from '../../http/refusal.ts';
import { chalkSheetPdf } from './chalk-sheet-pdf.ts';
import { tilesPdf } from './tiles-pdf.ts';

/** A block is printed whole: it has no toile but itself. */
const selectionOf = ({ garment }: Drafted, asked: Selection): Selection =>
  garment === 'gown' ? asked : 'whole-gown';

/** The pieces asked for as pages to glue together. */
export async function tilesOf({
  unit,
  paper,
  pieces,
  ...inputs
}: PrintRequest): Promise<Uint8Array> {
  const draft = draftAnyOrRefuse(inputs, unit);
  return pdfOf(draft, presetOrder(paper, selectionOf(draft, pieces)), unit);
}

/** The sheets of an order. */
export async function sheetsOf({ inputs, unit, order }: SheetsRequest): Promise<Uint8Array> {
  return pdfOf(draftFor(inputs, order, unit), order, unit);
}

/** The pieces of an order as SVG. */
export async function sheetsSvgOf({ inputs, unit, order }: SheetsRequest): Promise<Uint8Array> {
  return svgOf(draftFor(inputs, order, unit), order.pieces, unit);
}

/** The draft an order is for, once nothing in the order is wrong. */
function draftFor(inputs: SheetsRequest['inputs'], order: PrintOrder, unit: Unit): Drafted {
  const draft = draftAnyOrRefuse(inputs, unit);
  const problems = checkOrder(order, draft.pieces);
  if (problems.length > 0) throw refusalFor('bad-input', problems, unit);
  return draft;
}

async function pdfOf(draft: Drafted, order: PrintOrder, unit: Unit): Promise<Uint8Array> {
  try {
    return await tilesPdf(draft, order, unit);
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
  return chalkSheetPdf(draftAnyOrRefuse(inputs, unit), { paper, unit });
}

/** The pieces asked for as SVG. */
export async function piecesOf({
  unit,
  paper: _,
  pieces: selection,
  ...inputs
}: PrintRequest): Promise<Uint8Array> {
  const draft = draftAnyOrRefuse(inputs, unit);
  return svgOf(draft, selectionOf(draft, selection), unit);
}

async function svgOf(
  draft: Drafted,
  chosen: PrintOrder['pieces'],
  unit: Unit,
): Promise<Uint8Array> {
  const pieces =
    typeof chosen === 'string'
      ? choosePieces(draft.pieces, chosen)
      : draft.pieces.filter(({ name }) => chosen.some(({ piece }) => piece === name));
  return Promise.resolve(new TextEncoder().encode(piecesSvg({ ...draft, pieces }, unit)));
}
