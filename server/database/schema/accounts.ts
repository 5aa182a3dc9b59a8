import { pgTable, text, timestamp, uuid } from 'drizzle-orm/pg-core';

/** People who keep their work here. The address is kept in small letters, so that it is one person's. */
export const accounts = pgTable('accounts', {
  id: uuid('id').primaryKey().defaultRandom(),
  email: text('email').notNull().unique(),
  passwordHash: text('password_hash').notNull(),
  createdAt: timestamp('created_at', { withTimezone: true }).notNull().defaultNow(),
});
