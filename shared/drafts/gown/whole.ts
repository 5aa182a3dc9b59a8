import { drillPoints, edge, levelLine, notchAtHeight, to } from '../../drafting/outline.ts';
import type { Dart, Edge, LevelLine, LevelName, Piece } from '../../drafting/piece.ts';
import { reverse, startOf } from '../../geometry/curve.ts';
import { type Path, line } from '../../geometry/path.ts';
import { point } from '../../geometry/point.ts';
import { profilePath, xAt } from '../../geometry/profile.ts';
import { atSide, heightOn } from './half.ts';
import { type Intake, intakeEdge, princessWhole, wholeDarts } from './intakes.ts';
import { centreMarks } from './middle.ts';
import type { SideHeights } from './side-line.ts';
import { type FootOf, type PanelFoot, cornered } from './skirt-foot.ts';
import {
  type TopParts,
  armholeEdges,
  centreEdge,
  grainBetween,
  notched,
  strokesOf,
  topDartOf,
  topEdges,
} from './top.ts';

/** Levels across a piece that reaches from the top edge to the knee seam. */
const across: readonly (readonly [LevelName, keyof SideHeights])[] = [
  ['bust', 'bust'],
  ['underbust', 'underbust'],
  ['waist', 'waist'],
  ['top-hip', 'topHip'],
  ['hip', 'hip'],
];

const sideDown = ({ half, sideTop }: TopParts, partner: string, foot: PanelFoot): Edge =>
  edge(
    'side',
    'side',
    [...profilePath(half.line, sideTop, half.heights.knee), ...foot.outer],
    to(partner, 'side'),
  );

/** The centre edge from the foot of the piece up to the top line. */
function centreDown(parts: TopParts, foot: PanelFoot): Edge {
  const { side, heights } = parts.half;
  const above = centreEdge(side, point(0, heights.knee), topCentreOf(parts));
  return cornered({ ...above, path: [...foot.inner, ...above.path] }, foot);
}

const sideMarks = ({ half }: TopParts, own: Edge): Piece['notches'] =>
  (['bust', 'waist', 'hip'] as const).flatMap((level) =>
    notchAtHeight(level, own, half.heights[level], strokesOf(half.side)),
  );

/** The front is cut on the fold, the back as a pair joined at the centre. */
const cutOf = ({ half }: TopParts): Pick<Piece, 'cut' | 'copies'> =>
  half.side === 'front'
    ? { cut: 'cut 1 on fold', copies: 1 }
    : { cut: 'cut 2 (a pair)', copies: 2 };

const topCentreOf = ({ top }: TopParts) => startOf(top.centre) ?? point(0, 0);

/**
 * Two panels from the top edge to the knee seam: they meet at the princess seam, which takes in the
 * waist, runs out at its tip and goes straight on down.
 */
