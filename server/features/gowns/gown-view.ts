import type { Answer } from '#shared/api/endpoint.ts';
import type { Gown, GownContent, listGowns } from '#shared/api/gowns.ts';
import { engineVersion } from '#shared/engine/draft-gown.ts';
import type { Caller } from '../../http/session.ts';
import type { Drafter } from '../../drafting/drafter.ts';
import { lastingTurn } from '../../http/turn-of.ts';
import { drawnPiecesOf } from './drawing.ts';
import type { GownRow, ListedGownRow } from './repository.ts';

type Summary = Answer<typeof listGowns>['gowns'][number];

export const contentOf = (
  row: Pick<GownRow, 'typed' | 'unread' | 'garment' | 'card' | 'style' | 'rules'>,
): GownContent => ({
  typed: row.typed,
  unread: row.unread,
  inputs: keptInputs(row),
});

/** The style was kept beside the garment it is of. */
function keptInputs({
  garment,
  card,
  style,
  rules,
}: Pick<GownRow, 'garment' | 'card' | 'style' | 'rules'>): GownContent['inputs'] {
  return {
    ...(garment === 'gown' ? {} : { garment }),
    card,
    style,
    rules,
  };
}

const summaryOf = (row: ListedGownRow) => ({
  id: row.id,
  title: row.title,
  version: row.version,
  archived: row.archivedAt !== null,
  createdAt: row.createdAt.toISOString(),
  savedAt: row.savedAt.toISOString(),
  drawnBy: row.engine,
  fresh: row.fresh,
  personId: row.personId,
  cardId: row.cardId,
});

/** A gown as it stands in a list. */
export const listedGown = (row: ListedGownRow): Summary => ({
  ...summaryOf(row),
  picture: row.picture,
});

/** A gown in full, as the session that asks sees it. */
export async function gownView(
  row: GownRow,
  { accountId, sessionId }: Pick<Caller, 'accountId' | 'sessionId'>,
  drafter: Drafter,
): Promise<Gown> {
  const drawn = drawnPiecesOf(row);
  const isOlder = drawn !== null && drawn.engine !== engineVersion;
  return {
    ...summaryOf(row),
    content: contentOf(row),
    drawn,
    lastSave: {
      savedAt: row.savedAt.toISOString(),
      device: row.savedDevice,
      here: row.savedSession === sessionId,
    },
    redrawing: isOlder ? await drafter.redrawing(drawn, lastingTurn(accountId)) : null,
  };
}
