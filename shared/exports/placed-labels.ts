import { carriedPiece } from '../drafting/carried-piece.ts';
import type { FinishedPiece } from '../drafting/piece.ts';
import { type LabelFacts, lettering } from '../finishing/lettering.ts';
import { moved } from '../geometry/motion.ts';
import type { DrawnPiece } from '../sheets/drawn-pieces.ts';
import type { Placement } from '../sheets/layout.ts';
import type { SheetPlan } from '../sheets/sheet-plan.ts';
import type { Words } from './drawing.ts';
import { labelNotes } from './line-style.ts';
import { labelMarks } from './piece-drawing.ts';

/** A piece where it lies on the drawing. */
const laid = ({ piece }: DrawnPiece, { motion }: Placement): FinishedPiece =>
  carriedPiece(
    piece,
    (at) => moved(at, motion),
    (way) => moved(way, { ...motion, dx: 0, dy: 0 }),
  );

/** Where sheet comes on sheet, from edge to edge of a drawing. */
function seamsOf(
  { plan: { rows, columns, step } }: SheetPlan,
  fold: DrawnPiece['foldLine'],
  by: Placement['motion'],
) {
  const lines = (count: number, each: number): readonly number[] =>
    Array.from({ length: count - 1 }, (_, i) => (i + 1) * each);
  const ends = fold ? [moved(fold.from, by), moved(fold.to, by)] : [];
  const [a, b] = ends;
  const upright = a && b && Math.abs(a.x - b.x) < 1 ? [a.x] : [];
  const level = a && b && Math.abs(a.y - b.y) < 1 ? [a.y] : [];
  return { x: [...lines(columns, step.x), ...upright], y: [...lines(rows, step.y), ...level] };
}

/** Whether a label gives the whole name of its piece. */
const isNamed = ({ title }: FinishedPiece, label: FinishedPiece['lettering']): boolean =>
  label
    .map(({ text }) => text)
    .join(' ')
    .startsWith(title);

/** The number that stands for a piece too small for its name; the cover lists the pieces by it. */
const numberOf = (piece: DrawnPiece, drawn: ReadonlyMap<string, DrawnPiece>): string =>
  `no. ${[...drawn.values()].indexOf(piece) + 1}`;

/**
 * The labels of all pieces on the drawing, upright on the paper whichever way a piece is turned, and clear
 * of the seams between sheets wherever the piece has room for that.
 */
export function placedLabels(
  sheets: SheetPlan,
  drawn: ReadonlyMap<string, DrawnPiece>,
  facts: LabelFacts,
): readonly Words[] {
  const { order, layout } = sheets;
  return layout.placements.flatMap((placement) => {
    const found = drawn.get(placement.shape.piece);
    if (!found) return [];
    const piece = laid(found, placement);
    const print = { notes: labelNotes(order), scale: order.scale };
    const seams = seamsOf(sheets, found.foldLine, placement.motion);
    const clear = lettering(piece, facts, { ...print, seams });
    const label =
      clear.length > 1 && isNamed(piece, clear) ? clear : lettering(piece, facts, print);
    if (order.scale === 1 || isNamed(piece, label)) return labelMarks(piece, label);
    const numbered = { ...piece, title: numberOf(found, drawn), cut: '' };
    return labelMarks(numbered, lettering(numbered, facts, { ...print, seams }).slice(0, 1));
  });
}
