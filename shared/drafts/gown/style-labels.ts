import type { StyleKey } from './style-limits.ts';

/** The trade's word for each style choice, as the style card and every message show it. */
export const styleLabels: { readonly [K in StyleKey]: string } = {
  topDrop: 'Peak depth',
  neckDepth: 'Neck depth',
  neckWidth: 'Neck width',
  sideDepth: 'Side depth',
  backDepth: 'Back height',
  dartLength: 'Dart length',
  kneeLevel: 'Knee seam above the knee',
  kneeFinished: 'Finished knee',
  flareFraction: 'Flare, part of a circle',
  flareLength: 'Flare length',
  floorClearance: 'Floor clearance',
  heelHeight: 'Heel height',
  clothWidth: 'Cloth width',
  'ease.chest': 'Ease at the chest',
  'ease.bust': 'Ease at the bust',
  'ease.underbust': 'Ease at the under-bust',
  'ease.waist': 'Ease at the waist',
  'ease.topHip': 'Ease at the top hip',
  'ease.hip': 'Ease at the hip',
};

/** What each style choice means, one sentence for a hint beside it. */
export const styleHints: { readonly [K in StyleKey]: string } = {
  topDrop: 'From the side neck level down to the peak of the top line over the bust.',
  neckDepth: 'From the side neck level down to the top line at the centre front.',
  neckWidth: 'From the centre front out to the peak.',
  sideDepth: 'From the side neck level down to the top line at the side seam.',
  backDepth: 'Height of the top line at the centre back above the waist.',
  dartLength:
    'From the waist down to the tip of the front dart; the back dart runs a little lower.',
  kneeLevel: 'How far the seam of the flare lies above the middle of the knee.',
  kneeFinished: 'Girth of the gown at that seam.',
  flareFraction: 'Half a circle is 0.5, a full one 1.',
  flareLength: 'From the knee seam down to the hem.',
  floorClearance: 'From the hem down to the floor, in the shoes.',
  heelHeight: 'Height of the heels the gown is worn with.',
  clothWidth: 'Usable width of the cloth, without its selvedges.',
  'ease.chest': 'Room over the upper chest; less than nothing holds the edge in.',
  'ease.bust': 'Room over the bust.',
  'ease.underbust': 'Room at the under-bust; less than nothing lets the bodice hold.',
  'ease.waist': 'Room at the waist.',
  'ease.topHip': 'Room at the top hip.',
  'ease.hip': 'Room at the hip.',
};
