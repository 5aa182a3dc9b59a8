import { type Cubic, type Path, cubic } from './path.ts';
import { type Point, point } from './point.ts';

/**
 * A circular arc about a centre from one angle to another, radians measured from straight down
 * towards +x. In stretches of at most 22.5 degrees a cubic is within 1e-7 of the radius (the usual
 * 4/3 tan(angle/4) handles).
 */
export function arc(centre: Point, radius: number, from: number, to: number): Path {
  const stretches = Math.max(1, Math.ceil(Math.abs(to - from) / (Math.PI / 8) - 1e-9));
  const step = (to - from) / stretches;
  const handle = (4 / 3) * Math.tan(step / 4) * radius;
  const at = (angle: number): Point =>
    point(centre.x + radius * Math.sin(angle), centre.y + radius * Math.cos(angle));
  return Array.from({ length: stretches }, (_, i): Cubic => {
    const a = from + i * step;
    const b = a + step;
    const p = at(a);
    const q = at(b);
    return cubic(
      p,
      point(p.x + handle * Math.cos(a), p.y - handle * Math.sin(a)),
      point(q.x - handle * Math.cos(b), q.y + handle * Math.sin(b)),
      q,
    );
  });
}
