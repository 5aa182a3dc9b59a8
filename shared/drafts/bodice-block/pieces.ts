import { onDartAxis } from '../../drafting/dart-axis.ts';
import type { HouseRules } from '../../drafting/house-rules.ts';
import {
  edge,
  levelLine,
  mouth,
  notchAtHeight,
  notchAtLength,
  to,
} from '../../drafting/outline.ts';
import type { Dart, Piece } from '../../drafting/piece.ts';
import type { Quantity } from '../../drafting/quantity.ts';
import { type Path, line } from '../../geometry/path.ts';
import { point } from '../../geometry/point.ts';
import { waistDarts, waistEdgesBack } from '../waist-edges.ts';
import type { DrawnArmhole } from './pair-armholes.ts';
import type { BlockHeights, HalfPlan } from './plan-halves.ts';
import type { OpenedShoulder, Shoulder } from './shoulder.ts';

export const bodiceFront = 'bodice-front';
export const bodiceBack = 'bodice-back';
/** The dart at the bust point, wherever it is sewn. */
export const bustDart = 'bust';

/** Finished quarters of one half. */
export type BodiceQuarters = { readonly bust: Quantity; readonly waist: Quantity };

/** A half of the bodice block ready to be cut. */
export type BodiceHalf = {
  readonly plan: HalfPlan;
  readonly shoulder: Shoulder;
  readonly armhole: DrawnArmhole;
  readonly heights: BlockHeights;
  readonly rules: HouseRules;
  /** Length along the side seam, from the underarm down, to its bust notch. */
  readonly bustNotch: number;
};

/** A tip that is no bust point is drilled this far inside (common practice, no source: 10 to 15). */
const drillInside = 12;

/** Seams of a half from the underarm to the waist. */
export const sideOf = (plan: HalfPlan): Path => [line(plan.underarm, plan.waistEnd)];

/** The line of the bust from the centre to the side. */
export const bustLevel = ({ plan, heights }: BodiceHalf): Piece['levels'][number] =>
  levelLine('bust', point(0, heights.bust), point(plan.figures.bust, heights.bust));

/**
 * The front: its darts run to the bust point itself, so that they can be turned about it; they are
 * drilled where sewing ends.
 */
export function frontPiece(half: BodiceHalf, opened: OpenedShoulder): Piece {
  const { plan, shoulder, heights, rules } = half;
  const { bustPoint, nearMouth, farMouth } = opened;
  const side = edge('side', 'side', sideOf(plan), to(bodiceBack, 'side'));
  const arm = edge('armhole', 'top', half.armhole.path);
  const dart: Dart = {
    name: bustDart,
    tip: 'below',
    centreLeg: [line(nearMouth, bustPoint)],
    sideLeg: [line(farMouth, bustPoint)],
    mouth: 'bust-mouth',
    pressed: 'centre',
  };
  const darts = waistDarts(plan.waist, plan.tips);
  const atBustPoint = (tip: number): boolean => tip === bustPoint.y;
  return {
    name: bodiceFront,
    title: 'Bodice block, front',
    side: 'front',
    part: 'top',
    cut: 'cut 1 on fold',
    copies: 1,
    edges: [
      edge('neck', 'top', shoulder.neck),
      edge(
        'shoulder-a',
        'seam',
        [line(shoulder.sideNeck, nearMouth)],
        to(bodiceBack, 'shoulder-a'),
      ),
      mouth('bust-mouth', nearMouth, farMouth),
      edge('shoulder-b', 'seam', [line(farMouth, opened.tip)], to(bodiceBack, 'shoulder-b')),
      arm,
      side,
      ...waistEdgesBack(plan.waist),
      edge('centre', 'fold', [line(point(0, heights.waist), shoulder.centreNeck)]),
    ],
    darts: [dart, ...darts],
    levels: [bustLevel(half)],
    notches: [
      ...notchAtHeight('armhole', arm, half.armhole.upright.y, 1),
      ...notchAtLength('bust', side, half.bustNotch, 1),
    ],
    grain: grainBeside(bustPoint.x * 0.4, heights),
    drills: [
      ...onDartAxis(dart, rules.dartClearance),
      ...darts.flatMap((each, k) =>
        onDartAxis(each, atBustPoint(plan.tips[k] ?? 0) ? rules.dartClearance : drillInside),
      ),
    ],
  };
}

/** Below the bust, where no dart turns it. */
const grainBeside = (x: number, { bust, waist }: BlockHeights): Piece['grain'] => ({
  from: point(x, bust + 0.06 * (waist - bust)),
  to: point(x, waist - 0.1 * (waist - bust)),
});

/** The back: its shoulder is longer by the ease, its waist darts end at the bust line or under the arm. */
export function backPiece(half: BodiceHalf, shoulderEase: number): Piece {
  const { plan, shoulder, heights } = half;
  const side = edge('side', 'side', sideOf(plan), to(bodiceFront, 'side'));
  const arm = edge('armhole', 'top', half.armhole.path);
  const darts = waistDarts(plan.waist, plan.tips);
  return {
    name: bodiceBack,
    title: 'Bodice block, back',
    side: 'back',
    part: 'top',
    cut: 'cut 2 (a pair)',
    copies: 2,
    edges: [
      edge('neck', 'top', shoulder.neck),
      {
        ...edge(
          'shoulder',
          'seam',
          [line(shoulder.sideNeck, shoulder.tip)],
          to(bodiceFront, 'shoulder'),
        ),
        ease: shoulderEase,
      },
      arm,
      side,
      ...waistEdgesBack(plan.waist),
      edge('centre', 'zip', [line(point(0, heights.waist), shoulder.centreNeck)], 'self'),
    ],
    darts,
    levels: [bustLevel(half)],
    notches: [
      ...notchAtHeight('armhole', arm, half.armhole.upright.y, 2),
      ...notchAtLength('bust', side, half.bustNotch, 2),
    ],
    grain: {
      from: point(plan.figures.axis * 0.45, heights.underarm),
      to: point(plan.figures.axis * 0.45, heights.waist - 0.1 * (heights.waist - heights.bust)),
    },
    drills: darts.flatMap((each) => onDartAxis(each, drillInside)),
  };
}
