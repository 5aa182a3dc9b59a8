import type { TopOpening } from '../../drafting/construction.ts';
import type { DraftingTable, PartTable } from '../../drafting/drafting-table.ts';
import type { HouseRules } from '../../drafting/house-rules.ts';
import type { Piece } from '../../drafting/piece.ts';
import { pathLength } from '../../geometry/curve.ts';
import { point } from '../../geometry/point.ts';
import { profileLength, slopeAt, xAt } from '../../geometry/profile.ts';
import { mm, said } from '../../units/said.ts';
import { princessAbove, topDart } from './contour.ts';
import { intakeEdge, princessBelow, topDarts } from './intakes.ts';
import { refuseBluntDarts, tipOf } from './darts-reach.ts';
import { type Half, heightOn } from './half.ts';
import type { GownStyle } from './style-card.ts';
import { heightAtArc } from './truing.ts';
import { dartedTop, princessPanels } from './top.ts';
import { type TopLine, type TopLinePoints, notchCorner, topLine } from './top-line.ts';

/** The top line stays at least this far above the bust point. */
const overBust = 30;

/** Draws the top of a half: its top line, its princess panels or its one darted piece. */
export function drawTop(
  table: DraftingTable,
  paper: PartTable,
  half: Half,
  front: Half,
  opening: number,
  style: GownStyle,
  rules: HouseRules,
): { readonly pieces: readonly Piece[]; readonly openings: readonly TopOpening[] } {
  const { side, axis } = half;
  const points = topLinePoints(half, front, style);
  const bust = heightOn(half, 'bust', axis);
  const peak = side === 'front' ? style.topDrop : Math.min(points.centre.y, points.side.y);
  const sideTop = points.side.y;
  const corner = side === 'front' && style.topLine === 'notched' ? { topCorner: notchCorner } : {};
  if (style.shaping === 'princess') {
    const above = princessAbove(axis, bust, opening, peak);
    const top = topLine(points, above.legs);
    narrateTop(table, paper, half, points, top);
    narratePrincess(paper, half, opening, above.height);
    return {
      pieces: princessPanels({
        half,
        top,
        above: above.intake,
        sideTop,
        dartClearance: rules.dartClearance,
        ...corner,
      }),
      openings: openingOf(
        half,
        opening,
        above.height,
        { piece: `${side}-top-centre`, edge: 'princess' },
        { piece: `${side}-top-side`, edge: 'princess' },
      ),
    };
  }
  const dart = topDart(axis, bust, opening, peak, rules.dartClearance);
  refuseBluntDarts(
    half,
    topDarts(half, rules.dartClearance),
    opening > 0 ? tipOf(dart.legs.angle) : 0,
  );
  const top = topLine(points, dart.legs);
  narrateTop(table, paper, half, points, top);
  narrateDarts(paper, half, opening, rules.dartClearance);
  const on = { piece: `${side}-top`, edge: 'top-mouth' };
  return {
    pieces: dartedTop({
      half,
      top,
      sideTop,
      dartClearance: rules.dartClearance,
      ...corner,
      ...(opening > 0 ? { topDartTip: dart.legs.pivot } : {}),
    }),
    openings: openingOf(half, opening, dart.height, on, on),
  };
}

/** The back opens above the bust only where its edge stands at least this far over bust level. */
const backEdgeOver = 30;

/** Whether the back's top line, drawn with its opening, crosses it high enough over bust level. */
export function backEdgeIsHigh(
  { front, back }: { readonly front: Half; readonly back: Half },
  opening: number,
  style: GownStyle,
  rules: HouseRules,
): boolean {
  const points = topLinePoints(back, front, style);
  const bust = heightOn(back, 'bust', back.axis);
  const peak = Math.min(points.centre.y, points.side.y);
  const { legs } =
    style.shaping === 'princess'
      ? princessAbove(back.axis, bust, opening, peak)
      : topDart(back.axis, bust, opening, peak, rules.dartClearance);
  return bust - topLine(points, legs).crossing >= backEdgeOver;
}

const openingOf = (
  half: Half,
  wanted: number,
  height: number,
  centre: TopOpening['centre'],
  outer: TopOpening['outer'],
): readonly TopOpening[] =>
  wanted > 0 ? [{ side: half.side, wanted, height, centre, outer }] : [];

