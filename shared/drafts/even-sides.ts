/** A half with the side length that would let its waist line bend evenly, mm. */
type Wishing = { readonly wish: number };

const roundsAtMost = 60;

/**
 * Draws front and back with one length of side seam between them, the mean of what both waist lines wish
 * for; gives the halves as drawn with it, within 1e-7 mm.
 */
export function withEvenSides<Half extends Wishing>(
  start: number,
  draw: (length: number) => { readonly front: Half; readonly back: Half },
): { readonly front: Half; readonly back: Half } {
  let length = start;
  let halves = draw(length);
  for (let round = 0; round < roundsAtMost; round += 1) {
    const change = (halves.front.wish + halves.back.wish) / 2 - length;
    // Half way only: the wish itself moves with the length.
    length += change / 2;
    halves = draw(length);
    if (Math.abs(change) < 1e-7) break;
  }
  return halves;
}
