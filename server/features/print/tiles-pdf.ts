import type { Draft } from '#shared/engine/draft.ts';
import { type TileChoice, tilesJob } from '#shared/exports/tiles.ts';
import { pdfBytes } from './pdf-document.ts';

/**
 * The tiles of a draft as a PDF at true scale: cover first, then the sheets row by row. The same draft
 * and choice give the same bytes. Throws `SheetLimitError` before any page is drawn.
 */
export const tilesPdf = async (draft: Draft, choice: TileChoice): Promise<Uint8Array> =>
  pdfBytes(tilesJob(draft, choice));
