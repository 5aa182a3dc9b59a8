import { randomUUID } from 'node:crypto';
import type { Received } from '#shared/api/endpoint.ts';
import type {
  createPerson as creation,
  deletePerson as deletion,
  Person,
} from '#shared/api/people.ts';
import { holdAccount } from '../../database/account-hold.ts';
import type { Database, Store } from '../../database/client.ts';
import { acknowledge, type Acknowledged, acknowledgedSave } from '../../database/saves.ts';
import { notFound, sameSave } from '../../http/conflict.ts';
import { mostKept, refuseOneTooMany } from '../../http/most-kept.ts';
import { RefusalError } from '../../http/refusal.ts';
import type { Caller } from '../../http/session.ts';
import {
  countPeople,
  dropPerson,
  findPerson,
  holdPerson,
  insertPerson,
  ownedBy,
  type PersonRow,
} from './repository.ts';

type Saved = { readonly id: string; readonly version: number; readonly savedAt: string };

const savedAs = ({ record, version, savedAt }: Acknowledged): Saved => ({
  id: record,
  version,
  savedAt: savedAt.toISOString(),
});

const view = async (store: Store, row: PersonRow): Promise<Person> => ({
  id: row.id,
  name: row.name,
  createdAt: row.createdAt.toISOString(),
  ...(await ownedBy(store, row)),
});

export async function readPerson(
  database: Database,
  { accountId }: Caller,
  id: string,
): Promise<Person> {
  const row = await findPerson(database, accountId, id);
  if (row === undefined) throw notFound('person');
  return view(database, row);
}

/** Puts a person on the list once, however often it is sent. */
export async function createPerson(
  database: Database,
  { accountId }: Caller,
  { saveId, name }: Received<typeof creation>,
): Promise<Saved> {
  const savedAt = new Date();
  const save = { accountId, saveId, record: randomUUID(), version: 1, savedAt };
  return database.transaction(async (turn) => {
    await holdAccount(turn, accountId);
    if (!(await acknowledge(turn, save))) {
      const before = await acknowledgedSave(turn, accountId, saveId);
      const person = before && (await findPerson(turn, accountId, before.record));
      return savedAs(sameSave(before ?? save, person?.id, 1));
    }
    refuseOneTooMany('people', await countPeople(turn, accountId), mostKept.people);
    await insertPerson(turn, { id: save.record, accountId, name, createdAt: savedAt });
    return savedAs(save);
  });
}

const sameIds = (a: readonly string[], b: readonly string[]): boolean =>
  [...a].sort().join() === [...b].sort().join();

/** Deletes a person with all that is hers, where that is what the maker was shown. */
export async function deletePerson(
  database: Database,
  { accountId }: Caller,
  id: string,
  named: Received<typeof deletion>,
): Promise<Record<string, never>> {
  return database.transaction(async (turn) => {
    await holdAccount(turn, accountId);
    const row = await holdPerson(turn, accountId, id);
    if (row === undefined) throw notFound('person');
    const current = await view(turn, row);
    if (!sameIds(named.cards, current.cards) || !sameIds(named.gowns, current.gowns)) {
      throw new RefusalError(
        'conflict',
        'Cards or gowns have come or gone meanwhile. Nothing has been deleted: look at what goes, and delete again.',
        { current },
      );
    }
    await dropPerson(turn, row);
    return {};
  });
}
