import { DraftingError } from '#shared/drafting/drafting-error.ts';
import type { FinishedPiece } from '#shared/drafting/piece.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { pathData } from '#shared/exports/path-data.ts';
import type { Path } from '#shared/geometry/path.ts';
import { add, type Point } from '#shared/geometry/point.ts';

import type { DragOrder, DragPicture } from './drag-order.ts';
import { asCut } from './layout.ts';
import { shifted } from './moved-pieces.ts';

/*
 * Drafts in a thread of its own while a handle is dragged, so that the page has its frames for the
 * hand: what it sends back are lines ready to be shown.
 */

addEventListener('message', (event: MessageEvent<unknown>) => {
  const order = orderOf(event.data);
  postMessage({ value: order.value, picture: pictureOf(order) });
});

/** Only the page of this very build sends orders. */
function orderOf(data: unknown): DragOrder {
  return data as DragOrder;
}

function pictureOf({ inputs, key, value, shifts }: DragOrder): DragPicture | undefined {
  try {
    const style = { ...inputs.style, [key]: value };
    const draft = draftGown({ ...inputs, style });
    const { placed } = shifted(asCut(draft.pieces), shifts);
    const handle = draft.handles.find((each) => each.key === key);
    const under = placed.find(({ piece }) => piece.name === handle?.piece);
    if (handle === undefined || under === undefined) return undefined;
    const drawn = (lines: (piece: FinishedPiece) => readonly Path[], closed = false): string =>
      placed
        .flatMap(({ piece, at }) => lines(piece).map((path) => pathData(laid(path, at), closed)))
        .join('');
    return {
      at: add(handle.at, under.at),
      cut: drawn(({ cutLine }) => [cutLine], true),
      seams: drawn(({ edges }) => edges.map(({ path }) => path)),
      darts: drawn(({ darts }) => darts.flatMap(({ centreLeg, sideLeg }) => [centreLeg, sideLeg])),
    };
  } catch (error) {
    if (error instanceof DraftingError) return undefined;
    throw error;
  }
}

const laid = (path: Path, at: Point): Path =>
  path.map((each) =>
    each.kind === 'line'
      ? { ...each, from: add(each.from, at), to: add(each.to, at) }
      : {
          ...each,
          from: add(each.from, at),
          c1: add(each.c1, at),
          c2: add(each.c2, at),
          to: add(each.to, at),
        },
  );
