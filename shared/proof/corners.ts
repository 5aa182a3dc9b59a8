import type { Edge, Piece } from '../drafting/piece.ts';
import { finding, proofLine } from './finding.ts';
import { type JoinedPair, cornerBetween, isPanelSeam, spoken } from './joined-edges.ts';
import type { Finding, ProofLine } from './proof.ts';

const squareBound = 0.5;
const straightBound = 2;

/** Centre lines: what lies on the fold, or is sewn to its own mirror image. */
const isCentre = (edge: Edge): boolean => edge.kind === 'fold' || edge.joins === 'self';

/** Corners at the centre line, and those given in degrees. */
function squareCorners(piece: Piece): readonly Finding[] {
  return piece.edges.flatMap((edge, index) => {
    const before = piece.edges.at(index - 1);
    const atCentre = before !== undefined && isCentre(edge) !== isCentre(before);
    if (!before || (edge.corner === undefined && !atCentre)) return [];
    const degrees = cornerBetween(before, edge);
    const expected = edge.corner ?? 90;
    const at = edge.path[0]?.from;
    return [
      finding(
        degrees,
        expected,
        squareBound,
        [
          `${piece.title}: the ${spoken(before.name)} meets the ${spoken(edge.name)} at `,
          { deg: degrees },
          ...(expected === 90 ? ['.'] : [', meant to be ', { deg: expected }, '.']),
        ],
        [{ piece: piece.name, edge: edge.name, ...(at && { at }) }],
      ),
    ];
  });
}

function acrossSeam(pair: JoinedPair): readonly Finding[] {
  const { first, second } = pair;
  return pair.outerEnds.map((end) => {
    const sum = end.first.degrees + end.second.degrees;
    return finding(
      sum,
      180,
      straightBound,
      [
        `${first.piece.title} sewn to ${second.piece.title} along the ${spoken(first.edge.name)}: the ${spoken(end.first.neighbour.name)} runs on at `,
        { deg: sum },
        ' across the seam.',
      ],
      [
        { piece: first.piece.name, edge: first.edge.name, at: end.at },
        { piece: second.piece.name, edge: second.edge.name },
      ],
    );
  });
}

/** Proof line 4: square at fold, centre front and centre back; straight across joined seams. */
export function proveCorners(pieces: readonly Piece[], pairs: readonly JoinedPair[]): ProofLine {
  return proofLine(4, 'Square at the centre lines, straight across the seams', [
    ...pieces.flatMap(squareCorners),
    ...pairs.filter((pair) => !isPanelSeam(pair)).flatMap(acrossSeam),
  ]);
}
