import type { BustDartPlace, BustDartRule } from './style-card.ts';

/** Each rule for the bust dart in one sentence, with where it comes from. */
export const bustDartRuleWords: { readonly [R in BustDartRule]: string } = {
  cup: 'An eighth of a degree for each millimetre of bust less under-bust; our rule, for any cup.',
  shoulderTable:
    'A width that grows with the bust, after Aldrich, Metric Pattern Cutting (from memory).',
  proportional:
    'A quarter of the bust in cm, less 2.5, in degrees, after Bunka (from memory); best for busts of 78 to 92 cm.',
  lengths:
    'What the front is longer than the back, after a sewing blog of 2012 (seen); measure both lengths.',
};

/** Each place of the bust dart in one sentence. */
export const dartPlaceWords: { readonly [P in BustDartPlace]: string } = {
  shoulder: 'From the middle of the shoulder, as the block is drawn.',
  armhole: 'From where the armhole comes nearest; a round one leaves part of it to the waist.',
  side: 'From the side seam under the bust line, pointing up.',
  waist: 'All in the waist dart, so that one dart shapes the front.',
  neck: 'From the neck, where gathers or a fold may take its place.',
  topLine: 'Straight above the bust point, where a gown has its princess seam and top line.',
};
