import type { Garment } from '../engine/drafted.ts';

/** What each garment is called. */
export const garmentTitles: { readonly [G in Garment]: string } = {
  gown: 'Gown',
  'bodice-block': 'Bodice block',
  'skirt-block': 'Skirt block',
};
