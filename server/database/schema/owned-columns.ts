import { integer, text, timestamp, uuid } from 'drizzle-orm/pg-core';
import { accounts } from './accounts.ts';

/** What every versioned record of an account has. */
export const ownedColumns = () => ({
  id: uuid('id').primaryKey(),
  accountId: uuid('account_id')
    .notNull()
    .references(() => accounts.id, { onDelete: 'cascade' }),
  version: integer('version').notNull(),
  archivedAt: timestamp('archived_at', { withTimezone: true }),
  createdAt: timestamp('created_at', { withTimezone: true }).notNull(),
  savedAt: timestamp('saved_at', { withTimezone: true }).notNull(),
  savedDevice: text('saved_device').notNull(),
  /** The session may have ended since; no reference. */
  savedSession: text('saved_session').notNull(),
});
