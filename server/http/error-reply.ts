import type { ErrorRequestHandler } from 'express';
import type { Logger } from 'pino';
import { problemSchema } from '#shared/api/problem.ts';
import type { Refusal } from '#shared/api/problem-codes.ts';
import type { Problem } from '#shared/units/problem.ts';
import { isLostConnection } from '../database/lost-connection.ts';
import { RefusalError, statusOf } from './refusal.ts';
import { requestIdOf } from './request-log.ts';

/**
 * What may be logged of a bug: its kind and where it happened. Messages are left out, as they can
 * quote what a person typed (a query's parameters, a piece of the body).
 */
function traceOf(error: unknown): { kind: string; code?: unknown; frames: string[] } {
  if (!(error instanceof Error)) return { kind: typeof error, frames: [] };
  // A message may itself hold lines that look like frames.
  const frames = (error.stack ?? '')
    .replace(error.message, () => '')
    .split('\n')
    .filter((line) => line.trimStart().startsWith('at '));
  const cause = error.cause instanceof Error ? error.cause : error;
  return {
    kind: `${error.name}${cause === error ? '' : ` of ${cause.name}`}`,
    ...('code' in cause ? { code: cause.code } : {}),
    frames: frames.slice(0, 12).map((line) => line.trim()),
  };
}

/** Refusals of the body parser, in our words; its own quote the body. */
function fromParser(error: unknown): RefusalError | undefined {
  if (typeof error !== 'object' || error === null || !('type' in error)) return undefined;
  if (error.type === 'entity.too.large') {
    return new RefusalError(
      'too-large',
      'The request is larger than 64 kB. A card and a style need a few kB.',
    );
  }
  if (typeof error.type === 'string' && /^(entity|encoding|charset|request)\./.test(error.type)) {
    return new RefusalError('not-json', 'The request is not readable JSON in UTF-8.');
  }
  return undefined;
}

/** What the file server and the body parser set for the reply that did not come about. */
const ofAnotherReply = [
  'Content-Type',
  'Content-Length',
  'Content-Encoding',
  'Content-Disposition',
  'Accept-Ranges',
  'ETag',
  'Last-Modified',
];

const property = (error: unknown, key: string): unknown =>
  typeof error === 'object' && error !== null && key in error ? Reflect.get(error, key) : undefined;

/** Headers of a request that do not fit what they came with, as Express and its parts tell it by a status. */
function fromHeaders(error: unknown): RefusalError | undefined {
  const status = property(error, 'status') ?? property(error, 'statusCode');
  const code = property(error, 'code');
  if (typeof code === 'string' && /^(Z_|ERR_?_?(BROTLI|ZSTD))/.test(code)) {
    return new RefusalError('not-json', 'The request is not packed as it says it is.');
  }
  if (typeof status !== 'number' || status < 400 || status > 499) return undefined;
  if (status === 416) {
    return new RefusalError('no-such-range', 'The file has no such range: ask for less of it.');
  }
  if (status === 412) {
    return new RefusalError('precondition-failed', 'The file is another than the request expects.');
  }
  if (status === 404) return new RefusalError('not-found', 'There is nothing at this address.');
  return new RefusalError('not-json', 'The request cannot be read.');
}

/** A path that cannot be decoded is a stranger's mistake, not a bug. */
function fromPath(error: unknown): RefusalError | undefined {
  return error instanceof URIError
    ? new RefusalError('not-found', 'The address is not readable.')
    : undefined;
}

/** A database that is away for a moment: nothing is lost by asking again. */
function fromDatabase(error: unknown): RefusalError | undefined {
  return isLostConnection(error)
    ? new RefusalError(
        'unavailable',
        'The database does not answer for the moment. Send the same again.',
        { retryAfterSeconds: 1 },
      )
    : undefined;
}

/** Turns every failure into one shape of reply; only bugs are logged, with the request's id. */
export const errorReply =
  (log: Logger): ErrorRequestHandler =>
  (error: unknown, _request, response, next) => {
    if (response.headersSent) {
      next(error);
      return;
    }
    const known =
      error instanceof RefusalError
        ? error
        : (fromParser(error) ?? fromPath(error) ?? fromDatabase(error) ?? fromHeaders(error));
    const id = requestIdOf(response);
    if (known === undefined) log.error({ id, ...traceOf(error) }, 'fault');
    const refused =
      known ?? new RefusalError('internal', 'Something went wrong here; it is noted.');
    const { problems, retryAfterSeconds, allow, current } = refused.details;
    if (retryAfterSeconds !== undefined) response.setHeader('Retry-After', retryAfterSeconds);
    if (allow !== undefined) response.setHeader('Allow', allow);
    for (const each of ofAnotherReply) response.removeHeader(each);
    response.setHeader('Cache-Control', 'no-store');
    const body: Refusal = {
      code: refused.code,
      message: refused.message,
      ...(problems === undefined ? {} : { problems: problems.map(asSent) }),
      ...(current === undefined ? {} : { current }),
    };
    response.status(statusOf[refused.code]).json(body);
  };

const asSent = (problem: Problem) => problemSchema.parse(problem);
