import { flareRadius, partOfCircle } from './flare-plan.ts';
import { godetCount, godetPlaces, widestAngle } from './godets.ts';
import { edgesRunningOut, widestIntegral } from './integral.ts';
import { princessToTheKnee, skirtPanels } from './skirt-panel.ts';
import type { GownStyle } from './style-card.ts';
import { longestTrain } from './train.ts';

/** The choices that bound a flare, with what is left open already chosen. */
export type FlareChoices = Pick<
  GownStyle,
  | 'flare'
  | 'waistSeam'
  | 'shaping'
  | 'kneeFinished'
  | 'flareLength'
  | 'flareFraction'
  | 'clothWidth'
>;

/** Cloth taken up by the allowances of both seams of a piece, at the widest a house may have them. */
const widestAllowances = 100;

/** A quarter of the skirt at its knee line, front and back alike: bounds need no more. */
function seamsRunningOut(style: FlareChoices): number {
  const place = { axis: style.kneeFinished / 8, quarter: style.kneeFinished / 4, knee: 0 };
  return edgesRunningOut([
    ...skirtPanels('front', style, place),
    ...skirtPanels('back', style, place),
  ]);
}

/** Widest hem of a flare whose hem is asked for, mm all round. */
export function widestHem(style: FlareChoices, longest: number): number {
  const { kneeFinished: knee, flareLength: depth, clothWidth } = style;
  if (style.flare === 'godets') {
    const count = godetCount(godetPlaces(princessToTheKnee(style), 0));
    const fewer = godetCount(godetPlaces(princessToTheKnee(style), 1));
    const room = clothWidth - widestAllowances;
    return knee + Math.min(count, fewer) * depth * widestAngle(depth + longest, room);
  }
  if (style.flare === 'integral') return widestIntegral(knee, depth, seamsRunningOut(style));
  return knee + 2 * Math.PI * depth;
}

/** Longest train such a flare can have, mm: its back hem may fall away no more steeply than `train.ts` says. */
export function longestTrainOf(style: FlareChoices, hemSweep: number): number {
  const { kneeFinished: knee, flareLength: depth } = style;
  if (style.flare === 'godets') return longestTrain(knee / 4);
  if (style.flare === 'integral') {
    const edges = seamsRunningOut(style);
    const inBack = princessToTheKnee(style) ? 4 : 2;
    return longestTrain(knee / 4 + (inBack * (hemSweep - knee)) / (2 * edges));
  }
  const fraction =
    style.flare === 'circle' ? style.flareFraction : partOfCircle(knee, hemSweep, depth);
  // Half way to its end the hem is struck as much farther out, and is longer by that.
  const angle = (Math.PI / 2) * fraction;
  const level = longestTrain(angle * (flareRadius(knee, fraction) + depth));
  const gained = longestTrain(angle / 2);
  return gained < 1 ? level / (1 - gained) : Infinity;
}
