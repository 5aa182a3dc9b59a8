import { z } from 'zod';
import { keptText } from './kept-text.ts';

/**
 * Number the browser gives a save, new for each and the same when it is sent again: an acknowledged
 * save that is repeated answers as before and does nothing twice.
 */
export const saveId = z.uuid().describe('A random UUID, kept until the save is acknowledged.');

/** The version a save was made from; where the server has another, the save is refused as a `conflict`. */
export const baseVersion = z.int().min(1);

/** Dotted key of a field, as problems name it: `card.bustGirth`, `style.ease.waist`. */
export const fieldKey = z.string().regex(/^[A-Za-z][A-Za-z.-]{0,47}$/);

/** What the fields of the table hold letter for letter, so that what cannot be read yet is kept as well. */
export const typed = z.strictObject({
  unit: z.enum(['cm', 'in']),
  fields: z.record(fieldKey, keptText(200)).refine((fields) => Object.keys(fields).length <= 120),
});

/** An acknowledged save. */
export const saved = z.object({ version: z.int(), savedAt: z.iso.datetime() });

/** Where and when a record was last saved; `here` tells this session from another one. */
export const lastSave = z.object({
  savedAt: z.iso.datetime(),
  device: z.string(),
  here: z.boolean(),
});

/** For endpoints whose doing is their whole answer. */
export const done = z.object({});
