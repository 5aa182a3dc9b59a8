import { eq } from 'drizzle-orm';
import { hashPassword, unguessableHash } from '../http/passwords.ts';
import type { Database } from './client.ts';
import { accounts } from './schema/accounts.ts';
import { sessions } from './schema/sessions.ts';

/** An invented maker to look around as; its password is known to everybody who reads this. */
export const demoAccount = { email: 'demo@ellwand.example', password: 'ten ells of calico' };

/**
 * Lets the demo account in where the server is reached from this machine alone; anywhere else its
 * password opens nothing and its sessions end.
 */
export async function settleDemoAccount(database: Database, allowed: boolean): Promise<void> {
  const { email, password } = demoAccount;
  if (allowed) {
    const passwordHash = await hashPassword(password);
    await database
      .insert(accounts)
      .values({ email, passwordHash })
      .onConflictDoUpdate({ target: accounts.email, set: { passwordHash } });
    return;
  }
  const [closed] = await database
    .update(accounts)
    .set({ passwordHash: await unguessableHash() })
    .where(eq(accounts.email, email))
    .returning({ id: accounts.id });
  if (closed) await database.delete(sessions).where(eq(sessions.userId, closed.id));
}
