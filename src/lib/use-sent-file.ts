import { useMutation } from '@tanstack/react-query';
import { useEffect, useRef } from 'react';

import type { SentFile } from './call.ts';
import { saveFile } from './save-file.ts';

/** A file that was saved, and where it can be opened again. */
export type SavedFile = { readonly name: string; readonly address: string };

type Source<Order> = {
  readonly fetchFile: (order: Order, signal: AbortSignal) => Promise<SentFile>;
  /** What it is called where the server gave it no name. */
  readonly fallbackName: (order: Order) => string;
};

/** One file on its way: ordered, waited for, saved, or refused; it can be called off. */
export function useSentFile<Order>({ fetchFile, fallbackName }: Source<Order>) {
  const running = useRef<AbortController>(undefined);
  useEffect(() => () => running.current?.abort(), []);
  const file = useMutation({
    mutationFn: async (order: Order): Promise<SavedFile> => {
      running.current = new AbortController();
      const sent = await fetchFile(order, running.current.signal);
      const name = sent.name ?? fallbackName(order);
      return { name, address: saveFile(sent.blob, name) };
    },
  });
  return {
    order: file.mutate,
    waiting: file.isPending,
    saved: file.data,
    refused: file.error,
    cancel: () => {
      running.current?.abort();
      file.reset();
    },
  };
}
