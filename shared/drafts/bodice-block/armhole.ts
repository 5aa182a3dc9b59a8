import { type Path, cubic } from '../../geometry/path.ts';
import { type Point, between, point } from '../../geometry/point.ts';

/** What an armhole is drawn between: the shoulder, the underarm, and how far out it may come between them. */
export type ArmholeFrame = {
  readonly shoulder: Point;
  /** Slope of the shoulder line, radians below level; the armhole leaves square to it. */
  readonly shoulderSlope: number;
  readonly underarm: Point;
  /** How far the side seam runs in for each millimetre down; the armhole arrives square to it. */
  readonly sideLean: number;
  /** Distance from the centre line at which the armhole stands upright. */
  readonly guide: number;
};

/** The upright place lies this part of the way down; lower where the shoulder leans far over, at most to `lowest`. */
const usual = 0.58;
const lowest = 0.74;
/** Part of the height that the turn into the upright keeps below the shoulder's own direction. */
const turning = 0.24;
/** The guide keeps inside the shoulder point, and the hollow keeps some depth, mm. */
const insideShoulder = 5;
const leastHollow = 28;

/** Guide that this frame can be drawn with, nearest to the one asked for, mm. */
export function reachableGuide({ shoulder, shoulderSlope, underarm, guide }: ArmholeFrame): number {
  const height = underarm.y - shoulder.y;
  const leastX = shoulder.x - Math.tan(shoulderSlope) * (lowest - turning) * height;
  const mostX = Math.min(shoulder.x - insideShoulder, underarm.x - leastHollow);
  return Math.max(leastX, Math.min(mostX, guide));
}

/** Handles of the hollow, as parts of the way to its corner: a little fuller than a quarter of an ellipse. */
const hollow = 0.6;

/**
 * The armhole from the shoulder point down to the underarm: it leaves square to the shoulder, stands
 * upright at the guide and arrives square to the side seam, bending one way all along. Each half lies
 * within the triangle of its end directions; where they meet, their bends agree as nearly as that allows.
 */
export function armhole(frame: ArmholeFrame): { readonly path: Path; readonly upright: Point } {
  const { shoulder, shoulderSlope, underarm, sideLean } = frame;
  const x = reachableGuide(frame);
  const height = underarm.y - shoulder.y;
  const upper = point(x, shoulder.y + (shoulder.x - x) / Math.tan(shoulderSlope));
  const y = Math.min(
    shoulder.y + lowest * height,
    Math.max(shoulder.y + usual * height, upper.y + turning * height),
  );
  const upright = point(x, y);
  const lower = point(x, underarm.y - (underarm.x - x) * sideLean);
  const bend = ((2 / 3) * ((1 - hollow) * (underarm.x - x))) / (hollow * (lower.y - y)) ** 2;
  const near = 0.5;
  const reach = Math.sqrt(((2 / 3) * (1 - near) * (shoulder.x - x)) / bend) / (y - upper.y);
  const far = Math.max(0.4, Math.min(0.85, reach));
  return {
    upright,
    path: [
      cubic(shoulder, between(shoulder, upper, near), between(upright, upper, far), upright),
      cubic(upright, between(upright, lower, hollow), between(underarm, lower, hollow), underarm),
    ],
  };
}
