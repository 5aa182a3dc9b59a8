import type { WantedGirth } from '../drafting/construction.ts';
import type { HouseRules } from '../drafting/house-rules.ts';
import type { FinishedPiece } from '../drafting/piece.ts';
import { proveBlockGirths } from './block-girths.ts';
import { proveCorners } from './corners.ts';
import { proveDarts } from './darts.ts';
import { joinedPairs, placeEdges } from './joined-edges.ts';
import { proveOutlines } from './outlines.ts';
import type { Proof } from './proof.ts';
import { proveSeams } from './seams.ts';
import { verdictOf } from './verdict.ts';

/** The proof of a block (method section 8, lines 1 to 5), measured from the pieces themselves. */
export function proveBlock(input: {
  readonly pieces: readonly FinishedPiece[];
  readonly wanted: readonly WantedGirth[];
  readonly rules: HouseRules;
}): Proof {
  const { pieces, wanted, rules } = input;
  const placed = placeEdges(pieces);
  const pairs = joinedPairs(placed);
  const girths = proveBlockGirths(pieces, wanted);
  const seams = proveSeams(placed, pairs);
  const lines = [
    girths.line,
    seams.line,
    proveDarts(pieces, pairs),
    proveCorners(pieces, pairs),
    proveOutlines(pieces, rules),
  ];
  return {
    holds: lines.every((line) => line.holds),
    verdict: verdictOf(lines),
    lines,
    girths: girths.rows,
    seams: seams.rows,
  };
}
