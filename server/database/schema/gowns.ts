import { index, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { gownColumns } from './gown-columns.ts';
import { ownedColumns } from './owned-columns.ts';

/** Gowns as they were last saved. */
export const gowns = pgTable(
  'gowns',
  {
    ...ownedColumns(),
    title: text('title').notNull(),
    ...gownColumns(),
    /** The revision it was last returned to. */
    parentId: uuid('parent_id'),
  },
  (table) => [index('gowns_of_account').on(table.accountId, table.savedAt)],
);
