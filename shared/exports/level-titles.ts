import type { LevelName } from '../drafting/piece.ts';

/** The levels as they are lettered on paper. */
export const levelTitles: { readonly [L in LevelName]: string } = {
  chest: 'chest',
  bust: 'bust',
  underbust: 'under-bust',
  'waist-seam': 'waist seam',
  waist: 'waist',
  'top-hip': 'top hip',
  hip: 'hip',
  'knee-seam': 'knee seam',
  hem: 'hem',
};
