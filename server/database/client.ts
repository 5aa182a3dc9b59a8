import { drizzle, type NodePgDatabase } from 'drizzle-orm/node-postgres';
import { sql } from 'drizzle-orm';
import { Pool } from 'pg';
import { accounts } from './schema/accounts.ts';
import { classes } from './schema/classes.ts';
import { gownRevisions } from './schema/gown-revisions.ts';
import { gowns } from './schema/gowns.ts';
import { knownDevices } from './schema/known-devices.ts';
import { measureCards } from './schema/measure-cards.ts';
import { people } from './schema/people.ts';
import { sampleGowns } from './schema/sample-gowns.ts';
import { saves } from './schema/saves.ts';
import { sessions } from './schema/sessions.ts';
import { signInAttempts } from './schema/sign-in-attempts.ts';

const schema = {
  accounts,
  classes,
  gownRevisions,
  gowns,
  knownDevices,
  measureCards,
  people,
  sampleGowns,
  saves,
  sessions,
  signInAttempts,
};

export type Database = NodePgDatabase<typeof schema>;

/** A transaction under way, or the database outside of one. */
export type Store = Database | Parameters<Parameters<Database['transaction']>[0]>[0];

/** A pool of connections and the way to end it. */
export type Connection = {
  readonly database: Database;
  readonly close: () => Promise<void>;
};

/** `onLost` hears of idle connections that broke; the pool replaces them by itself. */
export function connect(url: string, onLost: (error: Error) => void): Connection {
  const pool = new Pool({ connectionString: url, max: 10, connectionTimeoutMillis: 5000 });
  pool.on('error', onLost);
  // A connection may also break while a transaction holds it, between two of its questions.
  pool.on('connect', (client) => client.on('error', onLost));
  return { database: drizzle(pool, { schema }), close: () => pool.end() };
}

export async function ping(database: Database): Promise<void> {
  await database.execute(sql`select 1`);
}
