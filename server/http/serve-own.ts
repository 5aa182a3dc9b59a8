import type { Router } from 'express';
import type { Endpoint, Received } from '#shared/api/endpoint.ts';
import { RefusalError } from './refusal.ts';
import { type Asked, type Given, serveTo } from './serve.ts';
import type { Drafter } from '../drafting/drafter.ts';
import type { Database } from '../database/client.ts';
import type { Limits } from '../settings.ts';
import type { Caller, Sessions } from './session.ts';

/** What a router of people's own things is built from. */
export type Own = {
  readonly database: Database;
  readonly sessions: Sessions;
  readonly limits: Limits;
  readonly overHttps: boolean;
  readonly drafter: Drafter;
};

/** Answers a line of the contract to people who are signed in, and to nobody else. */
export const serveOwn = <E extends Endpoint>(
  router: Router,
  sessions: Sessions,
  contract: E,
  handler: (received: Received<E>, asked: Asked<E, Caller>) => Promise<Given<E>>,
): void =>
  serveTo(
    router,
    async (request, response) => {
      const caller = await sessions.callerOf(request, response);
      if (caller === undefined) {
        throw new RefusalError(
          'not-signed-in',
          'Nobody is signed in here, or the session has ended. Sign in and send it again.',
        );
      }
      return caller;
    },
    contract,
    handler,
  );
