import { firstComeQueue, type Turn } from '../../http/first-come-queue.ts';
import { openThread } from '../../http/worker-thread.ts';
import { type Limits, workerPaths } from '../../settings.ts';
import type { PrintTask } from './print-task.ts';

/** Arranging takes seconds where every core is busy; a thread that takes so long is lost, ms. */
const patience = 120_000;

/** Prints in a thread of its own, so that everything else is answered meanwhile. */
export type Printer = {
  /** Waits its turn; throws RefusalError where it cannot be drawn or too many wait. */
  readonly print: (task: PrintTask, turn: Turn) => Promise<Uint8Array>;
  readonly close: () => Promise<void>;
};

export function openPrinter(limits: Limits): Printer {
  const queue = firstComeQueue({
    waiting: limits.printsWaiting,
    fromOne: limits.printsFromOneAddress,
    busy: 'Many people are printing at this moment. Try again in a few seconds.',
    retryAfterSeconds: 5,
  });
  const thread = openThread<PrintTask>(workerPaths.print, patience);
  return {
    print: (task, turn) => queue(turn, async () => bytesIn(await thread.ask(task, turn.gone))),
    close: thread.close,
  };
}

/** The printing thread makes nothing else. */
function bytesIn(made: unknown): Uint8Array {
  return made as Uint8Array;
}
