import type { RequestHandler } from 'express';
import { rateLimit } from 'express-rate-limit';
import { RefusalError } from './refusal.ts';

const minute = 60_000;

/** At most so many requests a minute from one address; 0 means none. */
export const addressLimit = (perMinute: number): RequestHandler =>
  rateLimit({
    windowMs: minute,
    limit: perMinute,
    standardHeaders: 'draft-7',
    legacyHeaders: false,
    handler: (_request, response, next) => {
      const seconds = Number(response.get('Retry-After') ?? 60);
      next(
        new RefusalError(
          'too-many-requests',
          `That was more than ${perMinute} requests in a minute from one address. Try again in ${seconds} seconds.`,
          { retryAfterSeconds: seconds },
        ),
      );
    },
  });
