import type { FinishedPiece } from '../drafting/piece.ts';
import { flatten } from '../geometry/curve.ts';
import type { Path } from '../geometry/path.ts';
import { type Point, between, distance, dot, subtract } from '../geometry/point.ts';

/** A piece that two drafts of one gown draw differently, and how far its lines lie apart at most, mm. */
export type PieceChange = {
  readonly piece: string;
  readonly title: string;
  /** `new` and `gone` pieces stand in one draft only; their deviation is 0. */
  readonly change: 'shape' | 'new' | 'gone';
  readonly deviation: number;
};

/** Curves are compared as chains this close to them, mm; below twice as much nothing has changed. */
const tolerance = 0.05;
/** Straight stretches are looked at this often, mm. */
const stride = 10;

type Chain = readonly Point[];

/** Points no farther than a stride apart along a chain. */
const looks = (chain: Chain): readonly Point[] =>
  chain.flatMap((from, index) => {
    const to = chain[index + 1];
    if (!to) return [from];
    const count = Math.max(1, Math.ceil(distance(from, to) / stride));
    return Array.from({ length: count }, (_, k) => between(from, to, k / count));
  });

function offStretch(at: Point, from: Point, to: Point): number {
  const along = subtract(to, from);
  const size = dot(along, along);
  const share = size === 0 ? 0 : dot(subtract(at, from), along) / size;
  return distance(at, between(from, to, Math.min(1, Math.max(0, share))));
}

const offChain = (at: Point, chain: Chain): number =>
  chain.reduce((least, from, index) => {
    const to = chain[index + 1] ?? from;
    return Math.min(least, offStretch(at, from, to));
  }, Infinity);

const farthest = (from: Chain, to: Chain): number =>
  looks(from).reduce((most, at) => Math.max(most, offChain(at, to)), 0);

function apart(before: Path, after: Path): number {
  const [a, b] = [flatten(before, tolerance), flatten(after, tolerance)];
  if (a.length === 0 || b.length === 0) return 0;
  return Math.max(farthest(a, b), farthest(b, a));
}

const seamLine = (piece: FinishedPiece): Path => piece.edges.flatMap((edge) => edge.path);
const dartLines = (piece: FinishedPiece): Path =>
  piece.darts.flatMap((dart) => [...dart.centreLeg, ...dart.sideLeg]);

const deviation = (before: FinishedPiece, after: FinishedPiece): number =>
  Math.max(
    apart(before.cutLine, after.cutLine),
    apart(seamLine(before), seamLine(after)),
    apart(dartLines(before), dartLines(after)),
  );

/**
 * The pieces that two drafts of one gown draw differently: farthest distance between their cutting
 * lines, seam lines and darts as they lie, mm (Hausdorff). Lines closer than 0.1 mm are the same.
 */
export function pieceChanges(
  before: readonly FinishedPiece[],
  after: readonly FinishedPiece[],
): readonly PieceChange[] {
  const now = new Map(after.map((each) => [each.name, each]));
  const then = new Set(before.map((each) => each.name));
  const changed = before.flatMap((piece): PieceChange[] => {
    const { name, title } = piece;
    const other = now.get(name);
    if (!other) return [{ piece: name, title, change: 'gone', deviation: 0 }];
    const off = deviation(piece, other);
    const same = off < 2 * tolerance && piece.darts.length === other.darts.length;
    return same ? [] : [{ piece: name, title, change: 'shape', deviation: off }];
  });
  const added = after
    .filter((each) => !then.has(each.name))
    .map((each) => ({ piece: each.name, title: each.title, change: 'new' as const, deviation: 0 }));
  return [...changed, ...added];
}
