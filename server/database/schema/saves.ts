import { index, integer, pgTable, primaryKey, timestamp, uuid } from 'drizzle-orm/pg-core';
import { accounts } from './accounts.ts';

/**
 * Every save that was acknowledged, under the number its browser gave it: one that is sent again is
 * answered from here. `record` is the gown, measure card or revision it made or changed.
 */
export const saves = pgTable(
  'saves',
  {
    accountId: uuid('account_id')
      .notNull()
      .references(() => accounts.id, { onDelete: 'cascade' }),
    saveId: uuid('save_id').notNull(),
    record: uuid('record').notNull(),
    version: integer('version').notNull(),
    savedAt: timestamp('saved_at', { withTimezone: true }).notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.accountId, table.saveId] }),
    index('saves_of_record').on(table.record),
  ],
);
