import { allowanceKind } from '../../drafting/edge-allowance.ts';
import type { Edge, Piece } from '../../drafting/piece.ts';

const isHem = ({ kind }: Edge): boolean => kind === 'hem';

/**
 * The pieces with a hem of one depth all round: where some of it bends and can be turned up only narrowly, so
 * is what lies straight beside it, or the two would not meet at their seam.
 */
export function evenHems(pieces: readonly Piece[]): readonly Piece[] {
  const bends = pieces.some((piece) =>
    piece.edges.some((edge) => isHem(edge) && allowanceKind(edge) === 'hem'),
  );
  if (!bends) return pieces;
  return pieces.map((piece) =>
    piece.edges.some(isHem)
      ? {
          ...piece,
          edges: piece.edges.map((edge) => (isHem(edge) ? { ...edge, narrow: true } : edge)),
        }
      : piece,
  );
}
