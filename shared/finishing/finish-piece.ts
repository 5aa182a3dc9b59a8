import type { HouseRules } from '../drafting/house-rules.ts';
import type { FinishedPiece, Piece } from '../drafting/piece.ts';
import { cutLine } from './cut-line.ts';
import { type LabelFacts, lettering } from './lettering.ts';
import { notchMark } from './notches.ts';

/**
 * A drafted piece made ready for the scissors: cutting line with the house's allowances, dart caps,
 * notch strokes and label. Seam lines stay as drafted: an allowance never enters a girth.
 */
export function finishPiece(piece: Piece, rules: HouseRules, label: LabelFacts): FinishedPiece {
  const outline = cutLine(piece, rules);
  return {
    ...piece,
    cutLine: outline,
    notchMarks: piece.notches.map((notch) => notchMark(notch, piece, outline, rules)),
    lettering: lettering(piece, label),
  };
}
