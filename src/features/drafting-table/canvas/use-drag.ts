import { useEffect, useRef, useState } from 'react';

import type { Handle } from '#shared/drafting/construction.ts';
import type { Draft } from '#shared/engine/draft.ts';

import type { DragOrder, DragPicture, DragReply } from './drag-order.ts';
import type { Shifts } from './moved-pieces.ts';

/** What is shown while a handle is dragged. */
export type Dragged = { readonly value: number; readonly picture: DragPicture };

/**
 * Has the pieces drafted in a thread of their own while a handle is held: one value at a time, the
 * newest next. What it draws is shown by whoever listens, past the table, which hears of the last value.
 */
export function useDrag(draft: Draft, shifts: Shifts) {
  const [held, setHeld] = useState<Handle['key']>();
  const worker = useRef<Worker>(undefined);
  const next = useRef<DragOrder>(undefined);
  const busy = useRef(false);
  const listener = useRef<(dragged: Dragged) => void>(undefined);
  useEffect(() => () => worker.current?.terminate(), []);

  const send = () => {
    const order = next.current;
    if (busy.current || order === undefined || worker.current === undefined) return;
    next.current = undefined;
    busy.current = true;
    worker.current.postMessage(order);
  };
  const start = () => {
    const begun = new Worker(new URL('./drag-worker.ts', import.meta.url), { type: 'module' });
    begun.addEventListener('message', (event: MessageEvent<unknown>) => {
      const { value, picture } = replyOf(event.data);
      busy.current = false;
      if (picture !== undefined) listener.current?.({ value, picture });
      send();
    });
    worker.current = begun;
  };
  return {
    held,
    /** The hand takes a handle. */
    hold: (key: Handle['key']) => {
      if (worker.current === undefined) start();
      setHeld(key);
    },
    to: (key: Handle['key'], value: number) => {
      next.current = { inputs: draft.inputs, key, value, shifts };
      send();
    },
    letGo: () => {
      next.current = undefined;
      setHeld(undefined);
    },
    listen: (to: (dragged: Dragged) => void) => {
      listener.current = to;
      return () => {
        listener.current = undefined;
      };
    },
  };
}

/** Only our own worker answers. */
function replyOf(data: unknown): DragReply {
  return data as DragReply;
}
