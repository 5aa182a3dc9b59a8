import { eq } from 'drizzle-orm';
import type { Database } from './client.ts';
import { sessions } from './schema/sessions.ts';

/** Notes when a session was last used. */
export async function noteSessionUse(database: Database, id: string, at: Date): Promise<void> {
  await database.update(sessions).set({ lastUsedAt: at }).where(eq(sessions.id, id));
}
