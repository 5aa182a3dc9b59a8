import { setTimeout as pause } from 'node:timers/promises';
import { Client } from 'pg';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { changePassword, signIn, signOut, signUp } from '#shared/api/accounts.ts';
import { firefox, openBrowser, openMaker, password } from './support/maker.ts';
import { ask } from './support/question.ts';
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

describe('nobody is locked out by others', () => {
  /** A browser at another address, as a proxy tells it. */
  const from = async (
    place: ServerUnderTest,
    address: string,
    body: unknown,
    cookie = '',
  ): Promise<number> => {
    const one = openBrowser(place.address, firefox, cookie);
    return (await one.send(signIn, body, {}, { 'x-forwarded-for': address })).status;
  };

  it('an owner signs in from home though two strangers used up their tries', async () => {
    const apart = await another({ trustedProxies: 1 });
    const { email } = await openMaker(apart.address);
    for (const stranger of ['203.0.113.5', '203.0.113.6']) {
      for (let i = 0; i < 10; i += 1) {
        expect(await from(apart, stranger, { email, password: 'a guess' })).toBe(401);
      }
      for (let i = 0; i < 100; i += 1) {
        expect(await from(apart, stranger, { email, password: 'a guess' })).toBe(429);
      }
    }
    expect(await from(apart, '203.0.113.7', { email, password })).toBe(200);
  });

  it('a device she was signed in on before stays hers when strangers from everywhere try', async () => {
    const apart = await another({ trustedProxies: 1 });
    const maker = await openMaker(apart.address);
    const { email } = maker;
    const device = maker.cookie();
    await maker.call(signOut, undefined);
    for (let place = 0; place < 11; place += 1) {
      for (let i = 0; i < 10; i += 1) {
        await from(apart, `203.0.113.${place}`, { email, password: 'a guess' });
      }
    }
    expect(await from(apart, '203.0.113.99', { email, password })).toBe(429);
    expect(await from(apart, '203.0.113.1', { email, password }, device)).toBe(200);
  });

  it('and a signed-in maker changes her password meanwhile', async () => {
    const apart = await another();
    const maker = await openMaker(apart.address);
    const { email } = maker;
    for (let i = 0; i < 11; i += 1) {
      await openBrowser(apart.address).send(signIn, { email, password: 'a guess' });
    }
    await maker.call(changePassword, { password, newPassword: 'eight plain tacks' });
  });

  it('a known device has no more tries than a stranger, and is known for its own account alone', async () => {
    const apart = await another();
    const maker = await openMaker(apart.address);
    const victim = await openMaker(apart.address);
    const at = async (email: string) =>
      (
        await openBrowser(apart.address, firefox, maker.cookie()).send(signIn, {
          email,
          password: 'a guess',
        })
      ).status;
    for (const email of [maker.email, victim.email]) {
      for (let i = 0; i < 10; i += 1) expect(await at(email)).toBe(401);
      expect(await at(email)).toBe(429);
    }
    const stranger = openBrowser(apart.address);
    await stranger.refused(429, signIn, { email: victim.email, password: 'a guess' });
  });
});

describe('a session of an old password', () => {
  it('is not begun where the password changes while it is looked at', async () => {
    const { email } = await openMaker(server.address);
    const other = new Client({ connectionString: server.databaseUrl });
    await other.connect();
    await other.query('begin');
    await other.query("update accounts set password_hash = 'another' where email = $1", [email]);
    const late = browser().send(signIn, { email, password });
    await pause(700);
    await other.query('commit');
    await other.end();
    expect((await late).status).toBe(401);
  });

  it('ends with it or not at all', async () => {
    const apart = await another();
    const maker = await openMaker(apart.address);
    await ask(
      apart.databaseUrl,
      `create function refuse() returns trigger language plpgsql as $$ begin raise 'no'; end $$`,
    );
    await ask(
      apart.databaseUrl,
      'create trigger refuse before delete on sessions for each row execute function refuse()',
    );
    await maker.refused(500, changePassword, { password, newPassword: 'eight plain tacks' });
    const old = await openBrowser(apart.address).send(signIn, { email: maker.email, password });
    expect(old.status).toBe(200);
  });
});

describe('accounts opened from one address', () => {
  it('are so many in an hour; a refused one does not count', async () => {
    const narrow = await another({ limits: { signUpsPerHour: 1 } });
    const visitor = openBrowser(narrow.address);
    await visitor.refused(422, signUp, { email: 'a@b.example', password: 'short' });
    await visitor.call(signUp, { email: 'a@b.example', password });
    const { message } = await visitor.refused(429, signUp, { email: 'c@b.example', password });
    expect(message).toMatch(/in an hour .* in \d+ minutes/);
  });
});
