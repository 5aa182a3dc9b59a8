import { randomUUID } from 'node:crypto';
import type { Store } from '../../database/client.ts';
import { mostKept } from '../../http/most-kept.ts';
import type { GownRow } from './repository.ts';
import {
  dropOldestAutomatic,
  findNamed,
  insertRevision,
  isKept,
  type RevisionRow,
} from './revision-repository.ts';

/** A copy of a gown as it stands. */
export const copyOf = (row: GownRow, name: string, automatic: boolean): RevisionRow => ({
  id: randomUUID(),
  gownId: row.id,
  name,
  automatic,
  version: row.version,
  parentId: row.parentId,
  cardId: row.cardId,
  createdAt: new Date(),
  typed: row.typed,
  unread: row.unread,
  garment: row.garment,
  card: row.card,
  style: row.style,
  rules: row.rules,
  engine: row.engine,
  draftNumber: row.draftNumber,
  drawnFrom: row.drawnFrom,
  pieces: row.pieces,
  fresh: row.fresh,
  picture: row.picture,
});

/** Keeps a gown by itself before it is replaced, unless this version is kept already. */
export async function keepAsRevision(store: Store, row: GownRow, name: string): Promise<void> {
  if (await isKept(store, row.id, row.version)) return;
  await insertRevision(store, copyOf(row, name, true));
  await dropOldestAutomatic(store, row.id, mostKept.automaticRevisions);
}

/** Keeps a gown under a name for good, unless a maker named this version already; gives the revision. */
export async function keepForGood(store: Store, row: GownRow, name: string): Promise<RevisionRow> {
  const named = await findNamed(store, row.id, row.version);
  if (named !== undefined) return named;
  const revision = copyOf(row, name, false);
  await insertRevision(store, revision);
  return revision;
}
