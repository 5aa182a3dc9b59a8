import { Router } from 'express';
import {
  createPerson,
  deletePerson,
  listPeople,
  readPerson,
  renamePerson,
} from '#shared/api/people.ts';
import { addressLimit } from '../../http/address-limit.ts';
import { doneTo } from '../../http/conflict.ts';
import { type Own, serveOwn } from '../../http/serve-own.ts';
import { listPeopleRows, setPersonName } from './repository.ts';
import * as service from './service.ts';

export function peopleRouter({ database, sessions, limits }: Own): Router {
  const router = Router();
  router.use('/api/people', addressLimit(limits.savesPerMinute));

  serveOwn(router, sessions, listPeople, async (_body, { caller }) => ({
    people: (await listPeopleRows(database, caller.accountId)).map(({ createdAt, ...row }) => ({
      ...row,
      createdAt: createdAt.toISOString(),
    })),
  }));
  serveOwn(router, sessions, createPerson, (body, { caller }) =>
    service.createPerson(database, caller, body),
  );
  serveOwn(router, sessions, readPerson, (_body, { caller, params }) =>
    service.readPerson(database, caller, params.personId),
  );
  serveOwn(router, sessions, renamePerson, async ({ name }, { caller, params }) =>
    doneTo('person', await setPersonName(database, caller.accountId, params.personId, name)),
  );
  serveOwn(router, sessions, deletePerson, (body, { caller, params }) =>
    service.deletePerson(database, caller, params.personId, body),
  );
  return router;
}
