import { and, desc, eq, sql } from 'drizzle-orm';
import type { Store } from '../../database/client.ts';
import { measureCards } from '../../database/schema/measure-cards.ts';

export type CardRow = typeof measureCards.$inferSelect;

/** What a save replaces. */
export type CardChange = Pick<
  CardRow,
  'typed' | 'card' | 'savedAt' | 'savedDevice' | 'savedSession'
>;

const owned = (accountId: string, id: string) =>
  and(eq(measureCards.id, id), eq(measureCards.accountId, accountId));

/** The account's measure cards, last saved first. */
export const listCardRows = (store: Store, accountId: string): Promise<CardRow[]> =>
  store
    .select()
    .from(measureCards)
    .where(eq(measureCards.accountId, accountId))
    .orderBy(desc(measureCards.savedAt));

export async function findCard(
  store: Store,
  accountId: string,
  id: string,
): Promise<CardRow | undefined> {
  const [row] = await store.select().from(measureCards).where(owned(accountId, id));
  return row;
}

/** The card, held so that nobody else saves it until the transaction ends. */
export async function holdCard(
  store: Store,
  accountId: string,
  id: string,
): Promise<CardRow | undefined> {
  const [row] = await store.select().from(measureCards).where(owned(accountId, id)).for('update');
  return row;
}

export async function insertCard(store: Store, row: CardRow): Promise<void> {
  await store.insert(measureCards).values(row);
}

/** Replaces a held card's content; gives its new version. */
export async function replaceCard(
  store: Store,
  { accountId, id }: CardRow,
  change: CardChange,
): Promise<number> {
  const [row] = await store
    .update(measureCards)
    .set({ ...change, version: sql`${measureCards.version} + 1` })
    .where(owned(accountId, id))
    .returning({ version: measureCards.version });
  if (row === undefined) throw new Error('A measure card that was held is gone.');
  return row.version;
}

export const countCards = (store: Store, accountId: string): Promise<number> =>
  store.$count(measureCards, eq(measureCards.accountId, accountId));

/** False where the account has no such card. */
async function set(
  store: Store,
  accountId: string,
  id: string,
  change: Partial<Pick<CardRow, 'name' | 'archivedAt'>>,
): Promise<boolean> {
  const changed = await store
    .update(measureCards)
    .set(change)
    .where(owned(accountId, id))
    .returning({ id: measureCards.id });
  return changed.length > 0;
}

export const setCardName = (store: Store, accountId: string, id: string, name: string) =>
  set(store, accountId, id, { name });

export const setCardArchived = (store: Store, accountId: string, id: string, at: Date | null) =>
  set(store, accountId, id, { archivedAt: at });
