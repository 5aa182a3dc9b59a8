import { index, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { gownColumns } from './gown-columns.ts';
import { measureCards } from './measure-cards.ts';
import { ownedColumns } from './owned-columns.ts';
import { people } from './people.ts';

/** Gowns as they were last saved. */
export const gowns = pgTable(
  'gowns',
  {
    ...ownedColumns(),
    title: text('title').notNull(),
    ...gownColumns(),
    /** The revision it comes from: the one it was last returned to, or regraded from. */
    parentId: uuid('parent_id'),
    /** Whom it is made for; it goes with them. */
    personId: uuid('person_id').references(() => people.id, { onDelete: 'cascade' }),
    /** The measure card that was laid on it last. */
    cardId: uuid('card_id').references(() => measureCards.id, { onDelete: 'set null' }),
  },
  (table) => [
    index('gowns_of_account').on(table.accountId, table.savedAt),
    index('gowns_of_person').on(table.personId),
    index('gowns_of_card').on(table.cardId),
  ],
);
