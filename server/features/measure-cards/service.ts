import { randomUUID } from 'node:crypto';
import { isDeepStrictEqual } from 'node:util';
import type { Received } from '#shared/api/endpoint.ts';
import type {
  CardContent,
  duplicateMeasureCard as duplication,
  giveMeasureCard as giving,
  KeptCard,
  saveMeasureCard as saving,
  startNextCard as starting,
} from '#shared/api/measure-cards.ts';
import { givenName } from '#shared/api/kept-text.ts';
import { error } from '#shared/units/problem.ts';
import { said } from '#shared/units/said.ts';
import { holdAccount } from '../../database/account-hold.ts';
import type { Database, Store } from '../../database/client.ts';
import { mostKept, refuseOneTooMany } from '../../http/most-kept.ts';
import { acknowledge, type Acknowledged, acknowledgedSave } from '../../database/saves.ts';
import { conflict, notFound, sameSave } from '../../http/conflict.ts';
import type { Caller } from '../../http/session.ts';
import { RefusalError, refusalFor } from '../../http/refusal.ts';
import { cardView } from './card-view.ts';
import {
  type CardRow,
  countCards,
  countPeople,
  deleteCardRow,
  findCard,
  findPersonNamed,
  giveCard as give,
  holdCard,
  insertCard,
  insertPerson,
  isPerson,
  listCardUses,
  type OwnedCardRow,
  pastOfCard,
  replaceCard,
} from './repository.ts';

type Saved = { readonly id: string; readonly version: number; readonly savedAt: string };

const savedAs = ({ record, version, savedAt }: Acknowledged): Saved => ({
  id: record,
  version,
  savedAt: savedAt.toISOString(),
});

async function ownCard(store: Store, accountId: string, id: string): Promise<OwnedCardRow> {
  const row = await findCard(store, accountId, id);
  if (row === undefined) throw notFound('measure card');
  return row;
}

export async function readCard(database: Database, caller: Caller, id: string): Promise<KeptCard> {
  const row = await ownCard(database, caller.accountId, id);
  return cardView(row, await listCardUses(database, caller.accountId), caller);
}

/** Stands on the list for cards that name nobody. */
const nobodyYet = 'Not named yet';

/** Who is named on a card, by the rule for all names on the list. */
function nameOn({ name = '' }: CardContent['card'], unit: CardContent['typed']['unit']): string {
  if (name.trim() === '') return nobodyYet;
  const read = givenName.safeParse(name);
  if (read.success) return read.data;
  throw refusalFor(
    'bad-input',
    [
      error({
        code: 'wrong-form',
        field: 'content.card.name',
        said: said`The name on the card has no letter that can be seen: type it anew, or leave it empty.`,
      }),
    ],
    unit,
  );
}

/** Whose a new card is: who is asked for, or who is named on it, put on the list where nobody is called so. */
async function personFor(
  turn: Store,
  accountId: string,
  asked: string | undefined,
  { card, typed }: CardContent,
): Promise<string> {
  if (asked !== undefined) {
    if (!(await isPerson(turn, accountId, asked))) throw notFound('person');
    return asked;
  }
  const name = nameOn(card, typed.unit);
  const known = await findPersonNamed(turn, accountId, name);
  if (known !== undefined) return known;
  refuseOneTooMany('people', await countPeople(turn, accountId), mostKept.people);
  return insertPerson(turn, { id: randomUUID(), accountId, name, createdAt: new Date() });
}

/** Today, by the clock of the server: for cards that bear no day. */
const today = (): string => new Date().toISOString().slice(0, 10);

