import express, { type Express } from 'express';
import type { Logger } from 'pino';
import type { Database } from './database/client.ts';
import { ping } from './database/client.ts';
import { accountRouter } from './features/account/router.ts';
import type { Drafter } from './drafting/drafter.ts';
import { draftsRouter } from './features/drafts/router.ts';
import { gownsRouter } from './features/gowns/router.ts';
import { createGown } from './features/gowns/service.ts';
import { classVisitsRouter, lessonsRouter } from './features/lessons/router.ts';
import { measureCardsRouter } from './features/measure-cards/router.ts';
import { peopleRouter } from './features/people/router.ts';
import type { Printer } from './features/print/printer.ts';
import { printRouter } from './features/print/router.ts';
import { samplesRouter } from './features/samples/router.ts';
import { addressLimit } from './http/address-limit.ts';
import { errorReply } from './http/error-reply.ts';
import { nothingHere } from './http/nothing-here.ts';
import { originCheck } from './http/origin-check.ts';
import { requestLog } from './http/request-log.ts';
import { securityHeaders } from './http/security-headers.ts';
import type { Own } from './http/serve-own.ts';
import { openSessions } from './http/session.ts';
import type { Limits } from './settings.ts';

/** All an application is built from; nothing in it is global. */
export type Parts = {
  readonly database: Database;
  readonly log: Logger;
  readonly limits: Limits;
  readonly drafter: Drafter;
  readonly printer: Printer;
  readonly overHttps: boolean;
  /** Addresses our own pages are opened under. */
  readonly origins: readonly string[];
  readonly trustedProxies: number;
  /** What answers outside the API: the built screens, or Vite in development. */
  readonly screens: express.RequestHandler;
  /** Development needs inline scripts, which the content security policy forbids. */
  readonly strictHeaders: boolean;
};

const bodyLimit = '64kb';

/** Builds the application; it does not listen. */
export function buildApp(parts: Parts): Express {
  const app = express();
  app.disable('x-powered-by');
  app.set('trust proxy', parts.trustedProxies);
  app.use(requestLog(parts.log));
  app.use(securityHeaders({ overHttps: parts.overHttps, strict: parts.strictHeaders }));
  app.get('/api/health', async (_request, response) => {
    response.locals['quiet'] = true;
    await ping(parts.database);
    response.setHeader('Cache-Control', 'no-store').json({ name: 'ellwand', database: 'answers' });
  });
  app.use(classVisitsRouter(parts.database, parts.limits));
  app.use(
    '/api',
    addressLimit(parts.limits.requestsPerMinute),
    originCheck(parts.origins),
    express.json({ limit: bodyLimit, strict: false }),
  );
  app.use(samplesRouter(parts.database));
  app.use(draftsRouter(parts.limits, parts.drafter));
  app.use(printRouter(parts.limits, parts.printer));
  const own: Own = { ...parts, sessions: openSessions(parts.database, parts.overHttps) };
  app.use(accountRouter(own, (maker, gown) => createGown(own, maker, gown)));
  app.use(gownsRouter(own));
  app.use(measureCardsRouter(own));
  app.use(peopleRouter(own));
  app.use(lessonsRouter(own));
  app.use('/api', nothingHere);
  app.use(parts.screens);
  app.use(nothingHere);
  app.use(errorReply(parts.log));
  return app;
}
