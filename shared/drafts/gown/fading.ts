import { type Profile, cubicProfile, straightProfile, xAt } from '../../geometry/profile.ts';
import type { GownStyle } from './style-card.ts';

/**
 * How what is taken in at the waist runs out below it: straight to the tip under a raised seam, upright
 * at first where the dart begins at a seam in the waist itself, or as one smooth seam that goes on down.
 */
export type Fading = 'straight' | 'upright' | 'seam';

/** How the intakes of a style run out. */
export const fadingOf = ({
  waistSeam,
  shaping,
}: Pick<GownStyle, 'waistSeam' | 'shaping'>): Fading =>
  waistSeam === 'raised'
    ? 'straight'
    : waistSeam === 'none' && shaping === 'princess'
      ? 'seam'
      : 'upright';

/** A dart that begins upright turns straight over this height at most, a third of its length [our rule]. */
const upright = 30;

/**
 * Part of the intake left at each height from the waist (1) to the tip (0), as a profile; mm of height.
 * No answer where the tip lies at the waist or above: nothing goes on below.
 */
export function fade(fading: Fading, waist: number, tip: number): Profile | undefined {
  if (tip <= waist) return undefined;
  const from = { y: waist, x: 1 };
  const end = { y: tip, x: 0 };
  if (fading === 'straight') return straightProfile(from, end);
  if (fading === 'seam') return cubicProfile(from, end, 0, 0);
  const turn = Math.min(upright, (tip - waist) / 3);
  const slope = -1 / (tip - waist - turn / 2);
  const knee = { y: waist + turn, x: 1 + (slope * turn) / 2 };
  return [
    { from: waist, to: knee.y, a: 1, b: 0, c: slope / (2 * turn), d: 0 },
    ...straightProfile(knee, end),
  ];
}

/** Part of the intake at the waist that is left at a height below it, 0 to 1. */
export const heldBelow = (fading: Fading, waist: number, tip: number, y: number): number => {
  if (tip <= waist || y >= tip) return 0;
  // Asked for in every round of every half: the straight one needs no profile.
  if (fading === 'straight') return (tip - y) / (tip - waist);
  const profile = fade(fading, waist, tip);
  return profile === undefined ? 0 : xAt(profile, y);
};

/** A profile of parts made one of millimetres. */
export const scaled = (profile: Profile, by: number): Profile =>
  profile.map(({ from, to, a, b, c, d }) => ({
    from,
    to,
    a: a * by,
    b: b * by,
    c: c * by,
    d: d * by,
  }));
