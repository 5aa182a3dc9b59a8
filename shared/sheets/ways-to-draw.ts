import type { Piece } from '../drafting/piece.ts';
import type { DrawnHow } from './print-order.ts';

/**
 * How a piece may be drawn, the way its draft has it first: a half on the fold, or opened out; a piece cut
 * as a pair once, or with its mirror image; any other once.
 */
export function waysToDraw({ edges, copies }: Piece): readonly [DrawnHow, ...DrawnHow[]] {
  if (edges.some(({ kind }) => kind === 'fold')) return ['on fold', 'opened out'];
  return copies > 1 ? ['drawn once', 'mirrored pair'] : ['drawn once'];
}
