import type { Database, Store } from '../../database/client.ts';
import type { Drafter } from '../../drafting/drafter.ts';
import { conflict } from '../../http/conflict.ts';
import type { Caller } from '../../http/session.ts';
import { gownView } from './gown-view.ts';
import type { GownRow } from './repository.ts';

/** What gowns are kept and drawn with. */
export type Workroom = { readonly database: Database; readonly drafter: Drafter };

/** Whoever saves, as far as it matters here. */
export type Maker = Omit<Caller, 'email'>;

/** A save was made from another version than the one that stands there. */
export class OtherVersionError extends Error {
  constructor(readonly row: GownRow) {
    super('The save was made from another version.');
    this.name = 'OtherVersionError';
  }
}

/**
 * Saves in one transaction. What stands there in a conflict may have to be drawn anew, which is done
 * when the transaction is over: nobody waits for a pencil with a gown held.
 */
export async function savedOrConflict<T>(
  { database, drafter }: Workroom,
  maker: Maker,
  save: (turn: Store) => Promise<T>,
): Promise<T> {
  try {
    return await database.transaction(save);
  } catch (error) {
    if (!(error instanceof OtherVersionError)) throw error;
    throw conflict(error.row, await gownView(error.row, maker, drafter));
  }
}
