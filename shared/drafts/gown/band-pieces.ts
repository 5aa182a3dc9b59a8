import type { PartTable } from '../../drafting/drafting-table.ts';
import { edge, notchAtLength, to } from '../../drafting/outline.ts';
import type { Edge, InnerLine, Piece } from '../../drafting/piece.ts';
import { type Quantity, leastSaid } from '../../drafting/quantity.ts';
import { pathLength } from '../../geometry/curve.ts';
import { line } from '../../geometry/path.ts';
import { type Point, point } from '../../geometry/point.ts';
import { deg, mm, said } from '../../units/said.ts';
import { type BandPlan, type BandShape, armRoom, pleatsFor } from './band.ts';

/** Names of the pieces the ends of a band are sewn to. */
export type BandPartners = { readonly front: string; readonly back: string };

/** The stretch of an armhole edge that a band is set into. */
export const setInEdge = 'armhole-band';

const bandName = 'sleeve-band';
const stayName = 'sleeve-band-stay';

/** What the ends of a band have in common: sewn to the armholes, one mark in front and two in the back. */
const endMarks = (front: Edge, back: Edge): Piece['notches'] => [
  ...notchAtLength('band', front, pathLength(front.path) / 2, 1),
  ...notchAtLength('band', back, pathLength(back.path) / 2, 2),
];

/** A plain band, laid flat, and its facing cut alike. */
export function plainBand(shape: BandShape, partners: BandPartners): readonly Piece[] {
  const closed = shape.backUnder.length > 0;
  // Where the ends run on below the armholes each is one straight line with the seam under the arm.
  const straight = closed ? { corner: 180 } : {};
  const front = {
    ...edge('front', 'armhole', shape.front, to(partners.front, setInEdge)),
    ...straight,
  };
  const back = edge('back', 'armhole', shape.back, to(partners.back, setInEdge));
  const upper = edge('upper', 'top', shape.upper);
  const lower = edge('lower', 'top', shape.lower);
  const backUnder = {
    ...edge('back-under', 'armhole', shape.backUnder, to(bandName, 'front-under')),
    ...straight,
  };
  const frontUnder = edge('front-under', 'armhole', shape.frontUnder, to(bandName, 'back-under'));
  const middle = pathLength(shape.upper) / 2;
  const deepest = Math.max(...shape.lower.map((each) => each.to.y));
  return [
    {
      name: bandName,
      title: 'Sleeve band',
      side: 'front',
      part: 'sleeve',
      cut: 'cut 4 (two pairs)',
      copies: 4,
      edges: [
        upper,
        back,
        ...(closed ? [backUnder] : []),
        lower,
        ...(closed ? [frontUnder] : []),
        front,
      ],
      darts: [],
      levels: [],
      notches: [...endMarks(front, back), ...notchAtLength('arm', upper, middle, 1)],
      grain: { from: point(0, 0.2 * deepest), to: point(0, 0.8 * deepest) },
      drills: [],
    },
  ];
}

/** Finished width of the strip that binds and stays the pleated edge (common practice, no source). */
const stayWidth = 15;

/** A rectangle with its upper edge first, clockwise. */
const rectangle = (width: number, height: number): readonly [Point, Point, Point, Point] => [
  point(0, 0),
  point(width, 0),
  point(width, height),
  point(0, height),
];

