import { and, eq, gt, lt } from 'drizzle-orm';
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

/** A number is remembered for so long, ms: thirty days. */
const remembered = 30 * 24 * 60 * 60 * 1000;

/**
 * Forgets the numbers of a record's changes that are older than any browser sends again. One that comes
 * later still is a change from a version long gone: a conflict, never done twice. What made a record is
 * not forgotten: sent again it would make another.
 */
const forgetOld = (store: Store, { accountId, record, savedAt }: Acknowledged) =>
  store
    .delete(saves)
    .where(
      and(
        eq(saves.accountId, accountId),
        eq(saves.record, record),
        gt(saves.version, 1),
        lt(saves.savedAt, new Date(savedAt.getTime() - remembered)),
      ),
    );

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
  if (save.version > 1) await forgetOld(store, save);
  return written.length > 0;
}
