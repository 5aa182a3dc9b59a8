import { randomBytes } from 'node:crypto';
import { rmSync, statSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { Client } from 'pg';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { type Cluster, startCluster } from '#server/ops/cluster.mjs';

const name = `try-${randomBytes(4).toString('hex')}`;
const start = () => startCluster(name, { durable: false });

let cluster: Cluster;
beforeAll(async () => {
  cluster = await start();
});
afterAll(() => {
  cluster.stop();
  rmSync(cluster.folder, { recursive: true, force: true });
});

async function ask(url: string, question: string): Promise<unknown> {
  const client = new Client({ connectionString: url });
  await client.connect();
  try {
    const { rows } = await client.query<Record<string, unknown>>(question);
    return Object.values(rows[0] ?? {})[0];
  } finally {
    await client.end();
  }
}

describe('the private database', () => {
  it('lets nobody in without the password, loopback or not', async () => {
    const guess = cluster.url.replace(/:[0-9a-f]+@/, ':guess@');
    await expect(ask(guess, 'select 1')).rejects.toThrow(/password authentication failed/);
  });

  it('listens on loopback alone, and keeps its files to itself', async () => {
    expect(await ask(cluster.url, 'show listen_addresses')).toBe('127.0.0.1');
    for (const each of ['password', 'owner-password']) {
      expect(statSync(join(cluster.folder, each)).mode & 0o077).toBe(0);
    }
    expect(statSync(cluster.folder).mode & 0o077).toBe(0);
  });

  it('is worked with as its owner, who is nobody on the machine', async () => {
    const rights = `select rolsuper or rolcreaterole or rolcreatedb or rolreplication or rolbypassrls
      or pg_has_role(current_user, 'pg_execute_server_program', 'member')
      from pg_roles where rolname = current_user`;
    expect(await ask(cluster.url, rights)).toBe(false);
    await expect(ask(cluster.url, "copy (select 1) to program 'true'")).rejects.toThrow(
      /must be superuser/,
    );
    await expect(ask(cluster.url, "select pg_read_file('/etc/hostname')")).rejects.toThrow(
      /permission denied/,
    );
  });

  it('made by an older Ellwand keeps its tables and goes on with them', async () => {
    await ask(cluster.adminUrl, 'create schema older');
    await ask(cluster.adminUrl, 'create table older.noted (id serial primary key, note text)');
    await ask(cluster.adminUrl, 'create table noted (id serial primary key, note text)');
    await ask(cluster.adminUrl, "insert into noted (note) values ('kept')");
    cluster.stop();
    rmSync(join(cluster.folder, 'owner-password'));
    cluster = await start();
    await ask(cluster.url, 'alter table noted add column more text');
    await ask(cluster.url, "insert into noted (note) values ('new')");
    expect(await ask(cluster.url, 'select count(*)::int from noted')).toBe(2);
    await ask(cluster.url, 'create table older.another (id serial)');
    await ask(cluster.url, "insert into older.noted (note) values ('new')");
  });

  it('is found running, and then left running to whoever started it', async () => {
    const again = await start();
    expect(again.started).toBe(false);
    expect(again.url).toBe(cluster.url);
  });

  it('keeps what it holds over a stop, and starts in spite of a pid file left by a power cut', async () => {
    await ask(cluster.url, 'create table kept as select 17 as value');
    cluster.stop();
    const worn = [process.pid, join(cluster.folder, 'data'), 1, 5432, '', '127.0.0.1', ''];
    writeFileSync(join(cluster.folder, 'data', 'postmaster.pid'), worn.join('\n'));
    cluster = await start();
    expect(cluster.started).toBe(true);
    expect(await ask(cluster.url, 'select value from kept')).toBe(17);
  });
});
