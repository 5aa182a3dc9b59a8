import type { Construction } from '#shared/drafting/construction.ts';
import type { HouseRules } from '#shared/drafting/house-rules.ts';
import type { Edge, FinishedPiece, LevelLine, LevelName, Side } from '#shared/drafting/piece.ts';
import { type Path, line } from '#shared/geometry/path.ts';
import { type Point, point } from '#shared/geometry/point.ts';

/*
 * A garment so plain that its proof can be reckoned by hand: a straight band round the body in two
 * heights, `top` over `middle`, joined at a waist seam, with one narrow dart in the waist of each
 * top and one in its upper edge.
 */

const allowance = { seam: 15, side: 25, zip: 25, top: 10, hem: 40 };

export const plainRules: HouseRules = {
  balance: { chest: 0, bust: 0, underbust: 0, waist: 0, topHip: 0, hip: 0, knee: 0 },
  cupShare: 0,
  sideShare: 0.45,
  dartWidest: 40,
  dartClearance: 25,
  peakOverBust: 85,
  shoulderDrop: 127,
  armholeAt: 'across',
  allowance,
};

const run = (...through: readonly Point[]): Path =>
  through.slice(1).map((to, index) => line(through[index] ?? to, to));

type Frame = { readonly right: number; readonly top: number; readonly bottom: number };

/** Rectangle round a piece: centre allowance on the left, side on the right. */
const cutRound = (frame: Frame, centre: number, above: number, below: number): Path => {
  const { right, top, bottom } = frame;
  const a = point(-centre, top - above);
  const b = point(right + allowance.side, top - above);
  const c = point(right + allowance.side, bottom + below);
  const d = point(-centre, bottom + below);
  return run(a, b, c, d, a);
};

const centreEdge = (side: Side, path: Path): Edge =>
  side === 'front'
    ? { name: 'centre', path, kind: 'fold' }
    : { name: 'centre', path, kind: 'zip', joins: 'self' };

const levelAt = (level: LevelName, y: number, right: number): LevelLine => ({
  level,
  from: point(0, y),
  to: point(right, y),
});

const shared = (
  side: Side,
  part: 'top' | 'middle',
): Pick<
  FinishedPiece,
  'name' | 'title' | 'side' | 'part' | 'cut' | 'copies' | 'lettering' | 'drills' | 'notchMarks'
> => ({
  name: `${side}-${part}`,
  title: `${side === 'front' ? 'Front' : 'Back'} ${part}`,
  side,
  part,
  cut: side === 'front' ? 'cut 1 on fold' : 'cut 2 (a pair)',
  copies: side === 'front' ? 1 : 2,
  lettering: [],
  notchMarks: [],
  drills: [],
});

function bandTop(side: Side): FinishedPiece {
  const other = side === 'front' ? 'back-top' : 'front-top';
  const width = 230;
  const below = `${side}-middle`;
  return {
    ...shared(side, 'top'),
    edges: [
      { name: 'top-a', kind: 'top', path: run(point(0, 0), point(99, 0)) },
      { name: 'top-mouth', kind: 'mouth', open: true, path: run(point(99, 0), point(101, 0)) },
      { name: 'top-b', kind: 'top', path: run(point(101, 0), point(width, 0)) },
      {
        name: 'side',
        kind: 'side',
        joins: { piece: other, edge: 'side' },
        path: run(point(width, 0), point(width, 300)),
      },
      {
        name: 'waist-b',
        kind: 'seam',
        joins: { piece: below, edge: 'waist-b' },
        path: run(point(width, 300), point(101, 300)),
      },
      {
        name: 'waist-mouth',
        kind: 'mouth',
        open: true,
        path: run(point(101, 300), point(99, 300)),
      },
      {
        name: 'waist-a',
        kind: 'seam',
        joins: { piece: below, edge: 'waist-a' },
        path: run(point(99, 300), point(0, 300)),
      },
      centreEdge(side, run(point(0, 300), point(0, 0))),
    ],
    darts: [
      {
        name: 'top',
        tip: 'below',
        centreLeg: run(point(99, 0), point(100, 100)),
        sideLeg: run(point(101, 0), point(100, 100)),
        mouth: 'top-mouth',
        pressed: 'centre',
      },
      {
        name: 'waist',
        tip: 'above',
        centreLeg: run(point(99, 300), point(100, 200)),
        sideLeg: run(point(101, 300), point(100, 200)),
        mouth: 'waist-mouth',
        pressed: 'centre',
      },
    ],
    levels: [levelAt('bust', 150, width), levelAt('underbust', 250, width)],
    notches: [
      { name: 'bust', edge: 'side', at: point(width, 150), outward: point(1, 0), strokes: 1 },
    ],
    grain: { from: point(50, 50), to: point(50, 250) },
    cutLine: cutRound(
      { right: width, top: 0, bottom: 300 },
      side === 'front' ? 0 : allowance.zip,
      allowance.top,
      allowance.seam,
    ),
  };
}

