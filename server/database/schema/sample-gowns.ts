import type { MeasureCard } from '#shared/body/card.ts';
import type { HouseRules } from '#shared/drafting/house-rules.ts';
import type { StyleCard } from '#shared/drafts/gown/style-card.ts';
import { integer, jsonb, pgTable, text } from 'drizzle-orm/pg-core';

/** Invented bodies and gowns that a visitor may start from. */
export const sampleGowns = pgTable('sample_gowns', {
  id: text('id').primaryKey(),
  position: integer('position').notNull().unique(),
  title: text('title').notNull(),
  note: text('note').notNull(),
  card: jsonb('card').$type<MeasureCard>().notNull(),
  style: jsonb('style').$type<StyleCard>().notNull(),
  rules: jsonb('rules').$type<HouseRules>().notNull(),
});
