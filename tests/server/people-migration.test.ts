import { cpSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { Client } from 'pg';
import { afterAll, beforeAll, expect, inject, it } from 'vitest';
import { z } from 'zod';
import { connect } from '#server/database/client.ts';
import { migrate } from '#server/database/migrate.ts';
import { owner } from '#server/ops/database-owner.mjs';
import { places } from '#server/settings.ts';
import { ask } from './support/question.ts';

const name = 'before_people';
const journal = z.object({ entries: z.array(z.looseObject({ tag: z.string() })) }).loose();
let folder = '';
let url = '';

async function asAdmin(sentence: string): Promise<void> {
  const admin = new Client({ connectionString: inject('adminUrl') });
  await admin.connect();
  await admin.query(sentence);
  await admin.end();
}

async function migrateFrom(migrations: string): Promise<void> {
  const { database, close } = connect(url, () => undefined);
  await migrate(database, migrations);
  await close();
}

beforeAll(async () => {
  await asAdmin(`create database ${name} owner ${owner}`);
  url = inject('clusterUrl').replace(/postgres$/, name);
  // The migrations as they were before people were kept.
  folder = mkdtempSync(join(tmpdir(), 'migrations-'));
  cpSync(places.migrations, folder, { recursive: true });
  const path = join(folder, 'meta', '_journal.json');
  const whole = journal.parse(JSON.parse(readFileSync(path, 'utf8')));
  const earlier = whole.entries.slice(
    0,
    whole.entries.findIndex(({ tag }) => tag.endsWith('_people')),
  );
  writeFileSync(path, JSON.stringify({ ...whole, entries: earlier }));
});
afterAll(async () => {
  rmSync(folder, { recursive: true, force: true });
  await asAdmin(`drop database if exists ${name} with (force)`);
});

it('cards kept before people were go to who is named on them, and bear their day', async () => {
  await migrateFrom(folder);
  await ask(
    url,
    `insert into accounts (id, email, password_hash) values
      ('00000000-0000-4000-8000-000000000001', 'a@workroom.example', 'x'),
      ('00000000-0000-4000-8000-000000000002', 'b@workroom.example', 'x')`,
  );
  const cards = [
    [1, 'Card a', { name: 'Tilda Rehm', date: '2025-03-04' }],
    [1, 'Card b', { name: ' Tilda Rehm ' }],
    [1, 'Card c', {}],
    [2, 'Card d', { name: 'Tilda Rehm' }],
  ] as const;
  for (const [account, title, card] of cards) {
    await ask(
      url,
      `insert into measure_cards (id, account_id, version, created_at, saved_at, saved_device, saved_session, name, typed, card)
       values (gen_random_uuid(), $1, 1, '2026-01-02T12:00:00Z', now(), 'x', 'x', $2, '{}', $3)`,
      [`00000000-0000-4000-8000-00000000000${account}`, title, JSON.stringify(card)],
    );
  }
  await migrateFrom(places.migrations);
  const rows = await ask(
    url,
    `select c.name, p.name as whose, p.account_id = c.account_id as own, c.taken_on::text as day
     from measure_cards c join people p on p.id = c.person_id order by c.name`,
  );
  expect(rows).toEqual([
    { name: 'Card a', whose: 'Tilda Rehm', own: true, day: '2025-03-04' },
    { name: 'Card b', whose: 'Tilda Rehm', own: true, day: '2026-01-02' },
    { name: 'Card c', whose: 'Not named yet', own: true, day: '2026-01-02' },
    { name: 'Card d', whose: 'Tilda Rehm', own: true, day: '2026-01-02' },
  ]);
  expect(await ask(url, 'select count(*)::int as people from people')).toEqual([{ people: 3 }]);
});
