import { once } from 'node:events';
import { setTimeout as pause } from 'node:timers/promises';
import { Worker } from 'node:worker_threads';
import { RefusalError } from './refusal.ts';
import type { ThreadAnswer } from './thread-work.ts';

/** A thread beside the one that answers requests; asked for one thing at a time. */
export type WorkerThread<Order> = {
  /** Begins the thread before anybody asks: the first to ask need not wait for it. */
  readonly begin: () => void;
  /** Throws RefusalError where the thread refuses. Ends the thread when nobody waits for the answer any more. */
  readonly ask: (order: Order, gone?: AbortSignal) => Promise<unknown>;
  readonly close: () => Promise<void>;
};

/** No gown takes a second; a thread that takes so long is lost, and a new one begun, ms. */
const usualPatience = 30_000;

/** A thread that runs a program, begun when it is first asked and again when it is lost. */
export function openThread<Order>(
  program: string,
  patience: number = usualPatience,
): WorkerThread<Order> {
  let worker: Worker | undefined;

  async function drop(): Promise<void> {
    const dropped = worker;
    worker = undefined;
    await dropped?.terminate();
  }

  function begun(): Worker {
    worker ??= new Worker(program);
    return worker;
  }

  return {
    begin: () => void begun(),
    ask: async (order, gone) => {
      try {
        return madeIn(await nextAnswer(begun(), order, { patience, gone }));
      } catch (error) {
        if (gone?.aborted === true || !(error instanceof RefusalError)) await drop();
        throw error;
      }
    },
    close: drop,
  };
}

type Waiting = { readonly patience: number; readonly gone: AbortSignal | undefined };

async function nextAnswer(
  worker: Worker,
  order: unknown,
  { patience, gone }: Waiting,
): Promise<ThreadAnswer<unknown>> {
  const settled = new AbortController();
  const { signal } = settled;
  try {
    const answered = once(worker, 'message', { signal });
    const ended = once(worker, 'exit', { signal }).then(() => {
      throw new Error('The thread ended.');
    });
    const late = pause(patience, undefined, { signal }).then(() => {
      throw new Error('The thread did not answer.');
    });
    const left = gone && leaving(gone, signal);
    worker.postMessage(order);
    return answerIn(await Promise.race([answered, ended, late, ...(left ? [left] : [])]));
  } finally {
    settled.abort();
  }
}

/** Fails when whoever waits leaves; never settles otherwise. */
const leaving = (gone: AbortSignal, until: AbortSignal): Promise<never> =>
  new Promise((_, fail) => {
    const leave = () => fail(new RefusalError('busy', 'Nobody waits for this any more.'));
    if (gone.aborted) leave();
    gone.addEventListener('abort', leave, { once: true, signal: until });
  });

/** The thread posts nothing else. */
function answerIn([posted]: readonly unknown[]): ThreadAnswer<unknown> {
  return posted as ThreadAnswer<unknown>;
}

function madeIn(answer: ThreadAnswer<unknown>): unknown {
  if (answer.kind === 'made') return answer.made;
  if (answer.kind === 'refused') {
    throw new RefusalError(answer.code, answer.message, { problems: answer.problems });
  }
  const fault = new Error('A thread met a fault.');
  fault.name = answer.name;
  fault.stack = answer.frames;
  throw fault;
}
