import { sql } from 'drizzle-orm';
import { migrate as runMigrations } from 'drizzle-orm/node-postgres/migrator';
import type { Database } from './client.ts';

/** Any number; the same for every Ellwand server, so that two starting at once take turns. */
const migrationLock = 41_730_001;

/** Brings the tables up to date. */
export async function migrate(database: Database, migrationsFolder: string): Promise<void> {
  await database.transaction(async (turn) => {
    await turn.execute(sql`select pg_advisory_xact_lock(${migrationLock})`);
    await runMigrations(database, { migrationsFolder });
  });
}
