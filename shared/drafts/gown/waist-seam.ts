import { crossingsOfLine, gentleLength, pointAt } from '../../geometry/curve.ts';
import { type Cubic, cubic } from '../../geometry/path.ts';
import { point } from '../../geometry/point.ts';

/** The seam rises or falls at the side by at most this. */
const mostFall = 15;

/** How far the seam falls at the side when it arrives at a slope (dy/dx): a third of slope x width. */
export const fallFor = (slope: number, width: number): number =>
  Math.max(-mostFall, Math.min(mostFall, (slope * width) / 3));

/**
 * The raised waist seam of a half, drawn closed: level and square at the centre line, arriving at the
 * side at a slope (dy/dx), `fall` lower than it set out, and exactly `length` long.
 */
export function closedSeam(length: number, y: number, fall: number, slope: number): Cubic {
  const drawn = (width: number): Cubic => {
    // The last handle lies level with the start where it can, which makes the fall a pure cube.
    const reach = Math.abs(slope) < 1e-3 ? 1 / 3 : fall / (slope * width);
    const handle = width * Math.min(0.55, Math.max(0.15, reach));
    return cubic(
      point(0, y),
      point(width / 3, y),
      point(width - handle, y + fall - handle * slope),
      point(width, y + fall),
    );
  };
  let width = length;
  for (let i = 0; i < 8; i += 1) {
    const short = length - gentleLength(drawn(width));
    width += short;
    if (Math.abs(short) < 1e-9) break;
  }
  return drawn(width);
}

/** Share of the closed seam at a distance from the centre line, and its height there. */
export function seamAt(seam: Cubic, x: number): { readonly t: number; readonly y: number } {
  const t = crossingsOfLine(seam, point(x, 0), point(x, 1))[0] ?? 1;
  return { t, y: pointAt(seam, t).y };
}
