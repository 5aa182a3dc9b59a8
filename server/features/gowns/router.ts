import { Router } from 'express';
import {
  archiveGown,
  createGown,
  deleteGown,
  duplicateGown,
  listGowns,
  noteCard,
  readGown,
  regradeGown,
  renameGown,
  saveGown,
  unarchiveGown,
} from '#shared/api/gowns.ts';
import {
  listRevisions,
  nameRevision,
  readRevision,
  returnToRevision,
} from '#shared/api/revisions.ts';
import { addressLimit } from '../../http/address-limit.ts';
import { doneTo } from '../../http/conflict.ts';
import { type Own, serveOwn } from '../../http/serve-own.ts';
import { listedGown } from './gown-view.ts';
import * as regrading from './regrading.ts';
import { listGownRows, setGownArchived, setGownTitle } from './repository.ts';
import * as revisions from './revisions.ts';
import * as service from './service.ts';

export function gownsRouter(own: Own): Router {
  const { database, sessions, limits } = own;
  const router = Router();
  router.use('/api/gowns', addressLimit(limits.savesPerMinute));

  serveOwn(router, sessions, listGowns, async (_body, { caller }) => ({
    gowns: (await listGownRows(database, caller.accountId)).map(listedGown),
  }));
  serveOwn(router, sessions, createGown, (body, { caller }) =>
    service.createGown(own, caller, body),
  );
  serveOwn(router, sessions, readGown, (_body, { caller, params }) =>
    service.readGown(own, caller, params.gownId),
  );
  serveOwn(router, sessions, saveGown, (body, { caller, params }) =>
    service.saveGown(own, caller, params.gownId, body),
  );
  serveOwn(router, sessions, noteCard, (body, { caller, params }) =>
    regrading.noteCard(own, caller, params.gownId, body),
  );
  serveOwn(router, sessions, regradeGown, (body, { caller, params }) =>
    regrading.regradeGown(own, caller, params.gownId, body),
  );
  serveOwn(router, sessions, duplicateGown, (body, { caller, params }) =>
    service.duplicateGown(own, caller, params.gownId, body),
  );
  serveOwn(router, sessions, renameGown, async ({ title }, { caller, params }) =>
    doneTo('gown', await setGownTitle(database, caller.accountId, params.gownId, title)),
  );
  serveOwn(router, sessions, archiveGown, async (_body, { caller, params }) =>
    doneTo('gown', await setGownArchived(database, caller.accountId, params.gownId, new Date())),
  );
  serveOwn(router, sessions, unarchiveGown, async (_body, { caller, params }) =>
    doneTo('gown', await setGownArchived(database, caller.accountId, params.gownId, null)),
  );

  serveOwn(router, sessions, deleteGown, (_body, { caller, params }) =>
    service.deleteGown(own, caller, params.gownId),
  );

  serveOwn(router, sessions, listRevisions, async (_body, { caller, params }) => ({
    revisions: await revisions.listRevisions(database, caller, params.gownId),
  }));
  serveOwn(router, sessions, nameRevision, (body, { caller, params }) =>
    revisions.nameRevision(own, caller, params.gownId, body),
  );
  serveOwn(router, sessions, readRevision, (_body, { caller, params }) =>
    revisions.readRevision(database, caller, params.gownId, params.revisionId),
  );
  serveOwn(router, sessions, returnToRevision, (body, { caller, params }) =>
    revisions.returnToRevision(own, caller, params, body),
  );
  return router;
}
