import {
  drillPoints,
  edge,
  levelLine,
  notchAtHeight,
  notchAtLength,
  to,
} from '../../drafting/outline.ts';
import type { Dart, Edge, LevelLine, Piece, Side } from '../../drafting/piece.ts';
import { endOf, reverse, startOf } from '../../geometry/curve.ts';
import { type Path, line } from '../../geometry/path.ts';
import { type Point, point } from '../../geometry/point.ts';
import { profilePath, xAt } from '../../geometry/profile.ts';
import type { Intake } from './intakes.ts';
import { intakeEdge, princessBelow, seamStretches, topDarts } from './intakes.ts';
import { type Half, dartShares, heightOn } from './half.ts';
import { waistEdges, waistStretch } from './middle.ts';
import type { TopLine } from './top-line.ts';

/** A top ready to be cut: its half, its top line and the straight legs above the bust. */
export type TopParts = {
  readonly half: Half;
  readonly top: TopLine;
  /** The princess gap above the bust; absent where darts shape the top. */
  readonly above?: Intake;
  /** Tip of the dart in the top line, where darts shape it and there is an opening. */
  readonly topDartTip?: Point;
  /** Height on the side seam at which the top line ends. */
  readonly sideTop: number;
  readonly dartClearance: number;
  /** Degrees between the centre and the top line where it is meant not to be square. */
  readonly topCorner?: number;
};

const other = (side: Side): Side => (side === 'front' ? 'back' : 'front');
const strokesOf = (side: Side): 1 | 2 => (side === 'front' ? 1 : 2);
const titleOf = (side: Side): string => (side === 'front' ? 'Front top' : 'Back top');

const centreEdge = (side: Side, from: Point, until: Point): Edge =>
  edge(
    'centre',
    side === 'front' ? 'fold' : 'zip',
    [line(from, until)],
    side === 'front' ? undefined : 'self',
  );

const sideEdge = ({ half, sideTop }: TopParts, partner: string): Edge =>
  edge('side', 'side', profilePath(half.line, sideTop, half.heights.seam), to(partner, 'side'));

const atSide = (half: Half, level: 'bust' | 'underbust'): Point =>
  point(xAt(half.line, half.heights[level]), half.heights[level]);

/** Which piece of the top a stretch of the waist seam belongs to. */
export const topPartner =
  (side: Side, shaping: 'princess' | 'darts') =>
  (stretch: number): string =>
    shaping === 'darts' ? `${side}-top` : stretch === 0 ? `${side}-top-centre` : `${side}-top-side`;

/** Two panels that meet at the princess seam: both pass the bust point upright and swell below it. */
export function princessPanels(parts: TopParts & { readonly above: Intake }): readonly Piece[] {
  const { half, top, above } = parts;
  const { side } = half;
  const strokes = strokesOf(side);
  const below = princessBelow(half);
  // Above the bust level of this half's own axis: in the back the trued bust level stands elsewhere.
  const upper = { ...above, top: top.crossing, foot: below.top };
  const leg = (towards: 'centre' | 'side'): Path => [
    ...intakeEdge(upper, towards),
    ...intakeEdge(below, towards),
  ];
  const openings = dartShares(half.dartCount).map((_, k) => (k === 0 ? half.gap.seam : 0));
  const [first = [], ...rest] = seamStretches(half, openings);
  const [nameCentre, nameSide] = [`${side}-top-centre`, `${side}-top-side`];
  const toMiddle = (path: Path, k: number): Edge =>
    edge(waistStretch(k), 'seam', reverse(path), to(`${side}-middle`, waistStretch(k)));
  const centrePrincess = edge('princess', 'seam', leg('centre'), to(nameSide, 'princess'));
  const sidePrincess = edge('princess', 'seam', reverse(leg('side')), to(nameCentre, 'princess'));
  const seamCentre = startOf(first) ?? point(0, half.levels.seam);
  const topCentre = startOf(top.centre) ?? point(0, 0);
  const own = sideEdge(parts, `${other(side)}-top-side`);
  const underbust = heightOn(half, 'underbust', half.axis);
  const marks = (on: Edge): Piece['notches'] => [
    ...notchAtHeight('bust-point', on, below.top, strokes),
    ...notchAtHeight('underbust', on, underbust, strokes),
  ];
  const acrossCentre = (level: 'bust' | 'underbust'): LevelLine => {
    const y = heightOn(half, level, half.axis);
    return levelLine(
      level,
      point(0, half.levels[level]),
      point(half.axis - xAt(below.gap, y) / 2, y),
    );
  };
  const acrossSide = (level: 'bust' | 'underbust'): LevelLine => {
    const y = heightOn(half, level, half.axis);
    return levelLine(level, point(half.axis + xAt(below.gap, y) / 2, y), atSide(half, level));
  };
  return [
    {
      name: nameCentre,
      title: `${titleOf(side)}, centre panel`,
      side,
      part: 'top',
      cut: side === 'front' ? 'cut 1 on fold' : 'cut 2 (a pair)',
      copies: side === 'front' ? 1 : 2,
      edges: [
        notched(edge('top', 'top', top.centre), parts.topCorner),
        centrePrincess,
        toMiddle(first, 0),
        centreEdge(side, seamCentre, topCentre),
      ],
      darts: [],
      levels: [acrossCentre('bust'), acrossCentre('underbust')],
      notches: marks(centrePrincess),
      grain: grainBetween(half.axis * 0.3, below.top, below.foot, topCentre.y),
      drills: [],
    },
    {
      name: nameSide,
      title: `${titleOf(side)}, side panel`,
      side,
      part: 'top',
      cut: 'cut 2 (a pair)',
      copies: 2,
      edges: [
        edge('top', 'top', top.outer),
        own,
        ...rest.map((path, k) => toMiddle(path, k + 1)).reverse(),
        sidePrincess,
      ],
      darts: [],
      levels: [acrossSide('bust'), acrossSide('underbust')],
      notches: [
        ...notchAtHeight('bust', own, half.heights.bust, strokes),
        ...marks(sidePrincess),
        ...secondDartMark(
          rest.map((path, k) => toMiddle(path, k + 1)),
          strokes,
        ),
      ],
      grain: grainBetween(
        (half.axis + xAt(half.line, half.heights.bust)) / 2,
        below.top,
        below.foot,
        parts.sideTop,
      ),
      drills: [],
    },
  ];
}

