/** A bend is seen where it swings a millimetre and a half off its chord, or has a corner of two degrees [our rule]. */
export const seenBend = { least: 1.5, kink: 2 } as const;

/** Girths nearer than this are alike, whole-body mm. */
const alike = 4;

/** How often girths, from the top down, turn from growing to shrinking or back. */
function turnsOf(girths: readonly number[]): number {
  let turns = 0;
  let way = 0;
  let last: number | undefined;
  for (const girth of girths) {
    if (last !== undefined && Math.abs(girth - last) < alike) continue;
    const next = last === undefined ? 0 : Math.sign(girth - last);
    if (way !== 0 && next !== 0 && next !== way) turns += 1;
    if (next !== 0) way = next;
    last = girth;
  }
  return turns;
}

/**
 * How often a side seam may change its bend between arm and knee (method section 8): three times, in at the
 * waist, out at the hip and in above the knee; oftener only where the finished girths asked of it turn oftener.
 */
export const mostSideChanges = (girths: readonly number[]): number => Math.max(3, turnsOf(girths));
