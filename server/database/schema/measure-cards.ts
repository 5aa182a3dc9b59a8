import type { CardContent } from '#shared/api/measure-cards.ts';
import { index, jsonb, pgTable, text } from 'drizzle-orm/pg-core';
import { ownedColumns } from './owned-columns.ts';

/** Measure cards a maker keeps, filled in as far as they are. */
export const measureCards = pgTable(
  'measure_cards',
  {
    ...ownedColumns(),
    name: text('name').notNull(),
    typed: jsonb('typed').$type<CardContent['typed']>().notNull(),
    card: jsonb('card').$type<CardContent['card']>().notNull(),
  },
  (table) => [index('measure_cards_of_account').on(table.accountId, table.savedAt)],
);
