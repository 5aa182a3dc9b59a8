import type { Dart, Piece } from '../drafting/piece.ts';
import { endTangent, pathLength, startTangent } from '../geometry/curve.ts';
import { fine } from '../units/said.ts';
import { finding, missing, proofLine } from './finding.ts';
import { type JoinedPair, isPanelSeam, spoken, turnBetween } from './joined-edges.ts';
import type { Finding, ProofLine } from './proof.ts';

const legBound = 0.1;
const kinkBound = 2;

const nameOf = (piece: Piece, dart: Dart): string => `${piece.title}, ${spoken(dart.name)} dart`;

function legsEqual(piece: Piece, dart: Dart): Finding {
  const centre = pathLength(dart.centreLeg);
  const side = pathLength(dart.sideLeg);
  const at = dart.centreLeg.at(-1)?.to;
  return finding(
    side,
    centre,
    legBound,
    [`${nameOf(piece, dart)}: legs `, fine(centre), ' and ', fine(side), '.'],
    [
      {
        piece: piece.name,
        ...(dart.mouth === undefined ? {} : { edge: dart.mouth }),
        ...(at && { at }),
      },
    ],
  );
}

/**
 * Kink left in the edge when the side leg is laid on the centre leg: each neighbour is read against
 * its own leg, so the motion that closes the dart need not be carried out.
 */
function closesFlat(piece: Piece, dart: Dart): readonly Finding[] {
  if (dart.mouth === undefined) return [];
  const index = piece.edges.findIndex((edge) => edge.name === dart.mouth);
  const mouth = piece.edges[index];
  const before = piece.edges.at(index - 1);
  const after = piece.edges[(index + 1) % piece.edges.length];
  const where = [{ piece: piece.name, edge: dart.mouth }];
  if (index < 0 || !mouth || !before || !after) {
    return [missing([`${nameOf(piece, dart)}: its mouth is not on the outline.`], where)];
  }
  const start = mouth.path[0]?.from ?? { x: 0, y: 0 };
  const reach = (leg: Dart['centreLeg']): number =>
    Math.hypot((leg[0]?.from.x ?? 0) - start.x, (leg[0]?.from.y ?? 0) - start.y);
  const centreFirst = reach(dart.centreLeg) <= reach(dart.sideLeg);
  const firstLeg = centreFirst ? dart.centreLeg : dart.sideLeg;
  const secondLeg = centreFirst ? dart.sideLeg : dart.centreLeg;
  const kink =
    turnBetween(endTangent(before.path), startTangent(firstLeg)) -
    turnBetween(startTangent(after.path), startTangent(secondLeg));
  return [
    finding(
      kink,
      0,
      kinkBound,
      [
        `${nameOf(piece, dart)}: closed, the edge bends by `,
        { deg: Math.abs(kink) },
        ' at the mouth.',
      ],
      [{ ...where[0], piece: piece.name, at: start }],
    ),
  ];
}

function panelsMeet(pair: JoinedPair): readonly Finding[] {
  return pair.outerEnds.map((end) => {
    const kink = end.first.degrees + end.second.degrees - 180;
    const { first, second } = pair;
    const edge = spoken(end.first.neighbour.name);
    return finding(
      kink,
      0,
      kinkBound,
      [
        `${first.piece.title}, ${spoken(first.edge.name)} sewn to ${second.piece.title}: the ${edge} edge bends by `,
        { deg: Math.abs(kink) },
        ' there.',
      ],
      [
        { piece: first.piece.name, edge: first.edge.name, at: end.at },
        { piece: second.piece.name, edge: second.edge.name },
      ],
    );
  });
}

/** Proof line 3: dart legs equal; darts and panel seams close without a kink in the edge. */
export function proveDarts(pieces: readonly Piece[], pairs: readonly JoinedPair[]): ProofLine {
  const darts = pieces.flatMap((piece) =>
    piece.darts.flatMap((dart) => [legsEqual(piece, dart), ...closesFlat(piece, dart)]),
  );
  const panels = pairs.filter(isPanelSeam).flatMap(panelsMeet);
  const findings = [...darts, ...panels];
  const line = proofLine(3, 'Darts and panel seams close without a kink', findings);
  // A gown without a single dart or panel has nothing here that could be wrong.
  return findings.length === 0 ? { ...line, holds: true } : line;
}
