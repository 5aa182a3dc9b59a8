import type { Edge, Notch, Piece } from '../drafting/piece.ts';
import { lengthBefore, pathLength } from '../geometry/curve.ts';
import { fine } from '../units/said.ts';
import { finding, missing, proofLine, reported } from './finding.ts';
import { type JoinedPair, type Placed, type PlacedEdge, keyOf, spoken } from './joined-edges.ts';
import { nearestPlace } from './nearest-place.ts';
import type { Finding, ProofLine, SeamRow } from './proof.ts';

const bound = 0.5;
/** A notch this far from its edge marks nothing. */
const farthest = 0.1;

/** Length of edge before a notch; no answer where the notch is off its edge. */
function arcOfNotch(edge: Edge, notch: Notch): number | undefined {
  const place = nearestPlace(edge.path, notch.at, farthest);
  return place && lengthBefore(edge.path, place);
}

const notchesOf = (piece: Piece, edge: Edge): readonly Notch[] =>
  piece.notches.filter((each) => each.edge === edge.name);

/** Length before a notch once the stated ease or gathers are sewn in. */
function sewnArc({ piece, edge }: PlacedEdge, arc: number): number {
  const even = arc / (edge.ratio ?? 1);
  const ease = edge.ease ?? 0;
  if (ease === 0) return even;
  const marks = notchesOf(piece, edge);
  const arcOf = (name: string | undefined): number | undefined => {
    const mark = marks.find((each) => each.name === name);
    return mark && arcOfNotch(edge, mark);
  };
  const a = arcOf(edge.easeBetween?.[0]) ?? 0;
  const b = arcOf(edge.easeBetween?.[1]) ?? pathLength(edge.path);
  const share = (arc - Math.min(a, b)) / Math.max(1e-9, Math.abs(b - a));
  return even - ease * Math.min(1, Math.max(0, share));
}

const titleOf = ({ first, second }: JoinedPair): string =>
  `${first.piece.title}, ${spoken(first.edge.name)}, to ${second.piece.title}, ${spoken(second.edge.name)}`;

/** A notch on a seam whose other side has none of that name. */
const loneNotch = ({ piece, edge }: PlacedEdge, notch: Notch): Finding =>
  missing(
    [
      `${piece.title}, ${spoken(edge.name)}: the notch “${spoken(notch.name)}” has no partner to meet.`,
    ],
    [{ piece: piece.name, edge: edge.name, at: notch.at }],
  );

function notchFindings(pair: JoinedPair): readonly Finding[] {
  const { first, second, opposite } = pair;
  const notches = notchesOf(first.piece, first.edge);
  const partners = notchesOf(second.piece, second.edge);
  const lone = partners.filter((each) => !notches.some((notch) => notch.name === each.name));
  const meeting = notches.flatMap((notch) => {
    const partner = partners.find((each) => each.name === notch.name);
    if (partner === undefined) return [loneNotch(first, notch)];
    const where = [
      { piece: first.piece.name, edge: first.edge.name, at: notch.at },
      { piece: second.piece.name, edge: second.edge.name, at: partner.at },
    ];
    const a = arcOfNotch(first.edge, notch);
    const b = arcOfNotch(second.edge, partner);
    if (a === undefined || b === undefined) {
      return [
        missing([`${titleOf(pair)}: the notch “${spoken(notch.name)}” is not on its seam.`], where),
      ];
    }
    const one = sewnArc(first, a);
    const along = sewnArc(second, b);
    const whole = sewnArc(second, pathLength(second.edge.path));
    const other = opposite ? whole - along : along;
    return [
      finding(
        one,
        other,
        bound,
        [
          `${titleOf(pair)}: the notches “${spoken(notch.name)}” lie `,
          fine(one),
          ' and ',
          fine(other),
          ' along.',
        ],
        where,
      ),
    ];
  });
  return [...meeting, ...lone.map((notch) => loneNotch(second, notch))];
}

function walk(pair: JoinedPair): { readonly row: SeamRow; readonly findings: readonly Finding[] } {
  const { first, second } = pair;
  const a = pathLength(first.edge.path);
  const b = pathLength(second.edge.path);
  const one = sewnArc(first, a);
  const other = sewnArc(second, b);
  const where = [
    { piece: first.piece.name, edge: first.edge.name },
    { piece: second.piece.name, edge: second.edge.name },
  ];
  const eased = one !== a || other !== b ? ', ease and gathers taken in' : '';
  const seam = finding(
    one,
    other,
    bound,
    [`${titleOf(pair)}: `, fine(one), ' and ', fine(other), `${eased}.`],
    where,
  );
  const findings = [seam, ...notchFindings(pair)];
  return {
    findings,
    row: {
      title: titleOf(pair),
      first: { piece: first.piece.name, edge: first.edge.name, length: a },
      second: { piece: second.piece.name, edge: second.edge.name, length: b },
      ease: (first.edge.ease ?? 0) - (second.edge.ease ?? 0),
      holds: findings.every((each) => each.holds),
    },
  };
}

/**
 * A centre seam, whose two sides are cut from one drawing: they cannot differ, so its length is said and
 * only its notches are looked at.
 */
function walkSelf({ piece, edge }: PlacedEdge): { row: SeamRow; findings: readonly Finding[] } {
  const length = pathLength(edge.path);
  const side = { piece: piece.name, edge: edge.name, length };
  const title = `${piece.title}, ${spoken(edge.name)}, left to right`;
  const where = [{ piece: piece.name, edge: edge.name }];
  const astray = notchesOf(piece, edge)
    .filter((notch) => arcOfNotch(edge, notch) === undefined)
    .map((notch) =>
      missing([`${title}: the notch “${spoken(notch.name)}” is not on its seam.`], where),
    );
  return {
    row: { title, first: side, second: side, ease: 0, holds: astray.length === 0 },
    findings: [
      reported(length, [`${title}: `, fine(length), ', cut as a pair from one drawing.'], where),
      ...astray,
    ],
  };
}

/** An edge that names a partner which is not there, or which names another one. */
function unmatched(placed: Placed, { piece, edge }: PlacedEdge): readonly Finding[] {
  const { joins } = edge;
  if (joins === undefined || joins === 'self') return [];
  const back = placed.get(keyOf(joins))?.edge.joins;
  if (
    back !== undefined &&
    back !== 'self' &&
    back.piece === piece.name &&
    back.edge === edge.name
  ) {
    return [];
  }
  const said = [`${piece.title}, ${spoken(edge.name)}: the edge it is sewn to does not answer it.`];
  return [missing(said, [{ piece: piece.name, edge: edge.name }])];
}

/** Proof line 2: joined edges equally long, notches meeting, after ease, gathers or pleats. */
export function proveSeams(
  placed: Placed,
  pairs: readonly JoinedPair[],
): { readonly line: ProofLine; readonly rows: readonly SeamRow[] } {
  const walked = [
    ...pairs.map(walk),
    ...[...placed.values()].filter(({ edge }) => edge.joins === 'self').map(walkSelf),
  ];
  const loose = [...placed.values()].flatMap((each) => unmatched(placed, each));
  const findings = [...walked.flatMap((each) => each.findings), ...loose];
  return {
    line: proofLine(2, 'Joined seams are equally long, notches meet', findings),
    rows: walked.map((each) => each.row),
  };
}
