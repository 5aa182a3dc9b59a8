import { and, desc, eq, getTableColumns, sql } from 'drizzle-orm';
import type { Store } from '../../database/client.ts';
import { gowns } from '../../database/schema/gowns.ts';
import { measureCards } from '../../database/schema/measure-cards.ts';

export type GownRow = typeof gowns.$inferSelect;

/** What a save replaces. */
export type GownChange = Omit<
  GownRow,
  | 'id'
  | 'accountId'
  | 'version'
  | 'archivedAt'
  | 'createdAt'
  | 'title'
  | 'parentId'
  | 'cardId'
  | 'personId'
> &
  Partial<Pick<GownRow, 'parentId' | 'cardId' | 'personId'>>;

const {
  typed: _typed,
  unread: _unread,
  card: _card,
  style: _style,
  rules: _rules,
  drawnFrom: _drawnFrom,
  pieces: _pieces,
  ...listed
} = getTableColumns(gowns);

const owned = (accountId: string, id: string) =>
  and(eq(gowns.id, id), eq(gowns.accountId, accountId));

/** The account's gowns without their content, last saved first. */
export const listGownRows = (store: Store, accountId: string) =>
  store
    .select(listed)
    .from(gowns)
    .where(eq(gowns.accountId, accountId))
    .orderBy(desc(gowns.savedAt));
export type ListedGownRow = Awaited<ReturnType<typeof listGownRows>>[number];

export async function findGown(
  store: Store,
  accountId: string,
  id: string,
): Promise<GownRow | undefined> {
  const [row] = await store.select().from(gowns).where(owned(accountId, id));
  return row;
}

/** The gown, held so that nobody else saves it until the transaction ends. */
export async function holdGown(
  store: Store,
  accountId: string,
  id: string,
): Promise<GownRow | undefined> {
  const [row] = await store.select().from(gowns).where(owned(accountId, id)).for('update');
  return row;
}

export async function insertGown(store: Store, row: GownRow): Promise<void> {
  await store.insert(gowns).values(row);
}

/** Replaces a held gown's content; gives its new version. */
export async function replaceGown(
  store: Store,
  { accountId, id }: GownRow,
  change: GownChange,
): Promise<number> {
  const [row] = await store
    .update(gowns)
    .set({ ...change, version: sql`${gowns.version} + 1` })
    .where(owned(accountId, id))
    .returning({ version: gowns.version });
  if (row === undefined) throw new Error('A gown that was held is gone.');
  return row.version;
}

export const countGowns = (store: Store, accountId: string): Promise<number> =>
  store.$count(gowns, eq(gowns.accountId, accountId));

/** False where the account has no such gown; its revisions and what is shared of it go with it. */
export async function deleteGownRow(store: Store, accountId: string, id: string): Promise<boolean> {
  const gone = await store.delete(gowns).where(owned(accountId, id)).returning({ id: gowns.id });
  return gone.length > 0;
}

/** False where the account has no such gown. */
async function set(
  store: Store,
  accountId: string,
  id: string,
  change: Partial<Pick<GownRow, 'title' | 'archivedAt' | 'cardId' | 'personId'>>,
): Promise<boolean> {
  const changed = await store
    .update(gowns)
    .set(change)
    .where(owned(accountId, id))
    .returning({ id: gowns.id });
  return changed.length > 0;
}

export const setGownTitle = (store: Store, accountId: string, id: string, title: string) =>
  set(store, accountId, id, { title });

export const setGownArchived = (store: Store, accountId: string, id: string, at: Date | null) =>
  set(store, accountId, id, { archivedAt: at });

/** Which card was laid on a gown last, and whose gown it is by that. */
export const setGownCard = (
  store: Store,
  accountId: string,
  id: string,
  card: Pick<LaidCard, 'id' | 'personId'>,
) => set(store, accountId, id, { cardId: card.id, personId: card.personId });

export type LaidCard = typeof measureCards.$inferSelect;

/** A measure card of the account, held so that it stays until the transaction ends. */
export async function findLaidCard(
  store: Store,
  accountId: string,
  id: string,
): Promise<LaidCard | undefined> {
  const [row] = await store
    .select()
    .from(measureCards)
    .where(and(eq(measureCards.id, id), eq(measureCards.accountId, accountId)))
    .for('share');
  return row;
}
