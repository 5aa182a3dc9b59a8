import { arc } from '../../geometry/arc.ts';
import type { Path } from '../../geometry/path.ts';
import { type Point, point } from '../../geometry/point.ts';
import { trainShare, trainedHem } from './train.ts';

/**
 * Inner radius of a circle flare: seam length over 2 pi times the part of a full circle.
 * Millimetres. Source: plane geometry; check values in `tests/outside`.
 */
export const flareRadius = (seam: number, fraction: number): number =>
  seam / (2 * Math.PI * fraction);

/** Length of the hem of a circle flare: the seam's own, and a part of 2 pi times the depth more. */
export const flareHem = (seam: number, fraction: number, depth: number): number =>
  seam + 2 * Math.PI * fraction * depth;

/** Part of a full circle that an A-line with this hem is: both its arcs are struck from one point. */
export const partOfCircle = (seam: number, hem: number, depth: number): number =>
  (hem - seam) / (2 * Math.PI * depth);

/** One half of the flare in equal gores: the first on the fold, the others whole. */
export type FlarePlan = {
  readonly inner: number;
  readonly outer: number;
  /** Angle of the half, and of half a gore, radians. */
  readonly angle: number;
  readonly halfGore: number;
  readonly gores: number;
  /** What the hem is longer by at the centre; nothing in the front. */
  readonly train: number;
};

/** What a half of the flare is planned from, mm. */
export type FlareInputs = {
  /** Knee seam of the half. */
  readonly seam: number;
  readonly inner: number;
  readonly depth: number;
  /** Usable width of cloth for a gore between its seam lines, more than nothing. */
  readonly room: number;
  readonly train?: number;
  /** So many gores at least. */
  readonly least?: number | undefined;
};

/** Divides a half of the flare until each gore fits the cloth and is at most a half circle. */
export function planFlare({
  seam,
  inner,
  depth,
  room,
  train = 0,
  least = 1,
}: FlareInputs): FlarePlan {
  const whole = { inner, outer: inner + depth, angle: seam / inner, train };
  for (let gores = least; ; gores += 1) {
    const plan = { ...whole, gores, halfGore: whole.angle / (2 * gores - 1) };
    if (plan.halfGore <= Math.PI / 2 + 1e-9 && widestGore(plan) <= room) return plan;
  }
}

/** Radius of the hem at an angle from the centre. */
export const hemRadius = ({ outer, angle, train }: FlarePlan, at: number): number =>
  train === 0 ? outer : outer + train * trainShare(at / angle);

/** Angle from the centre at which a gore begins, and half its own: the first lies half on each side of the fold. */
export const goreFrom = ({ halfGore }: FlarePlan, k: number): number =>
  k === 0 ? 0 : (2 * k - 1) * halfGore;

/** Places looked at along the hem of a gore. */
const looks = 12;

/** Widest gore across its grain, mm: twice the farthest that its hem lies from its middle. */
function widestGore(plan: FlarePlan): number {
  let widest = 0;
  for (let k = 0; k < plan.gores; k += 1) {
    const middle = 2 * k * plan.halfGore;
    for (let i = 0; i <= looks; i += 1) {
      const off = plan.halfGore * (k === 0 ? i / looks : (2 * i) / looks - 1);
      widest = Math.max(widest, 2 * hemRadius(plan, middle + off) * Math.abs(Math.sin(off)));
    }
    if (plan.train === 0) break;
  }
  return widest;
}

/** The point a half is struck from: over the middle of a gore's knee seam, which lies at the origin. */
export const apexOf = ({ inner }: Pick<FlarePlan, 'inner'>): Point => point(0, -inner);

/** The hem from one angle off the centre to another, turned by `by`. */
export function hemPath(plan: FlarePlan, from: number, until: number, by: number): Path {
  const apex = apexOf(plan);
  const { outer, angle, train } = plan;
  if (train === 0) return arc(apex, outer, from - by, until - by);
  return trainedHem(
    (share) => {
      const at = share * angle - by;
      return {
        at: point(outer * Math.sin(at), apex.y + outer * Math.cos(at)),
        along: point(outer * angle * Math.cos(at), -outer * angle * Math.sin(at)),
        fall: at,
        turn: angle,
      };
    },
    train,
    from / angle,
    until / angle,
  );
}

/** Widths of the knee stretches of a half, from the centre out. */
export const kneeWidths = (plan: FlarePlan): readonly number[] =>
  Array.from({ length: plan.gores }, (_, k) => plan.inner * plan.halfGore * (k === 0 ? 1 : 2));
