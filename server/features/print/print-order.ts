import type { PrintRequest } from '#shared/api/requests.ts';
import type { RefusalCode } from '#shared/api/problem-codes.ts';
import type { Problem } from '#shared/units/problem.ts';

/** What the printing thread is asked for. */
export type PrintOrder = {
  readonly what: 'tiles' | 'chalk-sheet' | 'pieces';
  readonly wanted: PrintRequest;
};

/** What it answers: bytes, a refusal, or a fault (its kind and place, never its words). */
export type PrintAnswer =
  | { readonly kind: 'printed'; readonly bytes: Uint8Array }
  | {
      readonly kind: 'refused';
      readonly code: RefusalCode;
      readonly message: string;
      readonly problems: readonly Problem[];
    }
  | { readonly kind: 'fault'; readonly name: string; readonly frames: string };
