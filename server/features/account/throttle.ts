import { createHash } from 'node:crypto';
import type { Database } from '../../database/client.ts';
import { RefusalError } from '../../http/refusal.ts';
import { countAttempt, forgetAttempts, forgiveAttempt } from './repository.ts';

/** Tries that may fail within the window: at one account from one place, from one address at any, at one account from anywhere. */
const mostFromOnePlace = 10;
const mostFromAddress = 50;
const mostForAccount = 100;
const windowSeconds = 15 * 60;

/** Who tries to get in, and where. */
export type Trier = {
  readonly email: string;
  readonly address: string;
  /** A session of this account, or a browser it was signed in on before: then strangers do not count. */
  readonly knownAs?: string | undefined;
};

/** Neither e-mail nor address is kept, only what tells them apart. */
const keyOf = (...words: readonly string[]) =>
  createHash('sha256').update(words.join(' ')).digest('hex');

type Bound = { readonly key: string; readonly most: number; readonly whole?: boolean };

/**
 * The bounds a try comes up against, in turn: one that is refused does not count for the next. So
 * one address cannot use up what an account allows to all, and nobody locks out who is known.
 */
function boundsOf({ email, address, knownAs }: Trier): readonly Bound[] {
  if (knownAs !== undefined) {
    return [{ key: keyOf('known', knownAs, email), most: mostFromOnePlace, whole: true }];
  }
  return [
    { key: keyOf('address', address), most: mostFromAddress },
    { key: keyOf('place', address, email), most: mostFromOnePlace, whole: true },
    { key: keyOf('account', email), most: mostForAccount },
  ];
}

/**
 * Counts a try before it is made, so that many at once are no way round, and refuses it where there
 * were too many, whether the account exists or not. A try that turns out right is taken back by
 * what it gives.
 */
export async function countTry(database: Database, trier: Trier): Promise<() => Promise<void>> {
  const bounds = boundsOf(trier);
  for (const { key, most } of bounds) {
    const { count, secondsLeft } = await countAttempt(database, key, windowSeconds);
    if (count <= most) continue;
    throw new RefusalError(
      'too-many-requests',
      `Too many tries failed. Wait ${Math.ceil(secondsLeft / 60)} minutes and try again.`,
      { retryAfterSeconds: secondsLeft },
    );
  }
  return async () => {
    for (const { key, whole } of bounds) {
      await (whole === true ? forgetAttempts(database, key) : forgiveAttempt(database, key));
    }
  };
}
