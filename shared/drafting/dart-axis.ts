import { endOf, startOf } from '../geometry/curve.ts';
import { type Point, add, cross, dot, scale, subtract, unit } from '../geometry/point.ts';
import type { Dart } from './piece.ts';

type Axis = { readonly tip: Point; readonly along: Point };

/** From the tip of a dart towards the middle of its mouth. */
function axisOf(dart: Dart): Axis | undefined {
  const tip = endOf(dart.centreLeg);
  const [a, b] = [startOf(dart.centreLeg), startOf(dart.sideLeg)];
  if (!tip || !a || !b) return undefined;
  return { tip, along: unit(add(unit(subtract(a, tip)), unit(subtract(b, tip)))) };
}

/** The place on the axis of a dart this far from its tip; none for a dart without legs. */
export function onDartAxis(dart: Dart, reach: number): readonly Point[] {
  const axis = axisOf(dart);
  return axis ? [add(axis.tip, scale(axis.along, reach))] : [];
}

/** How far from the tip a place on the axis of a dart lies, mm; no answer where it is not on it. */
export function reachOnAxis(dart: Dart, at: Point): number | undefined {
  const axis = axisOf(dart);
  if (!axis) return undefined;
  const out = subtract(at, axis.tip);
  const reach = dot(axis.along, out);
  return reach > 0 && Math.abs(cross(axis.along, out)) < 1e-3 ? reach : undefined;
}