function bandMiddle(side: Side): FinishedPiece {
  const other = side === 'front' ? 'back-middle' : 'front-middle';
  const width = 228;
  const above = `${side}-top`;
  return {
    ...shared(side, 'middle'),
    edges: [
      {
        name: 'waist-a',
        kind: 'seam',
        joins: { piece: above, edge: 'waist-a' },
        path: run(point(0, 300), point(99, 300)),
      },
      {
        name: 'waist-b',
        kind: 'seam',
        joins: { piece: above, edge: 'waist-b' },
        path: run(point(99, 300), point(width, 300)),
      },
      {
        name: 'side',
        kind: 'side',
        joins: { piece: other, edge: 'side' },
        path: run(point(width, 300), point(width, 900)),
      },
      { name: 'hem', kind: 'hem', path: run(point(width, 900), point(0, 900)) },
      centreEdge(side, run(point(0, 900), point(0, 300))),
    ],
    darts: [],
    levels: [levelAt('hip', 500, width), levelAt('knee-seam', 800, width)],
    notches: [
      { name: 'hip', edge: 'side', at: point(width, 500), outward: point(1, 0), strokes: 1 },
      ...(side === 'back'
        ? [
            {
              name: 'zip-end',
              edge: 'centre',
              at: point(0, 480),
              outward: point(-1, 0),
              strokes: 2,
            } as const,
          ]
        : []),
    ],
    grain: { from: point(50, 350), to: point(50, 850) },
    cutLine: cutRound(
      { right: width, top: 300, bottom: 900 },
      side === 'front' ? 0 : allowance.zip,
      allowance.seam,
      allowance.hem,
    ),
  };
}

export const bandPieces: readonly FinishedPiece[] = [
  bandTop('front'),
  bandTop('back'),
  bandMiddle('front'),
  bandMiddle('back'),
];

export const bandConstruction: Construction = {
  wanted: [
    { level: 'chest', body: 906, ease: -20, wanted: 886, estimated: true },
    { level: 'bust', body: 920, ease: 0, wanted: 920, estimated: false },
    // The waist dart is 1 mm wide at the under-bust: halfway up its hundred.
    { level: 'underbust', body: 931, ease: -15, wanted: 916, estimated: false },
    { level: 'waist-seam', body: 922, ease: -10, wanted: 912, estimated: true },
    { level: 'hip', body: 892, ease: 20, wanted: 912, estimated: false },
  ],
  chestSide: { front: 224, back: 224 },
  topOpenings: (['front', 'back'] as const).map((side) => ({
    side,
    wanted: 2.5,
    height: -25,
    centre: { piece: `${side}-top`, edge: 'top' },
    outer: { piece: `${side}-top`, edge: 'top' },
  })),
  opening: { closure: 'centreBackZip', hips: 892, least: 892, give: 0 },
  knees: { standing: 590, step: 700, caution: false },
};