/** Puts a card on the server once, however often it is sent. */
export async function createCard(
  database: Database,
  caller: Caller,
  parts: {
    readonly saveId: string;
    readonly name: string;
    readonly content: CardContent;
    readonly personId?: string | undefined;
    readonly startedFrom?: string;
  },
): Promise<Saved> {
  const { accountId } = caller;
  const { saveId, name, content } = parts;
  const takenOn = content.card.date ?? today();
  const now = new Date();
  const save = { accountId, saveId, record: randomUUID(), version: 1, savedAt: now };
  return database.transaction(async (turn) => {
    await holdAccount(turn, accountId);
    if (!(await acknowledge(turn, save))) {
      const before = await acknowledgedSave(turn, accountId, saveId);
      const card = before && (await findCard(turn, accountId, before.record));
      return savedAs(sameSave(before ?? save, card?.id, 1));
    }
    refuseOneTooMany('measure cards', await countCards(turn, accountId), mostKept.measureCards);
    await insertCard(turn, {
      id: save.record,
      accountId,
      version: 1,
      name,
      personId: await personFor(turn, accountId, parts.personId, content),
      takenOn,
      startedFrom: parts.startedFrom ?? null,
      archivedAt: null,
      createdAt: now,
      savedAt: now,
      savedDevice: caller.device,
      savedSession: caller.sessionId,
      typed: content.typed,
      card: { ...content.card, date: takenOn },
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
  const { typed, card, personId } = await ownCard(database, caller.accountId, id);
  return createCard(database, caller, { ...wanted, personId, content: { typed, card } });
}

/** Starts the next card of the same person from this one, as it was taken, on another day. */
export async function startNextCard(
  database: Database,
  caller: Caller,
  id: string,
  { takenOn, ...wanted }: Received<typeof starting>,
): Promise<Saved> {
  const { typed, card, personId } = await ownCard(database, caller.accountId, id);
  const content = { typed, card: { ...card, date: takenOn } };
  return createCard(database, caller, { ...wanted, personId, content, startedFrom: id });
}

/** The measures alone, without whose they are and when they were taken. */
const measuresOf = ({
  name: _name,
  date: _date,
  overruled: _kept,
  ...measures
}: CardContent['card']) => measures;

/** The past of a gown stays one person's: a card goes to nobody else while a gown would have measures of two. */
async function refuseMixedPast(turn: Store, row: CardRow, personId: string): Promise<void> {
  const mixed = (await pastOfCard(turn, row)).find((past) => {
    if (!past.isLaidNow) return past.gownPersonId !== null && past.gownPersonId !== personId;
    if (past.cardId === row.id || past.cardPersonId === personId) return false;
    // Typed before there was a card: they are the card's own measures, or somebody's.
    return past.cardId !== null || !isDeepStrictEqual(measuresOf(past.card), measuresOf(row.card));
  });
  if (mixed === undefined) return;
  throw new RefusalError(
    'another-person',
    mixed.isLaidNow
      ? `“${mixed.title}” would go along, and its revisions keep measures that are not from this card. Copy this card and give the copy; card and gown stay whose they are.`
      : `“${mixed.title}” keeps this card’s measures in its revisions and is made for somebody else. Copy this card and give the copy; card and gown stay whose they are.`,
  );
}

/** Says whose a card is after all. */
export async function giveCard(
  database: Database,
  { accountId }: Caller,
  id: string,
  { personId }: Received<typeof giving>,
): Promise<Record<string, never>> {
  return database.transaction(async (turn) => {
    await holdAccount(turn, accountId);
    const row = await holdCard(turn, accountId, id);
    if (row === undefined) throw notFound('measure card');
    if (!(await isPerson(turn, accountId, personId))) throw notFound('person');
    if (personId !== row.personId) await refuseMixedPast(turn, row, personId);
    await give(turn, row, personId);
    return {};
  });
}

/** A card that a gown was drawn from stays; what is to be done instead stands in the refusal. */
async function refuseUsed(
  turn: Store,
  accountId: string,
  id: string,
  instead: string,
): Promise<void> {
  const gowns = (await listCardUses(turn, accountId)).filter(({ cardId }) => cardId === id);
  const [first] = gowns;
  if (first === undefined) return;
  const others = gowns.length > 1 ? ` and ${gowns.length - 1} more` : '';
  throw new RefusalError(
    'card-in-use',
    `“${first.title}”${others} was drawn from this card, ${instead}`,
  );
}

/** Deletes a card nobody drew from. */
export async function deleteCard(
  database: Database,
  { accountId }: Caller,
  id: string,
): Promise<Record<string, never>> {
  return database.transaction(async (turn) => {
    await holdAccount(turn, accountId);
    const row = await holdCard(turn, accountId, id);
    if (row === undefined) throw notFound('measure card');
    await refuseUsed(turn, accountId, id, 'so it stays. Archive it to have it out of the way.');
    await deleteCardRow(turn, row);
    return {};
  });
}

/** Measures taken anew after a gown was drawn go on another card. */
const onTheNext =
  'so its measures stay as they are. Start the next card from it and type the new ones there.';

/** A card as it stands, put away as another one: a save is about to overwrite it. */
async function keepReplacedCard(turn: Store, row: CardRow): Promise<void> {
  refuseOneTooMany('measure cards', await countCards(turn, row.accountId), mostKept.measureCards);
  await insertCard(turn, {
    ...row,
    id: randomUUID(),
    version: 1,
    name: `${row.name}, as saved from ${row.savedDevice}`.slice(0, 80),
    startedFrom: null,
    archivedAt: new Date(),
  });
}

/** Saves a card as gowns are saved: in turn, once, and from the version it was made from. */
export async function saveCard(
  database: Database,
  caller: Caller,
  id: string,
  { saveId, baseVersion, content, keepReplaced }: Received<typeof saving>,
): Promise<Saved> {
  const { accountId } = caller;
  return database.transaction(async (turn) => {
    await holdAccount(turn, accountId);
    const row = await holdCard(turn, accountId, id);
    if (row === undefined) throw notFound('measure card');
    const before = await acknowledgedSave(turn, accountId, saveId);
    if (before !== undefined) return savedAs(sameSave(before, id, baseVersion + 1));
    await refuseUsed(turn, accountId, id, onTheNext);
    if (row.version !== baseVersion) {
      throw conflict(row, cardView(await ownCard(turn, accountId, id), [], caller));
    }
    if (keepReplaced) await keepReplacedCard(turn, row);
    const takenOn = content.card.date ?? row.takenOn;
    const savedAt = new Date();
    const version = await replaceCard(turn, row, {
      typed: content.typed,
      card: { ...content.card, date: takenOn },
      takenOn,
      savedAt,
      savedDevice: caller.device,
      savedSession: caller.sessionId,
    });
    const save = { accountId, saveId, record: id, version, savedAt };
    await acknowledge(turn, save);
    return savedAs(save);
  });
}
