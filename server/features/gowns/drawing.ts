import { isDeepStrictEqual } from 'node:util';
import { measureCard } from '#shared/api/card.ts';
import type { DrawnPieces, Gown, GownContent } from '#shared/api/gowns.ts';
import { pieceSchema } from '#shared/api/piece-reply.ts';
import { problemSchema } from '#shared/api/problem.ts';
import { pieceChanges } from '#shared/compare/piece-changes.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { draftGown, engineVersion } from '#shared/engine/draft-gown.ts';
import { picturePath } from '#shared/exports/picture.ts';
import type { GownRow } from './repository.ts';

/** The columns that hold the last pieces drawn. */
export type Drawing = Pick<
  GownRow,
  'engine' | 'draftNumber' | 'drawnFrom' | 'pieces' | 'picture' | 'fresh'
>;

export const nothingDrawn: Drawing = {
  engine: null,
  draftNumber: null,
  drawnFrom: null,
  pieces: null,
  picture: null,
  fresh: false,
};

/** Draws what a maker has put on the table; no answer where it is incomplete or cannot be drawn. */
export function drawn({ unread, inputs }: GownContent): Drawing | undefined {
  const card = measureCard.safeParse(inputs.card);
  if (unread.length > 0 || !card.success) return undefined;
  try {
    const drawnFrom = { ...inputs, card: card.data };
    const draft = draftGown(drawnFrom);
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

/** The pieces there are, and whether they are those of these inputs. */
export const kept = (
  { engine, draftNumber, drawnFrom, pieces, picture }: Drawing,
  { unread, inputs }: GownContent,
): Drawing => ({
  engine,
  draftNumber,
  drawnFrom,
  pieces,
  picture,
  fresh: unread.length === 0 && isDeepStrictEqual(drawnFrom, inputs),
});

/** The pieces as the contract tells them. */
export const drawnPiecesOf = (row: Drawing): DrawnPieces | null =>
  row.engine === null || row.draftNumber === null || row.drawnFrom === null || row.pieces === null
    ? null
    : {
        engine: row.engine,
        number: row.draftNumber,
        inputs: row.drawnFrom,
        pieces: row.pieces,
      };

/** What the current engine would draw otherwise; null where it drew the gown itself. */
export function redrawingOf(row: Drawing): Gown['redrawing'] {
  const before = drawnPiecesOf(row);
  if (before === null || before.engine === engineVersion) return null;
  try {
    const changes = pieceChanges(before.pieces, draftGown(before.inputs).pieces);
    const deviation = Math.max(0, ...changes.map((each) => each.deviation));
    return { engine: engineVersion, changes: [...changes], deviation, problems: [] };
  } catch (error) {
    if (!(error instanceof DraftingError)) throw error;
    const problems = error.problems.map((each) => problemSchema.parse(each));
    return { engine: engineVersion, changes: [], deviation: 0, problems };
  }
}
