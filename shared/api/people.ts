import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { givenName } from './kept-text.ts';
import { done, saved, saveId } from './saving.ts';

const person = {
  id: z.uuid(),
  name: z.string(),
  createdAt: z.iso.datetime(),
};

/** A person, and which measure cards and gowns are hers; also what a `conflict` carries. */
export const personSchema = z.object({
  ...person,
  cards: z.array(z.uuid()),
  gowns: z.array(z.uuid()),
});
export type Person = z.output<typeof personSchema>;

const params = z.object({ personId: z.uuid() });

/** The maker's own list of people, by name. */
export const listPeople = endpoint({
  method: 'GET',
  path: '/api/people',
  body: undefined,
  reply: {
    kind: 'json',
    schema: z.object({
      people: z.array(
        z.object({
          ...person,
          cards: z.int(),
          gowns: z.int(),
          /** Day of the last card; null where there is none. */
          measuredOn: z.iso.date().nullable(),
        }),
      ),
    }),
  },
});

export const createPerson = endpoint({
  method: 'POST',
  path: '/api/people',
  body: z.strictObject({ saveId, name: givenName }),
  reply: { kind: 'json', schema: z.object({ id: z.uuid(), ...saved.shape }) },
});

export const readPerson = endpoint({
  method: 'GET',
  path: '/api/people/:personId',
  params,
  body: undefined,
  reply: { kind: 'json', schema: personSchema },
});

/** The name alone; the last one given stands. */
export const renamePerson = endpoint({
  method: 'POST',
  path: '/api/people/:personId/rename',
  params,
  body: z.strictObject({ name: givenName }),
  reply: { kind: 'json', schema: done },
});

/**
 * Deletes a person with every card and gown of hers, their revisions too, for good. What is to go is
 * named, as the maker was shown it; where there is more or less by now it is refused as a `conflict`.
 */
export const deletePerson = endpoint({
  method: 'POST',
  path: '/api/people/:personId/delete',
  params,
  body: z.strictObject({ cards: z.array(z.uuid()).max(500), gowns: z.array(z.uuid()).max(500) }),
  reply: { kind: 'json', schema: done },
});
