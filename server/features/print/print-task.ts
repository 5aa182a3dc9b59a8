import type { PrintRequest, SheetsRequest } from '#shared/api/requests.ts';

/** What the printing thread is asked for. */
export type PrintTask =
  | { readonly what: 'tiles' | 'chalk-sheet' | 'pieces'; readonly wanted: PrintRequest }
  | { readonly what: 'sheets' | 'sheets-svg'; readonly wanted: SheetsRequest };
