import type { Drafted } from '#shared/engine/drafted.ts';
import { tilesJob } from '#shared/exports/tiles.ts';
import type { PrintOrder } from '#shared/sheets/print-order.ts';
import type { Unit } from '#shared/units/said.ts';
import { pdfBytes } from './pdf-document.ts';

/**
 * The sheets of a draft as a PDF: cover first, then the sheets row by row. The same draft, order and
 * unit give the same bytes. Throws `SheetLimitError` before any page is drawn.
 */
export const tilesPdf = async (
  draft: Drafted,
  order: PrintOrder,
  unit: Unit,
): Promise<Uint8Array> => pdfBytes(tilesJob(draft, order, unit));
