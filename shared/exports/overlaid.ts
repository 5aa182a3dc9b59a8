import { seamOutline } from '../compare/moved-piece.ts';
import type { FinishedPiece } from '../drafting/piece.ts';
import { flatten } from '../geometry/curve.ts';
import { type Point, point } from '../geometry/point.ts';
import { outerRims } from '../geometry/region.ts';
import { boxOf } from '../sheets/layout.ts';
import { spread } from './spread.ts';

/** One piece drawn several times over itself: in two drafts, or in the sizes of a nest. */
export type Stack = { readonly name: string; readonly pieces: readonly FinishedPiece[] };

/** A stack as one piece, its outer rim as the line to cut, for whatever lays pieces out by their outline. */
export function stackOutline({ pieces }: Stack): FinishedPiece {
  const [first] = pieces;
  if (!first) throw new Error('A stack has at least one piece.');
  return { ...first, cutLine: outerRims(pieces.map(seamOutline)), notchMarks: [] };
}

/** Stacks side by side on a sheet whose top left corner is 0, 0; mm. */
export type LaidStacks<S extends Stack> = {
  readonly placed: readonly { readonly stack: S; readonly translate: Point }[];
  readonly width: number;
  readonly height: number;
};

/** Between rows of pieces, mm. */
const gap = 40;

/** Lays stacks as the drafting table lays pieces; what has no place there comes in a row below. */
export function layStacks<S extends Stack>(stacks: readonly S[]): LaidStacks<S> {
  const outlines = stacks.map((stack) => ({ stack, piece: stackOutline(stack) }));
  const table = spread(outlines.map(({ piece }) => piece));
  const placed = outlines.flatMap(({ stack, piece }) => {
    const place = table.placed.find((each) => each.piece === piece);
    return place ? [{ stack, translate: place.translate }] : [];
  });
  let x = gap / 2;
  let { width, height } = table;
  const row = height;
  for (const { stack, piece } of outlines) {
    if (placed.some((each) => each.stack === stack)) continue;
    const box = boxOf(flatten(piece.cutLine, 0.5));
    placed.push({ stack, translate: point(x - box.x, row - box.y) });
    x += box.width + gap;
    width = Math.max(width, x);
    height = Math.max(height, row + box.height + gap / 2);
  }
  return { placed, width, height };
}
