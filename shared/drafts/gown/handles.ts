import type { Handle } from '../../drafting/construction.ts';
import type { Edge, Piece } from '../../drafting/piece.ts';
import { endOf, endTangent, startOf, startTangent } from '../../geometry/curve.ts';
import { type Point, distance, point, scale } from '../../geometry/point.ts';
import type { GownStyle } from './style-card.ts';

type Held = { readonly piece: Piece; readonly edge: Edge };

const down = point(0, 1);
const up = point(0, -1);
const out = point(1, 0);

/**
 * The points a maker moves by hand, each where it lies on a piece: neck depth, neck width and top drop
 * at the peak, side and back depth, waist seam, dart length, knee line and its girth, flare length, train. A straight top
 * line has neither dip nor peak: its drop is moved at the centre. The opening above the bust turns about `turns`.
 */
export function gownHandles(
  pieces: readonly Piece[],
  style: GownStyle,
  turns: Point,
): readonly Handle[] {
  const front = edgesOf(pieces, (piece) => piece.side === 'front' && piece.part === 'top');
  const back = edgesOf(pieces, (piece) => piece.side === 'back' && piece.part === 'top');
  const centre = heldAt(front, 'top', startOf);
  const outer = front.findLast(({ edge }) => edge.kind === 'top');
  const skirt = pieces.filter((piece) => piece.side === 'front' && isSkirt(piece));
  const middle = edgesOf(skirt, () => true);
  const flare = edgesOf(pieces, (piece) => piece.name === 'flare-front');
  return [
    ...(style.topLine === 'straight'
      ? move('topDrop', centre, down)
      : [...move('neckDepth', centre, down), ...peakHandles(front, style, turns)]),
    ...move('sideDepth', outer && placed(outer, endOf), down),
    ...move('backDepth', heldAt(back, 'top', startOf), up),
    ...(style.waistSeam === 'raised'
      ? move('waistSeamRise', heldAt(middle, 'fold', endOf), up)
      : []),
    ...move('dartLength', dartTip(skirt, style), down),
    ...move('kneeLevel', onKneeLine(skirt.slice(0, 1), 'from'), up),
    // A millimetre out at one of the four quarters of the knee line is four round it.
    ...move('kneeFinished', onKneeLine(skirt.slice(-1), 'to'), out, 4),
    ...move('flareLength', heldAt(flare.length > 0 ? flare : middle, 'fold', startOf), down),
    ...trainHandle(pieces),
  ];
}

type Placed = { readonly piece: string; readonly at: Point };

const move = (
  key: Handle['key'],
  place: Placed | undefined,
  along: Point,
  perMillimetre = 1,
): readonly Handle[] => (place === undefined ? [] : [{ key, ...place, along, perMillimetre }]);

const edgesOf = (pieces: readonly Piece[], take: (piece: Piece) => boolean): readonly Held[] =>
  pieces.filter(take).flatMap((piece) => piece.edges.map((edge) => ({ piece, edge })));

function placed({ piece, edge }: Held, end: typeof startOf): Placed | undefined {
  const at = end(edge.path);
  return at && { piece: piece.name, at };
}

/** An end of the first edge of a kind. */
function heldAt(
  edges: readonly Held[],
  kind: Edge['kind'],
  end: typeof startOf,
): Placed | undefined {
  const held = edges.find(({ edge }) => edge.kind === kind);
  return held && placed(held, end);
}

/** An end of the knee line on a piece. */
function onKneeLine([piece]: readonly Piece[], end: 'from' | 'to'): Placed | undefined {
  const line = piece?.levels.find(({ level }) => level === 'knee-seam');
  return piece && line && { piece: piece.name, at: line[end] };
}

/** The hem at the centre back, which moves down the way its centre seam or fold arrives there. */
function trainHandle(pieces: readonly Piece[]): readonly Handle[] {
  const back = pieces.filter(
    ({ side, name, levels }) =>
      side === 'back' &&
      (name === 'flare-back' || levels.some(({ level }) => level === 'knee-seam')),
  );
  const piece = back.findLast(({ name }) => name === 'flare-back') ?? back[0];
  const hem = piece?.edges.findIndex(({ kind }) => kind === 'hem') ?? -1;
  const up = piece?.edges[hem + 1];
  const at = up && startOf(up.path);
  if (!piece || !up || !at) return [];
  return move('train', { piece: piece.name, at }, scale(startTangent(up.path), -1));
}

/** Whether a piece reaches down to the knee seam. */
const isSkirt = ({ levels, part }: Piece): boolean =>
  part !== 'flare' && levels.some(({ level }) => level === 'knee-seam');

/**
 * The tip of the front dart, or the place where a princess seam has taken in all it does; none where
 * there is no dart, or one too small to reach its length.
 */
function dartTip(skirt: readonly Piece[], { dartLength }: GownStyle): Placed | undefined {
  for (const piece of skirt) {
    const waist = waistOf(piece);
    const ends = [
      ...(piece.darts.find(({ name }) => name === 'waist')?.centreLeg ?? []),
      ...(piece.edges.find(({ name }) => name === 'princess')?.path ?? []),
    ].map(({ to }) => to);
    const at = ends.find(({ y }) => Math.abs(y - (waist ?? 0) - dartLength) < 1e-6);
    if (at) return { piece: piece.name, at };
  }
  return undefined;
}

/** Height of the waist on a piece: its level, or its upper edge where the seam lies in the waist itself. */
const waistOf = (piece: Piece): number | undefined =>
  piece.levels.find(({ level }) => level === 'waist')?.from.y ??
  endOf(piece.edges.find(({ name }) => name === 'centre')?.path ?? [])?.y;

/**
 * Where the peak came to lie once the opening above the bust was laid flat: out along the top line it
 * widens the neck. The line climbs to the peak in one curve and falls in
 * another, so the peak is where two curves meet within an edge; failing that, where the line is cut.
 */
function peakHandles(front: readonly Held[], style: GownStyle, turns: Point): readonly Handle[] {
  const peak = point(style.neckWidth, style.topDrop);
  const places = front
    .filter(({ edge }) => edge.kind === 'top')
    .flatMap(({ piece, edge: { path } }) =>
      path.map((segment, index) => ({
        piece: piece.name,
        at: segment.to,
        along: endTangent([segment]),
        joint: index < path.length - 1,
      })),
    );
  const joints = places.filter(({ joint }) => joint);
  const found = (joints.length > 0 ? joints : places.slice(0, 1)).toSorted(
    (a, b) => distance(a.at, peak) - distance(b.at, peak),
  )[0];
  if (!found) return [];
  const { piece, at, along } = found;
  const { direction, travel } = dropOfPeak(along, style, turns);
  return [
    ...move('neckWidth', { piece, at }, along),
    ...move('topDrop', { piece, at }, direction, 1 / travel),
  ];
}

/**
 * Where the peak goes, and how far, for a millimetre of drop. On the outer panel it lies turned by the
 * opening, which keeps its amount at the peak's height: the lower the peak, the wider its angle.
 */
function dropOfPeak(
  along: Point,
  { neckWidth, topDrop }: GownStyle,
  turns: Point,
): { readonly direction: Point; readonly travel: number } {
  const { x: cos, y: sin } = along;
  const [out, height] = [neckWidth - turns.x, turns.y - topDrop];
  // The turn grows by sin / height a millimetre; the peak is carried round by it, and down by the drop.
  const moved = point(
    -sin + (sin / height) * (height * cos - out * sin),
    cos + (sin / height) * (out * cos + height * sin),
  );
  const travel = distance(moved, point(0, 0));
  return { direction: scale(moved, 1 / travel), travel };
}
