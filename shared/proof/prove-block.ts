import type { WantedGirth } from '../drafting/construction.ts';
import type { HouseRules } from '../drafting/house-rules.ts';
import type { FinishedPiece } from '../drafting/piece.ts';
import type { Said } from '../units/said.ts';
import { proveBlockGirths } from './block-girths.ts';
import { proveCorners } from './corners.ts';
import { proveDarts } from './darts.ts';
import { joinedPairs, placeEdges } from './joined-edges.ts';
import { proveOutlines } from './outlines.ts';
import type { Proof, ProofLine } from './proof.ts';
import { proveSeams } from './seams.ts';

function verdictOf(lines: readonly ProofLine[]): Said {
  const [first, ...others] = lines.flatMap((line) => line.findings.filter((each) => !each.holds));
  if (first === undefined) return ['These pieces sew together.'];
  const more = others.length === 0 ? '' : ` ${others.length} more do not hold.`;
  return ['These pieces do not sew together yet. ', ...first.said, more];
}

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
