import { z } from 'zod';
import type { DepthKey } from '../regrade/style-depths.ts';
import { bodiceBlockCard, skirtBlockCard } from './block-style.ts';
import { longestReason, measureCard, overruledWith } from './card.ts';
import { endpoint } from './endpoint.ts';
import { givenName, keptText } from './kept-text.ts';
import { pieceSchema } from './piece-reply.ts';
import { redrawing } from './redrawing.ts';
import { houseRules } from './rules.ts';
import { baseVersion, done, lastSave, fieldKey, saved, saveId, typed } from './saving.ts';
import { styleCard } from './style.ts';

/** A measure card as far as it has been filled in. */
export const partCard = measureCard.partial().extend({
  name: keptText(80).optional(),
  overruled: overruledWith(keptText(longestReason)),
});

/** The garment of what is kept, and its style card; gowns kept before there were blocks name none. */
const ofGown = { garment: z.literal('gown').optional(), style: styleCard };
const ofBodiceBlock = { garment: z.literal('bodice-block'), style: bodiceBlockCard };
const ofSkirtBlock = { garment: z.literal('skirt-block'), style: skirtBlockCard };

const onTable = { card: partCard, rules: houseRules };
const drawnFrom = { card: measureCard, rules: houseRules };

/**
 * What a maker has put on the table: the letters in the fields, and what they mean where they can be
 * read. It may be incomplete or impossible; it is kept all the same. While a field is `unread` nothing
 * is drawn, as its default would stand for what she is typing.
 */
export const gownContent = z.strictObject({
  typed,
  unread: z.array(fieldKey).max(120),
  inputs: z.discriminatedUnion('garment', [
    z.strictObject({ ...onTable, ...ofGown }),
    z.strictObject({ ...onTable, ...ofBodiceBlock }),
    z.strictObject({ ...onTable, ...ofSkirtBlock }),
  ]),
});
export type GownContent = z.output<typeof gownContent>;

/** A gown as it is put on the server for the first time. */
export const gownCreation = z.strictObject({
  saveId,
  title: givenName,
  content: gownContent,
  /** The measure card it is drawn from; it is then that person's gown. */
  cardId: z.uuid().optional(),
});

/** Outlines of the pieces as one SVG path in a box from 0, 0; whole numbers, a few hundred letters. */
const picture = z.object({ width: z.number(), height: z.number(), path: z.string() });
export type Picture = z.output<typeof picture>;

const summary = {
  id: z.uuid(),
  title: z.string(),
  version: z.int(),
  archived: z.boolean(),
  createdAt: z.iso.datetime(),
  savedAt: z.iso.datetime(),
  /** Engine that drew the pieces; null where nothing could be drawn yet. */
  drawnBy: z.string().nullable(),
  /** Whether the pieces are those of the inputs as they stand; else they are the last good ones. */
  fresh: z.boolean(),
  /** Whom it is made for, and the measure card that was laid on it last. */
  personId: z.uuid().nullable(),
  cardId: z.uuid().nullable(),
};

/** The pieces a gown keeps, and what they were drawn from. */
export const drawnPieces = z.object({
  engine: z.string(),
  /** Number printed on every piece. */
  number: z.string(),
  inputs: z.discriminatedUnion('garment', [
    z.object({ ...drawnFrom, ...ofGown }),
    z.object({ ...drawnFrom, ...ofBodiceBlock }),
    z.object({ ...drawnFrom, ...ofSkirtBlock }),
  ]),
  pieces: z.array(pieceSchema),
});
export type DrawnPieces = z.output<typeof drawnPieces>;

/** A gown in full; also what a `conflict` carries as `current`. */
export const gownSchema = z.object({
  ...summary,
  content: gownContent,
  drawn: drawnPieces.nullable(),
  lastSave,
  /** Where an older engine drew it: what the current one would draw otherwise. Null where there is nothing to decide. */
  redrawing: redrawing.nullable(),
});
export type Gown = z.output<typeof gownSchema>;

