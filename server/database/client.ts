import { drizzle, type NodePgDatabase } from 'drizzle-orm/node-postgres';
import { sql } from 'drizzle-orm';
import { Pool } from 'pg';
import * as sampleGowns from './schema/sample-gowns.ts';

const schema = { ...sampleGowns };

export type Database = NodePgDatabase<typeof schema>;

/** A pool of connections and the way to end it. */
export type Connection = {
  readonly database: Database;
  readonly close: () => Promise<void>;
};

/** `onLost` hears of idle connections that broke; the pool replaces them by itself. */
export function connect(url: string, onLost: (error: Error) => void): Connection {
  const pool = new Pool({ connectionString: url, max: 10, connectionTimeoutMillis: 5000 });
  pool.on('error', onLost);
  return { database: drizzle(pool, { schema }), close: () => pool.end() };
}

export async function ping(database: Database): Promise<void> {
  await database.execute(sql`select 1`);
}
