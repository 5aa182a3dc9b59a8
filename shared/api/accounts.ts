import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { gownCreation } from './gowns.ts';
import { done } from './saving.ts';

/** Letter case of an address is folded and outer space taken away, so that one person has one account. */
const email = z
  .string()
  .max(254)
  .transform((text) => text.trim().toLowerCase())
  .pipe(z.email());

/** A password somebody chooses: long rather than odd, no rule of composition. */
const newPassword = z.string().min(10).max(200);

/** A password somebody claims to have: its length gives nothing away. */
const password = z.string().max(200);

const account = z.object({ email: z.string() });
const signedIn = { kind: 'json', schema: z.object({ account }) } as const;

/**
 * Opens an account and signs in; `gown` is what was drawn at /try, kept as the first gown. Sent
 * again with the same password (its answer was lost) it signs in, and the gown is not doubled.
 */
export const signUp = endpoint({
  method: 'POST',
  path: '/api/account/sign-up',
  body: z.strictObject({ email, password: newPassword, gown: gownCreation.optional() }),
  reply: { kind: 'json', schema: z.object({ account, gownId: z.uuid().optional() }) },
});

export const signIn = endpoint({
  method: 'POST',
  path: '/api/account/sign-in',
  body: z.strictObject({ email, password }),
  reply: signedIn,
});

/** Ends this session; without one it does nothing. */
export const signOut = endpoint({
  method: 'POST',
  path: '/api/account/sign-out',
  body: undefined,
  reply: { kind: 'json', schema: done },
});

/** Ends every session of the account, this one as well. */
export const signOutEverywhere = endpoint({
  method: 'POST',
  path: '/api/account/sign-out-everywhere',
  body: undefined,
  reply: { kind: 'json', schema: done },
});

/** Who is signed in; nobody is an answer, not a refusal. */
export const whoAmI = endpoint({
  method: 'GET',
  path: '/api/account',
  body: undefined,
  reply: { kind: 'json', schema: z.object({ account: account.nullable() }) },
});

/** Changes the password; every other session ends. */
export const changePassword = endpoint({
  method: 'POST',
  path: '/api/account/password',
  body: z.strictObject({ password, newPassword }),
  reply: { kind: 'json', schema: done },
});

/** Where the account is signed in, last used first. */
export const listSessions = endpoint({
  method: 'GET',
  path: '/api/account/sessions',
  body: undefined,
  reply: {
    kind: 'json',
    schema: z.object({
      sessions: z.array(
        z.object({
          /** Browser and system in words, as the browser told: "Firefox on Linux". */
          device: z.string(),
          startedAt: z.iso.datetime(),
          /** To the minute. */
          lastUsedAt: z.iso.datetime(),
          /** The session that asks. */
          here: z.boolean(),
        }),
      ),
    }),
  },
});
