import { and, desc, eq, gt, lte } from 'drizzle-orm';
import type { DraftedInputs } from '#shared/engine/drafted.ts';
import type { Store } from '../../database/client.ts';
import { classes } from '../../database/schema/classes.ts';
import { gowns } from '../../database/schema/gowns.ts';

/** What an account's gown was last drawn from: null where nothing could be drawn, undefined where there is no such gown. */
export async function drawnFromOf(
  store: Store,
  accountId: string,
  gownId: string,
): Promise<DraftedInputs | null | undefined> {
  const [row] = await store
    .select({ drawnFrom: gowns.drawnFrom })
    .from(gowns)
    .where(and(eq(gowns.id, gownId), eq(gowns.accountId, accountId)));
  return row?.drawnFrom;
}

export type ClassRow = typeof classes.$inferSelect;

export async function insertClass(store: Store, row: ClassRow): Promise<void> {
  await store.insert(classes).values(row);
}

/** Classes of an account that are open at a moment, last opened first. */
export const openClassRows = (store: Store, accountId: string, now: Date): Promise<ClassRow[]> =>
  store
    .select()
    .from(classes)
    .where(and(eq(classes.accountId, accountId), gt(classes.expiresAt, now)))
    .orderBy(desc(classes.openedAt));

export const countOpenClasses = (store: Store, accountId: string, now: Date): Promise<number> =>
  store.$count(classes, and(eq(classes.accountId, accountId), gt(classes.expiresAt, now)));

/** The class whose link has this digest, as long as it is open. */
export async function classByDigest(
  store: Store,
  digest: string,
  now: Date,
): Promise<ClassRow | undefined> {
  const [row] = await store
    .select()
    .from(classes)
    .where(and(eq(classes.digest, digest), gt(classes.expiresAt, now)));
  return row;
}

/** Where the tutor of an open class stands. */
export async function stepByDigest(
  store: Store,
  digest: string,
  now: Date,
): Promise<string | undefined> {
  const [row] = await store
    .select({ step: classes.step })
    .from(classes)
    .where(and(eq(classes.digest, digest), gt(classes.expiresAt, now)));
  return row?.step;
}

/** False where the account has no such open class. */
export async function setClassStep(
  store: Store,
  accountId: string,
  id: string,
  step: string,
  now: Date,
): Promise<boolean> {
  const turned = await store
    .update(classes)
    .set({ step })
    .where(and(eq(classes.id, id), eq(classes.accountId, accountId), gt(classes.expiresAt, now)))
    .returning({ id: classes.id });
  return turned.length > 0;
}

/** False where the account has no such class. */
export async function deleteClass(store: Store, accountId: string, id: string): Promise<boolean> {
  const ended = await store
    .delete(classes)
    .where(and(eq(classes.id, id), eq(classes.accountId, accountId)))
    .returning({ id: classes.id });
  return ended.length > 0;
}

/** The same for one alone, by the digest of its link. */
export async function deleteIfExpired(store: Store, digest: string, now: Date): Promise<void> {
  await store.delete(classes).where(and(eq(classes.digest, digest), lte(classes.expiresAt, now)));
}

/** Forgets classes that have run out: nothing of them is of use any more. */
export async function deleteExpiredClasses(store: Store, now: Date): Promise<void> {
  await store.delete(classes).where(lte(classes.expiresAt, now));
}
