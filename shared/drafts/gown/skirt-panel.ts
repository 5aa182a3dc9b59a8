import type { Side } from '../../drafting/piece.ts';
import type { GownStyle } from './style-card.ts';
import { topNames } from './top-names.ts';

/** A panel of the skirt where it comes to the knee line: which seams it lies between, and how far out they are. */
export type SkirtPanel = {
  readonly piece: string;
  readonly side: Side;
  readonly inner: 'centre' | 'princess';
  readonly outer: 'princess' | 'side';
  /** Distances from the centre of its inner and its outer edge, and the height of the knee line, mm. */
  readonly from: number;
  readonly until: number;
  readonly knee: number;
};

/** Whether the skirt has princess seams at the knee line: where no waist seam ends them. */
export const princessToTheKnee = ({
  waistSeam,
  shaping,
}: Pick<GownStyle, 'waistSeam' | 'shaping'>): boolean =>
  waistSeam === 'none' && shaping === 'princess';

/** The panels of a half at the knee line, from the centre out. */
export function skirtPanels(
  side: Side,
  style: Pick<GownStyle, 'waistSeam' | 'shaping'>,
  {
    axis,
    quarter,
    knee,
  }: { readonly axis: number; readonly quarter: number; readonly knee: number },
): readonly SkirtPanel[] {
  const names = topNames(side, style);
  const whole = { side, inner: 'centre', outer: 'side', from: 0, until: quarter, knee } as const;
  if (style.waistSeam !== 'none') return [{ ...whole, piece: `${side}-middle` }];
  if (!princessToTheKnee(style)) return [{ ...whole, piece: names.one }];
  return [
    { ...whole, piece: names.centre, outer: 'princess', until: axis },
    { ...whole, piece: names.side, inner: 'princess', from: axis },
  ];
}
