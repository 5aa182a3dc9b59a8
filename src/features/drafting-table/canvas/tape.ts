import type { EdgeRef, FinishedPiece } from '#shared/drafting/piece.ts';
import { endOf, flatten, pathLength, startOf } from '#shared/geometry/curve.ts';
import { add, between, distance, dot, subtract, type Point } from '#shared/geometry/point.ts';

import type { Layout } from './layout.ts';

/** A place the tape is held to: on the paper, and on which seams how far from where each begins. */
export type TapePlace = {
  readonly at: Point;
  readonly on: readonly (EdgeRef & { readonly along: number })[];
  /** Where it is, in words; absent out on the bare paper. */
  readonly words?: string;
};

/** What the tape reads between two places: straight, and along the seam where both lie on one. */
export type TapeReading = {
  readonly straight: number;
  readonly along?: { readonly length: number; readonly seam: EdgeRef };
};

const spoken = (edge: string): string => edge.replace(/-[a-z]$/, '').replaceAll('-', ' ');

/** The corners of every piece and the tips of its darts, piece by piece, as places to hold the tape to. */
export const tapeCorners = ({ placed }: Layout): readonly TapePlace[] =>
  placed.flatMap(({ piece, at }) => [
    ...piece.edges.flatMap((edge, index): TapePlace[] => {
      const before = piece.edges.at(index - 1) ?? edge;
      const corner = startOf(edge.path);
      if (corner === undefined) return [];
      return [
        {
          at: add(corner, at),
          on: [
            { piece: piece.name, edge: before.name, along: pathLength(before.path) },
            { piece: piece.name, edge: edge.name, along: 0 },
          ],
          words: `${piece.title}, ${spoken(before.name)} to ${spoken(edge.name)}`,
        },
      ];
    }),
    ...piece.darts.flatMap((dart): TapePlace[] => {
      const tip = endOf(dart.centreLeg);
      const words = `${piece.title}, tip of the ${spoken(dart.name)} dart`;
      return tip === undefined ? [] : [{ at: add(tip, at), on: [], words }];
    }),
  ]);

/** What the tape catches at a place of the paper: a corner within reach, else a seam, else the bare paper. */
export function tapePlace(layout: Layout, at: Point, reach: number): TapePlace {
  const corner = nearest(tapeCorners(layout), at);
  if (corner !== undefined && distance(corner.at, at) <= reach) return corner;
  const seams = layout.placed.flatMap(({ piece, at: shift }) =>
    piece.edges.map((edge) => onEdge(piece, edge, shift, at)),
  );
  const seam = nearest(seams, at);
  return seam !== undefined && distance(seam.at, at) <= reach ? seam : { at, on: [] };
}

const nearest = (places: readonly TapePlace[], at: Point): TapePlace | undefined =>
  places.reduce<TapePlace | undefined>(
    (best, each) =>
      best !== undefined && distance(best.at, at) <= distance(each.at, at) ? best : each,
    undefined,
  );

/** The place of an edge nearest to a point, and how far along the edge it lies. */
function onEdge(
  piece: FinishedPiece,
  { name, path }: FinishedPiece['edges'][number],
  shift: Point,
  to: Point,
): TapePlace {
  const chain = flatten(path, 0.1).map((each) => add(each, shift));
  let best = { at: chain[0] ?? shift, run: 0 };
  let run = 0;
  chain.slice(1).forEach((end, index) => {
    const start = chain[index] ?? end;
    const length = distance(start, end);
    const way = subtract(end, start);
    const share = length === 0 ? 0 : dot(subtract(to, start), way) / length ** 2;
    const held = Math.min(1, Math.max(0, share));
    const at = between(start, end, held);
    if (distance(at, to) < distance(best.at, to)) best = { at, run: run + held * length };
    run += length;
  });
  // The chain is a little shorter than the curve it follows.
  const along = run === 0 ? 0 : (best.run / run) * pathLength(path);
  return {
    at: best.at,
    on: [{ piece: piece.name, edge: name, along }],
    words: `${piece.title}, ${spoken(name)}`,
  };
}

/** Reads the tape between two places. */
export function tapeReading(from: TapePlace, to: TapePlace): TapeReading {
  const straight = distance(from.at, to.at);
  for (const a of from.on) {
    const b = to.on.find(({ piece, edge }) => piece === a.piece && edge === a.edge);
    if (b === undefined) continue;
    const seam = { piece: a.piece, edge: a.edge };
    return { straight, along: { length: Math.abs(a.along - b.along), seam } };
  }
  return { straight };
}
