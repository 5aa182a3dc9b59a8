import { and, eq, lt, sql } from 'drizzle-orm';
import type { Database } from '../../database/client.ts';
import { accounts } from '../../database/schema/accounts.ts';
import { knownDevices } from '../../database/schema/known-devices.ts';
import { sessions } from '../../database/schema/sessions.ts';
import { signInAttempts } from '../../database/schema/sign-in-attempts.ts';

export type AccountRow = typeof accounts.$inferSelect;

export async function findAccount(
  database: Database,
  email: string,
): Promise<AccountRow | undefined> {
  const [row] = await database.select().from(accounts).where(eq(accounts.email, email));
  return row;
}

/** Opens an account; none where the address has one by now. */
export async function insertAccount(
  database: Database,
  email: string,
  passwordHash: string,
): Promise<AccountRow | undefined> {
  const [row] = await database
    .insert(accounts)
    .values({ email, passwordHash })
    .onConflictDoNothing({ target: accounts.email })
    .returning();
  return row;
}

/**
 * Changes a password that is still the one that was checked, and ends every session begun by the old
 * one and every device's being known, both or neither; none where it is another by now.
 */
export const replacePassword = (
  database: Database,
  { id, passwordHash }: AccountRow,
  next: string,
): Promise<AccountRow | undefined> =>
  database.transaction(async (turn) => {
    const [changed] = await turn
      .update(accounts)
      .set({ passwordHash: next })
      .where(and(eq(accounts.id, id), eq(accounts.passwordHash, passwordHash)))
      .returning();
    if (changed === undefined) return undefined;
    await turn.delete(sessions).where(eq(sessions.userId, id));
    await turn.delete(knownDevices).where(eq(knownDevices.accountId, id));
    return changed;
  });

/** Counts one more try under a key, from anew where the window is over; says how many there were. */
export async function countAttempt(
  database: Database,
  key: string,
  windowSeconds: number,
): Promise<{ readonly count: number; readonly secondsLeft: number }> {
  const over = sql`${signInAttempts.since} < now() - make_interval(secs => ${windowSeconds})`;
  const [row] = await database
    .insert(signInAttempts)
    .values({ key, count: 1, since: sql`now()` })
    .onConflictDoUpdate({
      target: signInAttempts.key,
      set: {
        count: sql`case when ${over} then 1 else ${signInAttempts.count} + 1 end`,
        since: sql`case when ${over} then now() else ${signInAttempts.since} end`,
      },
    })
    .returning({
      count: signInAttempts.count,
      passed: sql<number>`extract(epoch from now() - ${signInAttempts.since})::float8`,
    });
  return {
    count: row?.count ?? 1,
    secondsLeft: Math.max(1, Math.ceil(windowSeconds - (row?.passed ?? 0))),
  };
}

/** Takes back a try that succeeded. */
export async function forgiveAttempt(database: Database, key: string): Promise<void> {
  await database
    .update(signInAttempts)
    .set({ count: sql`greatest(${signInAttempts.count} - 1, 0)` })
    .where(eq(signInAttempts.key, key));
}

/** Forgets every try under a key, and those of yesterday under any. */
export async function forgetAttempts(database: Database, key: string): Promise<void> {
  await database.delete(signInAttempts).where(eq(signInAttempts.key, key));
  await database
    .delete(signInAttempts)
    .where(lt(signInAttempts.since, sql`now() - interval '1 day'`));
}
