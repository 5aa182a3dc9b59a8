import { pointAt, tangentAt, velocityAt } from '../../geometry/curve.ts';
import { type Cubic, type Path, cubic } from '../../geometry/path.ts';
import { type Point, between, cross, point, unit } from '../../geometry/point.ts';

/** What an armhole is drawn between: the shoulder, the underarm, and how far in it comes between them. */
export type ArmholeFrame = {
  readonly shoulder: Point;
  /** Slope of the shoulder line, radians below level; the armhole leaves square to it. */
  readonly shoulderSlope: number;
  readonly underarm: Point;
  /** How far the side seam runs in for each millimetre down; the armhole arrives square to it. */
  readonly sideLean: number;
  /** Distance from the centre line at which the armhole should stand upright. */
  readonly guide: number;
  /** Smallest radius it may turn with: its cutting line lies inside the curve and must follow it. */
  readonly tightest: number;
};

/** An armhole, and the place where it stands upright. */
export type Armhole = { readonly path: Path; readonly upright: Point };

/** Fullness of a sweep: how far its handles reach to the corner of its two end directions. */
const leastFull = 0.5;
const fullest = 0.75;
/** As flat as a sweep may become where it would otherwise turn too tightly. */
const flattest = 0.25;

const looks = 48;

/** Smallest radius along a path of curves, mm. */
export function smallestRadius(path: Path): number {
  let smallest = Infinity;
  for (const segment of path) {
    if (segment.kind === 'line') continue;
    for (let k = 1; k < looks; k += 1) {
      const t = k / looks;
      const speed = velocityAt(segment, t);
      const [before, after] = [velocityAt(segment, t - 1e-4), velocityAt(segment, t + 1e-4)];
      const turn = Math.abs(cross(unit(before), unit(after))) / 2e-4;
      smallest = Math.min(smallest, Math.hypot(speed.x, speed.y) / Math.max(1e-9, turn));
    }
  }
  return smallest;
}

/** Place where a sweep stands upright: it leaves the shoulder inwards and arrives outwards. */
function uprightOf(curve: Cubic): Point {
  let low = 0;
  let high = 1;
  for (let i = 0; i < 50; i += 1) {
    const t = (low + high) / 2;
    if (tangentAt(curve, t).x < 0) low = t;
    else high = t;
  }
  return pointAt(curve, low);
}

/** The armhole in one sweep that comes in to the guide, as nearly as its fullness allows. */
function sweep({ shoulder, shoulderSlope, underarm, sideLean, guide, tightest }: ArmholeFrame): {
  readonly curve: Cubic;
  readonly full: number;
} {
  // The corner: down from the shoulder square to it, and in from the underarm square to the side.
  const lean = Math.tan(shoulderSlope);
  const down =
    (underarm.y - shoulder.y + sideLean * (shoulder.x - underarm.x)) / (1 + sideLean * lean);
  const corner = point(shoulder.x - lean * down, shoulder.y + down);
  const drawn = (full: number): Cubic =>
    cubic(shoulder, between(shoulder, corner, full), between(underarm, corner, full), underarm);
  let low = 0.2;
  let high = 0.95;
  for (let i = 0; i < 40; i += 1) {
    const full = (low + high) / 2;
    if (uprightOf(drawn(full)).x > guide) low = full;
    else high = full;
  }
  let full = Math.min(fullest, Math.max(leastFull, low));
  while (full > flattest && smallestRadius([drawn(full)]) < tightest) full -= 0.02;
  return { curve: drawn(full), full: low };
}

/** The upright lies this part of the way down, or lower where the shoulder leans far over. */
const usual = 0.58;
/** Part of the height in which the curve turns upright below the shoulder's own direction. */
const turning = 0.2;
/** An upright lower than this part of the way leaves no room for the hollow. */
const lowest = 0.85;
/** Handles of the hollow, as parts of the way to its corner: a little fuller than a quarter of an ellipse. */
const hollow = 0.6;
/** The guide keeps inside the shoulder point, and the hollow keeps some depth, mm. */
const insideShoulder = 5;
const leastHollow = 28;

/** The armhole in two curves, upright where they meet on the guide; no answer where that lies too low. */
function twoCurves({
  shoulder,
  shoulderSlope,
  underarm,
  sideLean,
  guide,
}: ArmholeFrame): Armhole | undefined {
  const height = underarm.y - shoulder.y;
  const x = Math.min(guide, shoulder.x - insideShoulder, underarm.x - leastHollow);
  const upper = point(x, shoulder.y + (shoulder.x - x) / Math.tan(shoulderSlope));
  const share = Math.max(usual, (upper.y - shoulder.y) / height + turning);
  if (share > lowest) return undefined;
  const upright = point(x, shoulder.y + share * height);
  const lower = point(x, underarm.y - (underarm.x - x) * sideLean);
  const bend = ((2 / 3) * (1 - hollow) * (underarm.x - x)) / (hollow * (lower.y - upright.y)) ** 2;
  // The bend of the upper curve where the two meet is the lower one's, as nearly as its handle allows.
  const near = 0.5;
  const reach = Math.sqrt(((2 / 3) * (1 - near) * (shoulder.x - x)) / bend);
  const far = Math.max(0.4, Math.min(0.85, reach / (upright.y - upper.y)));
  return {
    upright,
    path: [
      cubic(shoulder, between(shoulder, upper, near), between(upright, upper, far), upright),
      cubic(upright, between(upright, lower, hollow), between(underarm, lower, hollow), underarm),
    ],
  };
}

/**
 * The armhole from the shoulder point down to the underarm: it leaves square to the shoulder, comes in to
 * the guide and arrives square to the side seam, bending one way all along. One sweep where that reaches
 * the guide; a straighter one, as most backs are, is drawn in two curves that meet upright on it.
 */
export function armhole(frame: ArmholeFrame): Armhole {
  const { curve, full } = sweep(frame);
  const straighter = full < leastFull ? twoCurves(frame) : undefined;
  const turnsEasily = straighter && smallestRadius(straighter.path) >= frame.tightest;
  return turnsEasily ? straighter : { path: [curve], upright: uprightOf(curve) };
}
