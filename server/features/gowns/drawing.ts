import { isDeepStrictEqual } from 'node:util';
import type { DrawnPieces, GownContent } from '#shared/api/gowns.ts';
import type { Drawing } from '../../drafting/drawing.ts';

export const nothingDrawn: Drawing = {
  engine: null,
  draftNumber: null,
  drawnFrom: null,
  pieces: null,
  picture: null,
  fresh: false,
};

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
