import type { Construction } from '../drafting/construction.ts';
import type { Piece } from '../drafting/piece.ts';
import { pathLength } from '../geometry/curve.ts';
import { fine } from '../units/said.ts';
import { finding, missing, proofLine, reported } from './finding.ts';
import type { Finding, ProofLine } from './proof.ts';
import { type MeasuredOpening, measureOpenings } from './top-openings.ts';

const bound = 0.5;

function openingFinding({ asked, width }: MeasuredOpening): Finding {
  const side = asked.side === 'front' ? 'Front' : 'Back';
  const where = [asked.centre, asked.outer];
  if (width === undefined) {
    return missing([`${side} opening above the bust: its edges are not on the pieces.`], where);
  }
  return finding(
    width,
    asked.wanted,
    bound,
    [`${side} opening above the bust: `, fine(width), ' taken of ', fine(asked.wanted), ' asked.'],
    where,
  );
}

/** Length of the finished top edge, darts and seams closed, round the whole body: said, compared with nothing. */
function edgeFinding(pieces: readonly Piece[]): Finding {
  const tops = pieces
    .filter(({ part }) => part !== 'inner')
    .flatMap((piece) =>
      piece.edges
        .filter((edge) => edge.kind === 'top')
        .map((edge) => ({ piece: piece.name, edge })),
    );
  const length = 2 * tops.reduce((sum, { edge }) => sum + pathLength(edge.path), 0);
  const where = tops.map(({ piece, edge }) => ({ piece, edge: edge.name }));
  return tops.length === 0
    ? missing(['No top edge is drawn.'], [])
    : reported(length, ['The closed top edge is ', fine(length), ' long.'], where);
}

/** Proof line 8: the edge above the bust has had its share taken out, so it cannot gape. */
export function proveTopEdge(
  pieces: readonly Piece[],
  construction: Construction,
  chest: readonly Finding[],
): ProofLine {
  const estimated = construction.wanted.some((each) => each.level === 'chest' && each.estimated);
  const marked = chest.map((each): Finding =>
    estimated ? { ...each, said: [...each.said, ' The upper chest is an estimate.'] } : each,
  );
  return proofLine(8, 'The top edge cannot gape', [
    ...measureOpenings(pieces, construction).map(openingFinding),
    ...(marked.length === 0 ? [missing(['No chest girth was asked for.'], [])] : marked),
    edgeFinding(pieces),
  ]);
}
