import { printSheets, printSheetsSvg } from '#shared/api/drafts.ts';
import type { Sent } from '#shared/api/endpoint.ts';

import { callForFile, type SentFile } from '../../lib/call.ts';

/** A file of sheets or pieces to be written by the server. */
export type SheetsAsked = {
  readonly kind: 'pdf' | 'svg';
  readonly draftNumber: string;
  readonly wanted: Sent<typeof printSheets>;
};

/** Has the server write the sheets, or the pieces as SVG. */
export const fetchSheets = (
  { kind, wanted }: SheetsAsked,
  signal: AbortSignal,
): Promise<SentFile> => callForFile(kind === 'pdf' ? printSheets : printSheetsSvg, wanted, signal);

export const sheetsName = ({ kind, draftNumber }: SheetsAsked): string =>
  `ellwand-${draftNumber}.${kind}`;
