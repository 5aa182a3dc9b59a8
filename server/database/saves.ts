import { and, eq } from 'drizzle-orm';
import type { Store } from './client.ts';
import { saves } from './schema/saves.ts';

export type Acknowledged = typeof saves.$inferSelect;

/** The save acknowledged under a browser's number, if there was one. */
export async function acknowledgedSave(
  store: Store,
  accountId: string,
  saveId: string,
): Promise<Acknowledged | undefined> {
  const [row] = await store
    .select()
    .from(saves)
    .where(and(eq(saves.accountId, accountId), eq(saves.saveId, saveId)));
  return row;
}

/**
 * Writes down that a save is acknowledged; false where another request just did so under the same
 * number (it waits for that one to end).
 */
export async function acknowledge(store: Store, save: Acknowledged): Promise<boolean> {
  const written = await store
    .insert(saves)
    .values(save)
    .onConflictDoNothing()
    .returning({ saveId: saves.saveId });
  return written.length > 0;
}
