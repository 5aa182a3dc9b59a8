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
import { refusal } from '#shared/api/problem-codes.ts';
import { firefox, openBrowser, openMaker, password } from './support/maker.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';
import { ask } from './support/question.ts';

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
    const [row] = await ask(
      server.databaseUrl,
      'select id from sessions order by started_at desc limit 1',
    );
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

  it('may not by another scheme at our own name', async () => {
    for (const scheme of ['ftp:', 'https:']) {
      const origin = server.address.replace('http:', scheme);
      expect((await browser().send(signIn, wanted, {}, { origin })).status).toBe(403);
    }
  });

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