/** A pleated band, folded double along its lower edge, and the strip its pleats are stayed by. */
export function pleatedBand(
  plan: BandPlan,
  ratio: number,
  partners: BandPartners,
): readonly Piece[] {
  const { path, height, setIn } = plan;
  const length = path * ratio;
  const [a, b, c, d] = rectangle(length, height);
  const held = (on: Edge, into: number): Edge =>
    Math.abs(height / into - 1) > 1e-6 ? { ...on, ratio: height / into } : on;
  const upper: Edge = {
    ...edge('upper', 'seam', [line(a, b)], to(stayName, 'band')),
    ...(ratio > 1 ? { ratio } : {}),
  };
  const back = held(
    edge('back', 'armhole', [line(b, c)], to(partners.back, setInEdge)),
    setIn.back,
  );
  const front = held(
    edge('front', 'armhole', [line(d, a)], to(partners.front, setInEdge)),
    setIn.front,
  );
  const lines = pleatsFor(path, ratio).lines.flatMap(({ place, fold }, i): readonly InnerLine[] => [
    {
      name: `pleat-${i + 1}-place`,
      kind: 'pleat-place',
      path: [line(point(place, 0), point(place, height))],
    },
    {
      name: `pleat-${i + 1}-fold`,
      kind: 'pleat-fold',
      path: [line(point(fold, 0), point(fold, height))],
    },
  ]);
  const [e, f, g, h] = rectangle(path, stayWidth);
  const bound = edge('band', 'seam', [line(g, h)], to(bandName, 'upper'));
  return [
    {
      name: bandName,
      title: 'Sleeve band, pleated',
      side: 'front',
      part: 'sleeve',
      cut: 'cut 2 on fold',
      copies: 2,
      edges: [upper, back, edge('lower', 'fold', [line(c, d)]), front],
      darts: [],
      levels: [],
      notches: [...endMarks(front, back), ...notchAtLength('arm', upper, length / 2, 1)],
      grain: { from: point(0.25 * length, 0.72 * height), to: point(0.75 * length, 0.72 * height) },
      drills: [],
      lines,
    },
    {
      name: stayName,
      title: 'Band stay',
      side: 'front',
      part: 'sleeve',
      cut: 'cut 2 on fold',
      copies: 2,
      edges: [
        edge('upper', 'fold', [line(e, f)]),
        edge('back', 'armhole', [line(f, g)]),
        bound,
        edge('front', 'armhole', [line(h, e)]),
      ],
      darts: [],
      levels: [],
      notches: notchAtLength('arm', bound, path / 2, 1),
      // At one end: the strip is low, and its name needs the rest.
      grain: { from: point(0.04 * path, 0.5 * stayWidth), to: point(0.2 * path, 0.5 * stayWidth) },
      drills: [],
    },
  ];
}

const raised = said`Bands off the shoulder hold the arms down: have her raise both at the fitting, and let in elastic at the back of the band if she cannot.`;

/** Records how a plain band was bent to the arm. */
export function narratePlain(
  paper: PartTable,
  plan: BandPlan,
  shape: BandShape,
  arm: Quantity,
  pieces: readonly Piece[],
): void {
  const free = plan.free.front + plan.free.back;
  const left = free > 0.5 ? said`, less ${mm(free)} of armhole left open under it,` : said``;
  const closed =
    plan.under > 0 ? said`, then sewn to each other for ${mm(plan.under)} under the arm` : said``;
  paper.draw(
    'Plain band',
    said`Upper edge ${mm(plan.path)}, the arm path. ${arm.how} and room ${mm(armRoom)}${left} make the lower edge ${mm(plan.lower)}: the band is bent through ${deg((shape.angle * 180) / Math.PI)}, ${mm(plan.height)} high over the arm, its ends set in for ${mm(plan.setIn.front)} at the front and ${mm(plan.setIn.back)} at the back${closed}.`,
    {
      why: raised,
      measures: arm.measures,
      pieces: pieces.map(({ name }) => name),
    },
  );
}

/** Records the cloth of a pleated band, and how its pleats are laid. */
export function narratePleated(
  paper: PartTable,
  plan: BandPlan,
  ratio: number,
  pieces: readonly Piece[],
): void {
  const { path, height, setIn } = plan;
  const { count, width, depth } = pleatsFor(path, ratio);
  const laid =
    count === 0 || depth < leastSaid
      ? said`no pleats are laid`
      : said`${count} pleats each ${mm(width)} wide and ${mm(depth)} deep, fold line laid on place line towards the front`;
  const drawn =
    height > Math.max(setIn.front, setIn.back) + 0.5
      ? said` Its ends, ${mm(height)} high, are pleated into ${mm(setIn.front)} of armhole at the front and ${mm(setIn.back)} at the back.`
      : said``;
  paper.draw(
    'Pleated band',
    said`Arm path ${mm(path)} times ${Number(ratio.toPrecision(3))} takes ${mm(path * ratio)} of cloth; ${mm(height)} high when finished, it is folded double along the lower edge, ${mm(2 * height)} deep before folding; ${laid}. The upper edge is bound by a strip ${mm(path)} long, which holds it to the arm path.${drawn}`,
    {
      why: raised,
      pieces: pieces.map(({ name }) => name),
    },
  );
}
