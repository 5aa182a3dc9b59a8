import type { Body } from '../../body/card.ts';
import type { BodyLevels } from '../../body/levels.ts';
import type { GownStyle } from './style-card.ts';

/** Widest tip of a dart, degrees (method section 6). */
export const widestTip = 30;

/** Part of the front's shaping under the bust that is sewn into the larger of two darts, the side seam having its share. */
const largestDart = 0.6 * 0.55;

/** Darts stop this short of the bust point. */
const clearance = 25;

/**
 * Tip angle (degrees) of the larger front dart, were this body shaped by darts: its intake at the under-bust
 * over the height from there to the tip.
 */
export function frontDartTip(body: Body, levels: BodyLevels, style: GownStyle): number {
  const { bustGirth, underbustGirth } = body.measures;
  const intake =
    (largestDart * (bustGirth + style.ease.bust - underbustGirth - style.ease.underbust)) / 4;
  const height = Math.max(1, levels.underbust - levels.bust - clearance);
  return (2 * Math.atan(intake / 2 / height) * 180) / Math.PI;
}

/** Whether darts can shape this bust without a tip wider than 30 degrees; else it takes a princess seam. */
export const dartsReach = (body: Body, levels: BodyLevels, style: GownStyle): boolean =>
  frontDartTip(body, levels, style) <= widestTip;