const params = z.object({ gownId: z.uuid() });
const doneReply = { kind: 'json', schema: done } as const;

/** Every gown of the account, archived ones too, last saved first. */
export const listGowns = endpoint({
  method: 'GET',
  path: '/api/gowns',
  body: undefined,
  reply: {
    kind: 'json',
    schema: z.object({
      gowns: z.array(z.object({ ...summary, picture: picture.nullable() })),
    }),
  },
});

export const createGown = endpoint({
  method: 'POST',
  path: '/api/gowns',
  body: gownCreation,
  reply: { kind: 'json', schema: z.object({ id: z.uuid(), ...saved.shape }) },
});

export const readGown = endpoint({
  method: 'GET',
  path: '/api/gowns/:gownId',
  params,
  body: undefined,
  reply: { kind: 'json', schema: gownSchema },
});

/**
 * Saves what is on the table. `engine` is the one the gown is to be drawn by: the current one draws
 * the pieces anew where the inputs allow it; the one that drew the gown keeps its pieces as they are.
 * `keepReplaced` keeps what is overwritten as a revision (the maker chose hers in a conflict).
 */
export const saveGown = endpoint({
  method: 'POST',
  path: '/api/gowns/:gownId/save',
  params,
  body: z.strictObject({
    saveId,
    baseVersion,
    engine: z.string().max(20),
    content: gownContent,
    keepReplaced: z.boolean().default(false),
  }),
  reply: { kind: 'json', schema: saved },
});

/**
 * Notes that a measure card was laid on the gown, which is then that person's; from now on the card is
 * not changed any more. Refused as `another-person` where the gown is somebody else's.
 */
export const noteCard = endpoint({
  method: 'POST',
  path: '/api/gowns/:gownId/card',
  params,
  body: z.strictObject({ cardId: z.uuid() }),
  reply: doneReply,
});

/**
 * Redraws what is kept for another measure card, a gown with its depths as given. What stood there is kept as a
 * revision, and the gown as regraded is kept as a revision that names it as its parent.
 */
export const regradeGown = endpoint({
  method: 'POST',
  path: '/api/gowns/:gownId/regrade',
  params,
  body: z.strictObject({
    saveId,
    baseVersion,
    engine: z.string().max(20),
    cardId: z.uuid(),
    /** Depths of a gown's top edge on the other body, mm; one left out stays as the style card has it. */
    depths: z.strictObject({
      topDrop: z.number().optional(),
      neckDepth: z.number().optional(),
      sideDepth: z.number().optional(),
      backDepth: z.number().optional(),
    }) satisfies z.ZodType<{ readonly [K in DepthKey]?: number | undefined }>,
  }),
  reply: { kind: 'json', schema: saved },
});

/** The title alone; it is no part of what versions guard, the last one given stands. */
export const renameGown = endpoint({
  method: 'POST',
  path: '/api/gowns/:gownId/rename',
  params,
  body: z.strictObject({ title: givenName }),
  reply: doneReply,
});

/** A gown of its own with the same content and pieces; revisions stay with the first. */
export const duplicateGown = endpoint({
  method: 'POST',
  path: '/api/gowns/:gownId/duplicate',
  params,
  body: z.strictObject({ saveId, title: givenName }),
  reply: { kind: 'json', schema: z.object({ id: z.uuid(), ...saved.shape }) },
});

export const archiveGown = endpoint({
  method: 'POST',
  path: '/api/gowns/:gownId/archive',
  params,
  body: undefined,
  reply: doneReply,
});

/** The gown for good, with its pieces, its revisions and what is shared of it. */
export const deleteGown = endpoint({
  method: 'POST',
  path: '/api/gowns/:gownId/delete',
  params,
  body: undefined,
  reply: doneReply,
});

export const unarchiveGown = endpoint({
  method: 'POST',
  path: '/api/gowns/:gownId/unarchive',
  params,
  body: undefined,
  reply: doneReply,
});
