import {
  lengthBefore,
  pathCrossings,
  pathLength,
  splitPath,
  stationAtLength,
} from '../geometry/curve.ts';
import { add, distance } from '../geometry/point.ts';
import type { Edge, Notch, Piece } from './piece.ts';

/** An edge of an outline with the notches that stand on it. */
export type Stretch = { readonly edge: Edge; readonly notches: readonly Notch[] };

/** The outline of a piece, each edge with its notches. */
export const stretchesOf = (piece: Piece): readonly Stretch[] =>
  piece.edges.map((edge) => ({
    edge,
    notches: piece.notches.filter((notch) => notch.edge === edge.name),
  }));

/** The seam a stretch belongs to: `waist` for `waist-b`. */
export const seamOf = (name: string): string => name.replace(/-[a-z]$/, '');

const letters = 'abcdefgh';

/** Length of edge before a notch on it, mm. */
function alongTo(edge: Edge, { at, outward }: Notch): number {
  const met = pathCrossings(edge.path, at, add(at, outward)).reduce<
    { readonly off: number; readonly length: number } | undefined
  >((best, station) => {
    const off = distance(station.at, at);
    return best && best.off <= off ? best : { off, length: lengthBefore(edge.path, station) };
  }, undefined);
  return met?.length ?? 0;
}

const withEase = (edge: Edge, ease: number): Edge =>
  edge.ease === undefined ? edge : { ...edge, ease };

/** A stretch cut in two at a length from its start, its ease shared by length; no answer where it has no inside there. */
export function cutStretch(
  { edge, notches }: Stretch,
  length: number,
): readonly [Stretch, Stretch] | undefined {
  const whole = pathLength(edge.path);
  const station = stationAtLength(edge.path, length);
  if (!station || length <= 0 || length >= whole) return undefined;
  const [head, tail] = splitPath(edge.path, station);
  const ease = edge.ease ?? 0;
  const before = notches.filter((notch) => alongTo(edge, notch) <= length);
  return [
    { edge: withEase({ ...edge, path: head }, (ease * length) / whole), notches: before },
    {
      edge: withEase({ ...edge, path: tail }, (ease * (whole - length)) / whole),
      notches: notches.filter((notch) => !before.includes(notch)),
    },
  ];
}

/** Two stretches of one seam that meet, as one. */
export const mergeStretches = (first: Stretch, second: Stretch): Stretch => ({
  edge: withEase(
    { ...first.edge, path: [...first.edge.path, ...second.edge.path] },
    (first.edge.ease ?? 0) + (second.edge.ease ?? 0),
  ),
  notches: [...first.notches, ...second.notches],
});

/** Place in the outline of the last side seam edge; after it the outline runs back to the centre. */
export const lastSide = (outline: readonly { readonly edge: Edge }[]): number =>
  outline.findLastIndex(({ edge }) => edge.kind === 'side');

/**
 * Names every stretch of these seams anew: the seam's own name where it is whole, else with letters
 * from the centre line out and from the top down, however the outline runs. Partners named alike
 * are renamed with them.
 */
export function lettered(
  outline: readonly Stretch[],
  seams: ReadonlySet<string>,
): readonly Stretch[] {
  const side = lastSide(outline);
  const names = new Map<Stretch, string>();
  for (const seam of seams) {
    const own = outline.filter(({ edge }) => edge.open !== true && seamOf(edge.name) === seam);
    const [first] = own;
    const back = first !== undefined && side >= 0 && outline.indexOf(first) > side;
    const fromCentre = back ? [...own].reverse() : own;
    fromCentre.forEach((stretch, k) =>
      names.set(stretch, own.length === 1 ? seam : `${seam}-${letters[k] ?? String(k)}`),
    );
  }
  return outline.map((stretch) => {
    const name = names.get(stretch);
    if (name === undefined) return stretch;
    const { edge, notches } = stretch;
    const { joins } = edge;
    const partner =
      joins !== undefined && joins !== 'self' && seamOf(joins.edge) === seamOf(edge.name)
        ? { joins: { ...joins, edge: name } }
        : {};
    return {
      edge: { ...edge, name, ...partner },
      notches: notches.map((notch) => ({ ...notch, edge: name })),
    };
  });
}

/** A piece with another outline. */
export const withOutline = (piece: Piece, outline: readonly Stretch[]): Piece => ({
  ...piece,
  edges: outline.map(({ edge }) => edge),
  notches: outline.flatMap(({ notches }) => notches),
});

/**
 * Cuts a whole seam of a piece into stretches whose lengths stand to each other as `shares` do, in
 * the order of the outline: its partner has a dart there.
 */
export function seamInStretches(piece: Piece, seam: string, shares: readonly number[]): Piece {
  const outline = stretchesOf(piece).flatMap((stretch): readonly Stretch[] => {
    if (stretch.edge.name !== seam) return [stretch];
    const whole = pathLength(stretch.edge.path);
    const sum = shares.reduce((total, share) => total + share, 0);
    const parts: Stretch[] = [];
    let rest = stretch;
    for (const share of shares.slice(0, -1)) {
      const cut = cutStretch(rest, (whole * share) / sum);
      if (!cut) break;
      parts.push(cut[0]);
      rest = cut[1];
    }
    return [...parts, rest];
  });
  return withOutline(piece, lettered(outline, new Set([seam])));
}
