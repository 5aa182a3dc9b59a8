import type { CompareRequest, NestRequest } from '#shared/api/comparing.ts';
import type { PrintRequest, SheetsRequest } from '#shared/api/requests.ts';
import type { WorksheetRequest } from '#shared/api/worksheet.ts';

/** What the printing thread is asked for. */
export type PrintTask =
  | { readonly what: 'tiles' | 'chalk-sheet' | 'pieces'; readonly wanted: PrintRequest }
  | { readonly what: 'sheets' | 'sheets-svg'; readonly wanted: SheetsRequest }
  | { readonly what: 'comparison' | 'comparison-svg'; readonly wanted: CompareRequest }
  | { readonly what: 'nest' | 'nest-svg'; readonly wanted: NestRequest }
  | { readonly what: 'worksheet'; readonly wanted: WorksheetRequest };
