/** An intake under this is not sewn, mm: the side seam takes it (decision of 2026-12-01). */
export const narrowestDart = 4;

/** What goes out of one quarter between a wide level and the waist: at the side, and in darts. */
export type QuarterIntake = { readonly side: number; readonly darts: number };

/**
 * Shares the suppression of a front and a back quarter: the side seam takes its share of the mean, at
 * most `sideMost`, alike on both, so that the two sides fall together; the darts take the rest. Where a
 * dart would be under 4 mm the side of that quarter takes all; where the waist is as wide, both do. mm.
 */
export function shareIntake(
  front: number,
  back: number,
  sideShare: number,
  sideMost: number,
): { readonly front: QuarterIntake; readonly back: QuarterIntake } {
  const mean = (front + back) / 2;
  const side = Math.min(sideMost, sideShare * mean);
  const quarter = (whole: number): QuarterIntake =>
    mean <= 0 || whole - side < narrowestDart
      ? { side: whole, darts: 0 }
      : { side, darts: whole - side };
  return { front: quarter(front), back: quarter(back) };
}
