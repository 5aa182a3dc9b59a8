import { useMutation } from '@tanstack/react-query';
import { useEffect, useRef } from 'react';

import { speak } from '#shared/units/speak.ts';
import type { Unit } from '#shared/units/said.ts';

import { CallFailed } from '../../lib/call.ts';
import { saveFile } from '../../lib/save-file.ts';
import { fetchPrint, type PrintOrder } from './queries.ts';

export type SavedPrint = { readonly name: string; readonly address: string };

/** One print on its way: ordered, waited for, saved, or refused in plain words; it can be called off. */
export function usePrint() {
  const running = useRef<AbortController>(undefined);
  useEffect(() => () => running.current?.abort(), []);
  const print = useMutation({
    mutationFn: async (order: PrintOrder): Promise<SavedPrint> => {
      running.current = new AbortController();
      const file = await fetchPrint(order, running.current.signal);
      const name = file.name ?? fallbackName(order);
      return { name, address: saveFile(file.blob, name) };
    },
  });
  return {
    order: print.mutate,
    waiting: print.isPending,
    saved: print.data,
    refused: print.error,
    cancel: () => {
      running.current?.abort();
      print.reset();
    },
  };
}

const fallbackName = ({ kind, draft }: PrintOrder): string =>
  kind === 'pieces.svg' ? `ellwand-${draft.number}.svg` : `ellwand-${draft.number}-${kind}.pdf`;

/** What went wrong, and what to do, for the maker. */
export function refusalWords(error: Error, unit: Unit): string {
  if (!(error instanceof CallFailed)) return 'The print was not saved. Try again.';
  const said = error.problems.map((problem) => speak(problem.said, unit));
  return [error.message, ...said].join(' ');
}
