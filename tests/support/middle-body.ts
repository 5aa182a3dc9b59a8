import type { MeasureCard } from '#shared/body/card.ts';

/** A middle body invented by us, ten core measures, for examples in tests. */
export const middleBody: MeasureCard = {
  name: 'Test body',
  date: '2026-11-14',
  bustGirth: 920,
  underbustGirth: 770,
  waistGirth: 730,
  hipGirth: 990,
  bustSpan: 200,
  sideNeckToBustPoint: 265,
  sideNeckToUnderbust: 345,
  frontWaistLength: 435,
  waistToHip: 205,
  waistToFloor: 1040,
};
