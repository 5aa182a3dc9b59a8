import type { Point } from './point.ts';

/** A straight stretch. */
export type Line = { readonly kind: 'line'; readonly from: Point; readonly to: Point };

/** A cubic Bezier stretch with its two handles. */
export type Cubic = {
  readonly kind: 'cubic';
  readonly from: Point;
  readonly c1: Point;
  readonly c2: Point;
  readonly to: Point;
};

export type Segment = Line | Cubic;

/** Stretches laid end to end: each starts where the one before it ends. */
export type Path = readonly Segment[];

export const line = (from: Point, to: Point): Line => ({ kind: 'line', from, to });

export const cubic = (from: Point, c1: Point, c2: Point, to: Point): Cubic => ({
  kind: 'cubic',
  from,
  c1,
  c2,
  to,
});
