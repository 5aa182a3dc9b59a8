import type { Answer, Received } from '#shared/api/endpoint.ts';
import type {
  listRevisions as listing,
  nameRevision as naming,
  readRevision as reading,
  returnToRevision as returning,
} from '#shared/api/revisions.ts';
import { holdAccount } from '../../database/account-hold.ts';
import type { Database } from '../../database/client.ts';
import { acknowledge, acknowledgedSave } from '../../database/saves.ts';
import { notFound, sameSave } from '../../http/conflict.ts';
import { mostKept, refuseOneTooMany } from '../../http/most-kept.ts';
import { drawnPiecesOf } from './drawing.ts';
import { contentOf } from './gown-view.ts';
import { copyOf, keepAsRevision } from './keep-as-revision.ts';
import { findGown, holdGown } from './repository.ts';
import {
  countNamedRevisions,
  findRevision,
  insertRevision,
  type ListedRevisionRow,
  listRevisionRows,
} from './revision-repository.ts';
import { changeGown, type Saved } from './service.ts';
import {
  type Maker,
  OtherVersionError,
  savedOrConflict,
  type Workroom,
} from './saved-or-conflict.ts';

type Listed = Answer<typeof listing>['revisions'][number];

const listed = (row: ListedRevisionRow): Listed => ({
  id: row.id,
  name: row.name,
  automatic: row.automatic,
  version: row.version,
  parentId: row.parentId,
  cardId: row.cardId,
  createdAt: row.createdAt.toISOString(),
  drawnBy: row.engine,
});

export async function listRevisions(
  database: Database,
  { accountId }: Maker,
  gownId: string,
): Promise<Listed[]> {
  if ((await findGown(database, accountId, gownId)) === undefined) throw notFound('gown');
  return (await listRevisionRows(database, accountId, gownId)).map(listed);
}

export async function readRevision(
  database: Database,
  { accountId }: Maker,
  gownId: string,
  revisionId: string,
): Promise<Answer<typeof reading>> {
  const row = await findRevision(database, accountId, gownId, revisionId);
  if (row === undefined) throw notFound('revision');
  return { ...listed(row), content: contentOf(row), drawn: drawnPiecesOf(row) };
}

/** Names a gown as it was last saved. */
export async function nameRevision(
  workroom: Workroom,
  maker: Maker,
  gownId: string,
  { saveId, baseVersion, name }: Received<typeof naming>,
): Promise<Listed> {
  const { accountId } = maker;
  return savedOrConflict(workroom, maker, async (turn) => {
    await holdAccount(turn, accountId);
    const row = await holdGown(turn, accountId, gownId);
    if (row === undefined) throw notFound('gown');
    const before = await acknowledgedSave(turn, accountId, saveId);
    if (before !== undefined) {
      const made = await findRevision(turn, accountId, gownId, before.record);
      sameSave(before, made?.id, baseVersion);
      if (made !== undefined) return listed(made);
    }
    if (row.version !== baseVersion) throw new OtherVersionError(row);
    refuseOneTooMany(
      'named revisions of one gown',
      await countNamedRevisions(turn, gownId),
      mostKept.namedRevisions,
    );
    const revision = copyOf(row, name, false);
    await insertRevision(turn, revision);
    const { id: record, version, createdAt: savedAt } = revision;
    await acknowledge(turn, { accountId, saveId, record, version, savedAt });
    return listed(revision);
  });
}

/** Makes a revision the gown again; what stood there is kept. */
export const returnToRevision = (
  workroom: Workroom,
  maker: Maker,
  { gownId, revisionId }: { readonly gownId: string; readonly revisionId: string },
  save: Received<typeof returning>,
): Promise<Saved> =>
  changeGown(workroom, maker, gownId, save, async (turn, row) => {
    const revision = await findRevision(turn, maker.accountId, gownId, revisionId);
    if (revision === undefined) throw notFound('revision');
    await keepAsRevision(turn, row, `Before returning to ${revision.name}`);
    const { engine, draftNumber, drawnFrom, pieces, picture, fresh } = revision;
    return {
      content: contentOf(revision),
      drawing: { engine, draftNumber, drawnFrom, pieces, picture, fresh },
      parentId: revisionId,
      cardId: revision.cardId,
    };
  });
