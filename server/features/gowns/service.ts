import { randomUUID } from 'node:crypto';
import type { Received } from '#shared/api/endpoint.ts';
import type {
  createGown as creation,
  duplicateGown as duplication,
  Gown,
  GownContent,
  saveGown as saving,
} from '#shared/api/gowns.ts';
import { engineVersion } from '#shared/engine/draft-gown.ts';
import { holdAccount } from '../../database/account-hold.ts';
import type { Store } from '../../database/client.ts';
import { mostKept, refuseOneTooMany } from '../../http/most-kept.ts';
import { acknowledge, type Acknowledged, acknowledgedSave } from '../../database/saves.ts';
import { doneTo, notFound, sameSave } from '../../http/conflict.ts';
import type { Drawing } from '../../drafting/drawing.ts';
import { RefusalError } from '../../http/refusal.ts';
import { lastingTurn } from '../../http/turn-of.ts';
import { kept, nothingDrawn } from './drawing.ts';
import { contentOf, gownView } from './gown-view.ts';
import { keepAsRevision, keepForGood } from './keep-as-revision.ts';
import {
  countGowns,
  deleteGownRow,
  findGown,
  findLaidCard,
  type GownRow,
  holdGown,
  insertGown,
  type LaidCard,
  replaceGown,
} from './repository.ts';
import {
  type Maker,
  OtherVersionError,
  savedOrConflict,
  type Workroom,
} from './saved-or-conflict.ts';

export type Saved = { readonly id: string; readonly version: number; readonly savedAt: string };

export const savedAs = ({ record, version, savedAt }: Acknowledged): Saved => ({
  id: record,
  version,
  savedAt: savedAt.toISOString(),
});

const columnsOf = ({ typed, unread, inputs }: GownContent) => ({
  typed,
  unread,
  ...inputs,
  garment: inputs.garment ?? 'gown',
});

export async function readGown(
  { database, drafter }: Workroom,
  maker: Maker,
  id: string,
): Promise<Gown> {
  const row = await findGown(database, maker.accountId, id);
  if (row === undefined) throw notFound('gown');
  return gownView(row, maker, drafter);
}

/** The gown a save under this number has put on the server already, if it has. */
async function putBefore(
  store: Store,
  { accountId }: Maker,
  saveId: string,
): Promise<Saved | undefined> {
  const before = await acknowledgedSave(store, accountId, saveId);
  if (before === undefined) return undefined;
  const gown = await findGown(store, accountId, before.record);
  return savedAs(sameSave(before, gown?.id, 1));
}

/** The card a gown is drawn from; it stays while the transaction lasts. */
export async function laidCard(turn: Store, accountId: string, id: string): Promise<LaidCard> {
  const card = await findLaidCard(turn, accountId, id);
  if (card === undefined) throw notFound('measure card');
  return card;
}

/** Puts a gown on the server once, however often it is sent. */
async function putGown(
  { database }: Workroom,
  maker: Maker,
  saveId: string,
  parts: {
    readonly title: string;
    readonly content: GownContent;
    readonly drawing: Drawing;
    readonly cardId?: string | null | undefined;
    readonly personId?: string | null;
  },
): Promise<Saved> {
  const { accountId } = maker;
  const now = new Date();
  const save = { accountId, saveId, record: randomUUID(), version: 1, savedAt: now };
  return database.transaction(async (turn) => {
    await holdAccount(turn, accountId);
    if (!(await acknowledge(turn, save))) {
      return (await putBefore(turn, maker, saveId)) ?? savedAs(sameSave(save, undefined, 1));
    }
    refuseOneTooMany('gowns', await countGowns(turn, accountId), mostKept.gowns);
    const card = parts.cardId ? await laidCard(turn, accountId, parts.cardId) : undefined;
    await insertGown(turn, {
      id: save.record,
      accountId,
      version: 1,
      title: parts.title,
      archivedAt: null,
      createdAt: now,
      savedAt: now,
      savedDevice: maker.device,
      savedSession: maker.sessionId,
      parentId: null,
      cardId: card?.id ?? null,
      personId: card?.personId ?? parts.personId ?? null,
      ...columnsOf(parts.content),
      ...parts.drawing,
    });
    return savedAs(save);
  });
}

export async function createGown(
  workroom: Workroom,
  maker: Maker,
  { saveId, title, content, cardId }: Received<typeof creation>,
): Promise<Saved> {
  const before = await putBefore(workroom.database, maker, saveId);
  if (before !== undefined) return before;
  const drawing = await workroom.drafter.drawing(content, lastingTurn(maker.accountId));
  return putGown(workroom, maker, saveId, {
    title,
    content,
    drawing: drawing ?? nothingDrawn,
    cardId,
  });
}

