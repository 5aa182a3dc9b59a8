import type { Request, Response, Router } from 'express';
import type { Answer, Endpoint, Received } from '#shared/api/endpoint.ts';
import { readBody } from '#shared/api/read-body.ts';
import { RefusalError, refusalFor } from './refusal.ts';
import { unitAsked } from './unit-asked.ts';

/** A file to keep, and the name it is offered under. */
export type Download = { readonly bytes: Uint8Array; readonly disposition: string };

/** A reply is only read: what is drafted may stay as unchangeable as it is. */
type Frozen<T> = T extends readonly (infer Item)[]
  ? readonly Frozen<Item>[]
  : T extends object
    ? { readonly [K in keyof T]: Frozen<T[K]> }
    : T;

/** What a handler gives: the contract's own answer or, for a file, its bytes with a name. */
type Given<E extends Endpoint> = E['reply'] extends { kind: 'file' } ? Download : Frozen<Answer<E>>;

type Handler<E extends Endpoint> = (received: Received<E>, request: Request) => Promise<Given<E>>;

/** Answers one line of the contract: reads the body by its schema, and writes the reply by its schema. */
export function serve<E extends Endpoint>(router: Router, contract: E, handler: Handler<E>): void {
  const method = contract.method === 'GET' ? 'get' : 'post';
  router[method](contract.path, async (request, response) => {
    const given = await handler(received(contract, request), request);
    response.setHeader('Cache-Control', 'no-store');
    send(contract, response, given);
  });
  router.all(contract.path, () => {
    const allow = contract.method === 'GET' ? 'GET, HEAD' : contract.method;
    throw new RefusalError('method-not-allowed', `This address answers ${allow}.`, { allow });
  });
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
    response.json(contract.reply.schema.parse(given));
    return;
  }
  const { bytes, disposition } = downloadOf(given);
  response.setHeader('Content-Type', contract.reply.mediaType);
  response.setHeader('Content-Disposition', disposition);
  response.end(bytes);
}

/** A file endpoint's handler can give nothing else. */
function downloadOf(given: unknown): Download {
  return given as Download;
}