export function wholePanels(
  parts: TopParts & { readonly above: Intake },
  footOf: FootOf,
): readonly Piece[] {
  const { half, top, above, names } = parts;
  const { side, heights, levels, axis } = half;
  const strokes = strokesOf(side);
  const below = princessWhole(half);
  const upper = { ...above, top: top.crossing, foot: below.top };
  const leg = (towards: 'centre' | 'side'): Path => [
    ...intakeEdge(upper, towards),
    ...intakeEdge(below, towards),
    line(point(axis, below.foot), point(axis, heights.knee)),
  ];
  const [centreFoot, sideFoot] = [footOf(names.centre), footOf(names.side)];
  const centrePrincess = edge(
    'princess',
    'seam',
    [...leg('centre'), ...centreFoot.outer],
    to(names.side, 'princess'),
  );
  const sidePrincess = cornered(
    edge(
      'princess',
      'seam',
      [...sideFoot.inner, ...reverse(leg('side'))],
      to(names.centre, 'princess'),
    ),
    sideFoot,
  );
  const own = sideDown(parts, parts.partner.side, sideFoot);
  const kneeLine = (from: number, until: number): LevelLine =>
    levelLine('knee-seam', point(from, heights.knee), point(until, heights.knee));
  const gapAt = (y: number): number => (y >= below.foot ? 0 : xAt(below.gap, y));
  const level = (
    name: LevelName,
    key: keyof SideHeights,
    towards: 'centre' | 'side',
  ): LevelLine => {
    const y = heightOn(half, key, axis);
    return towards === 'centre'
      ? levelLine(name, point(0, levels[key]), point(axis - gapAt(y) / 2, y))
      : levelLine(name, point(axis + gapAt(y) / 2, y), atSide(half, key));
  };
  const marks = (on: Edge): Piece['notches'] => [
    ...notchAtHeight('bust-point', on, below.top, strokes),
    ...(['underbust', 'waist', 'hip'] as const).flatMap((key) =>
      notchAtHeight(key, on, heightOn(half, key, axis), strokes),
    ),
  ];
  const centre = centreDown(parts, centreFoot);
  const grain = (x: number): Piece['grain'] =>
    grainBetween(x, levels.hip, heights.knee, levels.waist);
  return [
    {
      name: names.centre,
      title: `${names.title}, centre panel`,
      side,
      part: 'top',
      ...cutOf(parts),
      edges: [
        notched(edge('top', 'top', top.centre), parts.topCorner),
        centrePrincess,
        ...centreFoot.edges,
        centre,
      ],
      darts: [],
      levels: [...across.map(([name, key]) => level(name, key, 'centre')), kneeLine(0, axis)],
      notches: [...marks(centrePrincess), ...centreFoot.notches, ...centreMarks(half, centre)],
      grain: grain(axis * 0.35),
      drills: [],
    },
    {
      name: names.side,
      title: `${names.title}, side panel`,
      side,
      part: 'top',
      cut: 'cut 2 (a pair)',
      copies: 2,
      edges: [
        edge('top', 'top', top.outer),
        ...armholeEdges(parts),
        own,
        ...sideFoot.edges,
        sidePrincess,
      ],
      darts: [],
      levels: [
        ...across.map(([name, key]) => level(name, key, 'side')),
        kneeLine(axis, xAt(half.line, heights.knee)),
      ],
      notches: [...sideMarks(parts, own), ...marks(sidePrincess), ...sideFoot.notches],
      grain: grain((axis + xAt(half.line, heights.hip)) / 2),
      drills: [],
    },
  ];
}

/** One piece from the top edge to the knee seam, its waist taken in by darts pointed at both ends. */
export function wholeDarted(parts: TopParts, footOf: FootOf): readonly Piece[] {
  const { half, top, names } = parts;
  const { side, heights, levels } = half;
  const shaped = half.gap.underbust > 0 || half.gap.waist > 0;
  const waistDarts = (shaped ? wholeDarts(half, parts.dartClearance) : []).map(
    (intake, k): Dart => ({
      name: k === 0 ? 'waist' : `waist-${k + 1}`,
      tip: 'both',
      centreLeg: intakeEdge(intake, 'centre'),
      sideLeg: intakeEdge(intake, 'side'),
      pressed: 'centre',
    }),
  );
  const topDart = topDartOf(top, parts.topDartTip);
  const foot = footOf(names.one);
  const own = sideDown(parts, parts.partner.one, foot);
  const centre = centreDown(parts, foot);
  return [
    {
      name: names.one,
      title: names.title,
      side,
      part: 'top',
      ...cutOf(parts),
      edges: [
        ...topEdges(top, topDart, parts.topCorner),
        ...armholeEdges(parts),
        own,
        ...foot.edges,
        centre,
      ],
      darts: [...topDart, ...waistDarts],
      levels: [
        ...across.map(([name, key]) => levelLine(name, point(0, levels[key]), atSide(half, key))),
        levelLine('knee-seam', point(0, heights.knee), atSide(half, 'knee')),
      ],
      notches: [...sideMarks(parts, own), ...foot.notches, ...centreMarks(half, centre)],
      grain: grainBetween(half.axis * 0.35, levels.hip, heights.knee, levels.waist),
      drills: drillPoints([...waistDarts, ...topDart]),
    },
  ];
}