export async function duplicateGown(
  workroom: Workroom,
  maker: Maker,
  id: string,
  { saveId, title }: Received<typeof duplication>,
): Promise<Saved> {
  const row = await findGown(workroom.database, maker.accountId, id);
  if (row === undefined) throw notFound('gown');
  const { engine, draftNumber, drawnFrom, pieces, picture, fresh, cardId, personId } = row;
  const drawing = { engine, draftNumber, drawnFrom, pieces, picture, fresh };
  const content = contentOf(row);
  return putGown(workroom, maker, saveId, { title, content, drawing, cardId, personId });
}

/** What a save makes of the gown it finds. */
export type Change = {
  readonly content: GownContent;
  readonly drawing: Drawing;
  readonly parentId?: string;
  readonly cardId?: string | null;
  readonly personId?: string;
  /** Keeps the gown as it then stands under this name, for good. */
  readonly keepAs?: string;
};

/** What a save says of itself. */
type Save = { readonly saveId: string; readonly baseVersion: number };

/** The answer to a save done before; none where it is new and was made from the version there is. */
async function savedBefore(
  store: Store,
  row: GownRow,
  { saveId, baseVersion }: Save,
): Promise<Saved | undefined> {
  const before = await acknowledgedSave(store, row.accountId, saveId);
  if (before !== undefined) return savedAs(sameSave(before, row.id, baseVersion + 1));
  if (row.version !== baseVersion) throw new OtherVersionError(row);
  return undefined;
}

/**
 * The one way a gown changes: held, so that two saves take turns; a save done before is answered as
 * before; one made from another version is refused.
 */
export async function changeGown(
  workroom: Workroom,
  maker: Maker,
  id: string,
  save: Save,
  change: (turn: Store, row: GownRow) => Promise<Change>,
): Promise<Saved> {
  const { accountId } = maker;
  return savedOrConflict(workroom, maker, async (turn) => {
    await holdAccount(turn, accountId);
    const row = await holdGown(turn, accountId, id);
    if (row === undefined) throw notFound('gown');
    const before = await savedBefore(turn, row, save);
    if (before !== undefined) return before;
    const { content, drawing, keepAs, ...origin } = await change(turn, row);
    const savedAt = new Date();
    const changed = {
      ...columnsOf(content),
      ...drawing,
      ...origin,
      savedAt,
      savedDevice: maker.device,
      savedSession: maker.sessionId,
    };
    const version = await replaceGown(turn, row, changed);
    if (keepAs !== undefined) await keepForGood(turn, { ...row, ...changed, version }, keepAs);
    const acknowledged = { accountId, saveId: save.saveId, record: id, version, savedAt };
    await acknowledge(turn, acknowledged);
    return savedAs(acknowledged);
  });
}

/** Deletes a gown with all that is kept of it. */
export const deleteGown = (
  { database }: Workroom,
  { accountId }: Maker,
  id: string,
): Promise<Record<string, never>> =>
  database.transaction(async (turn) => {
    await holdAccount(turn, accountId);
    return doneTo('gown', await deleteGownRow(turn, accountId, id));
  });

function refuseOtherEngine(engine: string, row: GownRow): void {
  if (engine === engineVersion || engine === row.engine) return;
  throw new RefusalError(
    'engine-changed',
    'This page draws by older rules than the server. Open it again; what you typed is kept.',
  );
}

/** A save done before; no answer where it is new, and a refusal where it may not be done at all. */
export const lookAhead = (
  workroom: Workroom,
  maker: Maker,
  id: string,
  { engine, ...save }: Save & { readonly engine: string },
): Promise<Saved | undefined> =>
  savedOrConflict(workroom, maker, async (turn) => {
    const row = await findGown(turn, maker.accountId, id);
    if (row === undefined) throw notFound('gown');
    const done = await savedBefore(turn, row, save);
    if (done === undefined) refuseOtherEngine(engine, row);
    return done;
  });

/**
 * Saves what is on the table, drawn by the engine the maker has agreed to. Whether it may be saved at
 * all is looked at before it is drawn, and once more with the gown held.
 */
export async function saveGown(
  workroom: Workroom,
  maker: Maker,
  id: string,
  { engine, content, keepReplaced, ...save }: Received<typeof saving>,
): Promise<Saved> {
  const before = await lookAhead(workroom, maker, id, { engine, ...save });
  if (before !== undefined) return before;
  const fresh =
    engine === engineVersion
      ? await workroom.drafter.drawing(content, lastingTurn(maker.accountId))
      : undefined;
  return changeGown(workroom, maker, id, save, async (turn, row) => {
    refuseOtherEngine(engine, row);
    const redrawn = fresh !== undefined && row.engine !== null && row.engine !== engine;
    if (redrawn) await keepAsRevision(turn, row, `As drawn by engine ${row.engine}`);
    if (keepReplaced) await keepAsRevision(turn, row, `As saved from ${row.savedDevice}`);
    return { content, drawing: fresh ?? kept(row, content) };
  });
}
