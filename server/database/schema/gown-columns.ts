import type { DrawnPieces, GownContent, Picture } from '#shared/api/gowns.ts';
import type { Garment } from '#shared/engine/drafted.ts';
import { boolean, jsonb, text } from 'drizzle-orm/pg-core';

/** The three inputs as typed and as read, and the last pieces drawn, with what they were drawn from. */
export const gownColumns = () => ({
  typed: jsonb('typed').$type<GownContent['typed']>().notNull(),
  unread: jsonb('unread').$type<GownContent['unread']>().notNull(),
  garment: text('garment').$type<Garment>().notNull().default('gown'),
  card: jsonb('card').$type<GownContent['inputs']['card']>().notNull(),
  style: jsonb('style').$type<GownContent['inputs']['style']>().notNull(),
  rules: jsonb('rules').$type<GownContent['inputs']['rules']>().notNull(),
  /** Null as long as nothing could be drawn; then all of the next four are. */
  engine: text('engine'),
  draftNumber: text('draft_number'),
  drawnFrom: jsonb('drawn_from').$type<DrawnPieces['inputs']>(),
  pieces: jsonb('pieces').$type<DrawnPieces['pieces']>(),
  /** Whether the pieces are those of the three inputs above. */
  fresh: boolean('fresh').notNull(),
  picture: jsonb('picture').$type<Picture>(),
});
