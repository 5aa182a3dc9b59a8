import { afterEach, describe, expect, it } from 'vitest';
import { refusal } from '#shared/api/problem-codes.ts';
import type { Limits } from '#server/settings.ts';
import { saveGown } from '#shared/api/gowns.ts';
import { firefox, openBrowser, openMaker } from './support/maker.ts';
import { newGown, save } from './support/saved-gown.ts';
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

describe('drafts do not hold up anybody', () => {
  it('one address has so many places in the line; the rest come again', async () => {
    const address = await open({ draftsFromOneAddress: 3 });
    const replies = await Promise.all(
      Array.from({ length: 40 }, () => post(`${address}/api/drafts`, { card })),
    );
    const statuses = replies.map((each) => each.status);
    expect(new Set(statuses)).toEqual(new Set([200, 503]));
    const sentAway = replies.find((each) => each.status === 503);
    expect(sentAway?.headers.get('retry-after')).toBe('1');
    expect(refusal.parse(await sentAway?.json()).code).toBe('busy');
  });

  it('others are answered while many are drawn', async () => {
    const address = await open({});
    await post(`${address}/api/drafts`, { card });
    let drawn = 0;
    const drafts = Array.from({ length: 60 }, () =>
      post(`${address}/api/drafts`, { card }).then(async (reply) => {
        await reply.arrayBuffer();
        drawn += 1;
      }),
    );
    await expect.poll(() => drawn).toBeGreaterThan(0);
    expect((await fetch(`${address}/api/account`)).status).toBe(200);
    expect(drawn).toBeLessThan(30);
    await Promise.all(drafts);
  });

  it('a draft nobody waits for any more is not drawn', async () => {
    const address = await open({ draftsFromOneAddress: 60 });
    const leaving = new AbortController();
    const left = Array.from({ length: 50 }, () =>
      fetch(`${address}/api/drafts`, {
        method: 'POST',
        headers: { 'content-type': 'application/json' },
        body: JSON.stringify({ card }),
        signal: leaving.signal,
      }).catch(() => 'left'),
    );
    await post(`${address}/api/drafts`, { card });
    const before = performance.now();
    await (await post(`${address}/api/drafts`, { card })).arrayBuffer();
    const one = performance.now() - before;
    leaving.abort();
    await Promise.all(left);
    const start = performance.now();
    await post(`${address}/api/drafts`, { card });
    expect(performance.now() - start).toBeLessThan(Math.max(10 * one, 400));
  });

  it('a save that cannot be is refused before anything is drawn', async () => {
    const address = await open({});
    const maker = await openMaker(address);
    const gown = await newGown(maker);
    const stranger = await openMaker(address);
    const busy = await startServer({
      databaseUrl: server?.databaseUrl ?? '',
      limits: { draftsFromOneAddress: 0 },
    });
    const as = (one: typeof maker) => openBrowser(busy.address, firefox, one.cookie());
    await as(stranger).refused(404, saveGown, save(1), gown);
    await as(maker).refused(409, saveGown, save(7), gown);
    const { code } = await as(maker).refused(503, saveGown, save(1), gown);
    expect(code).toBe('busy');
    await busy.close();
  });
});

describe('under load', () => {
  it('one address has so many prints in the line', async () => {
    const address = await open({ printsFromOneAddress: 2 });
    const replies = await Promise.all(
      Array.from({ length: 8 }, () => post(`${address}/api/prints/tiles`, print)),
    );
    expect(new Set(replies.map((each) => each.status))).toEqual(new Set([200, 503]));
  });

  it('prints are answered in the order they were asked for', async () => {
    const address = await open({});
    const answered: number[] = [];
    const asked: Promise<void>[] = [];
    for (let turn = 0; turn < 8; turn += 1) {
      const reply = post(`${address}/api/prints/tiles`, print);
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
      Array.from({ length: 12 }, () => post(`${address}/api/prints/tiles`, print)),
    );
    const statuses = replies.map((each) => each.status);
    expect(new Set(statuses)).toEqual(new Set([200, 503]));
    const sentAway = replies.find((each) => each.status === 503);
    expect(sentAway?.headers.get('retry-after')).toBe('5');
    expect(refusal.parse(await sentAway?.json()).code).toBe('busy');
  });

  it('the health route answers while prints wait', async () => {
    const address = await open({});
    const prints = Array.from({ length: 6 }, () => post(`${address}/api/prints/tiles`, print));
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
