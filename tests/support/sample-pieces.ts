import type { HouseRules } from '#shared/drafting/house-rules.ts';
import type { Edge, Piece } from '#shared/drafting/piece.ts';
import { cubic, line } from '#shared/geometry/path.ts';
import type { Path } from '#shared/geometry/path.ts';
import { type Point, point } from '#shared/geometry/point.ts';

/** House rules with the allowances of method section 7. */
export const sampleRules: HouseRules = {
  balance: { chest: 6, bust: 10, underbust: -5, waist: 5, topHip: 2, hip: 0, knee: -5 },
  cupShare: 0,
  sideShare: 0.45,
  dartWidest: 40,
  dartClearance: 25,
  peakOverBust: 85,
  shoulderDrop: 127,
  armholeAt: 'across',
  allowance: { seam: 15, side: 25, zip: 25, top: 10, hem: 10 },
};

/** A circular arc as cubics of at most 30 degrees, clockwise on the page where `to` > `from` (degrees). */
export function arc(centre: Point, radius: number, from: number, to: number): Path {
  const count = Math.ceil(Math.abs(to - from) / 30);
  const step = ((to - from) / count) * (Math.PI / 180);
  const handle = (4 / 3) * Math.tan(step / 4) * radius;
  const at = (angle: number): Point =>
    point(centre.x + radius * Math.cos(angle), centre.y + radius * Math.sin(angle));
  return Array.from({ length: count }, (_, i) => {
    const a = (from * Math.PI) / 180 + i * step;
    const b = a + step;
    const [p, q] = [at(a), at(b)];
    return cubic(
      p,
      point(p.x - handle * Math.sin(a), p.y + handle * Math.cos(a)),
      point(q.x + handle * Math.sin(b), q.y - handle * Math.cos(b)),
      q,
    );
  });
}

const straight = (from: Point, to: Point): Path => [line(from, to)];

/**
 * A front skirt piece on the fold, 260 wide and 300 long: plain rectangle with a 30 mm waist dart,
 * 110 long, closed by turning about its tip.
 */
export const dartedFront: Piece = {
  name: 'front-middle',
  title: 'Front, waist to knee',
  side: 'front',
  part: 'middle',
  cut: 'cut 1 on fold',
  copies: 1,
  edges: [
    {
      name: 'waist-a',
      path: straight(point(0, 0), point(100, 0)),
      kind: 'seam',
      joins: { piece: 'front-top', edge: 'waist-a' },
    },
    {
      name: 'waist-mouth',
      path: straight(point(100, 0), point(130, 0)),
      kind: 'mouth',
      open: true,
    },
    {
      name: 'waist-b',
      path: straight(point(130, 0), point(260, 0)),
      kind: 'seam',
      joins: { piece: 'front-top', edge: 'waist-b' },
    },
    {
      name: 'side',
      path: straight(point(260, 0), point(260, 300)),
      kind: 'side',
      joins: { piece: 'back-middle', edge: 'side' },
    },
    {
      name: 'knee',
      path: straight(point(260, 300), point(0, 300)),
      kind: 'seam',
      joins: { piece: 'flare-front', edge: 'knee' },
    },
    { name: 'centre', path: straight(point(0, 300), point(0, 0)), kind: 'fold' },
  ],
  darts: [
    {
      name: 'waist',
      tip: 'below',
      centreLeg: straight(point(100, 0), point(115, 110)),
      sideLeg: straight(point(130, 0), point(115, 110)),
      mouth: 'waist-mouth',
      pressed: 'centre',
    },
  ],
  levels: [
    { level: 'waist', from: point(0, 60), to: point(260, 60) },
    { level: 'hip', from: point(0, 200), to: point(260, 200) },
  ],
  notches: [{ name: 'hip', edge: 'side', at: point(260, 200), outward: point(1, 0), strokes: 1 }],
  grain: { from: point(60, 60), to: point(60, 260) },
  drills: [point(115, 98)],
};

/** A back skirt piece with a centre-back zip and a curved side, tangent-continuous at its middle. */
export const curvedBack: Piece = {
  name: 'back-middle',
  title: 'Back, waist to knee',
  side: 'back',
  part: 'middle',
  cut: 'cut 2 (a pair)',
  copies: 2,
  edges: [
    {
      name: 'waist',
      path: [cubic(point(0, 0), point(60, 0), point(120, -4), point(180, -12))],
      kind: 'seam',
      joins: { piece: 'back-top', edge: 'waist' },
    },
    {
      name: 'side',
      path: [
        cubic(point(180, -12), point(200, 60), point(236, 100), point(236, 190)),
        cubic(point(236, 190), point(236, 350), point(190, 420), point(190, 500)),
      ],
      kind: 'side',
      joins: { piece: 'front-middle', edge: 'side' },
    },
    {
      name: 'knee',
      path: straight(point(190, 500), point(0, 500)),
      kind: 'seam',
      joins: { piece: 'flare-back', edge: 'knee' },
    },
    { name: 'centre', path: straight(point(0, 500), point(0, 160)), kind: 'seam', joins: 'self' },
    { name: 'zip', path: straight(point(0, 160), point(0, 0)), kind: 'zip', joins: 'self' },
  ],
  darts: [],
  levels: [{ level: 'hip', from: point(0, 190), to: point(236, 190) }],
  notches: [
    { name: 'hip', edge: 'side', at: point(236, 190), outward: point(1, 0), strokes: 2 },
    { name: 'zip-end', edge: 'zip', at: point(0, 160), outward: point(-1, 0), strokes: 2 },
  ],
  grain: { from: point(40, 200), to: point(40, 460) },
  drills: [],
};

const degrees = (angle: number): number => (angle * Math.PI) / 180;
const onCircle = (radius: number, angle: number): Point =>
  point(radius * Math.cos(degrees(angle)), radius * Math.sin(degrees(angle)));

/** A quarter-circle flare in four, 45 degrees: inner radius 240, 420 long, centre front on the fold. */
export const flareSector: Piece = {
  name: 'flare-front',
  title: 'Flare, front',
  side: 'front',
  part: 'flare',
  cut: 'cut 1 on fold',
  copies: 1,
  edges: [
    {
      name: 'knee',
      path: arc(point(0, 0), 240, 90, 45),
      kind: 'seam',
      joins: { piece: 'front-middle', edge: 'knee' },
    },
    {
      name: 'side',
      path: straight(onCircle(240, 45), onCircle(660, 45)),
      kind: 'side',
      joins: { piece: 'flare-back', edge: 'side' },
    },
    { name: 'hem', path: arc(point(0, 0), 660, 45, 90), kind: 'hem' },
    { name: 'centre', path: straight(onCircle(660, 90), onCircle(240, 90)), kind: 'fold' },
  ],
  darts: [],
  levels: [],
  notches: [],
  grain: { from: point(40, 300), to: point(40, 600) },
  drills: [],
};

/** The same piece with one edge given other properties. */
export function withEdge(piece: Piece, name: string, change: Partial<Edge>): Piece {
  return {
    ...piece,
    edges: piece.edges.map((edge) => (edge.name === name ? { ...edge, ...change } : edge)),
  };
}
