import { and, desc, eq, getTableColumns, inArray } from 'drizzle-orm';
import type { Store } from '../../database/client.ts';
import { gownRevisions } from '../../database/schema/gown-revisions.ts';
import { gowns } from '../../database/schema/gowns.ts';

export type RevisionRow = typeof gownRevisions.$inferSelect;

const all = getTableColumns(gownRevisions);
const {
  typed: _typed,
  unread: _unread,
  card: _card,
  style: _style,
  rules: _rules,
  drawnFrom: _drawnFrom,
  pieces: _pieces,
  picture: _picture,
  ...listed
} = all;
export type ListedRevisionRow = Omit<
  RevisionRow,
  'typed' | 'unread' | 'card' | 'style' | 'rules' | 'drawnFrom' | 'pieces' | 'picture'
>;

const ownedGown = (accountId: string) =>
  and(eq(gowns.id, gownRevisions.gownId), eq(gowns.accountId, accountId));

/** Revisions of an account's gown without their content, newest first. */
export const listRevisionRows = (
  store: Store,
  accountId: string,
  gownId: string,
): Promise<ListedRevisionRow[]> =>
  store
    .select(listed)
    .from(gownRevisions)
    .innerJoin(gowns, ownedGown(accountId))
    .where(eq(gownRevisions.gownId, gownId))
    .orderBy(desc(gownRevisions.createdAt));

export async function findRevision(
  store: Store,
  accountId: string,
  gownId: string,
  id: string,
): Promise<RevisionRow | undefined> {
  const [row] = await store
    .select(all)
    .from(gownRevisions)
    .innerJoin(gowns, ownedGown(accountId))
    .where(and(eq(gownRevisions.gownId, gownId), eq(gownRevisions.id, id)));
  return row;
}

/** Whether a version of a gown is kept as a revision already. */
export async function isKept(store: Store, gownId: string, version: number): Promise<boolean> {
  const rows = await store
    .select({ id: gownRevisions.id })
    .from(gownRevisions)
    .where(and(eq(gownRevisions.gownId, gownId), eq(gownRevisions.version, version)))
    .limit(1);
  return rows.length > 0;
}

/** The named revision of a version of a gown, if there is one. */
export async function findNamed(
  store: Store,
  gownId: string,
  version: number,
): Promise<RevisionRow | undefined> {
  const [row] = await store
    .select()
    .from(gownRevisions)
    .where(
      and(
        eq(gownRevisions.gownId, gownId),
        eq(gownRevisions.version, version),
        eq(gownRevisions.automatic, false),
      ),
    )
    .limit(1);
  return row;
}

export async function insertRevision(store: Store, row: RevisionRow): Promise<void> {
  await store.insert(gownRevisions).values(row);
}

export const countNamedRevisions = (store: Store, gownId: string): Promise<number> =>
  store.$count(
    gownRevisions,
    and(eq(gownRevisions.gownId, gownId), eq(gownRevisions.automatic, false)),
  );

/** Drops the oldest copies a gown kept by itself, beyond so many; named ones stay. */
export async function dropOldestAutomatic(
  store: Store,
  gownId: string,
  most: number,
): Promise<void> {
  const oldest = store
    .select({ id: gownRevisions.id })
    .from(gownRevisions)
    .where(and(eq(gownRevisions.gownId, gownId), eq(gownRevisions.automatic, true)))
    .orderBy(desc(gownRevisions.createdAt))
    .offset(most);
  await store.delete(gownRevisions).where(inArray(gownRevisions.id, oldest));
}
