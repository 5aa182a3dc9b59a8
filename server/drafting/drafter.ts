import type { DrawnPieces, Gown, GownContent } from '#shared/api/gowns.ts';
import type { DraftedInputs } from '#shared/engine/drafted.ts';
import { firstComeQueue, type Turn } from '../http/first-come-queue.ts';
import { openThread } from '../http/worker-thread.ts';
import { type Limits, workerPaths } from '../settings.ts';
import type { DraftOrder } from './draft-order.ts';
import type { Drawing } from './drawing.ts';

/** Drafts in a thread of its own, so that everything else is answered meanwhile; each waits its turn. */
export type Drafter = {
  /** Begins the drafting thread; without it, the first draft does. */
  readonly begin: () => void;
  /** A draft as the contract's JSON; throws RefusalError where it cannot be drawn or too many wait. */
  readonly reply: (inputs: DraftedInputs, turn: Turn) => Promise<Uint8Array>;
  /** What a gown keeps; none where it is incomplete or cannot be drawn. */
  readonly drawing: (content: GownContent, turn: Turn) => Promise<Drawing | undefined>;
  /** What the current engine would draw otherwise. */
  readonly redrawing: (before: DrawnPieces, turn: Turn) => Promise<Gown['redrawing']>;
  readonly close: () => Promise<void>;
};

export function openDrafter(limits: Limits): Drafter {
  const queue = firstComeQueue({
    waiting: limits.draftsWaiting,
    fromOne: limits.draftsFromOneAddress,
    busy: 'Many gowns are being drawn at this moment. Try again in a moment.',
    retryAfterSeconds: 1,
  });
  const thread = openThread<DraftOrder>(workerPaths.draft);
  const ask = (order: DraftOrder, turn: Turn) => queue(turn, () => thread.ask(order));
  return {
    begin: thread.begin,
    reply: async (inputs, turn) => bytesIn(await ask({ what: 'reply', inputs }, turn)),
    drawing: async (content, turn) => drawingIn(await ask({ what: 'drawing', content }, turn)),
    redrawing: async (before, turn) => redrawingIn(await ask({ what: 'redrawing', before }, turn)),
    close: thread.close,
  };
}

/** What the drafting thread makes of a `reply`. */
function bytesIn(made: unknown): Uint8Array {
  return made as Uint8Array;
}

/** What the drafting thread makes of a `drawing`. */
function drawingIn(made: unknown): Drawing | undefined {
  return made as Drawing | undefined;
}

/** What the drafting thread makes of a `redrawing`. */
function redrawingIn(made: unknown): Gown['redrawing'] {
  return made as Gown['redrawing'];
}
