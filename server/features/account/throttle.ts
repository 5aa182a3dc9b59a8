import { createHash } from 'node:crypto';
import type { Database } from '../../database/client.ts';
import { RefusalError } from '../../http/refusal.ts';
import { countAttempt, forgetAttempts, forgiveAttempt } from './repository.ts';

/** Tries that may fail within the window: for one account from anywhere, from one address for any. */
const mostForAccount = 10;
const mostFromAddress = 50;
const windowSeconds = 15 * 60;

/** Neither e-mail nor address is kept, only what tells them apart. */
const keyOf = (kind: 'account' | 'address', text: string) =>
  createHash('sha256').update(`${kind} ${text}`).digest('hex');

/**
 * Counts a try before it is made, so that many at once are no way round, and refuses it where there
 * were too many, whether the account exists or not. A try that turns out right is taken back by
 * what it gives.
 */
export async function countTry(
  database: Database,
  email: string,
  address: string,
): Promise<() => Promise<void>> {
  const account = keyOf('account', email);
  const from = keyOf('address', address);
  const tries = [
    { ...(await countAttempt(database, from, windowSeconds)), most: mostFromAddress },
    { ...(await countAttempt(database, account, windowSeconds)), most: mostForAccount },
  ];
  const over = tries.filter(({ count, most }) => count > most);
  if (over.length > 0) {
    const seconds = Math.max(...over.map((each) => each.secondsLeft));
    throw new RefusalError(
      'too-many-requests',
      `Too many tries failed. Wait ${Math.ceil(seconds / 60)} minutes and try again.`,
      { retryAfterSeconds: seconds },
    );
  }
  return async () => {
    await forgiveAttempt(database, from);
    await forgetAttempts(database, account);
  };
}
