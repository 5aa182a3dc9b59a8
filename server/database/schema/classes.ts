import type { DraftedInputs } from '#shared/engine/drafted.ts';
import { index, jsonb, pgTable, text, timestamp, uuid } from 'drizzle-orm/pg-core';
import { accounts } from './accounts.ts';
import { gowns } from './gowns.ts';

/**
 * Replays that are open to whoever has their link. What the link holds is kept as a digest alone; the
 * inputs are a copy without the name and the day, so that nothing of a person is read for a class.
 */
export const classes = pgTable(
  'classes',
  {
    id: uuid('id').primaryKey(),
    accountId: uuid('account_id')
      .notNull()
      .references(() => accounts.id, { onDelete: 'cascade' }),
    gownId: uuid('gown_id')
      .notNull()
      .references(() => gowns.id, { onDelete: 'cascade' }),
    digest: text('digest').notNull().unique(),
    title: text('title').notNull(),
    unit: text('unit').$type<'cm' | 'in'>().notNull(),
    inputs: jsonb('inputs').$type<DraftedInputs>().notNull(),
    step: text('step').notNull(),
    openedAt: timestamp('opened_at', { withTimezone: true }).notNull(),
    expiresAt: timestamp('expires_at', { withTimezone: true }).notNull(),
  },
  (table) => [index('classes_of_account').on(table.accountId, table.openedAt)],
);
