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
import { content, firefox, iphone, openBrowser, openMaker, password } from './support/maker.ts';
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
    expect(maker.cookie()).not.toMatch(/ellwand=/);
    await openBrowser(server.address, firefox, before).refused(401, listSessions);
  });

  it('ends with its time', async () => {
    const maker = await openMaker(server.address);
    await ask(
      server.databaseUrl,
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
    const [row] = await ask(
      server.databaseUrl,
      'select password_hash from accounts where email = $1',
      [email],
    );
    expect(row?.['password_hash']).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/);
  });

  it('failed tries are kept without e-mail or address', async () => {
    await browser().refused(401, signIn, { email: 'nobody@workroom.example', password });
    const rows = await ask(server.databaseUrl, 'select key from sign_in_attempts');
    expect(rows.length).toBeGreaterThan(0);
    for (const { key } of rows) expect(key).toMatch(/^[0-9a-f]{64}$/);
  });
});
