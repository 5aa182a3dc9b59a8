import type { Piece } from '#shared/drafting/piece.ts';
import { checkOrder } from '#shared/sheets/check-order.ts';
import { sheetPapers } from '#shared/sheets/papers.ts';
import { type PieceOrder, plainOrder, type PrintOrder } from '#shared/sheets/print-order.ts';
import { selections, choosePieces } from '#shared/sheets/selection.ts';
import { waysToDraw } from '#shared/sheets/ways-to-draw.ts';
import { error, type Problem } from '#shared/units/problem.ts';

import { choiceFor, type PaperField, type RoomChoices } from './room-choices.ts';

/** The contract's names of what is typed. */
export const fieldOf: { readonly [F in PaperField]: string } = {
  margin: 'order.margin',
  overlap: 'order.overlap',
  width: 'order.paper.width',
  height: 'order.paper.height',
};

/** What is looked at in place of a figure that cannot be read, so that it alone is told, mm. */
const standIns: { readonly [F in PaperField]: number } = {
  margin: plainOrder.margin,
  overlap: plainOrder.overlap,
  width: sheetPapers.A4.width,
  height: sheetPapers.A4.height,
};

export type OrderOrProblems =
  { readonly order: PrintOrder } | { readonly problems: readonly Problem[] };

/** What is typed that has a meaning beside the paper chosen. */
export const typedFields = ({ paper }: Pick<RoomChoices, 'paper'>): readonly PaperField[] =>
  paper === 'custom' ? ['margin', 'overlap', 'width', 'height'] : ['margin', 'overlap'];

/** The choices as an order for these pieces, with every sheet in it, or what stands in its way, field by field. */
export function orderOf(room: RoomChoices, pieces: readonly Piece[]): OrderOrProblems {
  const { lengths, paper, orientation, glueMarks, inkSaving, lines, scale } = room;
  const unread = typedFields(room).flatMap((field): readonly Problem[] => {
    const { read } = lengths[field];
    return 'said' in read
      ? [error({ code: 'not-read', field: fieldOf[field], said: read.said })]
      : [];
  });
  const mm = (field: PaperField): number => {
    const { read } = lengths[field];
    return 'mm' in read ? read.mm : standIns[field];
  };
  const order: PrintOrder = {
    paper: paper === 'custom' ? { width: mm('width'), height: mm('height') } : paper,
    orientation,
    margin: mm('margin'),
    overlap: mm('overlap'),
    glueMarks,
    pieces: orderedPieces(room, pieces),
    lines,
    inkSaving,
    scale,
    leftOut: [],
  };
  const problems = [...unread, ...checkOrder(order, pieces)];
  return problems.length === 0 ? { order } : { problems };
}

/** Pieces as an order names them: by a selection where it is exactly one, else one by one. */
function orderedPieces(room: RoomChoices, pieces: readonly Piece[]): PrintOrder['pieces'] {
  const printed = pieces.flatMap((piece): readonly PieceOrder[] => {
    const { printed: wanted, copies, how } = choiceFor(piece, room);
    return wanted ? [{ piece: piece.name, copies, how }] : [];
  });
  const asDrafted = printed.every(
    ({ piece, copies, how }) =>
      copies === 1 && pieces.some((each) => each.name === piece && waysToDraw(each)[0] === how),
  );
  const names = printed.map(({ piece }) => piece).join();
  const selection = selections.findLast(
    (each) =>
      choosePieces(pieces, each)
        .map(({ name }) => name)
        .join() === names,
  );
  return asDrafted && printed.length > 0 && selection !== undefined ? selection : printed;
}
