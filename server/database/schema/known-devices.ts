import { index, pgTable, primaryKey, text, timestamp, uuid } from 'drizzle-orm/pg-core';
import { accounts } from './accounts.ts';

/** Browsers an account was signed in on before, by a digest of the cookie that tells one. */
export const knownDevices = pgTable(
  'known_devices',
  {
    accountId: uuid('account_id')
      .notNull()
      .references(() => accounts.id, { onDelete: 'cascade' }),
    device: text('device').notNull(),
    usedAt: timestamp('used_at', { withTimezone: true }).notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.accountId, table.device] }),
    index('known_devices_of_account').on(table.accountId, table.usedAt),
  ],
);
