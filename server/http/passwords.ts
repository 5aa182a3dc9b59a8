import { randomBytes } from 'node:crypto';
import { Argon2id } from 'oslo/password';

/** Argon2id with 19 MiB, 2 passes, 1 lane: OWASP Password Storage Cheat Sheet, first recommendation. */
const argon2id = new Argon2id({ memorySize: 19_456, iterations: 2, parallelism: 1 });

export const hashPassword = (password: string): Promise<string> => argon2id.hash(password);

let nobodys: Promise<string> | undefined;

/** Whether a password is the one hashed; without a hash it takes as long and is always wrong. */
export async function isPassword(hash: string | undefined, password: string): Promise<boolean> {
  if (hash !== undefined) return argon2id.verify(hash, password);
  nobodys ??= hashPassword(randomBytes(32).toString('hex'));
  await argon2id.verify(await nobodys, password);
  return false;
}

/** A hash that no password fits. */
export const unguessableHash = (): Promise<string> =>
  hashPassword(randomBytes(32).toString('base64'));
