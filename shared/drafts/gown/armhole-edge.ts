import { type Path, cubic } from '../../geometry/path.ts';
import { type Point, point, turnRight, unit } from '../../geometry/point.ts';

/** Part of the armhole's height, and of its width, that its two handles reach (our rule). */
const hollow = 0.5;
const sweep = 0.55;

/**
 * The armhole edge of a gown off the shoulder: from the end of the top line, square to it, down and
 * out to the underarm, where it meets the side seam square. `outward` is the direction in which the
 * top line arrives, `sideLean` (dx/dy) that of the side seam at the underarm.
 */
export function armholeEdge(from: Point, outward: Point, underarm: Point, sideLean: number): Path {
  const down = turnRight(outward);
  const square = unit({ x: 1, y: -sideLean });
  const deep = hollow * (underarm.y - from.y);
  const wide = sweep * Math.max(underarm.x - from.x, 0.5 * (underarm.y - from.y));
  return [
    cubic(
      from,
      point(from.x + deep * down.x, from.y + deep * down.y),
      point(underarm.x - wide * square.x, underarm.y - wide * square.y),
      underarm,
    ),
  ];
}
