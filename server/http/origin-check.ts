import type { RequestHandler } from 'express';
import { RefusalError } from './refusal.ts';

const harmless = new Set(['GET', 'HEAD', 'OPTIONS']);

/**
 * Lets no page of somebody else's act in a maker's name. Browsers tell the origin of everything that
 * changes something; a program that tells none has no cookie to misuse, so it may only come without.
 */
export const originCheck =
  (own: readonly string[]): RequestHandler =>
  (request, _response, next) => {
    const { origin, cookie } = request.headers;
    const trusted = origin === undefined ? cookie === undefined : own.includes(origin);
    if (harmless.has(request.method) || trusted) {
      next();
      return;
    }
    next(
      new RefusalError(
        'wrong-origin',
        'This was sent from a page at another address than Ellwand’s own. Open Ellwand at the address it was given to you under.',
      ),
    );
  };
