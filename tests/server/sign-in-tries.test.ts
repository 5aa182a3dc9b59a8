import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { signIn, signUp } from '#shared/api/accounts.ts';
import { openBrowser, openMaker, password } from './support/maker.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';

let server: ServerUnderTest;
beforeAll(async () => {
  server = await startServer();
});
afterAll(() => server.close());

const opened: ServerUnderTest[] = [];
afterEach(async () => {
  for (const each of opened.splice(0)) await each.close();
});
async function another(options: Parameters<typeof startServer>[0] = {}): Promise<ServerUnderTest> {
  const one = await startServer(options);
  opened.push(one);
  return one;
}

const browser = () => openBrowser(server.address);

describe('a wrong sign-in', () => {
  it('says the same of a wrong password and of no account', async () => {
    const { email } = await openMaker(server.address);
    const wrong = await browser().refused(401, signIn, { email, password: 'not the one' });
    const nobody = await browser().refused(401, signIn, {
      email: 'nobody@workroom.example',
      password: 'not the one',
    });
    expect(wrong.code).toBe('wrong-sign-in');
    expect(nobody).toEqual(wrong);
  });

  it('takes as long for an account as for none', async () => {
    const apart = await another();
    const maker = await openMaker(apart.address);
    const time = async (email: string): Promise<number> => {
      const times: number[] = [];
      for (let i = 0; i < 8; i += 1) {
        const start = performance.now();
        await maker.refused(401, signIn, { email, password: 'not the one' });
        times.push(performance.now() - start);
      }
      return Math.min(...times);
    };
    const [there, not] = [await time(maker.email), await time('nobody@workroom.example')];
    expect(Math.max(there, not) / Math.min(there, not)).toBeLessThan(2);
  });

  it('too many for one account are held off, from anywhere and over a restart, also of none', async () => {
    const first = await another();
    const { email } = await openMaker(first.address);
    for (const who of [email, 'nobody@workroom.example']) {
      const body = { email: who, password: 'not the one' };
      for (let i = 0; i < 10; i += 1) await openBrowser(first.address).refused(401, signIn, body);
      const { code, message } = await openBrowser(first.address).refused(429, signIn, body);
      expect(code).toBe('too-many-requests');
      expect(message).toMatch(/Wait 15 minutes/);
    }
    const again = await another({ databaseUrl: first.databaseUrl });
    const right = await openBrowser(again.address).send(signIn, { email, password });
    expect(right.status).toBe(429);
    expect(Number(right.headers.get('retry-after'))).toBeGreaterThan(800);
  });

  it('too many at once are no way round', async () => {
    const apart = await another();
    const { email } = await openMaker(apart.address);
    const replies = await Promise.all(
      Array.from({ length: 30 }, () =>
        openBrowser(apart.address).send(signIn, { email, password: 'not the one' }),
      ),
    );
    expect(replies.filter((each) => each.status === 401)).toHaveLength(10);
    expect(replies.filter((each) => each.status === 429)).toHaveLength(20);
  });

  it('too many from one address are held off, whatever the account', async () => {
    const apart = await another();
    const tryWith = (i: number) =>
      openBrowser(apart.address).send(signUp, { email: `n${i}@b.example`, password: 'short' });
    for (let i = 0; i < 3; i += 1) expect((await tryWith(i)).status).toBe(422);
    const guess = (i: number) =>
      openBrowser(apart.address).send(signIn, { email: `n${i}@b.example`, password });
    for (let i = 0; i < 50; i += 1) expect((await guess(i)).status).toBe(401);
    expect((await guess(50)).status).toBe(429);
  });

  it('requests are counted by the minute as well', async () => {
    const narrow = await another({ limits: { signInsPerMinute: 1 } });
    const visitor = openBrowser(narrow.address);
    await visitor.refused(401, signIn, { email: 'a@b.example', password });
    await visitor.refused(429, signIn, { email: 'a@b.example', password });
  });

  it('does not count against one who gets it right', async () => {
    const apart = await another();
    const { email } = await openMaker(apart.address);
    for (let round = 0; round < 3; round += 1) {
      for (let i = 0; i < 9; i += 1) {
        await openBrowser(apart.address).refused(401, signIn, { email, password: 'slip' });
      }
      await openBrowser(apart.address).call(signIn, { email, password });
    }
  });
});
