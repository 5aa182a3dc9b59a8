import { pathCrossings, splitPath } from '../../geometry/curve.ts';
import { type Motion, moved, movedPath, turnAbout, undo } from '../../geometry/motion.ts';
import { type Path, cubic } from '../../geometry/path.ts';
import { type Point, distance, point, unit } from '../../geometry/point.ts';
import type { StraightLegs } from './contour.ts';
import type { TopLineShape } from './style-card.ts';

/** A top line cut at the princess seam or dart, laid flat again. */
export type TopLine = {
  /** From the centre line to the nearer leg. */
  readonly centre: Path;
  /** From the farther leg to the side. */
  readonly outer: Path;
  /** Height at which it meets both legs. */
  readonly crossing: number;
  /** Direction in which it arrives at its outer end, laid flat. */
  readonly outward: Point;
};

/** Where a top line sets out, peaks and ends. */
export type TopLinePoints = {
  readonly centre: Point;
  /** Absent in the back, and where the line is straight. */
  readonly peak?: Point;
  /** How it climbs from the centre to the peak. */
  readonly shape?: TopLineShape;
  readonly side: Point;
  /** Lean (dx/dy) of the side seam there: the line arrives square to it. Absent off the shoulder. */
  readonly sideLean?: number;
};

/**
 * Draws a top line with its opening closed, so that it crosses without a kink, and opens it again.
 * It sets out square to the centre line, is level at the peak and arrives square to the side seam, or, off
 * the shoulder, in one bend at the armhole.
 */
export function topLine(points: TopLinePoints, legs: StraightLegs): TopLine {
  // Closing turns the outer panel about the point where the straight legs would meet.
  const closing = turnAbout(legs.pivot, -2 * legs.angle);
  const side = moved(points.side, closing);
  const { centre, peak, shape = 'sweetheart', sideLean } = points;
  const arrive =
    sideLean === undefined
      ? bentTowards(peak ?? centre, side)
      : turned(unit({ x: 1, y: -sideLean }), closing);
  const drawn: Path = peak
    ? [...rise(centre, peak, shape), ...fall(peak, side, arrive)]
    : fall(centre, side, arrive);
  const leg = point(-Math.sin(legs.angle), -Math.cos(legs.angle));
  const beyond = { x: legs.pivot.x + leg.x, y: legs.pivot.y + leg.y };
  const crossing = pathCrossings(drawn, legs.pivot, beyond)[0];
  const at = crossing ?? { index: drawn.length - 1, t: 1, at: side };
  const [inner, outerClosed] = splitPath(drawn, at);
  return {
    centre: inner,
    outer: movedPath(outerClosed, undo(closing)),
    crossing: at.at.y,
    outward: turned(arrive, undo(closing)),
  };
}

const turned = (direction: Point, { cos, sin }: Motion): Point =>
  point(cos * direction.x - sin * direction.y, sin * direction.x + cos * direction.y);

/** Off the shoulder the line bends one way only from where it lay level: it arrives this much steeper than straight. */
const steeper = 1.6;
const steepestArrival = Math.tan((35 * Math.PI) / 180);

const bentTowards = (from: Point, to: Point): Point => {
  const slope = (steeper * (to.y - from.y)) / (to.x - from.x);
  return unit({ x: 1, y: Math.max(-steepestArrival, Math.min(steepestArrival, slope)) });
};

/** Tightest bend of the dip at the centre, so that an enclosed allowance still lies flat outside it. */
const tightestDip = 16;

/** A notched line leaves the centre at this angle from level, degrees. */
const notchClimb = 45;

/** Corner between a notched top line and the centre, degrees. */
export const notchCorner = 90 + notchClimb;

/**
 * Centre to peak, level at the peak. A sweetheart is square at the centre and rounder at the peak than
 * in the dip; a scoop is rounder in the dip; a notch leaves the centre at an angle.
 */
const rise = (centre: Point, peak: Point, shape: TopLineShape): Path => {
  const width = peak.x - centre.x;
  // Radius at the centre of a cubic level at both ends is 3/2 handle^2 over the height it climbs.
  const handle = Math.sqrt((tightestDip * Math.abs(centre.y - peak.y)) / 1.5);
  const least = shape === 'scooped' ? 0.72 * width : 0.4 * width;
  const reach = Math.max(least, Math.min(0.85 * width, handle));
  const soft = shape === 'scooped' ? 0.45 * width : 0.55 * width;
  if (shape === 'notched') {
    const climb = Math.min(0.4 * width, 0.6 * Math.abs(centre.y - peak.y));
    return [
      cubic(
        centre,
        point(centre.x + climb, centre.y - climb * Math.tan((notchClimb * Math.PI) / 180)),
        point(peak.x - soft, peak.y),
        peak,
      ),
    ];
  }
  return [cubic(centre, point(centre.x + reach, centre.y), point(peak.x - soft, peak.y), peak)];
};

/** On to the side: level where it sets out, square to the side seam where it arrives. */
const fall = (from: Point, side: Point, arrive: Point): Path => {
  const reach = distance(from, side);
  return [
    cubic(
      from,
      point(from.x + 0.42 * reach, from.y),
      point(side.x - 0.3 * reach * arrive.x, side.y - 0.3 * reach * arrive.y),
      side,
    ),
  ];
};
