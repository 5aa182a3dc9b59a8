import type { Side } from '../../drafting/piece.ts';

/** Up to this half suppression one dart a quarter; up to `twoBehind` the back takes two; then both do. */
const oneEach = 60;
const twoBehind = 100;

/**
 * Darts of a quarter of a straight skirt by its half suppression, mm: half width less half the finished
 * waist (common practice, no source: to 60 one and one, to 100 one and two, more two and two). A dart
 * that would be wider than `widest` is shared between two in any case.
 */
export function dartCount(side: Side, half: number, intake: number, widest: number): 0 | 1 | 2 {
  if (intake === 0) return 0;
  if (intake > widest) return 2;
  return half > (side === 'back' ? oneEach : twoBehind) ? 2 : 1;
}

/** Widest single dart of a skirt (common practice, no source: 30 to 35). */
export const widestSkirtDart = 35;

/** Where the darts of a quarter stand, as parts of its waist from the centre out, and how long each is, mm. */
export type DartPlan = { readonly at: number; readonly length: number };

/**
 * Places and lengths: one in front at a third from the side, 100 long; behind at the half, 140; two at the
 * thirds, the one nearer the side 15 shorter (lengths and places after Aldrich, from memory; the front's
 * second dart and the single back one: common practice, no source).
 */
export function dartPlans(side: Side, count: 0 | 1 | 2): readonly DartPlan[] {
  const length = side === 'front' ? 100 : 140;
  if (count === 0) return [];
  if (count === 1) return [{ at: side === 'front' ? 2 / 3 : 1 / 2, length }];
  return [
    { at: 1 / 3, length },
    { at: 2 / 3, length: length - 15 },
  ];
}
