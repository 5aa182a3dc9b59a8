import { z } from 'zod';

/** Characters PostgreSQL cannot keep: the NUL, and halves of a character standing alone. */
const unkeepable = /\0|\p{Cs}/gu;

/** Text of at most so many letters, as the database can keep it. */
export const keptText = (most: number) =>
  z
    .string()
    .max(most)
    .transform((text) => text.replace(unkeepable, '\ufffd'));

/** Characters that would break a line, or turn round what stands beside a name in a list. */
const unruly = /[\p{Cc}\p{Bidi_Control}]+/gu;
/** A character with something to see. */
const seen = /[^\p{C}\p{Z}\p{Default_Ignorable_Code_Point}]/u;

/** A title or name in a list: at most 80 letters, and at least one that can be seen. */
export const givenName = keptText(80)
  .transform((text) => text.replace(unruly, ' ').trim())
  .transform((text) => (seen.test(text) ? text : ''))
  .pipe(z.string().min(1));
