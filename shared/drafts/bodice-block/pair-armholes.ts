import type { Body } from '../../body/card.ts';
import { DraftingError } from '../../drafting/drafting-error.ts';
import { moved } from '../../geometry/motion.ts';
import type { Path } from '../../geometry/path.ts';
import { type Point, point } from '../../geometry/point.ts';
import { mm, said } from '../../units/said.ts';
import { type ArmholeFrame, armhole, reachableGuide } from './armhole.ts';
import type { HalfPlan } from './plan-halves.ts';
import type { OpenedShoulder, Shoulder } from './shoulder.ts';

/** An armhole and where its guide came to stand. */
export type DrawnArmhole = {
  readonly path: Path;
  readonly upright: Point;
  /** Distance from the centre line the measures ask for, and the one drawn. */
  readonly asked: number;
  readonly guide: number;
};

/** Ease of half the back width at the arm (Aldrich, from memory). */
export const backWidthEase = 5;

/** Least width of the armhole, mm: an eighth of the bust less 15 (Müller and Sohn, from memory, without ease). */
export const leastArmholeWidth = (bust: number): number => bust / 8 - 15;

/** An armhole less deep than this from the shoulder point leaves no room for the arm (our rule). */
const leastDepth = 90;

type Frames = { readonly front: ArmholeFrame; readonly back: ArmholeFrame };

function refuseShallow({ front, back }: Frames): void {
  const depth = Math.min(front.underarm.y - front.shoulder.y, back.underarm.y - back.shoulder.y);
  if (depth >= leastDepth) return;
  throw new DraftingError([
    {
      code: 'armhole-too-shallow',
      severity: 'error',
      field: 'card.underarmToWaist',
      with: [
        'card.sideNeckToBustPoint',
        'card.backWaistLength',
        'card.shoulderSlope',
        'style.bustDartRule',
      ],
      said: said`The armhole would be only ${mm(depth)} deep from the shoulder point; an arm needs at least ${mm(leastDepth)}. Measure underarm to waist, side neck to bust point and the shoulder slope again, or choose another rule for the bust dart.`,
    },
  ]);
}

/**
 * Both armholes. The guides stand at half the across measures, in front turned out with the bust dart;
 * where they would leave the arm too little width both come in alike, and each keeps to what its
 * shoulder and side allow.
 */
export function pairArmholes(
  body: Body,
  armpit: number,
  front: { readonly plan: HalfPlan; readonly shoulder: Shoulder; readonly opened: OpenedShoulder },
  back: { readonly plan: HalfPlan; readonly shoulder: Shoulder },
): { readonly front: DrawnArmhole; readonly back: DrawnArmhole } {
  const { acrossFront, acrossBack, bustGirth } = body.measures;
  const halfWay = (front.shoulder.tip.y + armpit) / 2;
  const asked = {
    front: moved(point(acrossFront / 2, halfWay), front.opened.motion).x,
    back: acrossBack / 2 + backWidthEase,
  };
  const frames: Frames = {
    front: {
      shoulder: front.opened.tip,
      shoulderSlope: front.opened.slope,
      underarm: front.plan.underarm,
      sideLean: front.plan.lean,
      guide: asked.front,
    },
    back: {
      shoulder: back.shoulder.tip,
      shoulderSlope: back.shoulder.slope,
      underarm: back.plan.underarm,
      sideLean: back.plan.lean,
      guide: asked.back,
    },
  };
  refuseShallow(frames);
  const width = frames.front.underarm.x - asked.front + frames.back.underarm.x - asked.back;
  const lack = Math.max(0, leastArmholeWidth(bustGirth) - width) / 2;
  const draw = (frame: ArmholeFrame): DrawnArmhole => {
    const own = { ...frame, guide: frame.guide - lack };
    return { ...armhole(own), asked: frame.guide, guide: reachableGuide(own) };
  };
  return { front: draw(frames.front), back: draw(frames.back) };
}
