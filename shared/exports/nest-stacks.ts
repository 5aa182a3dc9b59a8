import { type Alignment, frameMotion, motionFor } from '../compare/alignment.ts';
import { inBodyFrame } from '../compare/comparable.ts';
import { movedPiece, seamOutline } from '../compare/moved-piece.ts';
import type { FinishedPiece } from '../drafting/piece.ts';
import { pathLength, stationAtLength } from '../geometry/curve.ts';
import type { Point } from '../geometry/point.ts';
import { type Nest, sizeLabel } from '../regrade/nest.ts';
import type { Stack } from './overlaid.ts';

/** A piece in one size of a nest, laid on the card's own size. */
export type SizedPiece = {
  readonly step: number;
  readonly label: string;
  readonly piece: FinishedPiece;
  /** Where its label stands: on its own line, apart from those of the other sizes. */
  readonly labelAt: Point;
};

/** A piece in all sizes of a nest that have it, smallest first. */
export type NestStack = Stack & { readonly title: string; readonly sized: readonly SizedPiece[] };

/** The edge with most room for labels: the longest that is not a centre line, where sizes lie on each other. */
function labelEdge(piece: FinishedPiece): string | undefined {
  const free = piece.edges.filter(({ kind }) => kind !== 'fold' && kind !== 'zip');
  return free
    .map(({ name, path }) => ({ name, length: pathLength(path) }))
    .toSorted((a, b) => b.length - a.length)[0]?.name;
}

/** Where a size is lettered: at its own share of the edge that all sizes are lettered on. */
function labelPlace(piece: FinishedPiece, edge: string | undefined, share: number): Point {
  const path = piece.edges.find(({ name }) => name === edge)?.path ?? seamOutline(piece);
  return stationAtLength(path, pathLength(path) * share)?.at ?? { x: 0, y: 0 };
}

/** The pieces of a nest, sizes over each other, aligned on a point or a seam. */
export function nestStacks({ sizes }: Nest, align: Alignment): readonly NestStack[] {
  const base = sizes.find(({ step }) => step === 0) ?? sizes[0];
  if (!base) return [];
  const names = new Set(sizes.flatMap(({ draft }) => draft.pieces.map(({ name }) => name)));
  return [...names].map((name) => {
    const own = base.draft.pieces.find((each) => each.name === name);
    const sample = own ?? sizes.at(-1)?.draft.pieces.find((each) => each.name === name);
    const edge = sample && labelEdge(sample);
    const sized = sizes.flatMap(({ step, draft }, index): readonly SizedPiece[] => {
      const piece = draft.pieces.find((each) => each.name === name);
      if (!piece) return [];
      const drafts = { first: base.draft, second: draft };
      const laid = own
        ? movedPiece(piece, motionFor(drafts, { first: own, second: piece }, align))
        : inBodyFrame(piece)
          ? movedPiece(piece, frameMotion(drafts, piece.side, align))
          : piece;
      const share = (index + 1) / (sizes.length + 1);
      return [
        { step, label: sizeLabel(step), piece: laid, labelAt: labelPlace(laid, edge, share) },
      ];
    });
    const title = own?.title ?? sized[0]?.piece.title ?? name;
    return { name, title, sized, pieces: sized.map((each) => each.piece) };
  });
}
