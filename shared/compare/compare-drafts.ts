import type { FinishedPiece } from '../drafting/piece.ts';
import { type Overlap, overlapOf } from '../geometry/region.ts';
import { type Alignment, frameMotion, motionFor } from './alignment.ts';
import { type Comparable, inBodyFrame } from './comparable.ts';
import { type FigureRow, figureRows } from './figures.ts';
import { movedPiece, seamOutline } from './moved-piece.ts';

/** A piece in both drafts, the second's laid on the first's; or in one of them alone. */
export type PiecePair = {
  readonly name: string;
  readonly title: string;
  readonly first?: FinishedPiece;
  /** Moved onto the first by the alignment. */
  readonly second?: FinishedPiece;
  /** Between their seam lines; absent where there is only one. */
  readonly between?: Overlap;
};

/** Two drafts over each other, and their figures beside each other. */
export type Comparison = {
  readonly pairs: readonly PiecePair[];
  readonly rows: readonly FigureRow[];
};

/**
 * Lays a second draft over a first, piece by piece by name: aligned on a point or a seam, with the
 * areas between the seam lines, mm². A piece without a partner is laid where its half of the body lies.
 */
export function compareDrafts(first: Comparable, second: Comparable, align: Alignment): Comparison {
  const drafts = { first, second };
  const later = new Map(second.pieces.map((each) => [each.name, each]));
  const earlier = new Set(first.pieces.map((each) => each.name));
  const pairs = first.pieces.map((piece): PiecePair => {
    const { name, title } = piece;
    const other = later.get(name);
    if (!other) return { name, title, first: piece };
    const laid = movedPiece(other, motionFor(drafts, { first: piece, second: other }, align));
    const between = overlapOf(seamOutline(piece), seamOutline(laid));
    return { name, title, first: piece, second: laid, between };
  });
  const added = second.pieces
    .filter((each) => !earlier.has(each.name))
    .map((piece): PiecePair => {
      const { name, title } = piece;
      const laid = inBodyFrame(piece)
        ? movedPiece(piece, frameMotion(drafts, piece.side, align))
        : piece;
      return { name, title, second: laid };
    });
  return { pairs: [...pairs, ...added], rows: figureRows(first, second) };
}

/** Names of edges that both drafts have, most frequent first: what they can be laid together along. */
export function sharedEdges(first: Comparable, second: Comparable): readonly string[] {
  const later = new Set(
    second.pieces.flatMap(({ name, edges }) => edges.map((edge) => `${name}:${edge.name}`)),
  );
  const count = new Map<string, number>();
  for (const { name, edges } of first.pieces) {
    for (const edge of edges) {
      if (edge.open === true || !later.has(`${name}:${edge.name}`)) continue;
      count.set(edge.name, (count.get(edge.name) ?? 0) + 1);
    }
  }
  return [...count].sort(([, a], [, b]) => b - a).map(([name]) => name);
}
