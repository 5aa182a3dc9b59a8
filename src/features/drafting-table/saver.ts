import { CallFailed } from '../../lib/call.ts';
import { newId } from '../../lib/new-id.ts';

/** A save on its way: sent again with the same number until the server has acknowledged it. */
export type Unsent<C> = {
  readonly saveId: string;
  readonly baseVersion: number;
  readonly engine: string;
  readonly content: C;
  readonly keepReplaced: boolean;
};

/** How the work on the table stands to what the server has. */
export type Standing =
  | 'saved'
  /** Changed; sent as soon as the hand rests. */
  | 'waiting'
  | 'saving'
  /** The server cannot be reached or is not able to answer; tried again by itself. */
  | 'offline'
  | 'signed-out'
  | 'conflict'
  /** Refused for a reason that trying again does not mend; `message` says it. */
  | 'refused';

export type Saving<C, R> = {
  readonly standing: Standing;
  /** Version on the server that the table goes on from. */
  readonly base: number;
  readonly unsent: Unsent<C> | undefined;
  readonly message?: string | undefined;
  /** With `conflict`: how it was saved from elsewhere. */
  readonly current?: R | undefined;
};

export type Saver<C, R> = {
  readonly now: () => Saving<C, R>;
  readonly subscribe: (changed: () => void) => () => void;
  /** Something on the table has changed. */
  readonly edited: () => void;
  /** Sends what is not saved yet without waiting; done when the server has answered. */
  readonly flush: () => Promise<void>;
  /** In a conflict: saves what lies here over the other, which the server keeps as a revision. */
  readonly keepMine: () => void;
  /** What lies on the table is now this version of the server's. */
  readonly adopt: (version: number, content: C) => void;
  /** Sends what was left unsent when the table was opened. */
  readonly start: () => void;
  readonly close: () => void;
};

export type SaverParts<C, R> = {
  readonly base: number;
  readonly unsent: Unsent<C> | undefined;
  /** Whether the table holds work the server has not got. */
  readonly changed: boolean;
  readonly engine: string;
  readonly content: () => C;
  readonly send: (save: Unsent<C>) => Promise<{ readonly version: number }>;
  /** Reads what a conflict carries; no answer where it cannot be read. */
  readonly readCurrent: (current: unknown) => R | undefined;
  /** Whether two contents are the same work, however its figures were written. */
  readonly same: (a: C, b: C) => boolean;
};

/** The hand rests this long before a save, and a save waits at most this long, ms. */
const rest = 700;
const longestWait = 3000;
/** Tries after a failure: twice as late each time, at most half a minute apart, ms. */
const firstRetry = 1000;
const lastRetry = 30_000;

const passing: readonly CallFailed['code'][] = [
  'offline',
  'unreadable',
  'busy',
  'unavailable',
  'too-many-requests',
  'internal',
];

/** Keeps a record on the server as it is worked on: one save at a time, each from the version before. */
export function openSaver<C, R extends { readonly version: number; readonly content: C }>(
  parts: SaverParts<C, R>,
): Saver<C, R> {
  const { engine, content, send, readCurrent, same, ...start } = parts;
  const listeners = new Set<() => void>();
  let changed = start.changed;
  let acknowledged = changed ? undefined : JSON.stringify(content());
  let saving: Saving<C, R> = {
    standing: changed || start.unsent !== undefined ? 'waiting' : 'saved',
    base: start.base,
    unsent: start.unsent,
  };
  let timer: ReturnType<typeof setTimeout> | undefined;
  let waitingSince: number | undefined;
  let failures = 0;
  let running: Promise<void> | undefined;

  const tell = (next: Partial<Saving<C, R>>) => {
    saving = { ...saving, message: undefined, current: undefined, ...next };
    for (const listener of listeners) listener();
  };
  const sendIn = (wait: number) => {
    clearTimeout(timer);
    timer = setTimeout(() => void flush(), wait);
  };

  const flush = async (): Promise<void> => {
    clearTimeout(timer);
    running ??= saveAll().finally(() => {
      running = undefined;
    });
    await running;
  };

  async function saveAll(): Promise<void> {
    while (changed || saving.unsent !== undefined) {
      const unsent = saving.unsent ?? unsentNow(false);
      if (unsent === undefined) {
        tell({ standing: 'saved' });
        return;
      }
      tell({ standing: 'saving', unsent });
      try {
        const { version } = await send(unsent);
        failures = 0;
        acknowledged = JSON.stringify(unsent.content);
        tell({ standing: changed ? 'waiting' : 'saved', base: version, unsent: undefined });
      } catch (error) {
        refused(error, unsent);
        return;
      }
    }
  }

  /** A save of what lies on the table; none where the server has it already. */
  function unsentNow(keepReplaced: boolean): Unsent<C> | undefined {
    const now = content();
    changed = false;
    waitingSince = undefined;
    if (!keepReplaced && JSON.stringify(now) === acknowledged) return undefined;
    return { saveId: newId(), baseVersion: saving.base, engine, content: now, keepReplaced };
  }

  function refused(error: unknown, unsent: Unsent<C>): void {
    if (!(error instanceof CallFailed)) throw error;
    if (passing.includes(error.code)) {
      tell({ standing: 'offline', message: error.message });
      sendIn(Math.min(lastRetry, firstRetry * 2 ** failures));
      failures += 1;
      return;
    }
    if (error.code === 'not-signed-in') {
      tell({ standing: 'signed-out' });
      return;
    }
    const current = error.code === 'conflict' ? readCurrent(error.current) : undefined;
    if (current !== undefined && same(current.content, content())) {
      changed = false;
      acknowledged = JSON.stringify(content());
      tell({ standing: 'saved', base: current.version, unsent: undefined });
      return;
    }
    if (current !== undefined) {
      tell({ standing: 'conflict', current, unsent });
      return;
    }
    // What was refused is not sent again as it is; the next change is another try.
    changed = true;
    tell({ standing: 'refused', message: error.message, unsent: undefined });
  }

  return {
    now: () => saving,
    subscribe: (listener) => {
      listeners.add(listener);
      return () => listeners.delete(listener);
    },
    edited: () => {
      changed = true;
      if (!['saved', 'waiting', 'refused'].includes(saving.standing)) return;
      waitingSince ??= Date.now();
      if (saving.standing !== 'waiting') tell({ standing: 'waiting' });
      sendIn(Math.max(0, Math.min(rest, waitingSince + longestWait - Date.now())));
    },
    flush,
    keepMine: () => {
      if (saving.current === undefined) return;
      saving = { ...saving, base: saving.current.version };
      tell({ standing: 'waiting', unsent: unsentNow(true) });
      void flush();
    },
    adopt: (version, adopted) => {
      clearTimeout(timer);
      changed = false;
      acknowledged = JSON.stringify(adopted);
      tell({ standing: 'saved', base: version, unsent: undefined });
    },
    start: () => {
      if (saving.standing === 'waiting') void flush();
    },
    close: () => clearTimeout(timer),
  };
}
