import type { DrawnPieces, GownContent } from '#shared/api/gowns.ts';
import type { DraftedInputs } from '#shared/engine/drafted.ts';

/** What the drafting thread is asked for: a reply in JSON, what a gown keeps, or how an old gown would change. */
export type DraftOrder =
  | { readonly what: 'reply'; readonly inputs: DraftedInputs }
  | { readonly what: 'drawing'; readonly content: GownContent }
  | { readonly what: 'redrawing'; readonly before: DrawnPieces };
