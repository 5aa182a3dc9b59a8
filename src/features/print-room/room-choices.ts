import type { Piece } from '#shared/drafting/piece.ts';
import {
  type DrawnHow,
  type LineChoice,
  type Orientation,
  type PrintScale,
  type SheetName,
  plainOrder,
} from '#shared/sheets/print-order.ts';
import type { SquareName } from '#shared/sheets/scale-check.ts';
import { type Selection, choosePieces } from '#shared/sheets/selection.ts';
import { waysToDraw } from '#shared/sheets/ways-to-draw.ts';
import type { Unit } from '#shared/units/said.ts';

import {
  readLength,
  rewrittenFine,
  rewrittenLength,
  writtenLength,
  type TypedLength,
} from './typed-length.ts';

export const paperFields = ['margin', 'overlap', 'width', 'height'] as const;
export type PaperField = (typeof paperFields)[number];

/** What is typed: about the paper, and what the printed square measures. */
export type LengthField = PaperField | 'across' | 'down';

/** How one piece is printed. */
export type PieceChoice = {
  readonly printed: boolean;
  readonly copies: number;
  readonly how: DrawnHow;
};

/** Sheets left out of one plan; another plan has other sheets by the same names. */
type LeftOut = { readonly plan: string; readonly names: readonly string[] };

/** Everything chosen in the print room. */
export type RoomChoices = {
  readonly unit: Unit;
  readonly paper: SheetName | 'custom';
  readonly orientation: Orientation;
  readonly glueMarks: boolean;
  readonly inkSaving: boolean;
  readonly lines: LineChoice;
  readonly scale: PrintScale;
  readonly lengths: { readonly [F in LengthField]: TypedLength };
  /** Which printed square is measured; that of the reader's unit where none is chosen. */
  readonly square?: SquareName;
  /** By the piece's name; a piece nothing was chosen for is printed once, as drafted. */
  readonly pieces: { readonly [piece: string]: PieceChoice };
  readonly leftOut: LeftOut;
};

export type Chosen = Partial<
  Pick<
    RoomChoices,
    'square' | 'paper' | 'orientation' | 'glueMarks' | 'inkSaving' | 'lines' | 'scale'
  >
>;

export type RoomAction =
  | { readonly type: 'unit'; readonly unit: Unit }
  | { readonly type: 'chosen'; readonly choice: Chosen }
  | { readonly type: 'typed'; readonly field: LengthField; readonly text: string }
  /** A figure is typed to its end: it is written as the unit has it. */
  | { readonly type: 'settled'; readonly field: PaperField }
  | { readonly type: 'piece'; readonly piece: Piece; readonly choice: Partial<PieceChoice> }
  | {
      readonly type: 'selected';
      readonly pieces: readonly Piece[];
      readonly selection: Selection;
    }
  | { readonly type: 'sheet'; readonly plan: string; readonly name: string }
  | { readonly type: 'all sheets' };

/** A sheet of one's own begins as the size many wide home printers take, 13 x 19 in, mm. */
const customSize = { width: 329, height: 483 };

/** What is chosen before anybody has chosen. */
export const plainChoices = (unit: Unit, paper: SheetName): RoomChoices => ({
  unit,
  paper,
  orientation: plainOrder.orientation,
  glueMarks: plainOrder.glueMarks,
  inkSaving: plainOrder.inkSaving,
  lines: plainOrder.lines,
  scale: plainOrder.scale,
  lengths: {
    margin: writtenLength(plainOrder.margin, unit),
    overlap: writtenLength(plainOrder.overlap, unit),
    width: writtenLength(customSize.width, unit),
    height: writtenLength(customSize.height, unit),
    across: readLength('', unit),
    down: readLength('', unit),
  },
  pieces: {},
  leftOut: { plan: '', names: [] },
});

/** How a piece is printed as things stand. */
export const choiceFor = (piece: Piece, { pieces }: Pick<RoomChoices, 'pieces'>): PieceChoice => {
  const ways = waysToDraw(piece);
  const chosen = pieces[piece.name];
  if (chosen === undefined) return { printed: true, copies: 1, how: ways[0] };
  // The draft may have changed since: a fold that is gone cannot be opened out.
  return ways.includes(chosen.how) ? chosen : { ...chosen, how: ways[0] };
};

export function roomChoices(room: RoomChoices, action: RoomAction): RoomChoices {
  switch (action.type) {
    case 'unit':
      return { ...room, unit: action.unit, lengths: inUnit(room.lengths, action.unit) };
    case 'chosen':
      return { ...room, ...action.choice };
    case 'typed':
      return withLength(room, action.field, readLength(action.text, room.unit));
    case 'settled':
      return withLength(room, action.field, rewrittenLength(room.lengths[action.field], room.unit));
    case 'piece': {
      const choice = { ...choiceFor(action.piece, room), ...action.choice };
      return { ...room, pieces: { ...room.pieces, [action.piece.name]: choice } };
    }
    case 'selected':
      return { ...room, pieces: selected(room, action.pieces, action.selection) };
    case 'sheet':
      return { ...room, leftOut: toggled(room.leftOut, action.plan, action.name) };
    case 'all sheets':
      return { ...room, leftOut: { ...room.leftOut, names: [] } };
  }
}

const withLength = (room: RoomChoices, field: LengthField, typed: TypedLength): RoomChoices => ({
  ...room,
  lengths: { ...room.lengths, [field]: typed },
});

/** The lengths typed, for a reader of this unit. */
export const inUnit = (lengths: RoomChoices['lengths'], unit: Unit): RoomChoices['lengths'] => ({
  margin: rewrittenLength(lengths.margin, unit),
  overlap: rewrittenLength(lengths.overlap, unit),
  width: rewrittenLength(lengths.width, unit),
  height: rewrittenLength(lengths.height, unit),
  across: rewrittenFine(lengths.across, unit),
  down: rewrittenFine(lengths.down, unit),
});

function selected(
  room: RoomChoices,
  pieces: readonly Piece[],
  selection: Selection,
): RoomChoices['pieces'] {
  const chosen = new Set(choosePieces(pieces, selection).map(({ name }) => name));
  return Object.fromEntries(
    pieces.map((piece) => [
      piece.name,
      { ...choiceFor(piece, room), printed: chosen.has(piece.name) },
    ]),
  );
}

function toggled(leftOut: LeftOut, plan: string, name: string): LeftOut {
  const names = leftOut.plan === plan ? leftOut.names : [];
  return {
    plan,
    names: names.includes(name) ? names.filter((each) => each !== name) : [...names, name],
  };
}
