import { randomUUID } from 'node:crypto';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { listSessions, signIn } from '#shared/api/accounts.ts';
import { createGown, duplicateGown, saveGown } from '#shared/api/gowns.ts';
import { createMeasureCard } from '#shared/api/measure-cards.ts';
import { listRevisions, nameRevision } from '#shared/api/revisions.ts';
import { mostKept } from '#server/http/most-kept.ts';
import { content, openBrowser, openMaker, password } from './support/maker.ts';
import { ask } from './support/question.ts';
import { newGown, save } from './support/saved-gown.ts';
import { type ServerUnderTest, startServer } from './support/server-under-test.ts';

let server: ServerUnderTest;
beforeAll(async () => {
  server = await startServer();
});
afterAll(() => server.close());

/** Fills a table with copies of one row, under ids of their own. */
async function copies(table: string, id: string, count: number, change = ''): Promise<void> {
  await ask(
    server.databaseUrl,
    `insert into ${table} select (jsonb_populate_record(each, jsonb_build_object('id', gen_random_uuid()))).*
     from ${table} each, generate_series(1, $2) where id = $1 ${change}`,
    [id, count],
  );
}

describe('one account fills no disk', () => {
  it('gowns over the most are refused, also as copies, and the others stay', async () => {
    const maker = await openMaker(server.address);
    const gown = await newGown(maker);
    await copies('gowns', gown.gownId, mostKept.gowns - 1);
    const body = { saveId: randomUUID(), title: 'One more', content: content() };
    const { code, message } = await maker.refused(409, createGown, body);
    expect(code).toBe('account-full');
    expect(message).toContain(`${mostKept.gowns} gowns`);
    await maker.refused(409, duplicateGown, { saveId: randomUUID(), title: 'Copy' }, gown);
    await maker.call(saveGown, save(1), gown);
  });

  it('measure cards over the most are refused', async () => {
    const maker = await openMaker(server.address);
    const card = () => ({
      saveId: randomUUID(),
      name: 'Judith',
      content: { typed: { unit: 'cm' as const, fields: {} }, card: {} },
    });
    const { id } = await maker.call(createMeasureCard, card());
    await copies('measure_cards', id, mostKept.measureCards - 1);
    expect((await maker.refused(409, createMeasureCard, card())).code).toBe('account-full');
  });

  it('named revisions over the most are refused; what is kept by itself gives way to newer', async () => {
    const maker = await openMaker(server.address);
    const gown = await newGown(maker);
    const name = (text: string) => ({ saveId: randomUUID(), baseVersion: 1, name: text });
    const { id } = await maker.call(nameRevision, name('First toile'), gown);
    await copies('gown_revisions', id, mostKept.namedRevisions - 1);
    const { code } = await maker.refused(409, nameRevision, name('One more'), gown);
    expect(code).toBe('account-full');
    await ask(
      server.databaseUrl,
      `update gown_revisions set automatic = true, version = 0 where gown_id = $1 and id <> $2`,
      [gown.gownId, id],
    );
    await maker.call(saveGown, { ...save(1), keepReplaced: true }, gown);
    await maker.call(saveGown, { ...save(2), keepReplaced: true }, gown);
    const { revisions } = await maker.call(listRevisions, undefined, gown);
    expect(revisions.filter((each) => each.automatic)).toHaveLength(mostKept.automaticRevisions);
    expect(revisions.some((each) => each.id === id)).toBe(true);
    expect(revisions[0]).toMatchObject({ automatic: true, version: 2 });
  });

  it('a sign-in too many ends the session that was used longest ago', async () => {
    const maker = await openMaker(server.address);
    await ask(
      server.databaseUrl,
      `insert into sessions (id, account_id, expires_at, device, started_at, last_used_at)
       select 'made up ' || n, account_id, expires_at, device, started_at, last_used_at + interval '1 minute'
       from sessions, generate_series(1, $1) n order by sessions.started_at desc limit $1`,
      [mostKept.sessions - 1],
    );
    const other = openBrowser(server.address);
    await other.call(signIn, { email: maker.email, password });
    const { sessions } = await other.call(listSessions, undefined);
    expect(sessions).toHaveLength(mostKept.sessions);
    await maker.refused(401, listSessions);
  });
});

describe('one address may not ask for ever', () => {
  it('requests of any kind are counted by the minute', async () => {
    const narrow = await startServer({ limits: { requestsPerMinute: 2 } });
    const ask = () => fetch(`${narrow.address}/api/samples`);
    expect((await ask()).status).toBe(200);
    expect((await ask()).status).toBe(200);
    expect((await ask()).status).toBe(429);
    expect((await fetch(`${narrow.address}/api/health`)).status).toBe(200);
    await narrow.close();
  });
});
