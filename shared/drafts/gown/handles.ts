import type { Handle } from '../../drafting/construction.ts';
import type { Edge, Piece } from '../../drafting/piece.ts';
import { endOf, startOf } from '../../geometry/curve.ts';
import { type Point, distance, point } from '../../geometry/point.ts';
import type { GownStyle } from './style-card.ts';

/** The points of the front a maker moves by hand: neck depth, neck width, finished knee. */
export function gownHandles(pieces: readonly Piece[], style: GownStyle): readonly Handle[] {
  const tops = pieces.filter((piece) => piece.side === 'front' && piece.part === 'top');
  const topEdges = tops.flatMap((piece) =>
    piece.edges
      .filter((edge) => edge.kind === 'top')
      .map((edge): { readonly piece: Piece; readonly edge: Edge } => ({ piece, edge })),
  );
  const handles: Handle[] = [];
  const first = topEdges[0];
  const centre = first ? startOf(first.edge.path) : undefined;
  // A straight top line has neither dip nor peak to move.
  const dips = style.topLine !== 'straight';
  if (dips && first && centre) {
    handles.push({
      key: 'neckDepth',
      piece: first.piece.name,
      at: centre,
      along: point(0, 1),
      perMillimetre: 1,
    });
  }
  const peak = point(style.neckWidth, style.topDrop);
  const places = topEdges.flatMap(({ piece, edge }) =>
    edge.path.map((segment) => ({ piece: piece.name, at: segment.to })),
  );
  const nearest = places.reduce<{ readonly piece: string; readonly at: Point } | undefined>(
    (best, each) => (best && distance(best.at, peak) <= distance(each.at, peak) ? best : each),
    undefined,
  );
  if (dips && nearest) {
    handles.push({
      key: 'neckWidth',
      piece: nearest.piece,
      at: nearest.at,
      along: point(1, 0),
      perMillimetre: 1,
    });
  }
  const middle = pieces.find((piece) => piece.name === 'front-middle');
  const side = middle?.edges.find((edge) => edge.name === 'side');
  const knee = side ? endOf(side.path) : undefined;
  if (middle && knee) {
    // A millimetre out at one of the four quarters of the knee seam is four round it.
    handles.push({
      key: 'kneeFinished',
      piece: middle.name,
      at: knee,
      along: point(1, 0),
      perMillimetre: 4,
    });
  }
  return handles;
}
