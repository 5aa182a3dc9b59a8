import type { Edge, Piece } from '../drafting/piece.ts';
import { endOf, pathLength, startOf, startTangent } from '../geometry/curve.ts';
import { type Point, distance } from '../geometry/point.ts';
import type { Unit } from '../units/said.ts';
import { meetingOf, pairIn } from './chalk-flare.ts';
import type { Row } from './chalk-rows.ts';

const named = ({ edges }: Piece, name: string): Edge | undefined =>
  edges.find((each) => each.name === name);

const across = ({ path }: Edge): number => {
  const [from, to] = [startOf(path), endOf(path)];
  return from && to ? distance(from, to) : 0;
};

/** A ring's sector: struck from where its ends would meet. */
function bentRows(upper: Edge, lower: Edge, apex: Point, unit: Unit): readonly Row[] {
  const pair = pairIn(unit);
  const radius = (at: Point | undefined): number => (at ? distance(apex, at) : 0);
  return [
    pair('radius, upper edge', radius(startOf(upper.path))),
    pair('along it', pathLength(upper.path)),
    pair('straight across', across(upper)),
    pair('radius, lower edge, back', radius(startOf(lower.path))),
    pair('radius, lower edge, front', radius(endOf(lower.path))),
    pair('straight across', across(lower)),
  ];
}

/** Where the pleats of a straight band are laid: the first, then how far apart. */
function pleatRows(piece: Piece, unit: Unit): readonly Row[] {
  const pair = pairIn(unit);
  const places = (piece.lines ?? [])
    .filter(({ kind }) => kind === 'pleat-place')
    .flatMap(({ path }) => startOf(path)?.x ?? []);
  const fold = (piece.lines ?? []).find(({ kind }) => kind === 'pleat-fold');
  const [first, second] = places;
  if (first === undefined || !fold) return [];
  return [
    { kind: 'pair', name: 'pleats', value: String(places.length) },
    pair('first laid, from the front', first),
    pair('its fold', startOf(fold.path)?.x ?? 0),
    ...(second === undefined ? [] : [pair('each next farther', second - first)]),
  ];
}

/** The bands of the arms: a sector by its radii, or a rectangle with its pleats. */
export const bandRows = (pieces: readonly Piece[], unit: Unit): readonly Row[] =>
  pieces.flatMap((piece): readonly Row[] => {
    const [upper, back] = [named(piece, 'upper'), named(piece, 'back')];
    const [lower, front] = [named(piece, 'lower'), named(piece, 'front')];
    if (!upper || !back) return [];
    const heading: Row = { kind: 'heading', text: `${piece.title}, ${unit}` };
    const apex = front && meetingOf(front, back);
    if (lower && apex && Math.abs(startTangent(back.path).x) > 1e-6)
      return [heading, ...bentRows(upper, lower, apex, unit)];
    const pair = pairIn(unit);
    return [
      heading,
      pair('long', pathLength(upper.path)),
      pair('high, to the fold', pathLength(back.path)),
      ...pleatRows(piece, unit),
    ];
  });
