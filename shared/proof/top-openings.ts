import type { Construction, TopOpening } from '../drafting/construction.ts';
import type { EdgeRef, Piece } from '../drafting/piece.ts';
import { endOf, endTangent, pathCrossings, reverse, startOf } from '../geometry/curve.ts';
import type { Path } from '../geometry/path.ts';

/** An opening above the bust as it lies on the pieces; no width where a leg is not drawn. */
export type MeasuredOpening = { readonly asked: TopOpening; readonly width: number | undefined };

function legOf(
  pieces: readonly Piece[],
  ref: EdgeRef,
  which: 'centre' | 'outer',
): Path | undefined {
  const piece = pieces.find((each) => each.name === ref.piece);
  const edge = piece?.edges.find((each) => each.name === ref.edge);
  if (edge !== undefined && edge.open !== true) return edge.path;
  const dart = piece?.darts.find((each) => each.name === ref.edge || each.mouth === ref.edge);
  return which === 'centre' ? dart?.centreLeg : dart?.sideLeg;
}

/** x of a leg at a height: on it, or carried on straight beyond its upper end. */
function xAtHeight(leg: Path, height: number): number | undefined {
  const start = startOf(leg);
  const end = endOf(leg);
  if (start === undefined || end === undefined) return undefined;
  const upwards = start.y > end.y ? leg : reverse(leg);
  const top = endOf(upwards) ?? end;
  if (height > top.y) {
    return pathCrossings(upwards, { x: 0, y: height }, { x: 1, y: height }).at(-1)?.at.x;
  }
  const way = endTangent(upwards);
  return way.y === 0 ? undefined : top.x + (way.x * (height - top.y)) / way.y;
}

/** Gap between the two legs of each opening at its stated height, mm. */
export const measureOpenings = (
  pieces: readonly Piece[],
  construction: Construction,
): readonly MeasuredOpening[] =>
  construction.topOpenings.map((asked) => {
    const centre = legOf(pieces, asked.centre, 'centre');
    const outer = legOf(pieces, asked.outer, 'outer');
    const from = centre && xAtHeight(centre, asked.height);
    const to = outer && xAtHeight(outer, asked.height);
    return { asked, width: from === undefined || to === undefined ? undefined : to - from };
  });
