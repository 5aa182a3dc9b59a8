import { useEffect, useMemo, useRef, type RefObject } from 'react';

import type { DragOrder, DragReply, Hold } from './drag-order.ts';

export type Drag = {
  /** The hand takes a handle, draws it to a value, and lets it go. */
  readonly hold: (hold: Hold) => void;
  readonly to: (value: number) => void;
  readonly letGo: () => void;
};

/**
 * Has the pieces drafted and drawn on a canvas by a thread of their own while a handle is held; the page
 * hears of the first picture, the table of the last value. While the pieces are shown there the frame
 * carries `data-dragging`, and what lies under them hides. A browser that cannot lend a canvas to a
 * thread shows the pieces when the handle is let go.
 */
export function useDrag(
  canvas: RefObject<HTMLCanvasElement | null>,
  frame: RefObject<HTMLElement | null>,
): Drag {
  const worker = useRef<Worker>(undefined);
  useEffect(() => () => worker.current?.terminate(), []);

  return useMemo(() => {
    let grip = 0;
    let held = false;
    const tell = (order: DragOrder, lent: Transferable[] = []) =>
      worker.current?.postMessage(order, lent);
    const start = (lent: HTMLCanvasElement) => {
      const begun = new Worker(new URL('./drag-worker.ts', import.meta.url), { type: 'module' });
      begun.addEventListener('message', (event: MessageEvent<unknown>) => {
        if (held && replyOf(event.data).shown === grip) {
          frame.current?.setAttribute('data-dragging', '');
        }
      });
      worker.current = begun;
      const surface = lent.transferControlToOffscreen();
      tell({ canvas: surface }, [surface]);
    };
    return {
      hold: (hold) => {
        held = true;
        grip += 1;
        const lent = canvas.current;
        if (lent !== null && worker.current === undefined && 'transferControlToOffscreen' in lent) {
          start(lent);
        }
        tell({ grip, hold });
      },
      to: (value) => tell({ value }),
      letGo: () => {
        held = false;
        frame.current?.removeAttribute('data-dragging');
      },
    };
  }, [canvas, frame]);
}

/** Only our own worker answers. */
function replyOf(data: unknown): DragReply {
  return data as DragReply;
}
