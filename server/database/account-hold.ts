import { and, desc, eq, inArray } from 'drizzle-orm';
import type { Store } from './client.ts';
import { accounts } from './schema/accounts.ts';
import { sessions } from './schema/sessions.ts';

/**
 * Holds an account until the transaction ends, so that what is counted under it is counted in turn.
 * It is the one order of all locks: whatever writes to more than one gown, measure card or person holds
 * the account before it touches any of them, so two requests of one maker never wait for each other.
 */
export async function holdAccount(store: Store, id: string): Promise<void> {
  await store
    .select({ id: accounts.id })
    .from(accounts)
    .where(eq(accounts.id, id))
    .for('no key update');
}

/** The same where its password is still the one that was checked; else false. */
export async function holdAccountAsChecked(
  store: Store,
  { id, passwordHash }: { readonly id: string; readonly passwordHash: string },
): Promise<boolean> {
  const held = await store
    .select({ id: accounts.id })
    .from(accounts)
    .where(and(eq(accounts.id, id), eq(accounts.passwordHash, passwordHash)))
    .for('no key update');
  return held.length > 0;
}

/** Ends the sessions of an account that were used longest ago, beyond so many. */
export async function endOldestSessions(
  store: Store,
  accountId: string,
  most: number,
): Promise<void> {
  const oldest = store
    .select({ id: sessions.id })
    .from(sessions)
    .where(eq(sessions.userId, accountId))
    .orderBy(desc(sessions.lastUsedAt), desc(sessions.startedAt))
    .offset(most);
  await store.delete(sessions).where(inArray(sessions.id, oldest));
}
