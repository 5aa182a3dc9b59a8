import type { FinishedPiece, LevelName, Side } from '../drafting/piece.ts';
import { endOf, startOf } from '../geometry/curve.ts';
import { type Motion, layOn, shift } from '../geometry/motion.ts';
import { type Point, distance, point, subtract, unit } from '../geometry/point.ts';
import { type Comparable, bodyPieces, inBodyFrame } from './comparable.ts';

/** Points of the body that two drafts can be laid together at. */
export const alignPoints = [
  'centre-waist',
  'bust-point',
  'side-waist',
  'side-bust',
  'side-hip',
  'side-neck',
] as const;
export type AlignPoint = (typeof alignPoints)[number];

/** Their words on a screen and on paper; behind, the same height at the centre back stands for the bust point. */
export const alignTitles: { readonly [P in AlignPoint]: string } = {
  'centre-waist': 'Centre at the waist',
  'bust-point': 'Bust point',
  'side-waist': 'Side at the waist',
  'side-bust': 'Side at the bust',
  'side-hip': 'Side at the hip',
  'side-neck': 'Side neck point',
};

/** Laid together at a point of the body, or along the edge of this name wherever a piece has one. */
export type Alignment =
  | { readonly on: 'point'; readonly point: AlignPoint }
  | { readonly on: 'seam'; readonly edge: string };

export const atCentreWaist: Alignment = { on: 'point', point: 'centre-waist' };

function sideAt(draft: Comparable, side: Side, level: LevelName): Point | undefined {
  const ends = bodyPieces(draft, side).flatMap((piece) =>
    piece.levels.filter((each) => each.level === level).flatMap(({ from, to }) => [from, to]),
  );
  return ends.reduce<Point | undefined>(
    (far, each) => (far && far.x >= each.x ? far : each),
    undefined,
  );
}

const levelOf = { 'side-waist': 'waist', 'side-bust': 'bust', 'side-hip': 'hip' } as const;

/** Where a point of the body lies on one half of a draft, mm; no answer where the garment does not reach it. */
export function placeOf(draft: Comparable, side: Side, wanted: AlignPoint): Point | undefined {
  const { bodyLevels } = draft;
  switch (wanted) {
    case 'centre-waist':
      return point(0, bodyLevels.waist);
    case 'side-neck':
      return point(bodyLevels.sideNeckX, 0);
    case 'bust-point':
      if (side === 'back') return point(0, bodyLevels.bust);
      return draft.bustPoint ?? point(bodyLevels.bustPointX, bodyLevels.bust);
    case 'side-waist':
    case 'side-bust':
    case 'side-hip':
      return sideAt(draft, side, levelOf[wanted]);
  }
}

const ontoPlace = (from: Point, to: Point): Motion => shift(to.x - from.x, to.y - from.y);

/** The motion that lays the second draft's edge on the first's: starts together, ends in one direction. */
function ontoSeam(first: FinishedPiece, second: FinishedPiece, name: string): Motion | undefined {
  const ends = [first, second].map((piece) => {
    const path = piece.edges.find((each) => each.name === name)?.path ?? [];
    return [startOf(path), endOf(path)] as const;
  });
  const [[a, b] = [], [c, d] = []] = ends;
  if (!a || !b || !c || !d || distance(a, b) === 0 || distance(c, d) === 0) return undefined;
  return layOn(c, unit(subtract(d, c)), a, unit(subtract(b, a)));
}

/** Pieces in frames of their own lie together at the start of the first edge both have. */
function ontoFirstEdge(first: FinishedPiece, second: FinishedPiece): Motion {
  for (const edge of first.edges) {
    const other = second.edges.find((each) => each.name === edge.name);
    const [to, from] = [startOf(edge.path), other && startOf(other.path)];
    if (from && to) return ontoPlace(from, to);
  }
  return shift(0, 0);
}

/** How a piece of the second draft is laid on its partner in the first. */
export function motionFor(
  drafts: { readonly first: Comparable; readonly second: Comparable },
  pair: { readonly first: FinishedPiece; readonly second: FinishedPiece },
  align: Alignment,
): Motion {
  if (align.on === 'seam') {
    const laid = ontoSeam(pair.first, pair.second, align.edge);
    if (laid) return laid;
  }
  if (!inBodyFrame(pair.first)) return ontoFirstEdge(pair.first, pair.second);
  return frameMotion(drafts, pair.first.side, align);
}

/** How one half of the second draft is laid on the first; the centre at the waist where the point is missing. */
export function frameMotion(
  { first, second }: { readonly first: Comparable; readonly second: Comparable },
  side: Side,
  align: Alignment,
): Motion {
  const wanted = align.on === 'point' ? align.point : 'centre-waist';
  const [to, from] = [placeOf(first, side, wanted), placeOf(second, side, wanted)];
  if (to && from) return ontoPlace(from, to);
  return shift(0, first.bodyLevels.waist - second.bodyLevels.waist);
}
