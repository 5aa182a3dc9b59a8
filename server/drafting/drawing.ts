import { measureCard } from '#shared/api/card.ts';
import type { DrawnPieces, GownContent, Picture } from '#shared/api/gowns.ts';
import { pieceSchema } from '#shared/api/piece-reply.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { draftAny } from '#shared/engine/drafted.ts';
import { picturePath } from '#shared/exports/picture.ts';

/** The last pieces drawn of a gown, as they are kept. */
export type Drawing = {
  readonly engine: string | null;
  readonly draftNumber: string | null;
  readonly drawnFrom: DrawnPieces['inputs'] | null;
  readonly pieces: DrawnPieces['pieces'] | null;
  readonly picture: Picture | null;
  readonly fresh: boolean;
};

/** Draws what a maker has put on the table; no answer where it is incomplete or cannot be drawn. */
export function drawn({ unread, inputs }: GownContent): Drawing | undefined {
  const card = measureCard.safeParse(inputs.card);
  if (unread.length > 0 || !card.success) return undefined;
  try {
    const drawnFrom = { ...inputs, card: card.data };
    const draft = draftAny(drawnFrom);
    return {
      engine: draft.engine,
      draftNumber: draft.number,
      drawnFrom,
      pieces: draft.pieces.map((each) => pieceSchema.parse(each)),
      picture: picturePath(draft.pieces) ?? null,
      fresh: true,
    };
  } catch (error) {
    if (error instanceof DraftingError) return undefined;
    throw error;
  }
}
