import type { RequestHandler, Response } from 'express';
import { RefusalError } from './refusal.ts';

/** Methods that lines of the contract answer at the address asked for. */
const offered = new WeakMap<Response, readonly string[]>();

/** Notes what an address does answer, for a request whose method no line of it takes. */
export const offer =
  (methods: readonly string[]): RequestHandler =>
  (_request, response, next) => {
    offered.set(response, [...(offered.get(response) ?? []), ...methods]);
    next();
  };

/** Whoever comes this far asked for an address nobody answers, or by a method it does not take. */
export const nothingHere: RequestHandler = (_request, response, next) => {
  const allow = offered.get(response)?.join(', ');
  next(
    allow === undefined
      ? new RefusalError('not-found', 'There is nothing at this address.')
      : new RefusalError('method-not-allowed', `This address answers ${allow}.`, { allow }),
  );
};
