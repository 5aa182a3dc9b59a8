import type { MeasureKey } from './card.ts';

/**
 * How far two measures of one body lie apart, `larger` less `smaller` (millimetres). Outside `possible` no gown can be
 * drawn from them and the card is refused; outside `usual` the maker is asked to look again.
 */
export type Agreement = {
  readonly larger: MeasureKey;
  readonly smaller: MeasureKey;
  /** Half of the larger measure is meant. */
  readonly half?: true;
  readonly possible: readonly [least: number, most: number];
  readonly usual?: readonly [least: number, most: number];
};

const far = 10_000;

/**
 * Method section 2 and the flags at the end of reference.md section 5. The usual spans of hip - waist, bust - waist and
 * hip - bust are the extremes of 600 women (section 1, seen); the others are common practice, no source.
 */
export const agreements: readonly Agreement[] = [
  { larger: 'bustGirth', smaller: 'underbustGirth', possible: [10, 350], usual: [50, 280] },
  { larger: 'bustGirth', smaller: 'bustSpan', half: true, possible: [60, far] },
  { larger: 'bustGirth', smaller: 'waistGirth', possible: [-90, 340], usual: [-62, 228] },
  { larger: 'hipGirth', smaller: 'waistGirth', possible: [-70, 440], usual: [-43, 418] },
  { larger: 'hipGirth', smaller: 'bustGirth', possible: [-160, 390], usual: [-115, 350] },
  { larger: 'bustGirth', smaller: 'upperChestGirth', possible: [-40, 160], usual: [-25, 120] },
  {
    larger: 'sideNeckToUnderbust',
    smaller: 'sideNeckToBustPoint',
    possible: [40, 150],
    usual: [55, 120],
  },
  {
    larger: 'frontWaistLength',
    smaller: 'sideNeckToUnderbust',
    possible: [50, 200],
    usual: [60, 160],
  },
  { larger: 'frontWaistLength', smaller: 'sideNeckToBustPoint', possible: [100, 300] },
  { larger: 'waistGirth', smaller: 'underbustGirth', possible: [-300, 300], usual: [-200, 220] },
  { larger: 'waistToKnee', smaller: 'waistToHip', possible: [200, 560] },
  { larger: 'waistToFloor', smaller: 'waistToKnee', possible: [300, 700] },
  { larger: 'frontWaistLength', smaller: 'backWaistLength', possible: [-30, 160], usual: [0, 90] },
  { larger: 'backWaistLength', smaller: 'armscyeDepth', possible: [90, 400] },
  { larger: 'waistToHip', smaller: 'waistToTopHip', possible: [40, 200] },
  { larger: 'shoulderWidth', smaller: 'shoulderLength', half: true, possible: [-20, far] },
  { larger: 'height', smaller: 'waistToFloor', possible: [400, 900], usual: [500, 750] },
  { larger: 'hipGirth', smaller: 'kneeGirth', half: true, possible: [-20, far] },
  // Common practice, no source; the median shoulder girth of 260 women is 995 on a chest of 855 (Heinz et al. 2003, seen).
  {
    larger: 'shoulderGirth',
    smaller: 'upperChestGirth',
    possible: [-150, 600],
    usual: [40, 260],
  },
  { larger: 'upperArmGirth', smaller: 'wristGirth', possible: [20, 350] },
  { larger: 'height', smaller: 'armLength', possible: [700, 1500] },
  { larger: 'shoulderWidth', smaller: 'acrossFront', possible: [-60, 160] },
  { larger: 'shoulderWidth', smaller: 'acrossBack', possible: [-80, 160] },
  { larger: 'bothKneesGirth', smaller: 'kneeGirth', possible: [100, 420] },
];
