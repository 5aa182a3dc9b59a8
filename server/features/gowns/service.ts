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
import type { Database } from '../../database/client.ts';
import { acknowledge, type Acknowledged, acknowledgedSave } from '../../database/saves.ts';
import { conflict, notFound, sameSave } from '../../http/conflict.ts';
import { RefusalError } from '../../http/refusal.ts';
import type { Caller } from '../../http/session.ts';
import { type Drawing, drawn, kept, nothingDrawn } from './drawing.ts';
import { contentOf, gownView } from './gown-view.ts';
import { keepAsRevision } from './keep-as-revision.ts';
import { findGown, type GownRow, holdGown, insertGown, replaceGown } from './repository.ts';

/** Whoever saves, as far as it matters here. */
export type Maker = Omit<Caller, 'email'>;

export type Saved = { readonly id: string; readonly version: number; readonly savedAt: string };

export const savedAs = ({ record, version, savedAt }: Acknowledged): Saved => ({
  id: record,
  version,
  savedAt: savedAt.toISOString(),
});

const columnsOf = ({ typed, unread, inputs }: GownContent) => ({ typed, unread, ...inputs });

export async function readGown(database: Database, maker: Maker, id: string): Promise<Gown> {
  const row = await findGown(database, maker.accountId, id);
  if (row === undefined) throw notFound('gown');
  return gownView(row, maker);
}

/** Puts a gown on the server once, however often it is sent. */
async function putGown(
  database: Database,
  maker: Maker,
  saveId: string,
  parts: { readonly title: string; readonly content: GownContent; readonly drawing: Drawing },
): Promise<Saved> {
  const { accountId } = maker;
  const now = new Date();
  const save = { accountId, saveId, record: randomUUID(), version: 1, savedAt: now };
  return database.transaction(async (turn) => {
    if (!(await acknowledge(turn, save))) {
      const before = await acknowledgedSave(turn, accountId, saveId);
      const gown = before && (await findGown(turn, accountId, before.record));
      return savedAs(sameSave(before ?? save, gown?.id, 1));
    }
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
      ...columnsOf(parts.content),
      ...parts.drawing,
    });
    return savedAs(save);
  });
}

export const createGown = (
  database: Database,
  maker: Maker,
  { saveId, title, content }: Received<typeof creation>,
): Promise<Saved> =>
  putGown(database, maker, saveId, { title, content, drawing: drawn(content) ?? nothingDrawn });

export async function duplicateGown(
  database: Database,
  maker: Maker,
  id: string,
  { saveId, title }: Received<typeof duplication>,
): Promise<Saved> {
  const row = await findGown(database, maker.accountId, id);
  if (row === undefined) throw notFound('gown');
  const { engine, draftNumber, drawnFrom, pieces, picture, fresh } = row;
  const drawing = { engine, draftNumber, drawnFrom, pieces, picture, fresh };
  return putGown(database, maker, saveId, { title, content: contentOf(row), drawing });
}

/** What a save makes of the gown it finds. */
export type Change = {
  readonly content: GownContent;
  readonly drawing: Drawing;
  readonly parentId?: string;
};

/**
 * The one way a gown changes: held, so that two saves take turns; a save done before is answered as
 * before; one made from another version is refused.
 */
export async function changeGown(
  database: Database,
  maker: Maker,
  id: string,
  { saveId, baseVersion }: { readonly saveId: string; readonly baseVersion: number },
  change: (turn: Parameters<typeof holdGown>[0], row: GownRow) => Promise<Change>,
): Promise<Saved> {
  const { accountId } = maker;
  return database.transaction(async (turn) => {
    const row = await holdGown(turn, accountId, id);
    if (row === undefined) throw notFound('gown');
    const before = await acknowledgedSave(turn, accountId, saveId);
    if (before !== undefined) return savedAs(sameSave(before, id, baseVersion + 1));
    if (row.version !== baseVersion) throw conflict(row, gownView(row, maker));
    const { content, drawing, ...parent } = await change(turn, row);
    const savedAt = new Date();
    const version = await replaceGown(turn, row, {
      ...columnsOf(content),
      ...drawing,
      ...parent,
      savedAt,
      savedDevice: maker.device,
      savedSession: maker.sessionId,
    });
    const save = { accountId, saveId, record: id, version, savedAt };
    await acknowledge(turn, save);
    return savedAs(save);
  });
}

/** Saves what is on the table, drawn by the engine the maker has agreed to. */
export async function saveGown(
  database: Database,
  maker: Maker,
  id: string,
  { engine, content, keepReplaced, ...save }: Received<typeof saving>,
): Promise<Saved> {
  const isCurrent = engine === engineVersion;
  const fresh = isCurrent ? drawn(content) : undefined;
  return changeGown(database, maker, id, save, async (turn, row) => {
    if (!isCurrent && engine !== row.engine) {
      throw new RefusalError(
        'engine-changed',
        'This page draws by older rules than the server. Open it again; what you typed is kept.',
      );
    }
    const redrawn = fresh !== undefined && row.engine !== null && row.engine !== engine;
    if (redrawn) await keepAsRevision(turn, row, `As drawn by engine ${row.engine}`);
    if (keepReplaced) await keepAsRevision(turn, row, `As saved from ${row.savedDevice}`);
    return { content, drawing: fresh ?? kept(row, content) };
  });
}
