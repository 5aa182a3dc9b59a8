import type { Answer } from '#shared/api/endpoint.ts';
import type { Gown, GownContent, listGowns } from '#shared/api/gowns.ts';
import type { Caller } from '../../http/session.ts';
import { drawnPiecesOf, redrawingOf } from './drawing.ts';
import type { GownRow, ListedGownRow } from './repository.ts';

type Summary = Answer<typeof listGowns>['gowns'][number];

export const contentOf = (
  row: Pick<GownRow, 'typed' | 'unread' | 'card' | 'style' | 'rules'>,
): GownContent => ({
  typed: row.typed,
  unread: row.unread,
  inputs: { card: row.card, style: row.style, rules: row.rules },
});

const summaryOf = (row: ListedGownRow) => ({
  id: row.id,
  title: row.title,
  version: row.version,
  archived: row.archivedAt !== null,
  createdAt: row.createdAt.toISOString(),
  savedAt: row.savedAt.toISOString(),
  drawnBy: row.engine,
  fresh: row.fresh,
});

/** A gown as it stands in a list. */
export const listedGown = (row: ListedGownRow): Summary => ({
  ...summaryOf(row),
  picture: row.picture,
});

/** A gown in full, as the session that asks sees it. */
export const gownView = (row: GownRow, { sessionId }: Pick<Caller, 'sessionId'>): Gown => ({
  ...summaryOf(row),
  content: contentOf(row),
  drawn: drawnPiecesOf(row),
  lastSave: {
    savedAt: row.savedAt.toISOString(),
    device: row.savedDevice,
    here: row.savedSession === sessionId,
  },
  redrawing: redrawingOf(row),
});
