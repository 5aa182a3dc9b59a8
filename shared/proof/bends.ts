import type { WantedGirth } from '../drafting/construction.ts';
import { mostSideChanges, seenBend } from '../drafting/fair-bends.ts';
import type { Edge, Piece } from '../drafting/piece.ts';
import { endOf, startOf } from '../geometry/curve.ts';
import type { Path } from '../geometry/path.ts';
import { type Point, distance } from '../geometry/point.ts';
import { bendChanges, turnsAlong } from '../geometry/turns.ts';
import { atMost, proofLine, reported } from './finding.ts';
import { spoken } from './joined-edges.ts';
import type { Finding, ProofLine } from './proof.ts';

/** Edges of one half that are one line on the body, in order, and how often it may change its bend. */
type Run = {
  readonly title: string;
  readonly most: number;
  readonly edges: readonly { readonly piece: Piece; readonly edge: Edge }[];
};

const sideNames = /^side(-|$)/;
const princessNames = /^(back-)?princess(-|$)/;

/**
 * How often an edge may change its bend (house table, method section 8): a side seam as the girths ask, and
 * where it runs on to the hem it turns out once more; a princess seam out over the bust and in below it, and
 * where it runs on to the knee it follows the waist and the hip as a side seam does; a lacing closes in one S;
 * a hem bends once, and once more where it runs into a train between two seams that turn outwards; an
 * armhole may level out before it meets the side.
 */
function mostChanges(piece: Piece, edge: Edge, ofSides: number): number {
  if (sideNames.test(edge.name)) return runsToTheHem(piece) ? ofSides + 1 : ofSides;
  if (princessNames.test(edge.name)) return !runsToTheKnee(piece) ? 2 : runsToTheHem(piece) ? 5 : 4;
  if (edge.name === 'lacing') return 1;
  if (edge.kind === 'hem') return piece.edges.some(({ name }) => princessNames.test(name)) ? 2 : 1;
  return edge.kind === 'top' || edge.kind === 'armhole' ? 1 : 0;
}

const runsToTheKnee = (piece: Piece): boolean =>
  piece.levels.some(({ level }) => level === 'hip') &&
  piece.levels.some(({ level }) => level === 'bust');

const runsToTheHem = (piece: Piece): boolean => piece.edges.some(({ kind }) => kind === 'hem');

/**
 * A front top line bends out of its dip, down at its peak and level again towards the side; once more where a
 * wide peak stands beyond the bust seam, and off the shoulder before the armhole. A back one levels once,
 * off the shoulder twice.
 */
function topChanges(side: 'front' | 'back', tops: readonly Piece[]): number {
  if (side === 'front') return 3;
  return tops.some(({ edges }) => edges.some(({ kind }) => kind === 'armhole')) ? 2 : 1;
}

const title = (piece: Piece, edge: Edge): string => `${piece.title}, ${spoken(edge.name)}`;

/** Ends nearer than this are one, mm. */
const joint = 0.05;

const meets = (one: Path, other: Path): boolean => {
  const [end, start] = [endOf(one), startOf(other)];
  return end !== undefined && start !== undefined && distance(end, start) < joint;
};

/** The lines of a half: the side seam across the waist seam, the top line across its panels, each other edge. */
function runsOf(pieces: readonly Piece[], ofSides: number): readonly Run[] {
  const runs: Run[] = [];
  const outer = pieces.filter(({ part }) => part !== 'inner');
  for (const side of ['front', 'back'] as const) {
    const tops = outer
      .filter((piece) => piece.side === side && piece.part === 'top')
      .flatMap((piece) =>
        piece.edges.filter(({ kind }) => kind === 'top').map((edge) => ({ piece, edge })),
      );
    if (tops.length === 0) continue;
    const name = side === 'front' ? 'Front top line' : 'Back top line';
    runs.push({
      title: name,
      most: topChanges(
        side,
        tops.map(({ piece }) => piece),
      ),
      edges: tops,
    });
  }
  const drawn = outer.flatMap((piece) => piece.edges.map((edge) => ({ piece, edge })));
  const carriedOn = new Set<Edge>();
  for (const { piece, edge } of drawn) {
    if (edge.open === true || carriedOn.has(edge)) continue;
    if (edge.kind === 'top' && piece.part === 'top') continue;
    const below = sideNames.test(edge.name)
      ? drawn.find(
          (each) =>
            each.piece.side === piece.side &&
            each.piece !== piece &&
            sideNames.test(each.edge.name) &&
            piece.part === 'top' &&
            each.piece.part === 'middle' &&
            meets(edge.path, each.edge.path),
        )
      : undefined;
    if (below) carriedOn.add(below.edge);
    const edges = below ? [{ piece, edge }, below] : [{ piece, edge }];
    const half = piece.side === 'front' ? 'Front' : 'Back';
    runs.push({
      title: below ? `${half}, side seam` : title(piece, edge),
      most: mostChanges(below?.piece ?? piece, edge, ofSides),
      edges,
    });
  }
  return runs.filter((run) => !run.edges.some(({ edge }) => edge.open === true));
}

const times = (count: number): string =>
  count === 0 ? 'never' : count === 1 ? 'once' : count === 2 ? 'twice' : `${count} times`;

function bendFinding({ title: name, most, edges }: Run, given: boolean): readonly Finding[] {
  if (
    edges.every(
      ({ edge }) => edge.path.every(({ kind }) => kind === 'line') && edge.path.length < 2,
    )
  )
    return [];
  const changes: readonly Point[] = bendChanges(
    edges.flatMap(({ edge }) => turnsAlong(edge.path)),
    seenBend,
  );
  const count = changes.length;
  const said = [`${name}: changes its bend ${times(count)}, at most ${times(most)} is fair.`];
  const where = edges.map(({ piece, edge }, k) => {
    const at = k === 0 ? changes.at(-1) : undefined;
    return { piece: piece.name, edge: edge.name, ...(count > most && at ? { at } : {}) };
  });
  if (count > most && given) {
    const why = 'The house rules give the intakes outright, so it is said and not refused.';
    return [reported(count, [...said, ` ${why}`], where)];
  }
  return [atMost(count, most, said, where)];
}

/**
 * Proof line 6: no edge bends the wrong way. Where the house rules give intakes outright the side seam
 * takes what is left, so that its fairness is reported and not forced.
 */
export function proveBends(
  pieces: readonly Piece[],
  wanted: readonly WantedGirth[],
  intakesGiven: boolean,
): ProofLine {
  const findings = runsOf(pieces, mostSideChanges(wanted.map((each) => each.wanted))).flatMap(
    (run) => bendFinding(run, intakesGiven),
  );
  const line = proofLine(6, 'No edge bends the wrong way', findings);
  // Pieces of straight edges alone have nothing here that could be wrong.
  return findings.length === 0 ? { ...line, holds: true } : line;
}
