import {
  addressOf,
  type Answer,
  type Endpoint,
  type Params,
  type Sent,
} from '#shared/api/endpoint.ts';
import { refusal, type RefusalCode } from '#shared/api/problem-codes.ts';
import type { Problem } from '#shared/units/problem.ts';

/** Why a call gave nothing: the server's refusal, no way to the server, or an answer nobody can read. */
export class CallFailed extends Error {
  constructor(
    readonly code: RefusalCode | 'offline' | 'unreadable',
    message: string,
    readonly problems: readonly Problem[] = [],
    /** With `conflict`: the record as the server has it, not yet read by its schema. */
    readonly current?: unknown,
  ) {
    super(message);
    this.name = 'CallFailed';
  }
}

/** A file the server sent, with the name it gave it. */
export type SentFile = { readonly blob: Blob; readonly name: string | undefined };

/** Calls one line of the contract and gives its JSON, checked against the reply's schema. */
export const call = <E extends Endpoint>(
  endpoint: E,
  body: Sent<E>,
  signal?: AbortSignal,
): Promise<Answer<E>> => answerFrom(addressOf(endpoint), endpoint, body, signal);

/** The same for a line of the contract whose address names a record. */
export const callOf = <E extends Endpoint>(
  endpoint: E,
  params: Params<E>,
  body: Sent<E>,
  signal?: AbortSignal,
): Promise<Answer<E>> => answerFrom(addressOf(endpoint, params), endpoint, body, signal);

async function answerFrom<E extends Endpoint>(
  address: string,
  endpoint: E,
  body: Sent<E>,
  signal: AbortSignal | undefined,
): Promise<Answer<E>> {
  const { reply } = endpoint;
  if (reply.kind !== 'json') throw new Error(`${endpoint.path} answers a file: use callForFile`);
  const response = await answered(address, endpoint, body, signal);
  const parsed = reply.schema.safeParse(await jsonOf(response));
  if (!parsed.success) throw unreadable();
  return asAnswer<E>(parsed.data);
}

/** Calls one line of the contract that answers a file. */
export async function callForFile<E extends Endpoint>(
  endpoint: E,
  body: Sent<E>,
  signal?: AbortSignal,
): Promise<SentFile> {
  const response = await answered(endpoint.path, endpoint, body, signal);
  const disposition = response.headers.get('content-disposition') ?? '';
  const named = /filename\*=UTF-8''([^;]+)/i.exec(disposition)?.[1];
  return { blob: await response.blob(), name: named && decodeURIComponent(named) };
}

/** The schema of the endpoint's own reply has read it. */
function asAnswer<E extends Endpoint>(data: unknown): Answer<E> {
  return data as Answer<E>;
}

async function answered(
  address: string,
  endpoint: Endpoint,
  body: unknown,
  signal: AbortSignal | undefined,
): Promise<Response> {
  const response = await fetch(address, {
    method: endpoint.method,
    ...(body === undefined
      ? {}
      : { body: JSON.stringify(body), headers: { 'content-type': 'application/json' } }),
    ...(signal === undefined ? {} : { signal }),
  }).catch((error: unknown) => {
    if (signal?.aborted === true) throw error;
    throw new CallFailed(
      'offline',
      'The server cannot be reached. Your figures are kept here; look at your connection and try again.',
    );
  });
  if (response.ok) return response;
  const refused = refusal.safeParse(await jsonOf(response));
  if (!refused.success) throw unreadable();
  const { code, message, problems, current } = refused.data;
  throw new CallFailed(code, message, problems, current);
}

const jsonOf = (response: Response): Promise<unknown> =>
  response.json().catch((): unknown => undefined);

const unreadable = () =>
  new CallFailed(
    'unreadable',
    'The server’s answer could not be read. Open the page again, so that both are of one version.',
  );
