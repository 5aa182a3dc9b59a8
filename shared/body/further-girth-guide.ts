import { figureHeights as at, type Measure } from './measure.ts';

/**
 * The girths that are estimated when nobody has taken them. Bounds take in the extremes of both data
 * sets of reference.md section 1 where they list the measure; the rest are common practice, no source.
 */
export const furtherGirthGuide: {
  readonly [
    K in
      | 'upperChestGirth'
      | 'waistSeamGirth'
      | 'neckGirth'
      | 'topHipGirth'
      | 'kneeGirth'
      | 'bothKneesGirth'
      | 'upperArmGirth'
      | 'shoulderGirth'
      | 'wristGirth'
  ]: Measure;
} = {
  upperChestGirth: {
    label: 'Upper chest',
    term: 'Upper chest girth',
    how: 'Close under the armpits and above the breasts, the tape rising a little at the back.',
    min: 620,
    max: 1380,
    tolerance: 10,
    kind: 'length',
    tape: { kind: 'girth', view: 'front', at: at.upperChest },
  },
  waistSeamGirth: {
    label: 'Waist seam girth',
    term: 'Girth at the raised waist seam',
    how: 'Level round the ribs where the seam will lie: three inches (7.6 cm) above the waist cord, lower if that comes nearly to the under-bust.',
    min: 540,
    max: 1400,
    tolerance: 10,
    kind: 'length',
    tape: { kind: 'girth', view: 'front', at: at.waistSeam },
  },
  neckGirth: {
    label: 'Neck',
    term: 'Neck base girth',
    isoNumberFromMemory: '5.3.3',
    how: 'Round the base of the neck, over the nape, both sides and the front hollow.',
    min: 290,
    max: 500,
    tolerance: 5,
    kind: 'length',
    tape: { kind: 'girth', view: 'front', at: at.neck },
  },
  topHipGirth: {
    label: 'Top hip',
    term: 'Top hip girth',
    how: 'Level round the hip bones and over the abdomen, about halfway from waist to hip.',
    min: 580,
    max: 1560,
    tolerance: 10,
    kind: 'length',
    tape: { kind: 'girth', view: 'front', at: at.topHip },
  },
  kneeGirth: {
    label: 'Knee',
    term: 'Knee girth',
    how: 'Round one knee over the middle of the kneecap, leg straight.',
    min: 270,
    max: 560,
    tolerance: 5,
    kind: 'length',
    tape: { kind: 'girth', view: 'front', at: at.knee, off: 0.045 },
  },
  bothKneesGirth: {
    label: 'Both knees',
    term: 'Girth of both knees together',
    how: 'Round both knees standing close together, over the kneecaps.',
    min: 430,
    max: 940,
    tolerance: 10,
    kind: 'length',
    tape: { kind: 'girth', view: 'front', at: at.knee },
  },
  upperArmGirth: {
    label: 'Upper arm',
    term: 'Upper-arm girth',
    isoNumberFromMemory: '5.3.16',
    how: 'Round the fullest part of the upper arm, hanging loose.',
    min: 210,
    max: 520,
    tolerance: 5,
    kind: 'length',
    tape: { kind: 'girth', view: 'front', at: 0.25, off: 0.13 },
  },
  shoulderGirth: {
    label: 'Shoulder girth',
    term: 'Shoulder girth, round both arms',
    how: 'Level round both upper arms, chest and back, arms hanging.',
    min: 800,
    max: 1550,
    tolerance: 10,
    kind: 'length',
    tape: { kind: 'girth', view: 'front', at: 0.215 },
  },
  wristGirth: {
    label: 'Wrist',
    term: 'Wrist girth',
    how: 'Round the wrist over its bone.',
    min: 120,
    max: 240,
    tolerance: 5,
    kind: 'length',
    tape: { kind: 'girth', view: 'front', at: 0.47, off: 0.15 },
  },
};
