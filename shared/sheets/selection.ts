import type { Piece } from '../drafting/piece.ts';

/** What a maker prints: the top alone, to try on in calico first, or every piece. */
export const selections = ['bodice-toile', 'whole-gown'] as const;
export type Selection = (typeof selections)[number];

/** The pieces of a selection, in the draft's order. */
export const choosePieces = <P extends Piece>(
  pieces: readonly P[],
  selection: Selection,
): readonly P[] =>
  selection === 'whole-gown' ? pieces : pieces.filter((each) => each.part === 'top');
