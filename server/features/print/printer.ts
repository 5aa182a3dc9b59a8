import { once } from 'node:events';
import { setTimeout as pause } from 'node:timers/promises';
import { Worker } from 'node:worker_threads';
import { type Queue, firstComeQueue } from '../../http/first-come-queue.ts';
import { RefusalError } from '../../http/refusal.ts';
import { printWorkerPath } from '../../settings.ts';
import type { PrintAnswer, PrintOrder } from './print-order.ts';

/** Prints in a thread of its own, so that everything else is answered meanwhile. */
export type Printer = {
  /** Waits its turn; throws RefusalError where it cannot be drawn or too many wait. */
  readonly print: (order: PrintOrder, isStillWanted: () => boolean) => Promise<Uint8Array>;
  readonly close: () => Promise<void>;
};

/** No gown takes a second; a thread that takes so long is lost, and a new one begun. */
const patience = 30_000;

export function openPrinter(waiting: number): Printer {
  const queue: Queue = firstComeQueue(waiting);
  let worker: Worker | undefined;

  async function drop(): Promise<void> {
    const dropped = worker;
    worker = undefined;
    await dropped?.terminate();
  }

  async function ask(order: PrintOrder): Promise<PrintAnswer> {
    worker ??= new Worker(printWorkerPath);
    try {
      return await nextAnswer(worker, order);
    } catch (error) {
      await drop();
      throw error;
    }
  }

  return {
    print: (order, isStillWanted) =>
      queue(async () => {
        if (!isStillWanted())
          throw new RefusalError('busy', 'Nobody waits for this print any more.');
        return bytesOf(await ask(order));
      }),
    close: drop,
  };
}

async function nextAnswer(worker: Worker, order: PrintOrder): Promise<PrintAnswer> {
  const settled = new AbortController();
  const { signal } = settled;
  try {
    const answered = once(worker, 'message', { signal });
    const ended = once(worker, 'exit', { signal }).then(() => {
      throw new Error('The printing thread ended.');
    });
    const late = pause(patience, undefined, { signal }).then(() => {
      throw new Error('The printing thread did not answer.');
    });
    worker.postMessage(order);
    return answerIn(await Promise.race([answered, ended, late]));
  } finally {
    settled.abort();
  }
}

/** The thread posts nothing else. */
function answerIn([posted]: readonly unknown[]): PrintAnswer {
  return posted as PrintAnswer;
}

function bytesOf(answer: PrintAnswer): Uint8Array {
  if (answer.kind === 'printed') return answer.bytes;
  if (answer.kind === 'refused') {
    throw new RefusalError(answer.code, answer.message, { problems: answer.problems });
  }
  const fault = new Error('The printing thread met a fault.');
  fault.name = answer.name;
  fault.stack = answer.frames;
  throw fault;
}
