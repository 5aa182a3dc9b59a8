import { DraftingError } from '../../drafting/drafting-error.ts';
import { xAt } from '../../geometry/profile.ts';
import { deg, mm, said } from '../../units/said.ts';
import type { Half } from './half.ts';
import { heightOn } from './half.ts';
import type { Intake } from './intakes.ts';

/** Widest tip of a straight dart, degrees (method section 6). */
const widestTip = 30;
/**
 * A dart that opens at 30 degrees may swell on to this much between tip and under-bust, degrees
 * [our rule]: its legs curve outwards, which sews flat over a small bust only.
 */
const widestSwell = 40;

const degrees = (half: number, height: number): number =>
  (2 * Math.atan(half / height) * 180) / Math.PI;

/**
 * Refuses darts that would stand up in a cone instead of melting into the bust.
 * `top` is the dart in the top line: degrees at its
 * tip, mm of opening, and what the house sews in one.
 * @throws DraftingError on `style.shaping`, naming the princess seam as the remedy.
 */
export function refuseBluntDarts(
  half: Half,
  darts: readonly Intake[],
  top: { readonly tip: number; readonly opening: number; readonly widest: number },
): void {
  refuseWideTopDart(half, top);
  const below = darts.map((dart) => {
    const underbust = heightOn(half, 'underbust', dart.axis);
    return half.gap.underbust === 0
      ? 0
      : degrees(xAt(dart.gap, underbust) / 2, underbust - dart.top);
  });
  const blunt = Math.max(
    top.tip > widestTip ? top.tip : 0,
    ...below.filter((tip) => tip > widestSwell),
  );
  if (blunt === 0) return;
  throw new DraftingError([
    {
      code: 'darts-too-wide',
      severity: 'error',
      field: 'style.shaping',
      with: ['card.bustGirth', 'card.underbustGirth', 'card.upperChestGirth'],
      said: said`On the ${half.side} a dart would open at ${deg(blunt)} to take in ${mm(half.gap.underbust)} under the bust; a dart takes at most ${deg(widestTip)} at its tip. Choose the princess seam.`,
    },
  ]);
}

/** The dart in the top line is sewn in one: two would break the line. */
function refuseWideTopDart(
  half: Half,
  { opening, widest }: { readonly opening: number; readonly widest: number },
): void {
  if (opening <= widest) return;
  throw new DraftingError([
    {
      code: 'darts-too-wide',
      severity: 'error',
      field: 'style.shaping',
      with: ['card.bustGirth', 'card.upperChestGirth', 'rules.dartWidest'],
      said: said`On the ${half.side} a dart in the top line would take ${mm(opening)}; the house sews at most ${mm(widest)} in one. Choose the princess seam.`,
    },
  ]);
}

/** Tip angle of a dart with straight legs, degrees. */
export const tipOf = (halfAngle: number): number => (2 * halfAngle * 180) / Math.PI;
