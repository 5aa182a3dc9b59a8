import { createHash, randomBytes, randomUUID } from 'node:crypto';
import type { Answer, Received } from '#shared/api/endpoint.ts';
import type { ListedClass, openClass as opening, visitClass } from '#shared/api/classes.ts';
import { classCopy } from '#shared/lesson/class-copy.ts';
import { holdAccount } from '../../database/account-hold.ts';
import type { Database } from '../../database/client.ts';
import { notFound } from '../../http/conflict.ts';
import { mostKept, refuseOneTooMany } from '../../http/most-kept.ts';
import { RefusalError } from '../../http/refusal.ts';
import {
  classByDigest,
  type ClassRow,
  countOpenClasses,
  deleteExpiredClasses,
  deleteIfExpired,
  drawnFromOf,
  insertClass,
  openClassRows,
  stepByDigest,
} from './repository.ts';

/** Who reads the database cannot open a class with it. */
const digestOf = (token: string): string => createHash('sha256').update(token).digest('hex');

const hour = 3_600_000;

/** Opens a gown as it is drawn now; the token is in this answer and nowhere else. */
export async function openClass(
  database: Database,
  accountId: string,
  gownId: string,
  { title, step, unit, hours }: Received<typeof opening>,
): Promise<Answer<typeof opening>> {
  await deleteExpiredClasses(database, new Date());
  return database.transaction(async (turn) => {
    await holdAccount(turn, accountId);
    const drawnFrom = await drawnFromOf(turn, accountId, gownId);
    if (drawnFrom === undefined) throw notFound('gown');
    if (drawnFrom === null) {
      throw new RefusalError(
        'not-drawable',
        'Nothing is drawn of this gown yet. Fill in its measures on the drafting table first.',
      );
    }
    const now = new Date();
    refuseOneTooMany(
      'open classes',
      await countOpenClasses(turn, accountId, now),
      mostKept.openClasses,
    );
    const token = randomBytes(32).toString('base64url');
    const row: ClassRow = {
      id: randomUUID(),
      accountId,
      gownId,
      digest: digestOf(token),
      title,
      unit,
      inputs: classCopy(drawnFrom),
      step,
      openedAt: now,
      expiresAt: new Date(now.getTime() + hours * hour),
    };
    await insertClass(turn, row);
    return { id: row.id, token, expiresAt: row.expiresAt.toISOString() };
  });
}

export async function listClasses(database: Database, accountId: string): Promise<ListedClass[]> {
  const rows = await openClassRows(database, accountId, new Date());
  return rows.map(({ id, gownId, title, step, openedAt, expiresAt }) => ({
    id,
    gownId,
    title,
    step,
    openedAt: openedAt.toISOString(),
    expiresAt: expiresAt.toISOString(),
  }));
}

/** Says the same of a link that has run out, was withdrawn, or never was one. */
const noClass = (): RefusalError =>
  new RefusalError('not-found', 'There is nothing at this address.');

/** A link that opens nothing; where it did once, its measures go now. */
async function nothingBehind(database: Database, digest: string, now: Date): Promise<never> {
  await deleteIfExpired(database, digest, now);
  throw noClass();
}

/** What a class sees. */
export async function visit(database: Database, token: string): Promise<Answer<typeof visitClass>> {
  const [digest, now] = [digestOf(token), new Date()];
  const row = await classByDigest(database, digest, now);
  if (row === undefined) return nothingBehind(database, digest, now);
  const { title, unit, step, inputs, expiresAt } = row;
  return { title, unit, step, inputs, expiresAt: expiresAt.toISOString() };
}

/** Where the tutor stands. */
export async function tutorsStep(database: Database, token: string): Promise<string> {
  const [digest, now] = [digestOf(token), new Date()];
  const step = await stepByDigest(database, digest, now);
  return step ?? nothingBehind(database, digest, now);
}
