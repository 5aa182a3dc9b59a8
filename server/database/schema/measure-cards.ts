import type { CardContent } from '#shared/api/measure-cards.ts';
import { date, index, jsonb, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { ownedColumns } from './owned-columns.ts';
import { people } from './people.ts';

/** Measure cards a maker keeps, filled in as far as they are. */
export const measureCards = pgTable(
  'measure_cards',
  {
    ...ownedColumns(),
    name: text('name').notNull(),
    /** Whose measures they are. */
    personId: uuid('person_id')
      .notNull()
      .references(() => people.id, { onDelete: 'cascade' }),
    /** Day they were taken. */
    takenOn: date('taken_on').notNull(),
    /** The card it was copied from as its start; that one may be gone since. */
    startedFrom: uuid('started_from'),
    typed: jsonb('typed').$type<CardContent['typed']>().notNull(),
    card: jsonb('card').$type<CardContent['card']>().notNull(),
  },
  (table) => [
    index('measure_cards_of_account').on(table.accountId, table.savedAt),
    index('measure_cards_of_person').on(table.personId, table.takenOn),
  ],
);
