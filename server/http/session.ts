import { createHash } from 'node:crypto';
import { DrizzlePostgreSQLAdapter } from '@lucia-auth/adapter-drizzle';
import type { Request, Response } from 'express';
import { generateIdFromEntropySize, Lucia } from 'lucia';
import type { Database } from '../database/client.ts';
import { accounts } from '../database/schema/accounts.ts';
import { sessions } from '../database/schema/sessions.ts';
import { noteSessionUse } from '../database/session-use.ts';
import { deviceWords } from './device-words.ts';

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
  /** Signs this browser in, in place of whoever was signed in on it. */
  readonly begin: (
    request: Request,
    response: Response,
    accountId: string,
  ) => Promise<Pick<Caller, 'sessionId' | 'device'>>;
  readonly end: (response: Response, caller: Caller) => Promise<void>;
  /** Ends every session of an account, the one that asks as well. */
  readonly endAll: (response: Response, accountId: string) => Promise<void>;
  readonly placesOf: (accountId: string) => Promise<readonly SignedInPlace[]>;
};

const openLucia = (database: Database, overHttps: boolean) =>
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

/** The database keeps a digest: who reads it there cannot sign in with it. */
const digest = (secret: string) => createHash('sha256').update(secret).digest('hex');

/** How exactly it is kept when a session was last used. */
const minute = 60_000;

/** Opens the book of sessions; cookies are `Secure` where people come over https. */
export function openSessions(database: Database, overHttps: boolean): Sessions {
  const lucia = openLucia(database, overHttps);
  const setCookie = (response: Response, secret: string) =>
    response.setHeader('Set-Cookie', lucia.createSessionCookie(secret).serialize());
  const clearCookie = (response: Response) =>
    response.setHeader('Set-Cookie', lucia.createBlankSessionCookie().serialize());
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
    begin: async (request, response, accountId) => {
      const before = lucia.readSessionCookie(request.headers.cookie ?? '');
      if (before !== null) await lucia.invalidateSession(digest(before));
      const secret = generateIdFromEntropySize(25);
      const now = new Date();
      const sessionId = digest(secret);
      const device = deviceWords(request.headers['user-agent']);
      const attributes = { device, startedAt: now, lastUsedAt: now };
      await lucia.createSession(accountId, attributes, { sessionId });
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
