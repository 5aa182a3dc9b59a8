import { setImmediate as breathe } from 'node:timers/promises';
import { RefusalError } from './refusal.ts';

/** Whose work it is, and how it is told that nobody waits for it any more. */
export type Turn = { readonly from: string; readonly gone: AbortSignal };

/** Work that is done one after the other, in the order it came. */
export type Queue = <T>(turn: Turn, work: () => Promise<T>) => Promise<T>;

/** How long a line may grow, for all and for one; `busy` is told to whoever finds it full. */
export type Line = {
  readonly waiting: number;
  readonly fromOne: number;
  readonly busy: string;
  readonly retryAfterSeconds: number;
};

type Place = { readonly from: string; readonly begin: () => void };

/**
 * One worker at a time and at most `waiting` behind it, no more than `fromOne` of one address;
 * whoever comes then is sent away with a time to come back, rather than kept in a line that grows.
 * Who leaves while waiting gives the place free at once. Between two works other requests are answered.
 */
export function firstComeQueue({ waiting, fromOne, busy, retryAfterSeconds }: Line): Queue {
  const line: Place[] = [];
  let atWork: Place | undefined;

  const startNext = (): void => {
    atWork = line.shift();
    atWork?.begin();
  };

  /** Settles when it is this one's turn; fails, and leaves the line, when it is not wanted any more. */
  const turnOf = ({ from, gone }: Turn): Promise<void> =>
    new Promise((resolve, reject) => {
      const leave = (): void => {
        const at = line.indexOf(place);
        if (at >= 0) line.splice(at, 1);
        reject(new RefusalError('busy', 'Nobody waits for this any more.'));
      };
      const place: Place = {
        from,
        begin: () => {
          gone.removeEventListener('abort', leave);
          resolve();
        },
      };
      if (gone.aborted) {
        leave();
        return;
      }
      gone.addEventListener('abort', leave, { once: true });
      line.push(place);
      if (atWork === undefined) startNext();
    });

  return async (turn, work) => {
    const own = [...line, ...(atWork === undefined ? [] : [atWork])].filter(
      ({ from }) => from === turn.from,
    );
    const full = atWork !== undefined && line.length >= waiting;
    if (full || own.length >= fromOne) {
      throw new RefusalError('busy', busy, { retryAfterSeconds });
    }
    await turnOf(turn);
    try {
      await breathe();
      return await work();
    } finally {
      startNext();
    }
  };
}
