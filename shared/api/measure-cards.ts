import { z } from 'zod';
import { endpoint } from './endpoint.ts';
import { partCard } from './gowns.ts';
import { givenName } from './kept-text.ts';
import { baseVersion, done, lastSave, saved, saveId, typed } from './saving.ts';

/** A measure card as a maker has filled it in: the letters in the fields, and what can be read of them. */
export const cardContent = z.strictObject({ typed, card: partCard });
export type CardContent = z.output<typeof cardContent>;

/** Years a card may be dated in; others are slips of the keyboard, and no day the database can hold. */
export const cardYears = { first: 1900, last: 2100 } as const;

/** The day a card is dated with, as it may be sent: cards and gowns kept before are read as they are. */
const daySent = z.iso.date().refine(
  (day) => {
    const year = Number(day.slice(0, 4));
    return Number.isNaN(year) || (year >= cardYears.first && year <= cardYears.last);
  },
  { params: { outside: 'card-years' } },
);
const contentSent = cardContent.extend({ card: partCard.extend({ date: daySent.optional() }) });

const summary = {
  id: z.uuid(),
  /** Of the card in the list; whose measures they are stands in the card itself. */
  name: z.string(),
  version: z.int(),
  archived: z.boolean(),
  createdAt: z.iso.datetime(),
  savedAt: z.iso.datetime(),
  /** Measures taken so far, of the core ones and of all. */
  taken: z.object({ core: z.int(), all: z.int() }),
  person: z.object({ id: z.uuid(), name: z.string() }),
  /** Day the measures were taken. */
  takenOn: z.iso.date(),
  /** The card it was copied from as its start. */
  startedFrom: z.uuid().nullable(),
  /** Gowns it was laid on: as long as there are any it is not changed any more. */
  usedBy: z.array(z.object({ id: z.uuid(), title: z.string() })),
};

/** A measure card in full; also what a `conflict` carries as `current`. */
export const keptCardSchema = z.object({ ...summary, content: cardContent, lastSave });
export type KeptCard = z.output<typeof keptCardSchema>;

const params = z.object({ cardId: z.uuid() });
const created = { kind: 'json', schema: z.object({ id: z.uuid(), ...saved.shape }) } as const;
const doneReply = { kind: 'json', schema: done } as const;

/** Every measure card of the account, archived ones too, last saved first. */
export const listMeasureCards = endpoint({
  method: 'GET',
  path: '/api/measure-cards',
  body: undefined,
  reply: { kind: 'json', schema: z.object({ cards: z.array(z.object(summary)) }) },
});

/**
 * Puts a card on the server; it belongs to `personId`, or else to whoever of the maker's list is named
 * on it, who is put on the list where nobody is called so. Without a day it bears the present one.
 */
export const createMeasureCard = endpoint({
  method: 'POST',
  path: '/api/measure-cards',
  body: z.strictObject({
    saveId,
    name: givenName,
    content: contentSent,
    personId: z.uuid().optional(),
  }),
  reply: created,
});

/** Starts the next card of the same person as a copy of this one, taken on another day. */
export const startNextCard = endpoint({
  method: 'POST',
  path: '/api/measure-cards/:cardId/next',
  params: z.object({ cardId: z.uuid() }),
  body: z.strictObject({ saveId, name: givenName, takenOn: daySent }),
  reply: created,
});

/**
 * Says whose card it is after all; gowns it is laid on go along. Refused as `another-person` where a
 * gown would then keep measures of two people, one of them in its revisions.
 */
export const giveMeasureCard = endpoint({
  method: 'POST',
  path: '/api/measure-cards/:cardId/give',
  params: z.object({ cardId: z.uuid() }),
  body: z.strictObject({ personId: z.uuid() }),
  reply: { kind: 'json', schema: done },
});

export const readMeasureCard = endpoint({
  method: 'GET',
  path: '/api/measure-cards/:cardId',
  params,
  body: undefined,
  reply: { kind: 'json', schema: keptCardSchema },
});

/**
 * Saves a card; refused as `card-in-use` once it was laid on a gown. `keepReplaced` puts what is
 * overwritten into the archive as a card of its own (the maker chose hers in a conflict).
 */
export const saveMeasureCard = endpoint({
  method: 'POST',
  path: '/api/measure-cards/:cardId/save',
  params,
  body: z.strictObject({
    saveId,
    baseVersion,
    content: contentSent,
    keepReplaced: z.boolean().default(false),
  }),
  reply: { kind: 'json', schema: saved },
});

/** The name alone; it is no part of what versions guard, the last one given stands. */
export const renameMeasureCard = endpoint({
  method: 'POST',
  path: '/api/measure-cards/:cardId/rename',
  params,
  body: z.strictObject({ name: givenName }),
  reply: doneReply,
});

/** The card for good; refused as `card-in-use` once it was laid on a gown. */
export const deleteMeasureCard = endpoint({
  method: 'POST',
  path: '/api/measure-cards/:cardId/delete',
  params,
  body: undefined,
  reply: doneReply,
});

export const duplicateMeasureCard = endpoint({
  method: 'POST',
  path: '/api/measure-cards/:cardId/duplicate',
  params,
  body: z.strictObject({ saveId, name: givenName }),
  reply: created,
});

export const archiveMeasureCard = endpoint({
  method: 'POST',
  path: '/api/measure-cards/:cardId/archive',
  params,
  body: undefined,
  reply: doneReply,
});

export const unarchiveMeasureCard = endpoint({
  method: 'POST',
  path: '/api/measure-cards/:cardId/unarchive',
  params,
  body: undefined,
  reply: doneReply,
});
