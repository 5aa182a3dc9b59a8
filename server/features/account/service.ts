import type { Database } from '../../database/client.ts';
import { hashPassword, isPassword } from '../../http/passwords.ts';
import { refusalFor } from '../../http/refusal.ts';
import { wrongSignIn } from '../../http/session.ts';
import { error } from '#shared/units/problem.ts';
import { said } from '#shared/units/said.ts';
import { type AccountRow, findAccount, insertAccount, replacePassword } from './repository.ts';
import { countTry, type Trier } from './throttle.ts';

/** What somebody says who wants in, and from where. */
export type Credentials = Trier & { readonly password: string };

/** Checks a password; takes as long, and says the same, where there is no such account. */
export async function signIn(database: Database, claim: Credentials): Promise<AccountRow> {
  const takeBack = await countTry(database, claim);
  const account = await findAccount(database, claim.email);
  const right = await isPassword(account?.passwordHash, claim.password);
  if (account === undefined || !right) {
    throw wrongSignIn();
  }
  await takeBack();
  return account;
}

const notFree = () =>
  refusalFor(
    'bad-input',
    [
      error({
        code: 'not-free',
        field: 'email',
        said: said`No account can be opened with this e-mail. If you have one already, sign in with its password.`,
      }),
    ],
    'cm',
  );

/**
 * Opens an account, or signs in where it exists with this very password. Either way one password is
 * hashed and one try counted: that an address is taken shows in the answer alone, to few who ask.
 */
export async function signUp(database: Database, claim: Credentials): Promise<AccountRow> {
  const takeBack = await countTry(database, claim);
  const present = await findAccount(database, claim.email);
  const account =
    present === undefined
      ? await insertAccount(database, claim.email, await hashPassword(claim.password))
      : (await isPassword(present.passwordHash, claim.password)) && present;
  if (account === undefined || account === false) throw notFree();
  await takeBack();
  return account;
}

/** Changes a password after the present one was given once more; every session of the account ends. */
export async function changePassword(
  database: Database,
  claim: Credentials,
  next: string,
): Promise<AccountRow> {
  const takeBack = await countTry(database, claim);
  const account = await findAccount(database, claim.email);
  const right = await isPassword(account?.passwordHash, claim.password);
  const changed =
    account !== undefined && right
      ? await replacePassword(database, account, await hashPassword(next))
      : undefined;
  if (changed === undefined) {
    throw refusalFor(
      'bad-input',
      [
        error({
          code: 'wrong-password',
          field: 'password',
          said: said`This is not the present password: type it again.`,
        }),
      ],
      'cm',
    );
  }
  await takeBack();
  return changed;
}
