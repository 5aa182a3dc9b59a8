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

/** The longest edge of a piece has most room for labels. */
function labelPlace(piece: FinishedPiece, share: number): Point {
  const longest = piece.edges
    .map(({ path }) => ({ path, length: pathLength(path) }))
    .toSorted((a, b) => b.length - a.length)[0];
  const outline = longest?.path ?? seamOutline(piece);
  return stationAtLength(outline, (longest?.length ?? 0) * share)?.at ?? { x: 0, y: 0 };
}

/** The pieces of a nest, sizes over each other, aligned on a point or a seam. */
export function nestStacks({ sizes }: Nest, align: Alignment): readonly NestStack[] {
  const base = sizes.find(({ step }) => step === 0) ?? sizes[0];
  if (!base) return [];
  const names = new Set(sizes.flatMap(({ draft }) => draft.pieces.map(({ name }) => name)));
  return [...names].map((name) => {
    const own = base.draft.pieces.find((each) => each.name === name);
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
      return [{ step, label: sizeLabel(step), piece: laid, labelAt: labelPlace(laid, share) }];
    });
    const title = own?.title ?? sized[0]?.piece.title ?? name;
    return { name, title, sized, pieces: sized.map((each) => each.piece) };
  });
}
