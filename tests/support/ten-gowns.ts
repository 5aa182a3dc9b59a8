import type { MeasureCard } from '#shared/body/card.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import type { Draft } from '#shared/engine/draft.ts';
import type { StyleCard } from '#shared/drafts/gown/style-card.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { middleBody } from './middle-body.ts';

/** A slight body and a full one, invented by us. */
const slight: MeasureCard = {
  name: 'Slight body',
  date: '2026-11-14',
  bustGirth: 840,
  underbustGirth: 720,
  waistGirth: 650,
  hipGirth: 900,
  bustSpan: 180,
  sideNeckToBustPoint: 250,
  sideNeckToUnderbust: 325,
  frontWaistLength: 420,
  waistToHip: 200,
  waistToFloor: 1010,
};
const full: MeasureCard = {
  name: 'Full body',
  date: '2026-11-14',
  bustGirth: 1080,
  underbustGirth: 920,
  waistGirth: 900,
  hipGirth: 1140,
  bustSpan: 224,
  sideNeckToBustPoint: 292,
  sideNeckToUnderbust: 375,
  frontWaistLength: 455,
  waistToHip: 215,
  waistToFloor: 1060,
};

const gowns: readonly (readonly [string, MeasureCard, StyleCard])[] = [
  ['demo gown', middleBody, {}],
  ['demo gown with darts', middleBody, { shaping: 'darts' }],
  ['straight top, three quarter circle', middleBody, { topLine: 'straight', flareFraction: 0.75 }],
  ['short flare', middleBody, { flareLength: 300 }],
  ['slight body', slight, {}],
  ['slight body, darts, quarter circle', slight, { shaping: 'darts', flareFraction: 0.25 }],
  ['slight body, scooped, short', slight, { topLine: 'scooped', flareLength: 350 }],
  ['full body', full, {}],
  ['full body, darts', full, { shaping: 'darts' }],
  ['full body, narrow cloth', full, { clothWidth: 1000, flareLength: 420 }],
];

/** Ten gowns of three bodies, each with its name. */
export const tenGowns = (): readonly { readonly name: string; readonly draft: Draft }[] =>
  gowns.map(([name, card, style]) => ({
    name,
    draft: draftGown({ card, style, rules: balanced }),
  }));