/** Where the second dart of the middle meets the side panel: the end of the stretch before it. */
const secondDartMark = ([before, after]: readonly Edge[], strokes: 1 | 2): Piece['notches'] =>
  before && after ? notchAtLength('second-dart', before, 0, strokes) : [];

const grainBetween = (x: number, bust: number, foot: number, top: number): Piece['grain'] => ({
  from: point(x, Math.min(bust, top + 0.25 * (foot - top))),
  to: point(x, foot - 0.18 * (foot - bust)),
});

/** One piece shaped by darts: from the waist seam up to the bust, and from the top line down to it. */
export function dartedTop(parts: TopParts): readonly Piece[] {
  const { half, top, topDartTip } = parts;
  const { side } = half;
  const name = `${side}-top`;
  const strokes = strokesOf(side);
  const openings = dartShares(half.dartCount).map((share) => share * half.gap.seam);
  const stretches = seamStretches(half, openings);
  const below =
    half.gap.underbust === 0 && half.gap.seam === 0 ? [] : topDarts(half, parts.dartClearance);
  const waistDarts = below.map((intake, k): Dart => {
    const open = half.gap.seam > 0;
    return {
      name: k === 0 ? 'waist' : `waist-${k + 1}`,
      tip: open ? 'above' : 'both',
      centreLeg: open ? reverse(intakeEdge(intake, 'centre')) : intakeEdge(intake, 'centre'),
      sideLeg: open ? reverse(intakeEdge(intake, 'side')) : intakeEdge(intake, 'side'),
      ...(open ? { mouth: `waist-mouth-${'ab'[k] ?? ''}` } : {}),
      pressed: 'centre',
    };
  });
  const topDart = topDartOf(top, topDartTip);
  const own = sideEdge(parts, `${other(side)}-top`);
  const waist = waistEdges(stretches, waistDarts, () => `${side}-middle`).map((each): Edge => ({
    ...each,
    path: reverse(each.path),
  }));
  const seamCentre = point(0, half.levels.seam);
  const topCentre = startOf(top.centre) ?? point(0, 0);
  return [
    {
      name,
      title: titleOf(side),
      side,
      part: 'top',
      cut: side === 'front' ? 'cut 1 on fold' : 'cut 2 (a pair)',
      copies: side === 'front' ? 1 : 2,
      edges: [
        ...topEdges(top, topDart, parts.topCorner),
        own,
        ...[...waist].reverse(),
        centreEdge(side, seamCentre, topCentre),
      ],
      darts: [...topDart, ...waistDarts],
      levels: (['bust', 'underbust'] as const).map((level) =>
        levelLine(level, point(0, half.levels[level]), atSide(half, level)),
      ),
      notches: notchAtHeight('bust', own, half.heights.bust, strokes),
      grain: grainBetween(half.axis * 0.35, half.levels.bust, half.levels.seam, topCentre.y),
      drills: drillPoints([...waistDarts, ...topDart]),
    },
  ];
}

function topDartOf(top: TopLine, tip: Point | undefined): readonly Dart[] {
  const from = endOf(top.centre);
  const until = startOf(top.outer);
  if (!tip || !from || !until) return [];
  return [
    {
      name: 'top',
      tip: 'below',
      centreLeg: [line(from, tip)],
      sideLeg: [line(until, tip)],
      mouth: 'top-mouth',
      pressed: 'centre',
    },
  ];
}

const notched = (top: Edge, corner: number | undefined): Edge =>
  corner === undefined ? top : { ...top, corner };

function topEdges(
  top: TopLine,
  dart: readonly Dart[],
  corner: number | undefined,
): readonly Edge[] {
  const from = endOf(top.centre);
  const until = startOf(top.outer);
  if (dart.length === 0 || !from || !until)
    return [notched(edge('top', 'top', [...top.centre, ...top.outer]), corner)];
  return [
    notched(edge('top-a', 'top', top.centre), corner),
    { name: 'top-mouth', kind: 'mouth', path: [line(from, until)], open: true },
    edge('top-b', 'top', top.outer),
  ];
}
