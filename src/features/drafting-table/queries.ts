import { queryOptions } from '@tanstack/react-query';

import { printChalkSheet, printPieces, printTiles } from '#shared/api/drafts.ts';
import type { Sent } from '#shared/api/endpoint.ts';
import { listSamples } from '#shared/api/samples.ts';
import type { Drafted } from '#shared/engine/drafted.ts';
import type { Unit } from '#shared/units/said.ts';
import type { PaperName } from '#shared/sheets/papers.ts';

import { call, callForFile, type SentFile } from '../../lib/call.ts';

export const samplesQuery = queryOptions({
  queryKey: ['samples'],
  queryFn: ({ signal }) => call(listSamples, undefined, signal),
});

/** What a maker can take away from the table. */
export type PrintKind = 'chalk-sheet' | 'bodice-toile' | 'whole-gown' | 'pieces.svg';

export type PrintOrder = {
  readonly kind: PrintKind;
  readonly draft: Drafted;
  readonly unit: Unit;
  readonly paper: PaperName;
};

/** Has the server write what was ordered. */
export function fetchPrint(order: PrintOrder, signal: AbortSignal): Promise<SentFile> {
  const { kind, draft, unit, paper } = order;
  const pieces = kind === 'bodice-toile' ? 'bodice-toile' : 'whole-gown';
  const request: Sent<typeof printTiles> = { ...draft.inputs, unit, paper, pieces };
  const endpoint =
    kind === 'chalk-sheet' ? printChalkSheet : kind === 'pieces.svg' ? printPieces : printTiles;
  return callForFile(endpoint, request, signal);
}
