import { randomUUID } from 'node:crypto';
import type { Received } from '#shared/api/endpoint.ts';
import type {
  CardContent,
  duplicateMeasureCard as duplication,
  KeptCard,
  saveMeasureCard as saving,
} from '#shared/api/measure-cards.ts';
import { holdAccount } from '../../database/account-hold.ts';
import type { Database } from '../../database/client.ts';
import { mostKept, refuseOneTooMany } from '../../http/most-kept.ts';
import { acknowledge, type Acknowledged, acknowledgedSave } from '../../database/saves.ts';
import { conflict, notFound, sameSave } from '../../http/conflict.ts';
import type { Caller } from '../../http/session.ts';
import { cardView } from './card-view.ts';
import { countCards, findCard, holdCard, insertCard, replaceCard } from './repository.ts';

type Saved = { readonly id: string; readonly version: number; readonly savedAt: string };

const savedAs = ({ record, version, savedAt }: Acknowledged): Saved => ({
  id: record,
  version,
  savedAt: savedAt.toISOString(),
});

export async function readCard(database: Database, caller: Caller, id: string): Promise<KeptCard> {
  const row = await findCard(database, caller.accountId, id);
  if (row === undefined) throw notFound('measure card');
  return cardView(row, caller);
}

/** Puts a card on the server once, however often it is sent. */
export async function createCard(
  database: Database,
  caller: Caller,
  parts: { readonly saveId: string; readonly name: string; readonly content: CardContent },
): Promise<Saved> {
  const { accountId } = caller;
  const { saveId, name, content } = parts;
  const now = new Date();
  const save = { accountId, saveId, record: randomUUID(), version: 1, savedAt: now };
  return database.transaction(async (turn) => {
    if (!(await acknowledge(turn, save))) {
      const before = await acknowledgedSave(turn, accountId, saveId);
      const card = before && (await findCard(turn, accountId, before.record));
      return savedAs(sameSave(before ?? save, card?.id, 1));
    }
    await holdAccount(turn, accountId);
    refuseOneTooMany('measure cards', await countCards(turn, accountId), mostKept.measureCards);
    await insertCard(turn, {
      id: save.record,
      accountId,
      version: 1,
      name,
      archivedAt: null,
      createdAt: now,
      savedAt: now,
      savedDevice: caller.device,
      savedSession: caller.sessionId,
      ...content,
    });
    return savedAs(save);
  });
}

export async function duplicateCard(
  database: Database,
  caller: Caller,
  id: string,
  wanted: Received<typeof duplication>,
): Promise<Saved> {
  const row = await findCard(database, caller.accountId, id);
  if (row === undefined) throw notFound('measure card');
  const { typed, card } = row;
  return createCard(database, caller, { ...wanted, content: { typed, card } });
}

/** Saves a card as gowns are saved: in turn, once, and from the version it was made from. */
export async function saveCard(
  database: Database,
  caller: Caller,
  id: string,
  { saveId, baseVersion, content }: Received<typeof saving>,
): Promise<Saved> {
  const { accountId } = caller;
  return database.transaction(async (turn) => {
    const row = await holdCard(turn, accountId, id);
    if (row === undefined) throw notFound('measure card');
    const before = await acknowledgedSave(turn, accountId, saveId);
    if (before !== undefined) return savedAs(sameSave(before, id, baseVersion + 1));
    if (row.version !== baseVersion) throw conflict(row, cardView(row, caller));
    const savedAt = new Date();
    const version = await replaceCard(turn, row, {
      ...content,
      savedAt,
      savedDevice: caller.device,
      savedSession: caller.sessionId,
    });
    const save = { accountId, saveId, record: id, version, savedAt };
    await acknowledge(turn, save);
    return savedAs(save);
  });
}
