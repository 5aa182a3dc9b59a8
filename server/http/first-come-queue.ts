import { setImmediate as breathe } from 'node:timers/promises';
import { RefusalError } from './refusal.ts';

/** Work that is done one after the other, in the order it came. */
export type Queue = <T>(work: () => Promise<T>) => Promise<T>;

/**
 * One worker at a time and at most `waiting` behind it; whoever comes then is sent away with a
 * time to come back, rather than kept in a line that grows. Between two works other requests are
 * answered.
 */
export function firstComeQueue(waiting: number): Queue {
  let last: Promise<unknown> = Promise.resolve();
  let inside = 0;
  return async (work) => {
    if (inside > waiting) {
      throw new RefusalError(
        'busy',
        'Many people are printing at this moment. Try again in a few seconds.',
        { retryAfterSeconds: 5 },
      );
    }
    inside += 1;
    const turn = last.then(async () => {
      await breathe();
      return work();
    });
    last = turn.catch(() => undefined);
    try {
      return await turn;
    } finally {
      inside -= 1;
    }
  };
}
