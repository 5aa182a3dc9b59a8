import type { PartTable } from '../../drafting/drafting-table.ts';
import { edge, notchAtLength, to } from '../../drafting/outline.ts';
import type { Edge, Piece, Side } from '../../drafting/piece.ts';
import { arc } from '../../geometry/arc.ts';
import { pathLength, reverse } from '../../geometry/curve.ts';
import { line } from '../../geometry/path.ts';
import { type Point, point } from '../../geometry/point.ts';
import { deg, mm, said } from '../../units/said.ts';
import type { KneeStretch } from './knee-stretches.ts';

/**
 * Inner radius of a circle flare: seam length over 2 pi times the part of a full circle.
 * Millimetres. Source: plane geometry; check values in `tests/outside`.
 */
export const flareRadius = (seam: number, fraction: number): number =>
  seam / (2 * Math.PI * fraction);

/** Length of the hem of a circle flare: the seam's own, and a part of 2 pi times the depth more. */
export const flareHem = (seam: number, fraction: number, depth: number): number =>
  seam + 2 * Math.PI * fraction * depth;

/** One half of the flare in equal gores: the first on the fold, the others whole. */
export type FlarePlan = {
  readonly inner: number;
  readonly outer: number;
  /** Angle of the half, and of half a gore, radians. */
  readonly angle: number;
  readonly halfGore: number;
  readonly gores: number;
};

/** Divides a half of the flare until each gore fits the cloth and is at most a half circle; `from` so many on. */
export function planFlare(
  seamHalf: number,
  inner: number,
  depth: number,
  clothWidth: number,
  from = 1,
): FlarePlan {
  const angle = seamHalf / inner;
  const outer = inner + depth;
  const fits = (halfGore: number): boolean =>
    halfGore <= Math.PI / 2 + 1e-9 && 2 * outer * Math.sin(halfGore) <= clothWidth;
  let gores = from;
  while (!fits(angle / (2 * gores - 1)) && gores < 12) gores += 1;
  return { inner, outer, angle, halfGore: angle / (2 * gores - 1), gores };
}

/** Widths of the knee stretches of a half, from the centre out. */
export const kneeWidths = (plan: FlarePlan): readonly number[] =>
  Array.from({ length: plan.gores }, (_, k) => plan.inner * plan.halfGore * (k === 0 ? 1 : 2));

/** Name of a gore, from the centre out. */
export const goreName = (side: Side, k: number): string =>
  k === 0 ? `flare-${side}` : `flare-${side}-${k + 1}`;

/** The pieces of one half of the flare, each in a frame of its own: the apex at the origin. */
export function flarePieces(
  paper: PartTable,
  side: Side,
  plan: FlarePlan,
  otherGores: number,
  stretches: readonly KneeStretch[],
): readonly Piece[] {
  const degrees = (plan.angle * 180) / Math.PI;
  paper.draw(
    `Flare ${side}`,
    said`From one point strike an inner arc at ${mm(plan.inner)} and the hem at ${mm(plan.outer)}; the ${side} half takes ${deg(degrees)} of it, knee quarter ${mm(plan.inner * plan.angle)} over the radius${plan.gores > 1 ? `, in ${plan.gores} gores so that each fits the cloth` : ''}.`,
    {
      lines: [
        arc(point(0, 0), plan.outer, 0, plan.angle),
        arc(point(0, 0), plan.inner, 0, plan.angle),
      ],
      pieces: Array.from({ length: plan.gores }, (_, k) => goreName(side, k)),
    },
  );
  return Array.from({ length: plan.gores }, (_, k) => gore(side, plan, k, otherGores, stretches));
}

function gore(
  side: Side,
  plan: FlarePlan,
  k: number,
  otherGores: number,
  stretches: readonly KneeStretch[],
): Piece {
  const { inner, outer, halfGore, gores } = plan;
  const onFold = k === 0;
  const last = k === gores - 1;
  const from = onFold ? 0 : -halfGore;
  const origin = point(0, 0);
  const rim = (radius: number, angle: number): Point =>
    point(radius * Math.sin(angle), radius * Math.cos(angle));
  const other = side === 'front' ? 'back' : 'front';
  const strokes = side === 'front' ? 1 : 2;
  const angleAt = (along: number, goreFrom: number): number => from + (along - goreFrom) / inner;
  const knees = stretches
    .filter((stretch) => stretch.gore === k)
    .map(({ name, from: start, until, goreFrom, skirt }) =>
      edge(
        name,
        'seam',
        arc(origin, inner, angleAt(start, goreFrom), angleAt(until, goreFrom)),
        to(skirt, name),
      ),
    );
  const outwards = [line(rim(inner, halfGore), rim(outer, halfGore))];
  const far: Edge = last
    ? edge('side', 'side', outwards, to(goreName(other, otherGores - 1), 'side'))
    : edge(`gore-${k + 1}`, 'seam', outwards, to(goreName(side, k + 1), `gore-${k + 1}`));
  const hem = edge('hem', 'hem', reverse(arc(origin, outer, from, halfGore)));
  const inwards = [line(rim(outer, from), rim(inner, from))];
  const near: Edge = onFold
    ? edge('centre', 'fold', inwards)
    : edge(`gore-${k}`, 'seam', inwards, to(goreName(side, k - 1), `gore-${k}`));
  const depth = outer - inner;
  const markAt = (seam: number): number => (depth * seam) / (gores + 1);
  return {
    name: goreName(side, k),
    title: `Flare, ${side}${gores > 1 ? (onFold ? ', centre gore' : `, gore ${k + 1}`) : ''}`,
    side,
    part: 'flare',
    cut: onFold ? 'cut 1 on fold' : 'cut 2 (a pair)',
    copies: onFold ? 1 : 2,
    edges: [...knees, far, hem, near],
    darts: [],
    levels: [],
    notches: [
      ...knees.flatMap((knee) =>
        notchAtLength(`${knee.name}-half`, knee, pathLength(knee.path) / 2, strokes),
      ),
      // The seam nearer the centre is travelled upwards, from the hem.
      ...goreMark(near, depth - markAt(k), strokes),
      ...goreMark(far, markAt(k + 1), strokes),
    ],
    grain: grainOf(inner, outer, onFold ? halfGore * 0.3 : 0),
    drills: [],
  };
}

/** A mark on a gore seam, at a height of its own so that gores cannot be exchanged. */
const goreMark = (seam: Edge, along: number, strokes: 1 | 2): Piece['notches'] =>
  seam.name.startsWith('gore-') ? notchAtLength(seam.name, seam, along, strokes) : [];

const grainOf = (
  inner: number,
  outer: number,
  angle: number,
): { readonly from: Point; readonly to: Point } => {
  const x = (inner + (outer - inner) * 0.3) * Math.sin(angle);
  return {
    from: point(x, inner + (outer - inner) * 0.2),
    to: point(x, inner + (outer - inner) * 0.85),
  };
};
