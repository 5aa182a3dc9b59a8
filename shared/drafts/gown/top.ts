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
import { type Half, atSide, dartShares, heightOn } from './half.ts';
import { waistEdges, waistStretch } from './middle.ts';
import type { GownStyle } from './style-card.ts';
import type { TopLine } from './top-line.ts';
import { type TopNames, topNames } from './top-names.ts';

/** A top ready to be cut: its half, its top line and the straight legs above the bust. */
export type TopParts = {
  readonly half: Half;
  readonly top: TopLine;
  /** The princess gap above the bust; absent where darts shape the top. */
  readonly above?: Intake;
  /** Tip of the dart in the top line, where darts shape it and there is an opening. */
  readonly topDartTip?: Point;
  readonly names: TopNames;
  /** Names of the other half's pieces. */
  readonly partner: TopNames;
  /** Height on the side seam at which it begins: where the top line ends, or at the underarm. */
  readonly sideTop: number;
  /** From the top line to the underarm, where the gown is off the shoulder. */
  readonly armhole?: Path;
  readonly dartClearance: number;
  /** Degrees between the centre and the top line where it is meant not to be square. */
  readonly topCorner?: number;
};

export const strokesOf = (side: Side): 1 | 2 => (side === 'front' ? 1 : 2);

/** The centre line of a piece: a fold in front, the zip seam in the back. */
export const centreEdge = (side: Side, from: Point, until: Point): Edge =>
  edge(
    'centre',
    side === 'front' ? 'fold' : 'zip',
    [line(from, until)],
    side === 'front' ? undefined : 'self',
  );

/** The armhole edge, where there is one, travelled from the top line to the underarm. */
export const armholeEdges = ({ armhole }: TopParts): readonly Edge[] =>
  armhole ? [edge('armhole', 'armhole', armhole)] : [];

const sideEdge = ({ half, sideTop }: TopParts, partner: string): Edge =>
  edge('side', 'side', profilePath(half.line, sideTop, half.heights.seam), to(partner, 'side'));

/** Which piece of the top a stretch of the waist seam belongs to. */
export const topPartner =
  (side: Side, style: GownStyle) =>
  (stretch: number): string => {
    const { centre, side: outer, one } = topNames(side, style);
    return style.shaping === 'darts' ? one : stretch === 0 ? centre : outer;
  };

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
  const { centre: nameCentre, side: nameSide, title } = parts.names;
  const toMiddle = (path: Path, k: number): Edge =>
    edge(waistStretch(k), 'seam', reverse(path), to(`${side}-middle`, waistStretch(k)));
  const centrePrincess = edge('princess', 'seam', leg('centre'), to(nameSide, 'princess'));
  const sidePrincess = edge('princess', 'seam', reverse(leg('side')), to(nameCentre, 'princess'));
  const seamCentre = startOf(first) ?? point(0, half.levels.seam);
  const topCentre = startOf(top.centre) ?? point(0, 0);
  const own = sideEdge(parts, parts.partner.side);
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
      title: `${title}, centre panel`,
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
      title: `${title}, side panel`,
      side,
      part: 'top',
      cut: 'cut 2 (a pair)',
      copies: 2,
      edges: [
        edge('top', 'top', top.outer),
        ...armholeEdges(parts),
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

/** The grain of a piece, upright. */
export const grainBetween = (
  x: number,
  bust: number,
  foot: number,
  top: number,
): Piece['grain'] => ({
  from: point(x, Math.min(bust, top + 0.25 * (foot - top))),
  to: point(x, foot - 0.18 * (foot - bust)),
});

/** One piece shaped by darts: from the waist seam up to the bust, and from the top line down to it. */
export function dartedTop(parts: TopParts): readonly Piece[] {
  const { half, top, topDartTip } = parts;
  const { side } = half;
  const { one: name, title } = parts.names;
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
  const own = sideEdge(parts, parts.partner.one);
  const waist = waistEdges(stretches, waistDarts, () => `${side}-middle`).map((each): Edge => ({
    ...each,
    path: reverse(each.path),
  }));
  const seamCentre = point(0, half.levels.seam);
  const topCentre = startOf(top.centre) ?? point(0, 0);
  return [
    {
      name,
      title,
      side,
      part: 'top',
      cut: side === 'front' ? 'cut 1 on fold' : 'cut 2 (a pair)',
      copies: side === 'front' ? 1 : 2,
      edges: [
        ...topEdges(top, topDart, parts.topCorner),
        ...armholeEdges(parts),
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

/** The dart in the top line, where there is one. */
export function topDartOf(top: TopLine, tip: Point | undefined): readonly Dart[] {
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

/** A top edge that leaves the centre at an angle of its own. */
export const notched = (top: Edge, corner: number | undefined): Edge =>
  corner === undefined ? top : { ...top, corner };

/** The top line in one edge, or in two with the mouth of its dart between. */
export function topEdges(
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
