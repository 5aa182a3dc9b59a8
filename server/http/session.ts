import { createHash } from 'node:crypto';
import { DrizzlePostgreSQLAdapter } from '@lucia-auth/adapter-drizzle';
import type { Request, Response } from 'express';
import { generateIdFromEntropySize, Lucia } from 'lucia';
import { endOldestSessions, holdAccountAsChecked } from '../database/account-hold.ts';
import type { Database, Store } from '../database/client.ts';
import { accounts } from '../database/schema/accounts.ts';
import { sessions } from '../database/schema/sessions.ts';
import { noteSessionUse } from '../database/session-use.ts';
import { deviceWords } from './device-words.ts';
import { mostKept } from './most-kept.ts';
import { RefusalError } from './refusal.ts';

declare module 'lucia' {
  interface Register {
    Lucia: ReturnType<typeof openLucia>;
    DatabaseSessionAttributes: Device & { startedAt: Date; lastUsedAt: Date };
    DatabaseUserAttributes: { email: string };
  }
}
type Device = { device: string };

/** Who sends a request, and from which of their sessions. */
export type Caller = {
  readonly accountId: string;
  readonly email: string;
  readonly sessionId: string;
  readonly device: string;
};

/** One place an account is signed in. */
export type SignedInPlace = {
  readonly sessionId: string;
  readonly device: string;
  readonly startedAt: Date;
  readonly lastUsedAt: Date;
};

/** The sessions of everybody, as one server keeps them. */
export type Sessions = {
  /** Who sends a request; asks the database each time, so that an ended session is ended at once. */
  readonly callerOf: (request: Request, response: Response) => Promise<Caller | undefined>;
  /**
   * Signs this browser in, in place of whoever was signed in on it; only where the password that was
   * checked is the account's still, so that no session outlives a change of it.
   */
  readonly begin: (
    request: Request,
    response: Response,
    account: { readonly id: string; readonly passwordHash: string },
  ) => Promise<Pick<Caller, 'sessionId' | 'device'>>;
  readonly end: (response: Response, caller: Caller) => Promise<void>;
  /** Ends every session of an account, the one that asks as well. */
  readonly endAll: (response: Response, accountId: string) => Promise<void>;
  readonly placesOf: (accountId: string) => Promise<readonly SignedInPlace[]>;
};

const openLucia = (database: Store, overHttps: boolean) =>
  new Lucia(new DrizzlePostgreSQLAdapter(database, sessions, accounts), {
    sessionCookie: {
      // With the prefix a browser takes the cookie from this host over https alone.
      name: overHttps ? '__Host-ellwand' : 'ellwand',
      attributes: { secure: overHttps, sameSite: 'lax', path: '/' },
    },
    getSessionAttributes: ({ device, startedAt, lastUsedAt }) => ({
      device,
      startedAt,
      lastUsedAt,
    }),
    getUserAttributes: ({ email }) => ({ email }),
  });

/** Says the same for a wrong password, for one that was changed meanwhile, and for no account. */
export const wrongSignIn = (): RefusalError =>
  new RefusalError(
    'wrong-sign-in',
    'This e-mail and password do not belong together. Look at both and try again.',
  );

/** The database keeps a digest: who reads it there cannot sign in with it. */
const digest = (secret: string) => createHash('sha256').update(secret).digest('hex');

/** How exactly it is kept when a session was last used. */
const minute = 60_000;

/** Opens the book of sessions; cookies are `Secure` where people come over https. */
export function openSessions(database: Database, overHttps: boolean): Sessions {
  const lucia = openLucia(database, overHttps);
  const setCookie = (response: Response, secret: string) =>
    response.append('Set-Cookie', lucia.createSessionCookie(secret).serialize());
  const clearCookie = (response: Response) =>
    response.append('Set-Cookie', lucia.createBlankSessionCookie().serialize());
  return {
    callerOf: async (request, response) => {
      const secret = lucia.readSessionCookie(request.headers.cookie ?? '');
      if (secret === null) return undefined;
      const { session, user } = await lucia.validateSession(digest(secret));
      if (session === null) return undefined;
      if (session.fresh) setCookie(response, secret);
      const now = new Date();
      if (now.getTime() - session.lastUsedAt.getTime() > minute) {
        await noteSessionUse(database, session.id, now);
      }
      const { id: sessionId, device } = session;
      return { accountId: user.id, email: user.email, sessionId, device };
    },
    begin: async (request, response, account) => {
      const before = lucia.readSessionCookie(request.headers.cookie ?? '');
      const secret = generateIdFromEntropySize(25);
      const now = new Date();
      const sessionId = digest(secret);
      const device = deviceWords(request.headers['user-agent']);
      const attributes = { device, startedAt: now, lastUsedAt: now };
      await database.transaction(async (turn) => {
        if (!(await holdAccountAsChecked(turn, account))) throw wrongSignIn();
        const inTurn = openLucia(turn, overHttps);
        if (before !== null) await inTurn.invalidateSession(digest(before));
        await inTurn.createSession(account.id, attributes, { sessionId });
        await endOldestSessions(turn, account.id, mostKept.sessions);
      });
      setCookie(response, secret);
      await lucia.deleteExpiredSessions();
      return { sessionId, device };
    },
    end: async (response, { sessionId }) => {
      await lucia.invalidateSession(sessionId);
      clearCookie(response);
    },
    endAll: async (response, accountId) => {
      await lucia.invalidateUserSessions(accountId);
      clearCookie(response);
    },
    placesOf: async (accountId) =>
      (await lucia.getUserSessions(accountId)).map(({ id: sessionId, ...rest }) => ({
        sessionId,
        ...rest,
      })),
  };
}
