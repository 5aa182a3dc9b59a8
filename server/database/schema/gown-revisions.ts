import { boolean, index, integer, pgTable, text, timestamp, uuid } from 'drizzle-orm/pg-core';
import { gownColumns } from './gown-columns.ts';
import { gowns } from './gowns.ts';
import { measureCards } from './measure-cards.ts';

/** Copies of a gown that are never written again. */
export const gownRevisions = pgTable(
  'gown_revisions',
  {
    id: uuid('id').primaryKey(),
    gownId: uuid('gown_id')
      .notNull()
      .references(() => gowns.id, { onDelete: 'cascade' }),
    name: text('name').notNull(),
    automatic: boolean('automatic').notNull(),
    /** Version of the gown it copies. */
    version: integer('version').notNull(),
    parentId: uuid('parent_id'),
    /** The measure card that had been laid on it last. */
    cardId: uuid('card_id').references(() => measureCards.id, { onDelete: 'set null' }),
    createdAt: timestamp('created_at', { withTimezone: true }).notNull(),
    ...gownColumns(),
  },
  (table) => [
    index('gown_revisions_of_gown').on(table.gownId, table.createdAt),
    index('gown_revisions_of_card').on(table.cardId),
  ],
);