/** Where the top line runs: the back meets the front at the side seam, at the same length from the waist. */
function topLinePoints(half: Half, front: Half, style: GownStyle): TopLinePoints {
  const arc = profileLength(front.line, style.sideDepth, front.heights.waist);
  const y = half.side === 'front' ? style.sideDepth : heightAtArc(half, arc);
  const end = { side: point(xAt(half.line, y), y), sideLean: slopeAt(half.line, y) };
  return half.side === 'front'
    ? frontTopLine(style, half.axis, end)
    : { centre: point(0, half.levels.waist - style.backDepth), ...end };
}

function frontTopLine(
  style: GownStyle,
  axis: number,
  end: Pick<TopLinePoints, 'side' | 'sideLean'>,
): TopLinePoints {
  if (style.topLine === 'straight') {
    // Level from the centre to the princess line or dart, falling only from there to the side.
    return { centre: point(0, style.topDrop), peak: point(axis, style.topDrop), ...end };
  }
  return {
    centre: point(0, style.neckDepth),
    peak: point(style.neckWidth, style.topDrop),
    shape: style.topLine,
    ...end,
  };
}

function narrateTop(
  table: DraftingTable,
  paper: PartTable,
  half: Half,
  points: TopLinePoints,
  top: TopLine,
): void {
  const { centre, peak, side } = points;
  const run = peak
    ? said`From ${mm(centre.y)} down at the centre up to the peak, ${mm(peak.x)} out and ${mm(peak.y)} down, and on to the side seam ${mm(side.y)} down`
    : said`From ${mm(half.levels.waist - centre.y)} above the waist at the centre to the side seam, where it meets the front`;
  paper.draw(
    'Top line',
    said`${run}; drawn with the opening closed so that it crosses the seam without a kink, ${mm(pathLength(top.centre) + pathLength(top.outer))} long when sewn.`,
    {
      why: said`It sets out square to the centre and arrives square to the side seam, so front and back join without a corner.`,
      points: { 'top-centre': centre, ...(peak ? { 'top-peak': peak } : {}), 'top-side': side },
      lines: [top.centre, top.outer],
    },
  );
  const bust = heightOn(half, 'bust', half.axis);
  if (half.side === 'front' && bust - top.crossing < overBust) {
    table.warn({
      code: 'top-line-low',
      severity: 'warning',
      field: 'style.topDrop',
      with: ['style.sideDepth'],
      said: said`The top line passes ${mm(bust - top.crossing)} above the bust point; under ${mm(overBust)} it may not hold. Raise the top line or the side.`,
    });
  }
}

function narratePrincess(paper: PartTable, half: Half, opening: number, height: number): void {
  const below = princessBelow(half);
  const above =
    opening > 0
      ? said`opens to ${mm(opening)} at ${mm(below.top - height)} above it`
      : said`stays closed above it`;
  paper.draw(
    'Princess seam',
    said`${mm(half.axis)} out from the centre both panels pass ${half.side === 'front' ? 'the bust point' : 'bust level'} upright. Below it the gap is ${mm(half.gap.underbust)} at the under-bust and ${mm(half.gap.seam)} at the waist seam, half on each side; the seam ${above}.`,
    {
      why: said`The edges swell outside the straight legs and never cut the corner at bust level, which would cost girth there.`,
      points: { 'bust-point': point(half.axis, below.top) },
      lines: [intakeEdge(below, 'centre'), intakeEdge(below, 'side')],
      pieces: [`${half.side}-top-centre`, `${half.side}-top-side`],
    },
  );
}

function narrateDarts(paper: PartTable, half: Half, opening: number, clearance: number): void {
  const darts = topDarts(half, clearance);
  const above = opening > 0 ? said`; one from the top line takes ${mm(opening)}` : said``;
  paper.draw(
    'Bust darts',
    said`${darts.length === 1 ? 'One dart' : 'Two darts'} from the waist seam, ending ${mm(clearance)} short of ${half.side === 'front' ? 'the bust point' : 'bust level'}: ${mm(half.gap.underbust)} at the under-bust, ${mm(half.gap.seam)} at the waist seam${above}.`,
    {
      why: said`A dart that ran all the way would stand up in a point; stopped short it melts into the curve.`,
      lines: darts.flatMap((dart) => [intakeEdge(dart, 'centre'), intakeEdge(dart, 'side')]),
      pieces: [`${half.side}-top`],
    },
  );
}
