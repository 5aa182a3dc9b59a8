import type { PartTable } from '../../drafting/drafting-table.ts';
import { leastSaid } from '../../drafting/quantity.ts';
import { edge, notchAtLength, to } from '../../drafting/outline.ts';
import type { Edge, Piece, Side } from '../../drafting/piece.ts';
import { arc } from '../../geometry/arc.ts';
import { pathLength, reverse } from '../../geometry/curve.ts';
import { line } from '../../geometry/path.ts';
import { type Point, point } from '../../geometry/point.ts';
import { deg, mm, said } from '../../units/said.ts';
import { type FlarePlan, apexOf, goreFrom, hemPath, hemRadius } from './flare-plan.ts';
import type { KneeStretch } from './knee-stretches.ts';

/** Name of a gore, from the centre out. */
export const goreName = (side: Side, k: number): string =>
  k === 0 ? `flare-${side}` : `flare-${side}-${k + 1}`;

/** The pieces of one half of the flare, each in a frame of its own: the middle of its knee seam at the origin. */
export function flarePieces(
  paper: PartTable,
  side: Side,
  plan: FlarePlan,
  otherGores: number,
  stretches: readonly KneeStretch[],
): readonly Piece[] {
  const pieces = Array.from({ length: plan.gores }, (_, k) =>
    gore(side, plan, k, otherGores, stretches),
  );
  narrateHalf(paper, side, plan, pieces);
  return pieces;
}

function narrateHalf(
  paper: PartTable,
  side: Side,
  plan: FlarePlan,
  pieces: readonly Piece[],
): void {
  const { inner, outer, angle, gores, train } = plan;
  const hem = pieces
    .flatMap((piece) => piece.edges.filter(({ kind }) => kind === 'hem'))
    .reduce((sum, each) => sum + pathLength(each.path), 0);
  const divided = gores > 1 ? said`, in ${gores} gores so that each fits the cloth` : said``;
  const trained =
    train >= leastSaid
      ? said` From the side seam to the centre back the hem grows longer by ${mm(train)}, level where it leaves both.`
      : said``;
  paper.draw(
    `Flare ${side}`,
    said`From one point strike an inner arc at ${mm(inner)} and the hem at ${mm(outer)}; the ${side} half takes ${deg((angle * 180) / Math.PI)} of it, knee quarter ${mm(inner * angle)} over the radius${divided}.${trained} Its hem is ${mm(hem)} long.`,
    {
      why: said`Both arcs have one centre, so every seam is as long as the flare is deep and meets seam and hem squarely.`,
      lines: [hemPath(plan, 0, angle, 0), arc(apexOf(plan), inner, 0, angle)],
      pieces: pieces.map(({ name }) => name),
    },
  );
}

function gore(
  side: Side,
  plan: FlarePlan,
  k: number,
  otherGores: number,
  stretches: readonly KneeStretch[],
): Piece {
  const { inner, halfGore, gores } = plan;
  const onFold = k === 0;
  const last = k === gores - 1;
  const from = onFold ? 0 : -halfGore;
  // The gore lies upright about its own middle, this far round from the centre of the half.
  const middle = 2 * k * halfGore;
  const [begin, end] = [goreFrom(plan, k), goreFrom(plan, k + 1)];
  const apex = apexOf(plan);
  const rim = (radius: number, angle: number): Point =>
    point(radius * Math.sin(angle), apex.y + radius * Math.cos(angle));
  const other = side === 'front' ? 'back' : 'front';
  const strokes = side === 'front' ? 1 : 2;
  const angleAt = (along: number, start: number): number => from + (along - start) / inner;
  const knees = stretches
    .filter((stretch) => stretch.gore === k)
    .map(({ name, from: start, until, goreFrom: first, skirt }) =>
      edge(
        name,
        'seam',
        arc(apex, inner, angleAt(start, first), angleAt(until, first)),
        to(skirt, name),
      ),
    );
  const [near, far] = [hemRadius(plan, begin), hemRadius(plan, end)];
  const outwards = [line(rim(inner, halfGore), rim(far, halfGore))];
  const farEdge: Edge = last
    ? edge('side', 'side', outwards, to(goreName(other, otherGores - 1), 'side'))
    : edge(`gore-${k + 1}`, 'seam', outwards, to(goreName(side, k + 1), `gore-${k + 1}`));
  const hem = edge('hem', 'hem', reverse(hemPath(plan, begin, end, middle)));
  const inwards = [line(rim(near, from), rim(inner, from))];
  const nearEdge: Edge = onFold
    ? edge('centre', 'fold', inwards)
    : edge(`gore-${k}`, 'seam', inwards, to(goreName(side, k - 1), `gore-${k}`));
  const markAt = (length: number, seam: number): number => (length * seam) / (gores + 1);
  return {
    name: goreName(side, k),
    title: `Flare, ${side}${gores > 1 ? (onFold ? ', centre gore' : `, gore ${k + 1}`) : ''}`,
    side,
    part: 'flare',
    cut: onFold ? 'cut 1 on fold' : 'cut 2 (a pair)',
    copies: onFold ? 1 : 2,
    edges: [...knees, farEdge, hem, nearEdge],
    darts: [],
    levels: [],
    notches: [
      ...knees.flatMap((knee) =>
        notchAtLength(`${knee.name}-half`, knee, pathLength(knee.path) / 2, strokes),
      ),
      // The seam nearer the centre is travelled upwards, from the hem.
      ...goreMark(nearEdge, near - inner - markAt(near - inner, k), strokes),
      ...goreMark(farEdge, markAt(far - inner, k + 1), strokes),
    ],
    grain: grainOf(inner, Math.min(near, far), onFold ? halfGore * 0.3 : 0),
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
    from: point(x, (outer - inner) * 0.2),
    to: point(x, (outer - inner) * 0.85),
  };
};
