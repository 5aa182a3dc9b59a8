import { integer, pgTable, text, timestamp } from 'drizzle-orm/pg-core';

/** How often a sign-in failed for an account or from an address, by a digest of either. */
export const signInAttempts = pgTable('sign_in_attempts', {
  key: text('key').primaryKey(),
  count: integer('count').notNull(),
  since: timestamp('since', { withTimezone: true }).notNull(),
});
