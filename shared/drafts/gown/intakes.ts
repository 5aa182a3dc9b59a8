import { DraftingError } from '../../drafting/drafting-error.ts';
import { splitSegment } from '../../geometry/curve.ts';
import { shift, movedPath } from '../../geometry/motion.ts';
import type { Path, Segment } from '../../geometry/path.ts';
import {
  type Profile,
  cubicProfile,
  offsetProfile,
  positiveSpline,
  profilePath,
  slopeAt,
  widest,
  xAt,
} from '../../geometry/profile.ts';
import { mm, said } from '../../units/said.ts';
import { fade, scaled } from './fading.ts';
import { type Half, dartShares, heightOn, mouthsOn } from './half.ts';
import { seamAt } from './waist-seam.ts';

/** Steepest gap at a dart tip: 30 degrees between its legs (method section 6). */
export const widestTip = 2 * Math.tan((15 * Math.PI) / 180);

/** An intake about an upright axis: its whole width at every height between its ends. */
export type Intake = {
  readonly axis: number;
  readonly gap: Profile;
  readonly top: number;
  readonly foot: number;
};

/** The edge of an intake nearer the centre, or nearer the side, travelled downwards. */
export const intakeEdge = (intake: Intake, towards: 'centre' | 'side'): Path =>
  profilePath(
    offsetProfile(intake.axis, intake.gap, towards === 'centre' ? -0.5 : 0.5),
    intake.top,
    intake.foot,
  );

/** Places along the closed waist seam at which the darts of the middle open, from the centre out. */
export const mouthsOnSeam = (half: Half): readonly number[] =>
  mouthsOn(half.dartAxes, dartShares(half.dartCount), half.gap.seam);

/** Cloth left between an intake and its neighbour, the centre line or the side. */
const clothBetween = 8;

/**
 * Refuses a half whose intakes leave no cloth between each other, the centre line and the side.
 * @throws DraftingError naming the girths to measure again.
 */
export function refuseCrowdedIntakes(half: Half): void {
  // Between its levels a seam may swell a little over them.
  const most = Math.max(widest(princessBelow(half).gap), half.gap.waist);
  const bounds = dartShares(half.dartCount).flatMap((share, k) => {
    const axis = half.dartAxes[k] ?? half.axis;
    return [axis - (share * most) / 2, axis + (share * most) / 2];
  });
  const side = Math.min(
    xAt(half.line, half.heights.underbust),
    xAt(half.line, half.heights.seam),
    xAt(half.line, half.heights.waist),
  );
  // A princess seam takes the whole intake about its own axis.
  const places = [0, Math.min(half.axis - most / 2, bounds[0] ?? 0), ...bounds.slice(1), side];
  const crowded = places.some(
    (x, i) => i > 0 && i % 2 === 1 && x - (places[i - 1] ?? 0) < clothBetween,
  );
  const overlong = half.axis + most / 2 > side - clothBetween;
  if (!crowded && !overlong) return;
  throw new DraftingError([
    {
      code: 'intake-too-wide',
      severity: 'error',
      field: 'card.waistGirth',
      with: ['card.bustGirth', 'card.underbustGirth', 'card.hipGirth', 'card.waistSeamGirth'],
      said: said`The ${half.side} would have to take in ${mm(most)} in a half and no cloth is left beside the darts. Measure bust, under-bust, waist and hip again, or reduce the ease taken off.`,
    },
  ]);
}

/** The waist seam in stretches between mouths, each shifted out by the openings before it. */
export function seamStretches(half: Half, openings: readonly number[]): readonly Path[] {
  const stretches: Path[] = [];
  let rest: Segment = half.seam;
  let shiftBy = 0;
  let start = 0;
  mouthsOnSeam(half).forEach((x, k) => {
    const t = seamAt(half.seam, x).t;
    const [before, after] = splitSegment(rest, (t - start) / (1 - start));
    stretches.push(movedPath([before], shift(shiftBy, 0)));
    rest = after;
    start = t;
    shiftBy += openings[k] ?? 0;
  });
  stretches.push(movedPath([rest], shift(shiftBy, 0)));
  return stretches;
}

