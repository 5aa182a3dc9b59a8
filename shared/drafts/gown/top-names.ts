import type { Side } from '../../drafting/piece.ts';
import type { GownStyle } from './style-card.ts';

/** What the pieces above the knee seam are called, and how a maker reads it. */
export type TopNames = {
  /** The panels of a princess seam. */
  readonly centre: string;
  readonly side: string;
  /** The one piece that darts shape. */
  readonly one: string;
  readonly title: string;
};

/** Names of the top's pieces; without a waist seam they reach from the top edge to the knee. */
export const topNames = (side: Side, { waistSeam }: Pick<GownStyle, 'waistSeam'>): TopNames => {
  const word = side === 'front' ? 'Front' : 'Back';
  return waistSeam === 'none'
    ? { centre: `${side}-centre`, side: `${side}-side`, one: `${side}-whole`, title: word }
    : {
        centre: `${side}-top-centre`,
        side: `${side}-top-side`,
        one: `${side}-top`,
        title: `${word} top`,
      };
};
