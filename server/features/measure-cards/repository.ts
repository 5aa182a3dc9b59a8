import { and, asc, desc, eq, getTableColumns, or, sql } from 'drizzle-orm';
import type { Store } from '../../database/client.ts';
import { gownRevisions } from '../../database/schema/gown-revisions.ts';
import { gowns } from '../../database/schema/gowns.ts';
import { measureCards } from '../../database/schema/measure-cards.ts';
import { people } from '../../database/schema/people.ts';

export type CardRow = typeof measureCards.$inferSelect;
/** A card with the name of whose it is. */
export type OwnedCardRow = CardRow & { readonly personName: string };

/** What a save replaces. */
export type CardChange = Pick<
  CardRow,
  'typed' | 'card' | 'takenOn' | 'savedAt' | 'savedDevice' | 'savedSession'
>;

const withPerson = { ...getTableColumns(measureCards), personName: people.name };

const owned = (accountId: string, id: string) =>
  and(eq(measureCards.id, id), eq(measureCards.accountId, accountId));

/** The account's measure cards, last saved first. */
export const listCardRows = (store: Store, accountId: string): Promise<OwnedCardRow[]> =>
  store
    .select(withPerson)
    .from(measureCards)
    .innerJoin(people, eq(people.id, measureCards.personId))
    .where(eq(measureCards.accountId, accountId))
    .orderBy(desc(measureCards.savedAt));

export async function findCard(
  store: Store,
  accountId: string,
  id: string,
): Promise<OwnedCardRow | undefined> {
  const [row] = await store
    .select(withPerson)
    .from(measureCards)
    .innerJoin(people, eq(people.id, measureCards.personId))
    .where(owned(accountId, id));
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

export async function deleteCardRow(store: Store, { accountId, id }: CardRow): Promise<void> {
  await store.delete(measureCards).where(owned(accountId, id));
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

/** A gown that a card was laid on, now or in one of its revisions. */
export type CardUse = { readonly cardId: string; readonly id: string; readonly title: string };

/** Which gowns of the account which cards were laid on, by title. */
export async function listCardUses(store: Store, accountId: string): Promise<CardUse[]> {
  const rows = await store
    .selectDistinct({ cardId: measureCards.id, id: gowns.id, title: gowns.title })
    .from(measureCards)
    .leftJoin(gownRevisions, eq(gownRevisions.cardId, measureCards.id))
    .innerJoin(gowns, or(eq(gowns.cardId, measureCards.id), eq(gowns.id, gownRevisions.gownId)))
    .where(and(eq(measureCards.accountId, accountId), eq(gowns.accountId, accountId)))
    .orderBy(asc(gowns.title));
  return rows;
}

/** Whose a name is on the maker's list, held until the transaction ends; letter case says nothing. */
export async function findPersonNamed(
  store: Store,
  accountId: string,
  name: string,
): Promise<string | undefined> {
  const [row] = await store
    .select({ id: people.id })
    .from(people)
    .where(and(eq(people.accountId, accountId), eq(sql`lower(${people.name})`, name.toLowerCase())))
    .orderBy(asc(people.createdAt))
    .limit(1)
    .for('key share');
  return row?.id;
}

/** Whether somebody is on the maker's list. */
export async function isPerson(store: Store, accountId: string, id: string): Promise<boolean> {
  const rows = await store
    .select({ id: people.id })
    .from(people)
    .where(and(eq(people.id, id), eq(people.accountId, accountId)))
    .for('key share');
  return rows.length > 0;
}

export async function insertPerson(store: Store, row: typeof people.$inferInsert): Promise<string> {
  await store.insert(people).values(row);
  return row.id;
}

export const countPeople = (store: Store, accountId: string): Promise<number> =>
  store.$count(people, eq(people.accountId, accountId));

/** The revisions of gowns a card is laid on, and those drawn from it: each with whose its card and its gown are. */
export const pastOfCard = (store: Store, { accountId, id }: CardRow) =>
  store
    .select({
      title: gowns.title,
      isLaidNow: sql<boolean>`${gowns.cardId} is not distinct from ${id}`,
      gownPersonId: gowns.personId,
      cardId: gownRevisions.cardId,
      cardPersonId: measureCards.personId,
      card: gownRevisions.card,
    })
    .from(gownRevisions)
    .innerJoin(gowns, eq(gowns.id, gownRevisions.gownId))
    .leftJoin(measureCards, eq(measureCards.id, gownRevisions.cardId))
    .where(
      and(eq(gowns.accountId, accountId), or(eq(gowns.cardId, id), eq(gownRevisions.cardId, id))),
    )
    .orderBy(asc(gowns.title));

/** Gives a card, and every gown it is laid on, to somebody. */
export async function giveCard(
  store: Store,
  { accountId, id }: CardRow,
  personId: string,
): Promise<void> {
  await store.update(measureCards).set({ personId }).where(owned(accountId, id));
  await store
    .update(gowns)
    .set({ personId })
    .where(and(eq(gowns.cardId, id), eq(gowns.accountId, accountId)));
}
