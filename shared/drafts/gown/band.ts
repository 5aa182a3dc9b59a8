import { pathLength, reverse } from '../../geometry/curve.ts';
import { type Path, cubic, line } from '../../geometry/path.ts';
import { type Point, add, point, scale } from '../../geometry/point.ts';

/** Room round the upper arm at the lower edge of a band: 20 to 40 (common practice, no source). */
export const armRoom = 30;

/** What a sleeve band is planned from: one arm, finished lengths, mm. */
export type BandInputs = {
  /** Girth round both arms, chest and back at the band, with its ease. */
  readonly girth: number;
  /** Girth of one upper arm. */
  readonly arm: number;
  /** Half the finished top edges, openings closed, up to the points where the band is set in. */
  readonly frontTop: number;
  readonly backTop: number;
  /** The armhole edges below those points. */
  readonly frontArmhole: number;
  readonly backArmhole: number;
  readonly height: number;
  /** Whether the ends are pleated into the armholes, or else closed under the arm where they reach below them. */
  readonly pleated: boolean;
};

/** A band for one arm: how long it is above and below, and how deep it is set in. */
export type BandPlan = {
  /** Arm path: finished length of the upper edge, and what the top edges leave for it. */
  readonly path: number;
  readonly left: number;
  /** Length of the lower edge that lets the arm through. */
  readonly lower: number;
  readonly height: number;
  /** Length of the armhole edges that the ends are sewn to. */
  readonly setIn: { readonly front: number; readonly back: number };
  /** What is left of the armhole edges under the band. */
  readonly free: { readonly front: number; readonly back: number };
  /** Length in which the ends are sewn to each other under the arm. */
  readonly under: number;
};

/** Least part of an upper arm that a band goes over (our rule): from crease to crease outside. */
const leastOverArm = 0.4;

/** Shorter rests of an armhole edge are not left open under a band, mm. */
const leastFree = 3;
/** A shorter seam under the arm is not worth sewing, mm: the band is as high as its armholes. */
const leastUnder = 8;

/**
 * The arm path is half of the girth round both arms less the finished top edges of front and back (method
 * section 6), but never less than the outside of the arm: a deep top line lies longer than the tape. The ends are set in as deep as the band is high, or as the armhole edges reach; what hangs
 * below is closed under the arm. The lower edge and what is left open of the armholes go round the arm.
 */
export function planBand(inputs: BandInputs): BandPlan {
  const { height, arm, frontArmhole, backArmhole, pleated } = inputs;
  const below = height - (frontArmhole + backArmhole) / 2;
  const under = pleated || below < leastUnder ? 0 : below;
  const into = (armhole: number): number =>
    under > 0 || armhole < height + leastFree ? armhole : height;
  const setIn = { front: into(frontArmhole), back: into(backArmhole) };
  const free = { front: frontArmhole - setIn.front, back: backArmhole - setIn.back };
  const left = inputs.girth / 2 - inputs.frontTop - inputs.backTop;
  return {
    left,
    path: Math.max(left, leastOverArm * arm),
    lower: arm + armRoom - free.front - free.back,
    height,
    setIn,
    free,
    under,
  };
}

/** Height of a plain band at a share of its path from the front (0) to the back (1), and how fast it grows. */
const heightAt = (
  { setIn: { front, back }, under }: BandPlan,
  share: number,
): readonly [height: number, growth: number] => [
  front + under + (back - front) * share * share * (3 - 2 * share),
  (back - front) * 6 * share * (1 - share),
];

/** A place on an edge, and how far round from upright the band falls there, radians. */
type Place = { readonly at: Point; readonly turn: number };

/** A place on the upper edge, bent alike all along: `angle` in all, radians; it opens downwards. */
function upperAt(
  path: number,
  angle: number,
  share: number,
): { readonly at: Point; readonly turn: number } {
  const turn = angle * (share - 0.5);
  if (Math.abs(angle) < 1e-6) return { at: point(path * (share - 0.5), 0), turn: 0 };
  const radius = path / angle;
  return { at: point(radius * Math.sin(turn), radius * (Math.cos(turn) - 1)), turn };
}

const stretches = 12;

