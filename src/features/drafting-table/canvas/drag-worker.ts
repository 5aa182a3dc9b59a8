import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { add } from '#shared/geometry/point.ts';

import { cleared, drawHandle, drawPieces } from './drag-drawing.ts';
import type { DragOrder, DragReply, Hold } from './drag-order.ts';
import { asCut } from './layout.ts';
import { shifted } from './moved-pieces.ts';

/*
 * Drafts and draws in a thread of its own while a handle is dragged, so that the page has its frames
 * for the hand: the canvas is this thread's, and the newest value is drawn once a frame.
 */

let canvas: OffscreenCanvas | undefined;
let held: { readonly grip: number; readonly hold: Hold } | undefined;
let next: number | undefined;
let awaited = false;
let shown: number | undefined;

addEventListener('message', (event: MessageEvent<unknown>) => {
  const order = orderOf(event.data);
  if ('canvas' in order) canvas = order.canvas;
  else if ('hold' in order) [held, next] = [order, undefined];
  else {
    next = order.value;
    if (!awaited) requestAnimationFrame(drawNext);
    awaited = true;
  }
});

/** Only the page of this very build sends orders. */
function orderOf(data: unknown): DragOrder {
  return data as DragOrder;
}

function drawNext(): void {
  awaited = false;
  if (canvas === undefined || held === undefined || next === undefined) return;
  const { grip, hold } = held;
  if (!drawn(canvas, hold, next) || shown === grip) return;
  const reply: DragReply = { shown: grip };
  shown = grip;
  postMessage(reply);
}

/** Draws the pieces at a value; false where they cannot be drawn, and the last ones stand. */
function drawn(on: OffscreenCanvas, hold: Hold, value: number): boolean {
  const { inputs, key, shifts } = hold;
  try {
    const draft = draftGown({ ...inputs, style: { ...inputs.style, [key]: value } });
    const { placed } = shifted(asCut(draft.pieces), shifts);
    const handle = draft.handles.find((each) => each.key === key);
    const under = placed.find(({ piece }) => piece.name === handle?.piece);
    const pen = cleared(on, hold);
    if (handle === undefined || under === undefined || pen === undefined) return false;
    drawPieces(pen, placed, hold);
    drawHandle(pen, add(handle.at, under.at), value, hold);
    return true;
  } catch (error) {
    if (error instanceof DraftingError) return false;
    throw error;
  }
}
