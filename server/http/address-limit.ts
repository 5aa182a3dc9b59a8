import type { RequestHandler } from 'express';
import { rateLimit } from 'express-rate-limit';
import { RefusalError } from './refusal.ts';

const minute = 60_000;
export const hour = 60 * minute;

/** At most so many requests a minute, or within another time, from one address; 0 means none. */
export const addressLimit = (
  most: number,
  {
    within = minute,
    onlyDone = false,
  }: {
    readonly within?: number;
    /** Whether requests that were refused are not counted. */
    readonly onlyDone?: boolean;
  } = {},
): RequestHandler =>
  rateLimit({
    windowMs: within,
    limit: most,
    skipFailedRequests: onlyDone,
    standardHeaders: 'draft-7',
    legacyHeaders: false,
    handler: (_request, response, next) => {
      const seconds = Number(response.get('Retry-After') ?? within / 1000);
      const wait =
        seconds > 120 ? `${Math.ceil(seconds / 60)} minutes` : `${String(seconds)} seconds`;
      next(
        new RefusalError(
          'too-many-requests',
          `That was more than ${most} requests in ${within === hour ? 'an hour' : 'a minute'} from one address. Try again in ${wait}.`,
          { retryAfterSeconds: seconds },
        ),
      );
    },
  });
