import { Router } from 'express';
import {
  followClass,
  listClasses,
  openClass,
  turnClass,
  visitClass,
  withdrawClass,
} from '#shared/api/classes.ts';
import type { Database } from '../../database/client.ts';
import { addressLimit } from '../../http/address-limit.ts';
import { doneTo } from '../../http/conflict.ts';
import { serve } from '../../http/serve.ts';
import { type Own, serveOwn } from '../../http/serve-own.ts';
import type { Limits } from '../../settings.ts';
import { deleteClass, setClassStep } from './repository.ts';
import * as service from './service.ts';

/**
 * What a class sees without an account. It stands before the limit all other requests share: a whole
 * class sits behind one address, and each of them asks every other second where the tutor stands.
 */
export function classVisitsRouter(database: Database, limits: Limits): Router {
  const router = Router();
  router.use('/api/class-visits', addressLimit(limits.classVisitsPerMinute));
  serve(router, visitClass, (_body, { params }) => service.visit(database, params.token));
  serve(router, followClass, async (_body, { params }) => ({
    step: await service.tutorsStep(database, params.token),
  }));
  return router;
}

/** Classes of one's own: opened, turned, withdrawn. */
export function lessonsRouter({ database, sessions, limits }: Own): Router {
  const router = Router();
  router.use('/api/classes', addressLimit(limits.savesPerMinute));
  serveOwn(router, sessions, openClass, (body, { caller, params }) =>
    service.openClass(database, caller.accountId, params.gownId, body),
  );
  serveOwn(router, sessions, listClasses, async (_body, { caller }) => ({
    classes: await service.listClasses(database, caller.accountId),
  }));
  serveOwn(router, sessions, turnClass, async ({ step }, { caller, params }) =>
    doneTo(
      'class',
      await setClassStep(database, caller.accountId, params.classId, step, new Date()),
    ),
  );
  serveOwn(router, sessions, withdrawClass, async (_body, { caller, params }) =>
    doneTo('class', await deleteClass(database, caller.accountId, params.classId)),
  );
  return router;
}
