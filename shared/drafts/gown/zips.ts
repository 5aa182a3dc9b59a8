import { notchAtHeight, notchAtLength } from '../../drafting/outline.ts';
import type { Edge, Notch, Piece } from '../../drafting/piece.ts';
import { endOf, lengthBefore, pathCrossings, pathLength, startOf } from '../../geometry/curve.ts';
import { point } from '../../geometry/point.ts';

/** Pieces with a closure in them, and how long it is, mm. */
export type Closed = { readonly pieces: readonly Piece[]; readonly length: number };

/** The centre back as it was drawn: a seam of a pair, with room for a zip. */
export const isCentreBack = (edge: Edge): boolean => edge.kind === 'zip' && edge.joins === 'self';

const isSide = (edge: Edge): boolean => edge.name === 'side' && edge.kind === 'side';

/** Whether a piece belongs to the gown above its flare. */
export const isBody = ({ part }: Piece): boolean => part === 'top' || part === 'middle';

/** Length of an edge above a height, whichever way it is travelled, mm. */
function lengthAbove({ path }: Edge, y: number): number {
  const [from, until] = [startOf(path), endOf(path)];
  if (!from || !until) return 0;
  const station = pathCrossings(path, point(0, y), point(1, y))[0];
  if (!station) return Math.max(from.y, until.y) <= y ? pathLength(path) : 0;
  const before = lengthBefore(path, station);
  return from.y < until.y ? before : pathLength(path) - before;
}

const without = (notches: readonly Notch[], name: string): readonly Notch[] =>
  notches.filter((notch) => notch.name !== name);

/** A zip in the centre back from the top edge to a height. */
export function zipCentreBack(pieces: readonly Piece[], end: number): Closed {
  let length = 0;
  const closed = pieces.map((piece): Piece => {
    const centre = piece.edges.find(isCentreBack);
    if (!centre || !isBody(piece)) return piece;
    length += lengthAbove(centre, end);
    return {
      ...piece,
      notches: [...without(piece.notches, 'zip-end'), ...notchAtHeight('zip-end', centre, end, 2)],
    };
  });
  return { pieces: closed, length };
}

/** A centre back that runs straight down can lie on a fold; one that runs outwards below, or takes a godet, stays a seam. */
const isStraight = (pieces: readonly Piece[]): boolean =>
  pieces
    .filter(isBody)
    .flatMap((piece) => piece.edges.filter(isCentreBack))
    .every(
      ({ path, corner }) =>
        corner === undefined && path.every(({ from, to }) => from.x === 0 && to.x === 0),
    );

function withoutZip(piece: Piece, fold: boolean): Piece {
  const centre = piece.edges.find(isCentreBack);
  if (!centre) return piece;
  const notches = without(piece.notches, 'zip-end');
  const { joins: _sewn, ...plain } = centre;
  const changed: Edge = fold ? { ...plain, kind: 'fold' } : { ...centre, kind: 'seam' };
  return {
    ...piece,
    edges: piece.edges.map((edge) => (edge === centre ? changed : edge)),
    ...(fold ? { cut: 'cut 1 on fold', copies: 1 } : {}),
    notches: fold ? notches.filter(({ edge }) => edge !== centre.name) : notches,
  };
}

/**
 * A zip in the left side seam from its upper end to a height on the front; the back's end lies as far
 * above its hip mark along the seam. The centre back is then cut on the fold where it runs straight.
 */
export function zipSide(
  pieces: readonly Piece[],
  end: number,
): Closed & { readonly fold: boolean } {
  const fold = isStraight(pieces);
  let length = 0;
  const above = new Map<string, number>();
  for (const piece of pieces) {
    const side = isBody(piece) && piece.side === 'front' ? piece.edges.find(isSide) : undefined;
    if (!side) continue;
    const own = lengthAbove(side, end);
    length += own;
    if (own < pathLength(side.path))
      above.set(side.joins === 'self' ? '' : (side.joins?.piece ?? ''), own);
  }
  const closed = pieces.map((piece): Piece => {
    const side = isBody(piece) ? piece.edges.find(isSide) : undefined;
    if (!side) return withoutZip(piece, fold);
    const along = above.get(piece.name);
    const marks =
      piece.side === 'front'
        ? notchAtHeight('zip-end', side, end, 1)
        : along === undefined
          ? []
          : notchAtLength('zip-end', side, along, 2);
    const plain = withoutZip(piece, fold);
    return {
      ...plain,
      edges: plain.edges.map((edge) => (isSide(edge) ? { ...edge, kind: 'zip' } : edge)),
      notches: [...plain.notches, ...marks],
    };
  });
  return { pieces: closed, length, fold };
}
