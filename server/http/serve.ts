import type { Request, Response, Router } from 'express';
import type { Answer, Endpoint, Params, Received } from '#shared/api/endpoint.ts';
import { readBody } from '#shared/api/read-body.ts';
import { offer } from './nothing-here.ts';
import { RefusalError, refusalFor } from './refusal.ts';
import { unitAsked } from './unit-asked.ts';

/** A file to keep, and the name it is offered under. */
export type Download = { readonly bytes: Uint8Array; readonly disposition: string };

/** A reply that a thread has written already, by the contract's own schema. */
export type Written = { readonly writtenJson: Uint8Array };

/** A reply is only read: what is drafted may stay as unchangeable as it is. */
type Frozen<T> = T extends readonly (infer Item)[]
  ? readonly Frozen<Item>[]
  : T extends object
    ? { readonly [K in keyof T]: Frozen<T[K]> }
    : T;

/** What a handler gives: the contract's own answer or, for a file, its bytes with a name. */
export type Given<E extends Endpoint> = E['reply'] extends { kind: 'file' }
  ? Download
  : Frozen<Answer<E>> | Written;

/** What a handler is given beside the body. */
export type Asked<E extends Endpoint, C = undefined> = {
  readonly request: Request;
  readonly response: Response;
  readonly params: Params<E>;
  readonly caller: C;
};

type Handler<E extends Endpoint> = (received: Received<E>, asked: Asked<E>) => Promise<Given<E>>;

/** Answers one line of the contract: reads the body by its schema, and writes the reply by its schema. */
export function serve<E extends Endpoint>(router: Router, contract: E, handler: Handler<E>): void {
  serveTo(router, () => Promise.resolve(undefined), contract, handler);
}

/** The same to somebody in particular: who it is is settled before anything of the request is read. */
export function serveTo<E extends Endpoint, C>(
  router: Router,
  whoAsks: (request: Request, response: Response) => Promise<C>,
  contract: E,
  handler: (received: Received<E>, asked: Asked<E, C>) => Promise<Given<E>>,
): void {
  const method = contract.method === 'GET' ? 'get' : 'post';
  router[method](contract.path, async (request, response) => {
    response.setHeader('Cache-Control', 'no-store');
    const caller = await whoAsks(request, response);
    const params = paramsOf(contract, request);
    const body = received(contract, request);
    send(contract, response, await handler(body, { request, response, params, caller }));
  });
  router.all(contract.path, offer(contract.method === 'GET' ? ['GET', 'HEAD'] : ['POST']));
}

function paramsOf<E extends Endpoint>(contract: E, request: Request): Params<E> {
  if (contract.params === undefined) return paramsAs(undefined);
  const parsed = contract.params.safeParse(request.params);
  if (!parsed.success) throw new RefusalError('not-found', 'There is nothing at this address.');
  return paramsAs(parsed.data);
}

/** The value was read by the contract's own schema, which its type is made of. */
function paramsAs<E extends Endpoint>(value: unknown): Params<E> {
  return value as Params<E>;
}

function received<E extends Endpoint>(contract: E, request: Request): Received<E> {
  if (contract.body === undefined) return bodyOf(undefined);
  if (request.is('application/json') === false) {
    throw new RefusalError('wrong-media-type', 'Send the request as application/json.');
  }
  const sent: unknown = request.body;
  const reading = readBody(contract.body, sent);
  if ('problems' in reading) throw refusalFor('bad-input', reading.problems, unitAsked(sent));
  return bodyOf(reading.value);
}

/** The value was read by the contract's own schema, which its type is made of. */
function bodyOf<E extends Endpoint>(value: unknown): Received<E> {
  return value as Received<E>;
}

function send(contract: Endpoint, response: Response, given: unknown): void {
  if (contract.reply.kind === 'json') {
    if (isWritten(given)) {
      response.type('json').end(given.writtenJson);
      return;
    }
    response.json(contract.reply.schema.parse(given));
    return;
  }
  const { bytes, disposition } = downloadOf(given);
  response.setHeader('Content-Type', contract.reply.mediaType);
  response.setHeader('Content-Disposition', disposition);
  response.end(bytes);
}

const isWritten = (given: unknown): given is Written =>
  typeof given === 'object' && given !== null && 'writtenJson' in given;

/** A file endpoint's handler can give nothing else. */
function downloadOf(given: unknown): Download {
  return given as Download;
}
