/** A place on the drafting paper, millimetres. x runs out from the centre line, y runs down. */
export type Point = { readonly x: number; readonly y: number };

export const point = (x: number, y: number): Point => ({ x, y });

export const add = (a: Point, b: Point): Point => ({ x: a.x + b.x, y: a.y + b.y });

export const subtract = (a: Point, b: Point): Point => ({ x: a.x - b.x, y: a.y - b.y });

export const scale = (a: Point, by: number): Point => ({ x: a.x * by, y: a.y * by });

export const dot = (a: Point, b: Point): number => a.x * b.x + a.y * b.y;

/** z of the cross product: positive where b turns clockwise from a on the page (y runs down). */
export const cross = (a: Point, b: Point): number => a.x * b.y - a.y * b.x;

export const distance = (a: Point, b: Point): number => Math.hypot(b.x - a.x, b.y - a.y);

export const between = (a: Point, b: Point, share: number): Point => ({
  x: a.x + (b.x - a.x) * share,
  y: a.y + (b.y - a.y) * share,
});

/** The direction of a vector with length one; a vector without length stays as it is. */
export const unit = (a: Point): Point => {
  const length = Math.hypot(a.x, a.y);
  return length === 0 ? a : { x: a.x / length, y: a.y / length };
};

/** A quarter turn clockwise on the page: (1, 0) becomes (0, 1). */
export const turnRight = (a: Point): Point => ({ x: -a.y, y: a.x });

/** A quarter turn anticlockwise on the page: (1, 0) becomes (0, -1). */
export const turnLeft = (a: Point): Point => ({ x: a.y, y: -a.x });
