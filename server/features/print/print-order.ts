import type { PrintRequest } from '#shared/api/requests.ts';

/** What the printing thread is asked for. */
export type PrintOrder = {
  readonly what: 'tiles' | 'chalk-sheet' | 'pieces';
  readonly wanted: PrintRequest;
};
