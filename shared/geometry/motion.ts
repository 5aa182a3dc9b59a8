import type { Path } from './path.ts';
import type { Point } from './point.ts';

/** A rigid motion of the paper: turned by cos/sin, then shifted. Lengths and angles stay. */
export type Motion = {
  readonly cos: number;
  readonly sin: number;
  readonly dx: number;
  readonly dy: number;
};

export const shift = (dx: number, dy: number): Motion => ({ cos: 1, sin: 0, dx, dy });

/** A turn by `angle` radians about a pivot; positive turns clockwise on the page. */
export function turnAbout(pivot: Point, angle: number): Motion {
  const cos = Math.cos(angle);
  const sin = Math.sin(angle);
  return {
    cos,
    sin,
    dx: pivot.x - cos * pivot.x + sin * pivot.y,
    dy: pivot.y - sin * pivot.x - cos * pivot.y,
  };
}

/** The motion that lays `from` on `to` with direction `fromAlong` on `toAlong` (unit vectors). */
export function layOn(from: Point, fromAlong: Point, to: Point, toAlong: Point): Motion {
  const cos = fromAlong.x * toAlong.x + fromAlong.y * toAlong.y;
  const sin = fromAlong.x * toAlong.y - fromAlong.y * toAlong.x;
  return {
    cos,
    sin,
    dx: to.x - (cos * from.x - sin * from.y),
    dy: to.y - (sin * from.x + cos * from.y),
  };
}

export const moved = (p: Point, by: Motion): Point => ({
  x: by.cos * p.x - by.sin * p.y + by.dx,
  y: by.sin * p.x + by.cos * p.y + by.dy,
});

/** The motion that takes a moved point back. */
export const undo = (by: Motion): Motion => ({
  cos: by.cos,
  sin: -by.sin,
  dx: -(by.cos * by.dx + by.sin * by.dy),
  dy: by.sin * by.dx - by.cos * by.dy,
});

export const movedPath = (path: Path, by: Motion): Path =>
  path.map((segment) =>
    segment.kind === 'line'
      ? { kind: 'line', from: moved(segment.from, by), to: moved(segment.to, by) }
      : {
          kind: 'cubic',
          from: moved(segment.from, by),
          c1: moved(segment.c1, by),
          c2: moved(segment.c2, by),
          to: moved(segment.to, by),
        },
  );
