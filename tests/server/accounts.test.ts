import { randomUUID } from 'node:crypto';
import { Client } from 'pg';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import {
  changePassword,
  listSessions,
  signIn,
  signOut,
  signOutEverywhere,
  signUp,
  whoAmI,
} from '#shared/api/accounts.ts';
import { listGowns, readGown } from '#shared/api/gowns.ts';
import { refusal } from '#shared/api/problem-codes.ts';
import { content, firefox, iphone, openBrowser, openMaker, password } from './support/maker.ts';
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

async function ask(question: string, values: unknown[] = []): Promise<Record<string, unknown>[]> {
  const client = new Client({ connectionString: server.databaseUrl });
  await client.connect();
  try {
    return (await client.query<Record<string, unknown>>(question, values)).rows;
  } finally {
    await client.end();
  }
}

describe('nobody signed in', () => {
  it.each([listSessions, signOutEverywhere, changePassword])(
    '$path is refused, before anything is read',
    async (line) => {
      const { code } = await browser().refused(401, line, line.method === 'GET' ? undefined : {});
      expect(code).toBe('not-signed-in');
    },
  );

  it('nor by a cookie somebody made up', async () => {
    const stranger = openBrowser(server.address, firefox, 'ellwand=abcdefghijklmnopqrstuvwxyz');
    await stranger.refused(401, listSessions);
    expect(await stranger.call(whoAmI, undefined)).toEqual({ account: null });
  });

  it('nor by what the database keeps of a session', async () => {
    const maker = await openMaker(server.address);
    const [row] = await ask('select id from sessions order by started_at desc limit 1');
    expect(maker.cookie()).not.toContain(String(row?.['id']));
    const thief = openBrowser(server.address, firefox, `ellwand=${String(row?.['id'])}`);
    await thief.refused(401, listSessions);
  });

  it('may sign out all the same', async () => {
    expect(await browser().call(signOut, undefined)).toEqual({});
  });
});

describe('a page of somebody else’s', () => {
  const wanted = { email: 'page@workroom.example', password };

  it.each(['https://elsewhere.example', 'http://127.0.0.1:1', 'null', 'nonsense'])(
    'may not send anything from %s',
    async (origin) => {
      const reply = await browser().send(signIn, wanted, {}, { origin });
      expect(reply.status).toBe(403);
      expect(refusal.parse(await reply.json()).code).toBe('wrong-origin');
    },
  );

  it('nor may a cookie come without its page being told', async () => {
    const maker = await openMaker(server.address);
    const reply = await fetch(`${server.address}${signOut.path}`, {
      method: 'POST',
      headers: { cookie: maker.cookie() },
    });
    expect(reply.status).toBe(403);
    expect((await maker.call(whoAmI, undefined)).account).toEqual({ email: maker.email });
  });

  it('is told from ours by the public address, where there is one', async () => {
    const open = await another({ publicUrl: 'https://gowns.example', overHttps: true });
    const visitor = openBrowser(open.address);
    const at = (origin: string) => visitor.send(signUp, wanted, {}, { origin });
    expect((await at(open.address)).status).toBe(403);
    expect((await at('https://gowns.example')).status).toBe(200);
  });

  it('localhost and 127.0.0.1 are both ours on loopback', async () => {
    const local = server.address.replace('127.0.0.1', 'localhost');
    const reply = await browser().send(
      signUp,
      { ...wanted, email: 'local@workroom.example' },
      {},
      {
        origin: local,
      },
    );
    expect(reply.status).toBe(200);
  });
});

describe('what cannot be an account', () => {
  it.each([
    ['no address', { email: 'hazel', password }, 'email', /whole address/],
    ['an address nobody has', { email: `${'x'.repeat(300)}@a.example`, password }, 'email', /254/],
    [
      'a short password',
      { email: 'a@b.example', password: 'too short' },
      'password',
      /at least 10/,
    ],
    ['an endless password', { email: 'a@b.example', password: 'x'.repeat(201) }, 'password', /200/],
    ['no password', { email: 'a@b.example' }, 'password', /missing/],
    ['more than is asked', { email: 'a@b.example', password, admin: true }, 'admin', /no field/],
  ])('%s', async (_case, body, field, words) => {
    const { code, problems, message } = await browser().refused(422, signUp, body);
    expect(code).toBe('bad-input');
    expect(problems?.[0]?.field).toBe(field);
    expect(message).toMatch(words);
  });

  it('an address that is taken, in whatever letters, with no word of whose', async () => {
    const { email } = await openMaker(server.address);
    const { problems } = await browser().refused(422, signUp, {
      email: email.toUpperCase(),
      password: 'another password',
    });
    expect(problems).toMatchObject([{ code: 'not-free', field: 'email' }]);
  });

  it('a body over 64 kB', async () => {
    const body = { email: 'a@b.example', password: 'x'.repeat(70_000) };
    expect((await browser().refused(413, signUp, body)).code).toBe('too-large');
  });
});

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

