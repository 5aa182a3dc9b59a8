import type { FinishedPiece } from '../drafting/piece.ts';
import { pathLength, reverse, stationAtLength } from '../geometry/curve.ts';
import type { Path } from '../geometry/path.ts';
import { type Point, between } from '../geometry/point.ts';
import type { PiecePair } from './compare-drafts.ts';

/** A line on its way from one draft to the other; one without a partner fades instead of moving. */
export type MorphLine = {
  readonly name: string;
  readonly kind: 'edge' | 'dart';
  readonly chain: readonly Point[];
  /** 0 (gone) to 1. */
  readonly presence: number;
};

/** Places of equal arc share looked at on a bent line, ends included. */
const looks = 25;

/** Places at equal shares of a path's length; a straight line needs its ends alone. */
function stations(path: Path, count: number): readonly Point[] {
  const whole = pathLength(path);
  return Array.from({ length: count }, (_, k) => {
    const station = stationAtLength(path, (whole * k) / (count - 1));
    return station ? [station.at] : [];
  }).flat();
}

const isStraight = (path: Path): boolean => path.length === 1 && path[0]?.kind === 'line';

type Named = { readonly name: string; readonly kind: MorphLine['kind']; readonly path: Path };

const linesOf = (piece: FinishedPiece | undefined): readonly Named[] =>
  piece === undefined
    ? []
    : [
        ...piece.edges.map(({ name, path }): Named => ({ name, kind: 'edge', path })),
        ...piece.darts.map(({ name, centreLeg, sideLeg }): Named => ({
          name,
          kind: 'dart',
          path: [...centreLeg, ...reverse(sideLeg)],
        })),
      ];

/** A pair of pieces measured once, so that a slider only has to mix: a place in each draft, by arc share. */
type Track =
  | {
      readonly name: string;
      readonly kind: MorphLine['kind'];
      readonly from: readonly Point[];
      readonly to: readonly Point[];
    }
  | {
      readonly name: string;
      readonly kind: MorphLine['kind'];
      readonly alone: 'first' | 'second';
      readonly chain: readonly Point[];
    };

/** The lines of a pair of pieces matched by name, ready for `morphAt`. */
export function tracksOf({ first, second }: PiecePair): readonly Track[] {
  const [before, after] = [linesOf(first), linesOf(second)];
  const same = (a: Named, b: Named): boolean => a.name === b.name && a.kind === b.kind;
  const moving = before.map((line): Track => {
    const { name, kind } = line;
    const other = after.find((each) => same(each, line));
    if (!other) return { name, kind, alone: 'first', chain: stations(line.path, looks) };
    const count = isStraight(line.path) && isStraight(other.path) ? 2 : looks;
    return { name, kind, from: stations(line.path, count), to: stations(other.path, count) };
  });
  const coming = after
    .filter((line) => !before.some((each) => same(each, line)))
    .map(({ name, kind, path }): Track => ({
      name,
      kind,
      alone: 'second',
      chain: stations(path, looks),
    }));
  return [...moving, ...coming];
}

/** The lines at a share of the way from the first draft (0) to the second (1). */
export const morphAt = (tracks: readonly Track[], share: number): readonly MorphLine[] =>
  tracks.map((track): MorphLine => {
    const { name, kind } = track;
    if ('alone' in track) {
      const presence = track.alone === 'first' ? 1 - share : share;
      return { name, kind, chain: track.chain, presence };
    }
    const chain = track.from.map((at, k) => between(at, track.to[k] ?? at, share));
    return { name, kind, chain, presence: 1 };
  });
