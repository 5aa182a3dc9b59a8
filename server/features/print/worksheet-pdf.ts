import type { WorksheetRequest } from '#shared/api/worksheet.ts';
import type { Drafted } from '#shared/engine/drafted.ts';
import { type WorksheetChoice, worksheetJob } from '#shared/exports/worksheet.ts';
import { draftAnyOrRefuse } from '../../drafting/draft-or-refuse.ts';
import { pdfBytes } from './pdf-document.ts';

/** The worksheet of a draft as a PDF; the same draft and choice give the same bytes. */
export const worksheetPdf = async (draft: Drafted, choice: WorksheetChoice): Promise<Uint8Array> =>
  pdfBytes(worksheetJob(draft, choice));

/** The worksheet that is asked for, or the refusal that names its fields. */
export const worksheetOf = ({ inputs, unit, paper }: WorksheetRequest): Promise<Uint8Array> =>
  worksheetPdf(draftAnyOrRefuse(inputs, unit), { paper, unit });
