import { sql } from 'drizzle-orm';
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
    card: {
      name: 'Tamsin Orrell',
      date: '2026-10-06',
      bustGirth: 826,
      underbustGirth: 708,
      waistGirth: 645,
      hipGirth: 884,
      bustSpan: 172,
      sideNeckToBustPoint: 246,
      sideNeckToUnderbust: 308,
      frontWaistLength: 404,
      waistToHip: 190,
      waistToFloor: 952,
    },
    style: { heelHeight: 10 },
    rules: houseRulePresets.balanced,
  },
  {
    id: 'judith',
    position: 2,
    title: 'Judith, middle figure',
    note: 'A gala dinner in November with a little dancing: the plain case a class begins with.',
    card: {
      name: 'Judith Amsel',
      date: '2026-10-12',
      bustGirth: 920,
      underbustGirth: 780,
      waistGirth: 738,
      hipGirth: 990,
      bustSpan: 190,
      sideNeckToBustPoint: 275,
      sideNeckToUnderbust: 345,
      frontWaistLength: 440,
      waistToHip: 205,
      waistToFloor: 1050,
    },
    style: { heelHeight: 60 },
    rules: houseRulePresets.balanced,
  },
  {
    id: 'bridget',
    position: 3,
    title: 'Bridget, full bust',
    note: 'Singing at the winter concert. The gown must hold without straps, so the top edge is drawn close.',
    card: {
      name: 'Bridget Tallow',
      date: '2026-11-02',
      bustGirth: 1084,
      underbustGirth: 866,
      waistGirth: 904,
      hipGirth: 1082,
      bustSpan: 216,
      sideNeckToBustPoint: 309,
      sideNeckToUnderbust: 394,
      frontWaistLength: 480,
      waistToHip: 210,
      waistToFloor: 1062,
    },
    style: { heelHeight: 45, kneeLevel: 80 },
    rules: houseRulePresets.balanced,
  },
  {
    id: 'lotte',
    position: 4,
    title: 'Lotte, fuller hip',
    note: 'A summer ball. Wide hips over a small waist: the side seam has the most to do here.',
    card: {
      name: 'Lotte Verbruin',
      date: '2026-11-14',
      bustGirth: 902,
      underbustGirth: 772,
      waistGirth: 722,
      hipGirth: 1092,
      bustSpan: 186,
      sideNeckToBustPoint: 270,
      sideNeckToUnderbust: 339,
      frontWaistLength: 434,
      waistToHip: 214,
      waistToFloor: 1046,
    },
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
