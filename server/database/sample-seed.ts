import { sql } from 'drizzle-orm';
import { sampleCards } from '#shared/body/sample-cards.ts';
import { houseRulePresets } from '#shared/drafting/house-rule-presets.ts';
import type { Database } from './client.ts';
import { sampleGowns } from './schema/sample-gowns.ts';

type SampleRow = typeof sampleGowns.$inferInsert;

/** Four bodies that ask for different drafts. All people and measures are invented. */
export const sampleSeed: readonly SampleRow[] = [
  {
    id: 'tamsin',
    position: 1,
    title: 'Tamsin, petite',
    note: 'A registry wedding in May, flat shoes. Short from shoulder to waist, so every level sits high.',
    card: sampleCards.tamsin,
    style: { heelHeight: 10 },
    rules: houseRulePresets.balanced,
  },
  {
    id: 'judith',
    position: 2,
    title: 'Judith, middle figure',
    note: 'A gala dinner in November with a little dancing: the plain case a class begins with.',
    card: sampleCards.judith,
    style: { heelHeight: 60 },
    rules: houseRulePresets.balanced,
  },
  {
    id: 'bridget',
    position: 3,
    title: 'Bridget, full bust',
    note: 'Singing at the winter concert. The gown must hold without straps, so the top edge is drawn close.',
    card: sampleCards.bridget,
    style: { heelHeight: 45, kneeLevel: 80 },
    rules: houseRulePresets.balanced,
  },
  {
    id: 'lotte',
    position: 4,
    title: 'Lotte, fuller hip',
    note: 'A summer ball. Wide hips over a small waist: the side seam has the most to do here.',
    card: sampleCards.lotte,
    style: { heelHeight: 70 },
    rules: houseRulePresets.balanced,
  },
];

/** Writes the samples as they stand here; a second time changes nothing. */
export async function seedSamples(database: Database): Promise<void> {
  await database
    .insert(sampleGowns)
    .values([...sampleSeed])
    .onConflictDoUpdate({
      target: sampleGowns.id,
      set: {
        position: sql`excluded.position`,
        title: sql`excluded.title`,
        note: sql`excluded.note`,
        card: sql`excluded.card`,
        style: sql`excluded.style`,
        rules: sql`excluded.rules`,
      },
    });
}
