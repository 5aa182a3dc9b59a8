import type { MeasureKey } from './card.ts';
import { coreMeasureGuide } from './core-measure-guide.ts';
import { furtherGirthGuide } from './further-girth-guide.ts';
import { furtherLengthGuide } from './further-length-guide.ts';
import type { Measure } from './measure.ts';

/** What a maker needs to know of every measure, by its key. */
export const measureGuide: { readonly [K in MeasureKey]: Measure } = {
  ...coreMeasureGuide,
  ...furtherGirthGuide,
  ...furtherLengthGuide,
};
