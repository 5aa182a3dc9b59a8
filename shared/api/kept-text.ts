import { z } from 'zod';

/** Characters PostgreSQL cannot keep: the NUL, and halves of a character standing alone. */
const unkeepable = /\0|\p{Cs}/gu;

/** Text of at most so many letters, as the database can keep it. */
export const keptText = (most: number) =>
  z
    .string()
    .max(most)
    .transform((text) => text.replace(unkeepable, '\ufffd'));

/** A title or name in a list: at most 80 letters, and at least one. */
export const givenName = keptText(80)
  .transform((text) => text.trim())
  .pipe(z.string().min(1));
