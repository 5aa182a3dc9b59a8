import { pathCrossings, splitPath } from '../../geometry/curve.ts';
import { moved, movedPath, turnAbout, undo } from '../../geometry/motion.ts';
import { type Path, cubic } from '../../geometry/path.ts';
import { type Point, distance, point, unit } from '../../geometry/point.ts';
import type { StraightLegs } from './contour.ts';

/** A top line cut at the princess seam or dart, laid flat again. */
export type TopLine = {
  /** From the centre line to the nearer leg. */
  readonly centre: Path;
  /** From the farther leg to the side. */
  readonly outer: Path;
  /** Height at which it meets both legs. */
  readonly crossing: number;
  /** Whether the peak stands on the outer panel. */
  readonly peakOutside: boolean;
};

/** Where a top line sets out, peaks and ends. */
export type TopLinePoints = {
  readonly centre: Point;
  /** Absent in the back. */
  readonly peak?: Point;
  readonly side: Point;
  /** Lean (dx/dy) of the side seam there: the line arrives square to it. */
  readonly sideLean: number;
};

/**
 * Draws a top line with its opening closed, so that it crosses without a kink, and opens it again.
 * It sets out square to the centre line, is level at the peak and arrives square to the side seam.
 */
export function topLine(points: TopLinePoints, legs: StraightLegs): TopLine {
  // Closing turns the outer panel about the point where the straight legs would meet.
  const closing = turnAbout(legs.pivot, -2 * legs.angle);
  const side = moved(points.side, closing);
  const outward = unit({ x: 1, y: -points.sideLean });
  const arrive = {
    x: closing.cos * outward.x - closing.sin * outward.y,
    y: closing.sin * outward.x + closing.cos * outward.y,
  };
  const { centre, peak } = points;
  const drawn: Path = peak
    ? [...rise(centre, peak), ...fall(peak, side, arrive)]
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
    peakOutside: peak !== undefined && at.index === 0,
  };
}

/** Tightest bend of the dip at the centre, so that an enclosed allowance still lies flat outside it. */
const tightestDip = 16;

/** Centre to peak: square at the centre, level at the peak, rounder at the peak than in the dip. */
const rise = (centre: Point, peak: Point): Path => {
  const width = peak.x - centre.x;
  // Radius at the centre of a cubic level at both ends is 3/2 handle^2 over the height it climbs.
  const handle = Math.sqrt((tightestDip * Math.abs(centre.y - peak.y)) / 1.5);
  const reach = Math.max(0.4 * width, Math.min(0.85 * width, handle));
  return [
    cubic(centre, point(centre.x + reach, centre.y), point(peak.x - 0.55 * width, peak.y), peak),
  ];
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
