import {
  addressOf,
  type Answer,
  type Endpoint,
  type Params,
  type Sent,
} from '#shared/api/endpoint.ts';
import { refusal, type Refusal } from '#shared/api/problem-codes.ts';
import { signUp } from '#shared/api/accounts.ts';
import { houseRulePresets } from '#shared/drafting/house-rule-presets.ts';
import type { GownContent } from '#shared/api/gowns.ts';
import { card } from './request-bodies.ts';

/** One browser: it keeps its cookie, and says where its page is from. */
export type Browser = {
  /** Sends a line of the contract as it is and gives the bare reply. */
  readonly send: (
    line: Endpoint,
    body?: unknown,
    params?: Readonly<Record<string, string>>,
    headers?: Record<string, string>,
  ) => Promise<Response>;
  /** Calls a line of the contract that must succeed. */
  readonly call: <E extends Endpoint>(
    line: E,
    body: Sent<E>,
    ...params: Params<E> extends undefined ? [] : [Params<E>]
  ) => Promise<Answer<E>>;
  /** Sends what must be refused with a status. */
  readonly refused: (
    status: number,
    line: Endpoint,
    body?: unknown,
    params?: Readonly<Record<string, string>>,
  ) => Promise<Refusal>;
  readonly cookie: () => string;
};

export const firefox = 'Mozilla/5.0 (X11; Linux x86_64; rv:143.0) Gecko/20100101 Firefox/143.0';
export const iphone =
  'Mozilla/5.0 (iPhone; CPU iPhone OS 18_5 like Mac OS X) AppleWebKit/605.1.15 (KHTML, like Gecko) Version/18.5 Mobile/15E148 Safari/604.1';

/** A browser with nobody signed in. */
export function openBrowser(address: string, userAgent = firefox, cookieBefore = ''): Browser {
  const jar = new Map(
    cookieBefore.split('; ').map((pair) => [pair.slice(0, pair.indexOf('=')), pair] as const),
  );
  const cookieNow = () => [...jar.values()].filter((pair) => pair !== '').join('; ');
  const send: Browser['send'] = async (line, body, params, headers) => {
    const cookie = cookieNow();
    const reply = await fetch(`${address}${addressOf(line, params)}`, {
      method: line.method,
      headers: {
        'user-agent': userAgent,
        ...(cookie === '' ? {} : { cookie }),
        ...(line.method === 'GET' ? {} : { origin: address }),
        ...(body === undefined ? {} : { 'content-type': 'application/json' }),
        ...headers,
      },
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    });
    for (const set of reply.headers.getSetCookie()) {
      const pair = set.split(';')[0] ?? '';
      const name = pair.slice(0, pair.indexOf('='));
      if (pair.endsWith('=')) jar.delete(name);
      else jar.set(name, pair);
    }
    return reply;
  };
  return {
    send,
    call: async (line, body, ...[params]) => {
      const reply = await send(line, body, params);
      if (!reply.ok) throw new Error(`${reply.status}: ${await reply.text()}`);
      return answerOf(line, await reply.json());
    },
    refused: async (status, line, body, params) => {
      const reply = await send(line, body, params);
      const told = refusal.parse(await reply.json());
      if (reply.status !== status) throw new Error(`${reply.status}: ${told.message}`);
      return told;
    },
    cookie: cookieNow,
  };
}

/** The reply's own schema has read it. */
function answerOf<E extends Endpoint>(line: E, json: unknown): Answer<E> {
  return (line.reply.kind === 'json' ? line.reply.schema.parse(json) : json) as Answer<E>;
}

export const password = 'seven plain tacks';

let makers = 0;

/** A browser with a new account signed in. */
export async function openMaker(address: string): Promise<Browser & { readonly email: string }> {
  makers += 1;
  const email = `maker${makers}@workroom.example`;
  const browser = openBrowser(address);
  await browser.call(signUp, { email, password });
  return { ...browser, email };
}

/** A gown on the table, whole and drawable; figures may be changed and texts spoilt. */
export const content = (
  change: { readonly waistGirth?: number; readonly typed?: Record<string, string> } = {},
): GownContent => ({
  typed: { unit: 'cm', fields: { 'card.waistGirth': '73,8', ...change.typed } },
  unread: [],
  inputs: {
    card: { ...card, waistGirth: change.waistGirth ?? card.waistGirth },
    style: { heelHeight: 60 },
    rules: houseRulePresets.balanced,
  },
});
