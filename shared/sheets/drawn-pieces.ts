import type { FinishedPiece } from '../drafting/piece.ts';
import { type Point, point } from '../geometry/point.ts';
import type { PieceOrder, PrintOrder } from './print-order.ts';
import { choosePieces } from './selection.ts';
import { foldOf, openedOut, smaller, turnedOver } from './turned-over.ts';

/** A piece as it is drawn on these sheets, at their scale. */
export type DrawnPiece = {
  /** Name of the drawing, unique in a print: `front-middle`, `front-middle mirrored`. */
  readonly drawing: string;
  readonly piece: FinishedPiece;
  readonly copies: number;
  /** Where an opened-out piece is folded, if anywhere. */
  readonly foldLine?: { readonly from: Point; readonly to: Point };
};

/** How a piece is drawn where nobody says: on its fold where it has one. */
export const plainPieceOrder = (piece: FinishedPiece): PieceOrder => ({
  piece: piece.name,
  copies: 1,
  how: foldOf(piece) ? 'on fold' : 'drawn once',
});

function foldLineOf(piece: FinishedPiece): NonNullable<DrawnPiece['foldLine']> {
  const fold = foldOf(piece)?.path;
  return { from: fold?.[0]?.from ?? point(0, 0), to: fold?.at(-1)?.to ?? point(0, 0) };
}

function drawn(piece: FinishedPiece, { copies, how }: PieceOrder): readonly DrawnPiece[] {
  const plain = { drawing: piece.name, piece, copies };
  if (how === 'opened out') {
    const opened = openedOut(piece);
    return opened ? [{ ...plain, piece: opened, foldLine: foldLineOf(piece) }] : [plain];
  }
  if (how !== 'mirrored pair') return [plain];
  const one = { ...piece, cut: 'cut 1 of this, 1 mirrored' };
  return [
    { ...plain, piece: one },
    {
      drawing: `${piece.name} mirrored`,
      piece: { ...turnedOver(piece), title: `${piece.title}, mirrored`, cut: one.cut },
      copies,
    },
  ];
}

/**
 * The pieces of an order as they are drawn, in its order; a piece it names that the draft has not got is
 * passed over. Labels of mirrored and smaller pieces are to be set anew.
 */
export function drawnPieces(
  pieces: readonly FinishedPiece[],
  { pieces: wanted, scale }: Pick<PrintOrder, 'pieces' | 'scale'>,
): readonly DrawnPiece[] {
  const orders =
    typeof wanted === 'string' ? choosePieces(pieces, wanted).map(plainPieceOrder) : wanted;
  return orders.flatMap((order) => {
    const found = pieces.find((each) => each.name === order.piece);
    return found ? drawn(smaller(found, scale), order) : [];
  });
}
