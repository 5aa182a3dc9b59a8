import type { Drafted } from '#shared/engine/drafted.ts';
import { type ChalkChoice, chalkSheetJob } from '#shared/exports/chalk-sheet.ts';
import { pdfBytes } from './pdf-document.ts';

/** The chalk sheet of a draft as a PDF of one page; the same draft and choice give the same bytes. */
export const chalkSheetPdf = async (draft: Drafted, choice: ChalkChoice): Promise<Uint8Array> =>
  pdfBytes(chalkSheetJob(draft, choice));
