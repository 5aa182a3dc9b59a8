import type { Construction } from '../drafting/construction.ts';
import type { HouseRules } from '../drafting/house-rules.ts';
import type { FinishedPiece } from '../drafting/piece.ts';
import { proveBends } from './bends.ts';
import { proveCorners } from './corners.ts';
import { proveDarts } from './darts.ts';
import { proveGirths } from './girths.ts';
import { hasLength } from './crossing-itself.ts';
import { joinedPairs, placeEdges } from './joined-edges.ts';
import { proveOpening } from './opening.ts';
import { proveOutlines } from './outlines.ts';
import type { Proof } from './proof.ts';
import { proveSeams } from './seams.ts';
import { proveTopEdge } from './top-edge.ts';
import { verdictOf } from './verdict.ts';

/** What a proof is made from: the pieces as cut, what they were meant to be, the allowances. */
export type ProofInput = {
  readonly pieces: readonly FinishedPiece[];
  readonly construction: Construction;
  readonly rules: HouseRules;
};

/** A piece whose edges are rid of stretches without length, which have no direction to be measured. */
const measurable = (piece: FinishedPiece): FinishedPiece => ({
  ...piece,
  edges: piece.edges.map((edge) =>
    edge.path.every(hasLength) ? edge : { ...edge, path: edge.path.filter(hasLength) },
  ),
});

/** The proof of a gown (method section 8, all eight lines), measured from the pieces themselves. */
export function prove({ pieces: drawn, construction, rules }: ProofInput): Proof {
  const pieces = drawn.map(measurable);
  const placed = placeEdges(pieces);
  const pairs = joinedPairs(placed);
  const girths = proveGirths(pieces, construction);
  const seams = proveSeams(placed, pairs);
  const lines = [
    girths.line,
    seams.line,
    proveDarts(pieces, pairs),
    proveCorners(pieces, pairs),
    proveOutlines(pieces, rules),
    proveBends(pieces, construction.wanted, construction.intakesGiven === true),
    proveOpening(pieces, construction),
    proveTopEdge(pieces, construction, girths.chest),
  ];
  return {
    holds: lines.every((line) => line.holds),
    verdict: verdictOf(lines),
    lines,
    girths: girths.rows,
    seams: seams.rows,
  };
}
