import { Client } from 'pg';

/** Asks a database one question beside the server. */
export async function ask(
  databaseUrl: string,
  question: string,
  values: readonly unknown[] = [],
): Promise<Record<string, unknown>[]> {
  const client = new Client({ connectionString: databaseUrl });
  await client.connect();
  try {
    return (await client.query<Record<string, unknown>>(question, [...values])).rows;
  } finally {
    await client.end();
  }
}
