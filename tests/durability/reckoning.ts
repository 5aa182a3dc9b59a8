import { Client } from 'pg';
import type { Ledger } from './ledger.ts';

/** What the database holds against what was acknowledged. */
export type Reckoning = {
  readonly lost: number;
  readonly doubled: number;
};

type Kept = { readonly record: string; readonly save_id: string; readonly version: number };
type Gown = { readonly id: string; readonly version: number; readonly last: string };

/**
 * Lost: acknowledged, and either unknown to the database under that version or, for the last of a
 * gown, not what stands in it. Doubled: versions a gown has beyond its acknowledged saves.
 */
export async function reckon(databaseUrl: string, ledger: Ledger): Promise<Reckoning> {
  const client = new Client({ connectionString: databaseUrl });
  await client.connect();
  const kept = await client.query<Kept>('select record, save_id, version from saves');
  const gowns = await client.query<Gown>(
    "select id, version, typed -> 'fields' ->> 'card.name' as last from gowns",
  );
  await client.end();
  const there = new Set(kept.rows.map((row) => `${row.record} ${row.save_id} ${row.version}`));
  const missing = ledger.acknowledged.filter(
    (each) => !there.has(`${each.gownId} ${each.saveId} ${each.version}`),
  );
  let overwritten = 0;
  let doubled = 0;
  for (const gown of gowns.rows) {
    const own = ledger.acknowledged.filter((each) => each.gownId === gown.id);
    if (gown.last !== `save ${own.at(-1)?.count ?? 0}`) overwritten += 1;
    doubled += gown.version - 1 - own.length;
    const rows = kept.rows.filter((row) => row.record === gown.id && row.version > 1);
    doubled += rows.length - own.length;
  }
  return { lost: missing.length + overwritten, doubled };
}
