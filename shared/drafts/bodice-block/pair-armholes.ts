import type { Body } from '../../body/card.ts';
import { DraftingError } from '../../drafting/drafting-error.ts';
import type { DraftingTable } from '../../drafting/drafting-table.ts';
import { pathLength } from '../../geometry/curve.ts';
import { moved } from '../../geometry/motion.ts';
import { point } from '../../geometry/point.ts';
import { warning } from '../../units/problem.ts';
import { mm, said } from '../../units/said.ts';
import { type Armhole, type ArmholeFrame, armhole, smallestRadius } from './armhole.ts';
import type { HalfPlan } from './plan-halves.ts';
import type { OpenedShoulder, Shoulder } from './shoulder.ts';

/** An armhole, and the distance from the centre line at which the measures ask it to stand upright. */
export type DrawnArmhole = Armhole & { readonly asked: number };

/** Ease of half the back width at the arm (Aldrich, from memory). */
export const backWidthEase = 5;

/** Least width of the armhole, mm: an eighth of the bust less 15 (Müller and Sohn, from memory, without ease). */
export const leastArmholeWidth = (bust: number): number => bust / 8 - 15;

/** An armhole less deep than this from the shoulder point leaves no room for the arm (our rule). */
const leastDepth = 65;

/** The armhole turns with a radius this much wider than its allowance, so that the cutting line can follow. */
const besideAllowance = 1;

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

/** The hollow between the upright and the underarm is at least this deep, mm (our rule). */
const leastHollow = 8;

function refuseNarrow(
  { shoulder, underarm, tightest }: ArmholeFrame,
  { path, upright }: Armhole,
): void {
  const last = path.at(-1);
  const arrives = last?.kind === 'cubic' ? underarm.x - last.c2.x : 0;
  const fits =
    underarm.x - upright.x >= leastHollow &&
    arrives >= leastHollow / 2 &&
    shoulder.x > upright.x &&
    smallestRadius(path) >= tightest;
  if (fits) return;
  throw new DraftingError([
    {
      code: 'armhole-too-narrow',
      severity: 'error',
      field: 'card.sideNeckToBustPoint',
      with: ['card.bustGirth', 'card.underbustGirth', 'card.shoulderLength', 'style.bustDartRule'],
      said: said`The shoulder point lies ${mm(shoulder.x)} from the centre and the underarm ${mm(underarm.x)}: no armhole fits between them. Measure side neck to bust point, bust, under-bust and shoulder length again, or choose another rule for the bust dart.`,
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
  allowance: number,
  front: { readonly plan: HalfPlan; readonly shoulder: Shoulder; readonly opened: OpenedShoulder },
  back: { readonly plan: HalfPlan; readonly shoulder: Shoulder },
): { readonly front: DrawnArmhole; readonly back: DrawnArmhole } {
  const { acrossFront, acrossBack, bustGirth } = body.measures;
  const halfWay = (front.shoulder.tip.y + armpit) / 2;
  const asked = {
    front: moved(point(acrossFront / 2, halfWay), front.opened.motion).x,
    back: acrossBack / 2 + backWidthEase,
  };
  const tightest = allowance + besideAllowance;
  const frames: Frames = {
    front: {
      shoulder: front.opened.tip,
      shoulderSlope: front.opened.slope,
      underarm: front.plan.underarm,
      sideLean: front.plan.lean,
      guide: asked.front,
      tightest,
    },
    back: {
      shoulder: back.shoulder.tip,
      shoulderSlope: back.shoulder.slope,
      underarm: back.plan.underarm,
      sideLean: back.plan.lean,
      guide: asked.back,
      tightest,
    },
  };
  refuseShallow(frames);
  const width = frames.front.underarm.x - asked.front + frames.back.underarm.x - asked.back;
  const lack = Math.max(0, leastArmholeWidth(bustGirth) - width) / 2;
  const draw = (frame: ArmholeFrame): DrawnArmhole => {
    const drawn = armhole({ ...frame, guide: frame.guide - lack });
    refuseNarrow(frame, drawn);
    return { ...drawn, asked: frame.guide };
  };
  return { front: draw(frames.front), back: draw(frames.back) };
}

/** An armhole is at least this much longer than the upper arm is round (common practice, no source; usually 100 or more). */
const overArm = 60;

/** Warns where the sewn armhole lies too near to the upper arm. */
export function warnOfTightArmhole(
  table: DraftingTable,
  body: Body,
  { front, back }: { readonly front: Armhole; readonly back: Armhole },
): void {
  const length = pathLength(front.path) + pathLength(back.path);
  const arm = body.measures.upperArmGirth;
  if (length >= arm + overArm) return;
  const guessed = 'upperArmGirth' in body.estimated ? ' (estimated)' : '';
  table.warn(
    warning({
      code: 'armhole-tight',
      field: 'card.upperArmGirth',
      with: ['style.armholeDrop', 'card.underarmToWaist'],
      said: said`The armhole is ${mm(length)} round and the upper arm ${mm(arm)}${guessed}: lower the armhole, or measure underarm to waist and upper arm again.`,
    }),
  );
}
