import { carriedPiece } from '../drafting/carried-piece.ts';
import type { FinishedPiece } from '../drafting/piece.ts';
import { type Motion, moved } from '../geometry/motion.ts';
import type { Path } from '../geometry/path.ts';

/** A piece carried elsewhere whole: lines, darts, levels, marks and lettering. */
export const movedPiece = (piece: FinishedPiece, by: Motion): FinishedPiece =>
  carriedPiece(
    piece,
    (at) => moved(at, by),
    (way) => moved(way, { ...by, dx: 0, dy: 0 }),
  );

/** The finished outline of a piece: its edges one after the other. */
export const seamOutline = ({ edges }: Pick<FinishedPiece, 'edges'>): Path =>
  edges.flatMap((edge) => edge.path);
