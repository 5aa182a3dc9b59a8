import { asc } from 'drizzle-orm';
import type { Database } from '../../database/client.ts';
import { sampleGowns } from '../../database/schema/sample-gowns.ts';

export type SampleGownRow = typeof sampleGowns.$inferSelect;

/** The samples in the order they are shown. */
export function listSampleGowns(database: Database): Promise<SampleGownRow[]> {
  return database.select().from(sampleGowns).orderBy(asc(sampleGowns.position));
}
