import { createHash, randomBytes, randomUUID } from 'node:crypto';
import type { RequestHandler, Response } from 'express';
import type { Logger } from 'pino';

/** New with every start: marks in two logs cannot be joined, nor an address be guessed from one. */
const salt = randomBytes(16);

/** Tells one address from another in the log without keeping it. */
const markOf = (address: string | undefined) =>
  createHash('sha256')
    .update(salt)
    .update(address ?? '')
    .digest('hex')
    .slice(0, 8);

/** The id under which a request stands in the log and in the reply. */
export const requestIdOf = (response: Response): string => response.get('X-Request-Id') ?? '';

/**
 * One line a request. The path is the route's own pattern: no body, no query, no name and no
 * address goes into the log.
 */
export const requestLog =
  (log: Logger): RequestHandler =>
  (request, response, next) => {
    const start = performance.now();
    const id = randomUUID();
    response.setHeader('X-Request-Id', id);
    response.on('close', () => {
      const level = response.locals['quiet'] === true ? 'debug' : 'info';
      log[level](
        {
          id,
          method: request.method,
          route: routeOf(request.route),
          status: response.statusCode,
          ended: response.writableFinished,
          ms: Math.round(performance.now() - start),
          from: markOf(request.ip),
        },
        'request',
      );
    });
    next();
  };

/** Express types the matched route loosely; only its pattern is of use. */
function routeOf(route: unknown): string | undefined {
  if (typeof route !== 'object' || route === null || !('path' in route)) return undefined;
  return typeof route.path === 'string' ? route.path : undefined;
}