/** The princess gap from the bust point, where both panels touch upright, down to the waist seam. */
export function princessBelow(half: Half): Intake {
  const bust = heightOn(half, 'bust', half.axis);
  const underbust = heightOn(half, 'underbust', half.axis);
  const seam = seamAt(half.seam, mouthsOnSeam(half)[0] ?? half.axis).y;
  return {
    axis: half.axis,
    top: bust,
    foot: seam,
    gap: positiveSpline(
      [
        { y: bust, x: 0 },
        { y: underbust, x: half.gap.underbust },
        { y: seam, x: half.gap.seam },
      ],
      0,
      0,
    ),
  };
}

/** A second dart of the top is shorter by this, or by this part of the first where that is short. */
const shorterBy = 20;
const shorterPart = 0.3;

/**
 * The darts of a top from short of the bust point down to the waist seam. At the under-bust each takes
 * by its height, so that their tips open alike.
 */
export function topDarts(half: Half, clearance: number): readonly Intake[] {
  const mouths = mouthsOnSeam(half);
  const shares = dartShares(half.dartCount);
  const places = shares.map((_, k) => {
    const axis = half.dartAxes[k] ?? half.axis;
    const underbust = heightOn(half, 'underbust', axis);
    const first = Math.max(1, underbust - heightOn(half, 'bust', axis) - clearance);
    return { axis, underbust, height: first - k * Math.min(shorterBy, shorterPart * first) };
  });
  const heights = places.reduce((sum, { height }) => sum + height, 0);
  return places.map(({ axis, underbust, height }, k) => {
    const seam = seamAt(half.seam, mouths[k] ?? axis).y;
    const atSeam = { y: seam, x: (shares[k] ?? 1) * half.gap.seam };
    const held = (half.gap.underbust * height) / heights;
    if (held === 0) {
      return {
        axis,
        top: underbust,
        foot: seam,
        gap: positiveSpline(
          [{ y: underbust, x: 0 }, atSeam],
          Math.min(atSeam.x / (seam - underbust), widestTip),
          0,
        ),
      };
    }
    const tip = { y: underbust - height, x: 0 };
    return {
      axis,
      top: tip.y,
      foot: seam,
      gap: positiveSpline(
        [tip, { y: underbust, x: held }, atSeam],
        Math.min(held / height, widestTip),
        0,
      ),
    };
  });
}

/** The darts of the middle: upright at a raised waist seam, a cubic to the waist, straight to the tip. */
export function middleDarts(half: Half): readonly Intake[] {
  const { waist } = half.levels;
  const mouths = mouthsOnSeam(half);
  return dartShares(half.dartCount).map((share, k) => {
    const axis = half.dartAxes[k] ?? half.axis;
    const top = seamAt(half.seam, mouths[k] ?? axis).y;
    if (half.fading !== 'straight') return below(half, { axis, gap: [], top, foot: top }, k);
    const atSeam = { y: top, x: share * half.gap.seam };
    const atWaist = share * half.gap.waist;
    const runOut = fade(half.fading, waist, half.dartTips[k] ?? waist);
    const closing = runOut && atWaist > 0 ? atWaist * slopeAt(runOut, waist) : undefined;
    const toWaist: Intake = {
      axis,
      top,
      foot: waist,
      gap:
        closing === undefined
          ? cubicProfile(atSeam, { y: waist, x: 0 }, 0, -atSeam.x / (waist - top))
          : cubicProfile(atSeam, { y: waist, x: atWaist }, 0, closing),
    };
    return closing === undefined ? toWaist : below(half, toWaist, k);
  });
}

/** An intake carried on below the waist to the tip of its dart. */
function below(half: Half, above: Intake, k: number): Intake {
  const tip = half.dartTips[k] ?? above.foot;
  const share = dartShares(half.dartCount)[k] ?? 1;
  const runOut = fade(half.fading, above.foot, tip);
  if (!runOut) return above;
  return { ...above, foot: tip, gap: [...above.gap, ...scaled(runOut, share * half.gap.waist)] };
}

/** The princess gap of a gown without a waist seam: through the waist it goes on down and runs out at the tip. */
export const princessWhole = (half: Half): Intake => below(half, princessBelow(half), 0);

/** The darts of a gown without a waist seam, pointed at both ends. */
export const wholeDarts = (half: Half, clearance: number): readonly Intake[] =>
  topDarts(half, clearance).map((dart, k) => below(half, dart, k));
