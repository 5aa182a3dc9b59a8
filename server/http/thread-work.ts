import { parentPort } from 'node:worker_threads';
import type { RefusalCode } from '#shared/api/problem-codes.ts';
import type { Problem } from '#shared/units/problem.ts';
import { RefusalError } from './refusal.ts';

/** What a thread answers: what it made, a refusal, or a fault (its kind and place, never its words). */
export type ThreadAnswer<Made> =
  | { readonly kind: 'made'; readonly made: Made }
  | {
      readonly kind: 'refused';
      readonly code: RefusalCode;
      readonly message: string;
      readonly problems: readonly Problem[];
    }
  | { readonly kind: 'fault'; readonly name: string; readonly frames: string };

async function answer(
  order: unknown,
  work: (order: unknown) => unknown,
): Promise<ThreadAnswer<unknown>> {
  try {
    return { kind: 'made', made: await work(order) };
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

/** Makes this thread answer orders, one at a time: the next is sent when this one is answered. */
export function answerOrders(work: (order: unknown) => unknown): void {
  parentPort?.on('message', (order: unknown) => {
    void answer(order, work).then((given) => parentPort?.postMessage(given));
  });
}
