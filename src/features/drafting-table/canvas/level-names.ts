import type { LevelName } from '#shared/drafting/piece.ts';

/** The levels as the trade says them. */
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
