import { parentPort } from 'node:worker_threads';
import { RefusalError } from '../../http/refusal.ts';
import type { PrintAnswer, PrintOrder } from './print-order.ts';
import { chalkSheetOf, piecesOf, tilesOf } from './service.ts';

const makers = { tiles: tilesOf, 'chalk-sheet': chalkSheetOf, pieces: piecesOf };

async function answer({ what, wanted }: PrintOrder): Promise<PrintAnswer> {
  try {
    return { kind: 'printed', bytes: await makers[what](wanted) };
  } catch (error) {
    if (error instanceof RefusalError) {
      const { code, message, details } = error;
      return { kind: 'refused', code, message, problems: details.problems ?? [] };
    }
    if (!(error instanceof Error)) return { kind: 'fault', name: typeof error, frames: '' };
    const frames = (error.stack ?? '').split('\n').filter((line) => /^\s+at /.test(line));
    return { kind: 'fault', name: error.name, frames: frames.join('\n') };
  }
}

/** One order at a time: the next is sent when this one is answered. */
parentPort?.on('message', (order: PrintOrder) => {
  void answer(order).then((given) => parentPort?.postMessage(given));
});
