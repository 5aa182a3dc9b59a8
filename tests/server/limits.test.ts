import { afterEach, describe, expect, it } from 'vitest';
import { refusal } from '#shared/api/problem-codes.ts';
import type { Limits } from '#server/settings.ts';
import { card, post, print } from './support/request-bodies.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';

let server: ServerUnderTest | undefined;
afterEach(async () => {
  await server?.close();
  server = undefined;
});

async function open(limits: Partial<Limits>): Promise<string> {
  server = await startServer({ limits });
  return server.address;
}

describe('one address may not take everybody’s turn', () => {
  it('prints over the limit are sent away with a time to come back', async () => {
    const address = await open({ printsPerMinute: 2 });
    const tiles = () => post(`${address}/api/prints/tiles`, print);
    expect((await tiles()).status).toBe(200);
    expect((await post(`${address}/api/prints/chalk-sheet`, print)).status).toBe(200);
    const third = await tiles();
    expect(third.status).toBe(429);
    expect(Number(third.headers.get('retry-after'))).toBeGreaterThan(0);
    expect(refusal.parse(await third.json()).code).toBe('too-many-requests');
  });

  it('bad requests count as well, so that nobody can try for ever', async () => {
    const address = await open({ printsPerMinute: 1 });
    expect((await post(`${address}/api/prints/tiles`, {})).status).toBe(422);
    expect((await post(`${address}/api/prints/tiles`, {})).status).toBe(429);
  });

  it('drafts have a limit of their own', async () => {
    const address = await open({ draftsPerMinute: 1, printsPerMinute: 1 });
    expect((await post(`${address}/api/prints/tiles`, print)).status).toBe(200);
    expect((await post(`${address}/api/drafts`, { card })).status).toBe(200);
    expect((await post(`${address}/api/drafts`, { card })).status).toBe(429);
  });
});

describe('under load', () => {
  it('prints are answered in the order they were asked for', async () => {
    const address = await open({});
    const answered: number[] = [];
    const asked: Promise<void>[] = [];
    for (let turn = 0; turn < 8; turn += 1) {
      const reply = post(`${address}/api/prints/tiles`, { ...print, pieces: 'whole-gown' });
      asked.push(
        reply.then(async (each) => {
          expect(each.status).toBe(200);
          await each.arrayBuffer();
          answered.push(turn);
        }),
      );
      await new Promise((resolve) => setTimeout(resolve, 5));
    }
    await Promise.all(asked);
    expect(answered).toEqual([0, 1, 2, 3, 4, 5, 6, 7]);
  });

  it('who finds the line full is told so at once, and the others still get their pages', async () => {
    const address = await open({ printsWaiting: 1 });
    const replies = await Promise.all(
      Array.from({ length: 12 }, () =>
        post(`${address}/api/prints/tiles`, { ...print, pieces: 'whole-gown' }),
      ),
    );
    const statuses = replies.map((each) => each.status);
    expect(new Set(statuses)).toEqual(new Set([200, 503]));
    const sentAway = replies.find((each) => each.status === 503);
    expect(sentAway?.headers.get('retry-after')).toBe('5');
    expect(refusal.parse(await sentAway?.json()).code).toBe('busy');
  });

  it('the health route answers while prints wait', async () => {
    const address = await open({});
    const prints = Array.from({ length: 6 }, () =>
      post(`${address}/api/prints/tiles`, { ...print, pieces: 'whole-gown' }),
    );
    const order: string[] = [];
    const health = fetch(`${address}/api/health`).then((reply) => {
      order.push('health');
      return reply.json();
    });
    const all = Promise.all(prints).then(() => order.push('prints'));
    expect(await health).toEqual({ name: 'ellwand', database: 'answers' });
    await all;
    expect(order).toEqual(['health', 'prints']);
  });
});
