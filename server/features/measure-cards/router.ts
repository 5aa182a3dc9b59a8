import { Router } from 'express';
import {
  archiveMeasureCard,
  createMeasureCard,
  deleteMeasureCard,
  duplicateMeasureCard,
  giveMeasureCard,
  listMeasureCards,
  readMeasureCard,
  renameMeasureCard,
  saveMeasureCard,
  startNextCard,
  unarchiveMeasureCard,
} from '#shared/api/measure-cards.ts';
import { addressLimit } from '../../http/address-limit.ts';
import { doneTo } from '../../http/conflict.ts';
import { type Own, serveOwn } from '../../http/serve-own.ts';
import { listedCard } from './card-view.ts';
import { listCardRows, listCardUses, setCardArchived, setCardName } from './repository.ts';
import * as service from './service.ts';

export function measureCardsRouter({ database, sessions, limits }: Own): Router {
  const router = Router();
  router.use('/api/measure-cards', addressLimit(limits.savesPerMinute));

  serveOwn(router, sessions, listMeasureCards, async (_body, { caller }) => {
    const uses = await listCardUses(database, caller.accountId);
    const rows = await listCardRows(database, caller.accountId);
    return { cards: rows.map((row) => listedCard(row, uses)) };
  });
  serveOwn(router, sessions, createMeasureCard, (body, { caller }) =>
    service.createCard(database, caller, body),
  );
  serveOwn(router, sessions, readMeasureCard, (_body, { caller, params }) =>
    service.readCard(database, caller, params.cardId),
  );
  serveOwn(router, sessions, saveMeasureCard, (body, { caller, params }) =>
    service.saveCard(database, caller, params.cardId, body),
  );
  serveOwn(router, sessions, duplicateMeasureCard, (body, { caller, params }) =>
    service.duplicateCard(database, caller, params.cardId, body),
  );
  serveOwn(router, sessions, startNextCard, (body, { caller, params }) =>
    service.startNextCard(database, caller, params.cardId, body),
  );
  serveOwn(router, sessions, giveMeasureCard, (body, { caller, params }) =>
    service.giveCard(database, caller, params.cardId, body),
  );
  serveOwn(router, sessions, deleteMeasureCard, (_body, { caller, params }) =>
    service.deleteCard(database, caller, params.cardId),
  );
  serveOwn(router, sessions, renameMeasureCard, async ({ name }, { caller, params }) =>
    doneTo('measure card', await setCardName(database, caller.accountId, params.cardId, name)),
  );
  serveOwn(router, sessions, archiveMeasureCard, async (_body, { caller, params }) =>
    doneTo(
      'measure card',
      await setCardArchived(database, caller.accountId, params.cardId, new Date()),
    ),
  );
  serveOwn(router, sessions, unarchiveMeasureCard, async (_body, { caller, params }) =>
    doneTo('measure card', await setCardArchived(database, caller.accountId, params.cardId, null)),
  );
  return router;
}
