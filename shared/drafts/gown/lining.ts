import type { PartTable } from '../../drafting/drafting-table.ts';
import { to } from '../../drafting/outline.ts';
import type { Edge, Notch, Piece } from '../../drafting/piece.ts';
import {
  endOf,
  endTangent,
  flatten,
  pathLength,
  reverse,
  splitPath,
  startOf,
  startTangent,
  stationAtLength,
} from '../../geometry/curve.ts';
import type { Path } from '../../geometry/path.ts';
import { type Point, add, distance, scale } from '../../geometry/point.ts';
import { mm, said } from '../../units/said.ts';
import { droppedHem, fallingHem } from './train.ts';

/** The lining's hem hangs this much above the gown's (reference.md 3h, common practice: 20 to 30). */
const hemShorter = 25;
/** Long seams of the lining are sewn this much inside their allowance, for 5 to 10 of ease a seam. */
const seamedInside = 3;
/** Where the back is on the fold, this much is laid in a pleat at the centre (10 to 20). */
const pleat = 15;

const nameOf = (name: string): string => `lining-${name}`;

/** A path shortened by a length at one end. */
function cutShort(path: Path, by: number, end: 'start' | 'end'): Path {
  const way = end === 'end' ? path : reverse(path);
  const station = stationAtLength(way, pathLength(way) - by);
  const kept = station ? splitPath(way, station)[0] : way;
  return end === 'end' ? kept : reverse(kept);
}

/** A hem moved up by the same, the way its cloth falls, between the ends of the shortened seams. */
function raised(hem: Path, from: Point, until: Point): Path {
  const [first, last] = [startOf(hem) ?? from, endOf(hem) ?? until];
  const fallTo = (at: Point, up: Point): number => Math.atan2(at.x - up.x, at.y - up.y);
  const level = fallingHem(hem, fallTo(first, from), fallTo(last, until));
  return droppedHem(level, () => [-hemShorter, 0], 0, 1);
}

/** The edges of a piece with its hem raised and the seams that run into it shortened. */
function shorterEdges(edges: readonly Edge[]): readonly Edge[] {
  const hems = edges.filter(({ kind }) => kind === 'hem');
  if (hems.length === 0) return edges;
  const short = edges.map((edge, k): Edge => {
    if (edge.kind === 'hem') return edge;
    const [before, after] = [edges.at(k - 1), edges[(k + 1) % edges.length]];
    let { path } = edge;
    if (after?.kind === 'hem') path = cutShort(path, hemShorter, 'end');
    if (before?.kind === 'hem') path = cutShort(path, hemShorter, 'start');
    return { ...edge, path };
  });
  return short.map((edge, k): Edge => {
    if (edge.kind !== 'hem') return edge;
    const [before, after] = [short.at(k - 1), short[(k + 1) % short.length]];
    const out = (tangent: Point, by: number): Point => scale({ x: tangent.y, y: -tangent.x }, by);
    const own = { from: edge.path[0]?.from, until: edge.path.at(-1)?.to };
    const from =
      before && before.kind !== 'hem'
        ? before.path.at(-1)?.to
        : own.from && add(own.from, out(startTangent(edge.path), -hemShorter));
    const until =
      after && after.kind !== 'hem'
        ? after.path[0]?.from
        : own.until && add(own.until, out(endTangent(edge.path), -hemShorter));
    return from && until ? { ...edge, path: raised(edge.path, from, until) } : edge;
  });
}

/** Marks that still lie on their edges: those on a seam that was shortened may not. */
const kept = (notches: readonly Notch[], edges: readonly Edge[]): readonly Notch[] =>
  notches.filter(({ edge: name, at }) => {
    const chain = flatten(edges.find((each) => each.name === name)?.path ?? [], 0.01);
    return chain.some((from, k) => {
      const until = chain[k + 1];
      return until && distance(from, at) + distance(at, until) - distance(from, until) < 0.01;
    });
  });

const liningPiece = (piece: Piece, lined: ReadonlySet<string>): Piece => {
  const { lines: _marks, ...plain } = piece;
  const edges = shorterEdges(piece.edges).map((edge): Edge => {
    const { joins, ...own } = edge;
    if (joins === undefined || joins === 'self') return edge;
    return lined.has(joins.piece) ? { ...own, joins: to(nameOf(joins.piece), joins.edge) } : own;
  });
  return {
    ...plain,
    name: nameOf(piece.name),
    title: `Lining, ${piece.title.charAt(0).toLowerCase()}${piece.title.slice(1)}`,
    part: 'inner',
    cloth: 'lining',
    edges,
    notches: kept(piece.notches, edges),
    // Eyelets are drilled in the gown alone.
    drills: piece.drills.slice(0, piece.darts.length),
  };
};

/** The lining of every piece but the sleeves: the same seam lines, shorter at the hem. */
export function lineGown(
  paper: PartTable,
  pieces: readonly Piece[],
  faced: boolean,
): readonly Piece[] {
  const outer = pieces.filter(({ part }) => part !== 'inner' && part !== 'sleeve');
  const lined = new Set(outer.map(({ name }) => name));
  const lining = outer.map((piece) => liningPiece(piece, lined));
  const onFold = pieces.some(
    ({ side, part, edges }) =>
      side === 'back' && part === 'top' && edges.some(({ kind }) => kind === 'fold'),
  );
  paper.draw(
    'Lining',
    said`The same seam lines as the gown, the hem ${mm(hemShorter)} shorter. Sew the long seams of the skirt ${mm(seamedInside)} nearer to the cut edge than the seam line: each then gives ${mm(2 * seamedInside)} of ease; those of the bodice as drawn, so that it stays smooth.${onFold ? ' Lay the fold of the back ' : ''}${onFold ? said`${mm(pleat)} beyond the centre line and press that into a pleat.` : ''}${faced ? ' Lay the facing on the lining, stitch it down along its lower edge, and sew both to the upper edge as one.' : ''}`,
    {
      why: said`A lining that is a little wider takes no strain, and one that is shorter never shows. Ease is given in the sewing, so that every seam line still meets its partner and is proven.`,
      pieces: lining.map(({ name }) => name),
    },
  );
  return lining;
}