describe('an account', () => {
  it('is opened and signed in, by a cookie no script can read', async () => {
    const visitor = browser();
    const reply = await visitor.send(signUp, { email: ' Ruth@Workroom.example ', password });
    expect(await reply.json()).toEqual({ account: { email: 'ruth@workroom.example' } });
    const [cookie = ''] = reply.headers.getSetCookie();
    expect(cookie).toMatch(/^ellwand=/);
    for (const word of ['HttpOnly', 'SameSite=Lax', 'Path=/']) expect(cookie).toContain(word);
    expect(cookie).not.toContain('Secure');
    expect(await visitor.call(whoAmI, undefined)).toEqual({
      account: { email: 'ruth@workroom.example' },
    });
  });

  it('has a cookie for https alone where people come over https', async () => {
    const open = await another({ publicUrl: 'https://gowns.example', overHttps: true });
    const reply = await openBrowser(open.address).send(
      signUp,
      { email: 'ruth@workroom.example', password },
      {},
      { origin: 'https://gowns.example' },
    );
    const [cookie = ''] = reply.headers.getSetCookie();
    expect(cookie).toMatch(/^__Host-ellwand=/);
    expect(cookie).toContain('Secure');
  });

  it('keeps what was drawn before it as its first gown, once, however often it is sent', async () => {
    const saveId = randomUUID();
    const body = {
      email: 'try@workroom.example',
      password,
      gown: { saveId, title: 'Drawn at the try table', content: content() },
    };
    const visitor = browser();
    const first = await visitor.call(signUp, body);
    const second = await browser().call(signUp, body);
    expect(second).toEqual(first);
    const { gowns } = await visitor.call(listGowns, undefined);
    expect(gowns).toMatchObject([
      { id: first.gownId, title: 'Drawn at the try table', fresh: true },
    ]);
    const gown = await visitor.call(readGown, undefined, { gownId: first.gownId ?? '' });
    expect(gown.drawn?.pieces.length).toBeGreaterThan(4);
  });

  it('signs in again, in place of whoever was signed in on that browser', async () => {
    const one = await openMaker(server.address);
    const two = await openMaker(server.address);
    const before = one.cookie();
    await one.call(signIn, { email: two.email, password });
    expect(await one.call(whoAmI, undefined)).toEqual({ account: { email: two.email } });
    await openBrowser(server.address, firefox, before).refused(401, listSessions);
  });

  it('signs out: the cookie is taken back and opens nothing any more', async () => {
    const maker = await openMaker(server.address);
    const before = maker.cookie();
    await maker.call(signOut, undefined);
    expect(maker.cookie()).toBe('');
    await openBrowser(server.address, firefox, before).refused(401, listSessions);
  });

  it('ends with its time', async () => {
    const maker = await openMaker(server.address);
    await ask(
      "update sessions set expires_at = now() - interval '1 second' where account_id = (select id from accounts where email = $1)",
      [maker.email],
    );
    await maker.refused(401, listSessions);
  });

  it('lists where it is signed in, in words, and signs out everywhere', async () => {
    const desk = await openMaker(server.address);
    const phone = openBrowser(server.address, iphone);
    await phone.call(signIn, { email: desk.email, password });
    const { sessions } = await phone.call(listSessions, undefined);
    expect(sessions.map(({ device, here }) => [device, here])).toEqual(
      expect.arrayContaining([
        ['Firefox on Linux', false],
        ['Safari on iPhone', true],
      ]),
    );
    await desk.call(signOutEverywhere, undefined);
    await phone.refused(401, listSessions);
    await desk.refused(401, listSessions);
    await desk.call(signIn, { email: desk.email, password });
  });

  it('changes its password by the present one alone, and every other session ends', async () => {
    const desk = await openMaker(server.address);
    const phone = openBrowser(server.address, iphone);
    await phone.call(signIn, { email: desk.email, password });
    const next = 'eight plain tacks';
    const wrong = { password: 'not the one', newPassword: next };
    const { problems } = await desk.refused(422, changePassword, wrong);
    expect(problems).toMatchObject([{ code: 'wrong-password', field: 'password' }]);
    const short = await desk.refused(422, changePassword, { password, newPassword: 'short' });
    expect(short.problems).toMatchObject([{ field: 'newPassword' }]);
    await desk.call(changePassword, { password, newPassword: next });
    await phone.refused(401, listSessions);
    expect((await desk.call(listSessions, undefined)).sessions).toHaveLength(1);
    await browser().refused(401, signIn, { email: desk.email, password });
    await browser().call(signIn, { email: desk.email, password: next });
  });
});

describe('the log and the database', () => {
  it('tell no e-mail, password or hash, also where a question of ours fails', async () => {
    const apart = await another();
    const secret = { email: 'secret.person@workroom.example', password: 'secret of seven tacks' };
    const sly = { ...secret, email: 'sly@workroom.example' };
    await openBrowser(apart.address).call(signUp, secret);
    await openBrowser(apart.address).refused(401, signIn, { ...secret, password: 'secret slip' });
    const client = new Client({ connectionString: apart.databaseUrl });
    await client.connect();
    await client.query(
      'alter table accounts add column later text not null default gen_random_uuid()',
    );
    await client.query('alter table accounts alter column later drop default');
    const { code, message } = await openBrowser(apart.address).refused(500, signUp, sly);
    await client.end();
    expect(code).toBe('internal');
    expect(message).not.toContain('sly');
    expect(apart.logged()).toContain('"fault"');
    for (const word of ['secret', 'workroom', 'sly', 'argon2', 'tacks', 'params']) {
      expect(apart.logged()).not.toContain(word);
    }
  });

  it('the password is kept as Argon2id', async () => {
    const { email } = await openMaker(server.address);
    const [row] = await ask('select password_hash from accounts where email = $1', [email]);
    expect(row?.['password_hash']).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
  });

  it('failed tries are kept without e-mail or address', async () => {
    await browser().refused(401, signIn, { email: 'nobody@workroom.example', password });
    const rows = await ask('select key from sign_in_attempts');
    expect(rows.length).toBeGreaterThan(0);
    for (const { key } of rows) expect(key).toMatch(/^[0-9a-f]{64}$/);
  });
});
