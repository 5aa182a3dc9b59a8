import { and, asc, countDistinct, eq, max } from 'drizzle-orm';
import type { Store } from '../../database/client.ts';
import { gowns } from '../../database/schema/gowns.ts';
import { measureCards } from '../../database/schema/measure-cards.ts';
import { people } from '../../database/schema/people.ts';

export type PersonRow = typeof people.$inferSelect;

const owned = (accountId: string, id: string) =>
  and(eq(people.id, id), eq(people.accountId, accountId));

/** The maker's people by name, with how many cards and gowns each has and the day of the last card. */
export const listPeopleRows = (store: Store, accountId: string) =>
  store
    .select({
      id: people.id,
      name: people.name,
      createdAt: people.createdAt,
      cards: countDistinct(measureCards.id),
      gowns: countDistinct(gowns.id),
      measuredOn: max(measureCards.takenOn),
    })
    .from(people)
    .leftJoin(measureCards, eq(measureCards.personId, people.id))
    .leftJoin(gowns, eq(gowns.personId, people.id))
    .where(eq(people.accountId, accountId))
    .groupBy(people.id)
    .orderBy(asc(people.name));

export async function findPerson(
  store: Store,
  accountId: string,
  id: string,
): Promise<PersonRow | undefined> {
  const [row] = await store.select().from(people).where(owned(accountId, id));
  return row;
}

/** The person, held so that nothing becomes hers until the transaction ends. */
export async function holdPerson(
  store: Store,
  accountId: string,
  id: string,
): Promise<PersonRow | undefined> {
  const [row] = await store.select().from(people).where(owned(accountId, id)).for('update');
  return row;
}

export async function insertPerson(store: Store, row: PersonRow): Promise<void> {
  await store.insert(people).values(row);
}

export const countPeople = (store: Store, accountId: string): Promise<number> =>
  store.$count(people, eq(people.accountId, accountId));

/** False where the account has no such person. */
export async function setPersonName(
  store: Store,
  accountId: string,
  id: string,
  name: string,
): Promise<boolean> {
  const changed = await store
    .update(people)
    .set({ name })
    .where(owned(accountId, id))
    .returning({ id: people.id });
  return changed.length > 0;
}

/** Deletes a person; cards, gowns and their revisions go with her. */
export async function dropPerson(store: Store, { accountId, id }: PersonRow): Promise<void> {
  await store.delete(people).where(owned(accountId, id));
}

/** Which gowns and which measure cards are hers. */
export async function ownedBy(
  store: Store,
  { accountId, id }: PersonRow,
): Promise<{ readonly cards: string[]; readonly gowns: string[] }> {
  const hers = await store
    .select({ id: gowns.id })
    .from(gowns)
    .where(and(eq(gowns.personId, id), eq(gowns.accountId, accountId)))
    .orderBy(asc(gowns.id));
  const cards = await store
    .select({ id: measureCards.id })
    .from(measureCards)
    .where(and(eq(measureCards.personId, id), eq(measureCards.accountId, accountId)))
    .orderBy(asc(measureCards.id));
  return { cards: cards.map((each) => each.id), gowns: hers.map((each) => each.id) };
}
