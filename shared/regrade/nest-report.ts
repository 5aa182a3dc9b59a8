import { type Alignment, motionFor } from '../compare/alignment.ts';
import { girthsOf } from '../compare/figures.ts';
import { pointsOf } from '../compare/points.ts';
import type { LevelName } from '../drafting/piece.ts';
import { moved } from '../geometry/motion.ts';
import { type Point, between, distance } from '../geometry/point.ts';
import type { Nest, NestSize } from './nest.ts';

/** A point of one size that does not lie on the straight line between the smallest and the largest. */
export type OffPoint = {
  readonly step: number;
  readonly piece: string;
  readonly title: string;
  /** From where straight interpolation would put it, mm. */
  readonly off: number;
};

/** A finished girth through the sizes, mm. */
export type GradedGirth = {
  readonly level: LevelName;
  readonly girths: readonly { readonly step: number; readonly girth: number }[];
};

/** A piece whose edges or darts are not the same ones in every size. */
export type UnlikePiece = { readonly piece: string; readonly steps: readonly number[] };

/** What a maker should know of a nest before cutting from it. */
export type NestReport = {
  readonly girths: readonly GradedGirth[];
  readonly off: readonly OffPoint[];
  readonly unlike: readonly UnlikePiece[];
};

/** A point may lie this far off the straight line without being listed, mm. */
export const straightWithin = 1.5;

type Place = {
  readonly step: number;
  readonly at: Point;
  readonly piece: string;
  readonly title: string;
};

/** Every named point through the sizes, all laid on the smallest. */
function placesOf(sizes: readonly NestSize[], align: Alignment): readonly (readonly Place[])[] {
  const [smallest] = sizes;
  if (!smallest) return [];
  const places = new Map<string, Place[]>();
  for (const { step, draft } of sizes) {
    for (const piece of draft.pieces) {
      const first = smallest.draft.pieces.find((each) => each.name === piece.name);
      if (!first) continue;
      const drafts = { first: smallest.draft, second: draft };
      const motion = motionFor(drafts, { first, second: piece }, align);
      for (const { key, title, at } of pointsOf(piece)) {
        const place = { step, at: moved(at, motion), piece: piece.name, title };
        places.set(key, [...(places.get(key) ?? []), place]);
      }
    }
  }
  return [...places.values()].filter((each) => each.length === sizes.length);
}

function offStraight(places: readonly Place[]): readonly OffPoint[] {
  const [first, last] = [places[0], places.at(-1)];
  if (!first || !last || first.step === last.step) return [];
  return places
    .map(({ step, at, piece, title }) => {
      const share = (step - first.step) / (last.step - first.step);
      return { step, piece, title, off: distance(at, between(first.at, last.at, share)) };
    })
    .filter(({ off }) => off > straightWithin);
}

/** Names of all edges and darts of a piece, to tell whether two sizes are made alike. */
const makeOf = ({ draft }: NestSize, piece: string): string => {
  const found = draft.pieces.find((each) => each.name === piece);
  return [...(found?.edges ?? []), ...(found?.darts ?? [])].map(({ name }) => name).join();
};

function unlikePieces(sizes: readonly NestSize[]): readonly UnlikePiece[] {
  const largest = sizes.at(-1);
  if (!largest) return [];
  const names = new Set(sizes.flatMap(({ draft }) => draft.pieces.map(({ name }) => name)));
  return [...names].flatMap((piece) => {
    const like = makeOf(largest, piece);
    const steps = sizes.filter((each) => makeOf(each, piece) !== like).map(({ step }) => step);
    return steps.length === 0 ? [] : [{ piece, steps }];
  });
}

/** Finished girths through the sizes, points off straight interpolation, and pieces made unlike. */
export function nestReport({ sizes }: Nest, align: Alignment): NestReport {
  const girths = sizes.map(({ step, draft }) => ({ step, found: girthsOf(draft) }));
  const levels = (girths[0]?.found ?? []).flatMap(({ level }) => (level ? [level] : []));
  return {
    girths: levels.map((level) => ({
      level,
      girths: girths.flatMap(({ step, found }) => {
        const girth = found.find((each) => each.level === level)?.value;
        return girth === undefined ? [] : [{ step, girth }];
      }),
    })),
    off: placesOf(sizes, align)
      .flatMap(offStraight)
      .toSorted((a, b) => b.off - a.off),
    unlike: unlikePieces(sizes),
  };
}
