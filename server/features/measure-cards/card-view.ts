import type { Answer } from '#shared/api/endpoint.ts';
import type { KeptCard, listMeasureCards } from '#shared/api/measure-cards.ts';
import { coreMeasures, furtherMeasures } from '#shared/body/card.ts';
import type { Caller } from '../../http/session.ts';
import type { CardUse, OwnedCardRow } from './repository.ts';

type Summary = Answer<typeof listMeasureCards>['cards'][number];

/** A card as it stands in a list. */
export function listedCard(row: OwnedCardRow, uses: readonly CardUse[]): Summary {
  const core = coreMeasures.filter((key) => row.card[key] !== undefined).length;
  const further = furtherMeasures.filter((key) => row.card[key] !== undefined).length;
  return {
    id: row.id,
    name: row.name,
    version: row.version,
    archived: row.archivedAt !== null,
    createdAt: row.createdAt.toISOString(),
    savedAt: row.savedAt.toISOString(),
    taken: { core, all: core + further },
    person: { id: row.personId, name: row.personName },
    takenOn: row.takenOn,
    startedFrom: row.startedFrom,
    usedBy: uses.filter(({ cardId }) => cardId === row.id).map(({ id, title }) => ({ id, title })),
  };
}

/** A card in full, as the session that asks sees it. */
export const cardView = (
  row: OwnedCardRow,
  uses: readonly CardUse[],
  { sessionId }: Pick<Caller, 'sessionId'>,
): KeptCard => ({
  ...listedCard(row, uses),
  content: { typed: row.typed, card: row.card },
  lastSave: {
    savedAt: row.savedAt.toISOString(),
    device: row.savedDevice,
    here: row.savedSession === sessionId,
  },
});
