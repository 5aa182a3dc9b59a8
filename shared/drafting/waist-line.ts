import { pathLength } from '../geometry/curve.ts';
import { type Path, cubic } from '../geometry/path.ts';
import { type Point, point } from '../geometry/point.ts';

/** A waist dart with straight legs, before its width is known: upright, its tip at a height. */
export type PlannedDart = {
  /** Distance of its axis from the centre line. */
  readonly axis: number;
  /** Height of its tip. */
  readonly tip: number;
  /** Its part of the whole intake. */
  readonly share: number;
};

/** A waist line to be drawn from the centre line out. */
export type PlannedWaist = {
  /** Height at the centre line, where it sets out square. */
  readonly centre: number;
  /** From the centre out. */
  readonly darts: readonly PlannedDart[];
  readonly side: Point;
  /** Slope (dy/dx) at which it arrives at the side. */
  readonly sideSlope: number;
};

/** The two ends of the mouth of a dart. */
export type Mouth = { readonly centre: Point; readonly side: Point };

/** A waist line as drawn: its stretches between the mouths of the darts, from the centre out. */
export type WaistLine = { readonly stretches: readonly Path[]; readonly mouths: readonly Mouth[] };

type Way = { readonly at: Point; readonly slope: number };

/**
 * Part of the way that the last handle of a curve reaches: a third, or less where the curve sets out level
 * and ends lower than an even bend would, so that it never turns back on itself.
 */
function lastHandle({ at, slope }: Way, until: Way): number {
  const even = (until.at.x - at.x) * until.slope;
  if (slope !== 0 || even === 0) return 1 / 3;
  return Math.max(0.15, Math.min(1 / 3, ((2 / 3) * (until.at.y - at.y)) / even));
}

/** A curve from one place to another with given slopes (dy/dx) at its ends. */
function swept(from: Way, until: Way): Path {
  const width = until.at.x - from.at.x;
  const near = width / 3;
  const far = width * lastHandle(from, until);
  return [
    cubic(
      from.at,
      point(from.at.x + near, from.at.y + near * from.slope),
      point(until.at.x - far, until.at.y - far * until.slope),
      until.at,
    ),
  ];
}

/** Height of the end of a curve that bends evenly all the way (a parabola). */
const evenlyTo = (from: Way, x: number, slope: number): number =>
  from.at.y + ((x - from.at.x) * (from.slope + slope)) / 2;

/**
 * The mouth of a dart of this width: level, so that its legs are equal, each leg square to the waist
 * line, so that the line runs on smoothly when the dart is closed.
 */
function mouthAfter(from: Way, { axis, tip }: PlannedDart, width: number): readonly [Way, Way] {
  const away = Math.sign(from.at.y - tip) || 1;
  let y = from.at.y;
  let slope = 0;
  for (let i = 0; i < 12; i += 1) {
    slope = (away * width) / 2 / Math.max(1, away * (y - tip));
    y = evenlyTo(from, axis - width / 2, slope);
  }
  return [
    { at: point(axis - width / 2, y), slope },
    { at: point(axis + width / 2, y), slope: -slope },
  ];
}

type Drawn = WaistLine & { readonly last: Way };

function drawn(plan: PlannedWaist, intake: number): Drawn {
  const stretches: Path[] = [];
  const mouths: Mouth[] = [];
  let last: Way = { at: point(0, plan.centre), slope: 0 };
  for (const dart of plan.darts) {
    const [near, far] = mouthAfter(last, dart, dart.share * intake);
    stretches.push(swept(last, near));
    mouths.push({ centre: near.at, side: far.at });
    last = far;
  }
  stretches.push(swept(last, { at: plan.side, slope: plan.sideSlope }));
  return { stretches, mouths, last };
}

/** The waist line with darts that take this much in all. */
export const waistLine = (plan: PlannedWaist, intake: number): WaistLine => drawn(plan, intake);

/** Sewn length of a waist line, mm: its stretches, darts closed. */
export const waistLength = (waist: WaistLine): number =>
  waist.stretches.reduce((sum, stretch) => sum + pathLength(stretch), 0);

/** The waist line rises or falls to the side by at most this, mm (our rule; the trade's skirts rise by about 12). */
const mostRise = 20;

/** Height at which the waist line would reach the side bending evenly: half the rise of its two slopes, within 20 mm. */
export function evenSideHeight(plan: PlannedWaist, intake: number): number {
  const rise = evenlyTo(drawn(plan, intake).last, plan.side.x, plan.sideSlope) - plan.centre;
  return plan.centre + Math.max(-mostRise, Math.min(mostRise, rise));
}

const roundsAtMost = 30;

/** What the darts must take in all, mm, for the sewn waist line to be this long, within 1e-9. */
export function intakeFor(plan: PlannedWaist, length: number): number {
  let intake = Math.max(0, plan.side.x - length);
  for (let round = 0; round < roundsAtMost; round += 1) {
    const over = waistLength(drawn(plan, intake)) - length;
    if (Math.abs(over) < 1e-9) break;
    intake += over;
  }
  return intake;
}