/** A curve at some depth under the upper edge, from front to back. */
function curveUnder(
  { path }: BandPlan,
  angle: number,
  depth: (share: number) => readonly [depth: number, growth: number],
): Path {
  const stations = Array.from({ length: stretches + 1 }, (_, i) => {
    const share = i / stretches;
    const { at, turn } = upperAt(path, angle, share);
    const down = point(Math.sin(turn), Math.cos(turn));
    const along = point(Math.cos(turn), -Math.sin(turn));
    const [deep, growth] = depth(share);
    return {
      at: add(at, scale(down, deep)),
      handle: scale(add(scale(along, path + angle * deep), scale(down, growth)), 1 / stretches / 3),
    };
  });
  return stations.slice(1).flatMap((to, i) => {
    const from = stations[i];
    if (!from) return [];
    return [cubic(from.at, add(from.at, from.handle), add(to.at, scale(to.handle, -1)), to.at)];
  });
}

/** A plain band laid flat, front end on the left: its edges clockwise from the upper one. */
export type BandShape = {
  /** Angle in which it is bent, radians: a ring's sector where front and back are set in alike. */
  readonly angle: number;
  readonly upper: Path;
  /** The end sewn to the back armhole, and what of it is closed under the arm; then the same in front. */
  readonly back: Path;
  readonly backUnder: Path;
  readonly lower: Path;
  readonly frontUnder: Path;
  readonly front: Path;
};

const shapeAt = (plan: BandPlan, angle: number): BandShape => {
  const { front, back } = plan.setIn;
  const upper = curveUnder(plan, angle, () => [0, 0]);
  const lower = curveUnder(plan, angle, (share) => heightAt(plan, share));
  const [start, end] = [upperAt(plan.path, angle, 0), upperAt(plan.path, angle, 1)];
  const under = (from: Place, length: number): Point =>
    add(from.at, scale(point(Math.sin(from.turn), Math.cos(from.turn)), length));
  const ends = (from: Place, setIn: number): { readonly sewn: Path; readonly under: Path } => ({
    sewn: [line(from.at, under(from, setIn))],
    under: plan.under > 0 ? [line(under(from, setIn), under(from, setIn + plan.under))] : [],
  });
  const [toFront, toBack] = [ends(start, front), ends(end, back)];
  return {
    angle,
    upper,
    back: toBack.sewn,
    backUnder: toBack.under,
    lower: reverse(lower),
    frontUnder: reverse(toFront.under),
    front: reverse(toFront.sewn),
  };
};

/** A band is bent into at most this, radians (our rule): more, and its ends would nearly meet in the cloth. */
const mostBent = 4.4;

/**
 * Bends a plain band until its lower edge is as long as the arm needs. No answer where it would have to be bent
 * farther than cloth allows. Source of the ring's sector: angle = (lower - upper) / height, derived.
 */
export function shapeBand(plan: BandPlan): BandShape | undefined {
  let [low, high] = [-0.8, mostBent];
  const lengthAt = (angle: number): number => pathLength(shapeAt(plan, angle).lower);
  if (lengthAt(high) < plan.lower) return undefined;
  for (let i = 0; i < 40; i += 1) {
    const angle = (low + high) / 2;
    if (lengthAt(angle) < plan.lower) low = angle;
    else high = angle;
  }
  return shapeAt(plan, (low + high) / 2);
}

/** Knife pleats that take up a band to its finished length: each lies `width` wide and takes `depth` twice. */
export type Pleats = {
  readonly count: number;
  readonly width: number;
  readonly depth: number;
  /** Places along the cloth: the line a pleat is folded on, and the one it is laid on. */
  readonly lines: readonly { readonly place: number; readonly fold: number }[];
};

/** A pleat shows about this much (common practice, no source: 20 to 30). */
const pleatShows = 25;

/**
 * Cloth for n pleats of width w and depth d: n (w + 2 d). So many that each shows about 25. Source: take-up
 * of a pleat is twice its depth (`reference.md` 3g); check values in `tests/outside`.
 */
export function pleatsFor(finished: number, ratio: number): Pleats {
  if (ratio - 1 < 1e-6) return { count: 0, width: finished, depth: 0, lines: [] };
  const count = Math.max(3, Math.round(finished / pleatShows));
  const width = finished / count;
  const depth = (width * (ratio - 1)) / 2;
  return {
    count,
    width,
    depth,
    lines: Array.from({ length: count }, (_, i) => {
      const place = width / 2 + i * (width + 2 * depth);
      return { place, fold: place + 2 * depth };
    }),
  };
}
