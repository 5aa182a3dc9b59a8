import type { TopOpening } from '../../drafting/construction.ts';
import type { DraftingTable, PartTable } from '../../drafting/drafting-table.ts';
import type { HouseRules } from '../../drafting/house-rules.ts';
import type { Quantity } from '../../drafting/quantity.ts';
import type { Piece } from '../../drafting/piece.ts';
import { pathLength } from '../../geometry/curve.ts';
import type { Path } from '../../geometry/path.ts';
import { point } from '../../geometry/point.ts';
import { slopeAt, xAt } from '../../geometry/profile.ts';
import { armholeEdge } from './armhole-edge.ts';
import { princessAbove, topDart } from './contour.ts';
import { refuseBluntDarts, tipOf } from './darts-reach.ts';
import { type Half, heightOn } from './half.ts';
import { topDarts } from './intakes.ts';
import { narrateArmhole, narrateDarts, narratePrincess, narrateTop } from './narrate-top.ts';
import type { FootOf } from './skirt-foot.ts';
import { type GownStyle, isOffShoulder } from './style-card.ts';
import { type TopParts, dartedTop, princessPanels } from './top.ts';
import { type TopLine, notchCorner, topLine } from './top-line.ts';
import { topLinePoints } from './top-line-points.ts';
import { topNames } from './top-names.ts';
import { wholeDarted, wholePanels } from './whole.ts';

/** What the top of a half is drawn from. */
export type TopInputs = {
  readonly half: Half;
  /** The front half, whose side seam is master. */
  readonly front: Half;
  readonly opening: number;
  /** The width of the body where a gown off the shoulder ends, and half of it. */
  readonly across: Quantity;
  readonly halfAcross: number;
  /** How the pieces end that reach down to the knee. */
  readonly footOf: FootOf;
  readonly style: GownStyle;
  readonly rules: HouseRules;
};

/** The top of a half in pieces, with the edges that hold it up. */
export type DrawnTop = {
  readonly pieces: readonly Piece[];
  readonly openings: readonly TopOpening[];
  /** Length of the top edge sewn, mm. */
  readonly topEdge: number;
  /** The armhole edge of a gown off the shoulder, from the top line to the underarm. */
  readonly armhole?: Path;
};

/** Draws the top of a half: its top line, its princess panels or its one darted piece. */
export function drawTop(table: DraftingTable, paper: PartTable, inputs: TopInputs): DrawnTop {
  const { half, opening, style, rules, footOf } = inputs;
  const { side, axis } = half;
  const points = topLinePoints(half, inputs.front, style, inputs);
  const bust = heightOn(half, 'bust', axis);
  const peak = side === 'front' ? style.topDrop : Math.min(points.centre.y, points.side.y);
  const names = topNames(side, style);
  const whole = style.waistSeam === 'none';
  const partsOf = (top: TopLine): TopParts => ({
    half,
    top,
    names,
    partner: topNames(side === 'front' ? 'back' : 'front', style),
    dartClearance: rules.dartClearance,
    ...outerEnd(inputs, top, points.side.y),
    ...(side === 'front' && style.topLine === 'notched' ? { topCorner: notchCorner } : {}),
  });
  const finish = (
    parts: TopParts,
    pieces: readonly Piece[],
    openings: readonly TopOpening[],
  ): DrawnTop => {
    if (parts.armhole) narrateArmhole(paper, parts.top, parts.armhole, inputs);
    return {
      pieces,
      openings,
      topEdge: pathLength(parts.top.centre) + pathLength(parts.top.outer),
      ...(parts.armhole ? { armhole: parts.armhole } : {}),
    };
  };
  if (style.shaping === 'princess') {
    const above = princessAbove(axis, bust, opening, peak);
    const parts = { ...partsOf(topLine(points, above.legs)), above: above.intake };
    narrateTop(table, paper, half, points, parts.top);
    narratePrincess(paper, half, style, opening, above.height);
    return finish(
      parts,
      whole ? wholePanels(parts, footOf) : princessPanels(parts),
      openingOf(
        half,
        opening,
        above.height,
        { piece: names.centre, edge: 'princess' },
        { piece: names.side, edge: 'princess' },
      ),
    );
  }
  const dart = topDart(axis, bust, opening, peak, rules.dartClearance);
  refuseBluntDarts(half, topDarts(half, rules.dartClearance), {
    tip: opening > 0 ? tipOf(dart.legs.angle) : 0,
    opening,
    widest: rules.dartWidest,
  });
  const parts: TopParts = {
    ...partsOf(topLine(points, dart.legs)),
    ...(opening > 0 ? { topDartTip: dart.legs.pivot } : {}),
  };
  narrateTop(table, paper, half, points, parts.top);
  narrateDarts(paper, half, style, opening, rules.dartClearance);
  const on = { piece: names.one, edge: 'top-mouth' };
  return finish(
    parts,
    whole ? wholeDarted(parts, footOf) : dartedTop(parts),
    openingOf(half, opening, dart.height, on, on),
  );
}

/** Where the side seam begins: at the top line, or at the underarm under an armhole edge. */
function outerEnd(
  { half, style }: TopInputs,
  top: TopLine,
  sideDepth: number,
): Pick<TopParts, 'sideTop' | 'armhole'> {
  const from = top.outer.at(-1)?.to;
  if (!isOffShoulder(style) || !from) return { sideTop: sideDepth };
  const y = half.heights.underarm;
  return {
    sideTop: y,
    armhole: armholeEdge(from, top.outward, point(xAt(half.line, y), y), slopeAt(half.line, y)),
  };
}

/**
 * The back opens above the bust only where its edge stands at least this far over bust level, or over the
 * tip where a dart takes the opening: a shorter dart cannot be sewn.
 */
const backEdgeOver = 30;

/** Whether the back's top line, drawn with its opening, crosses it high enough over bust level. */
export function backEdgeIsHigh(inputs: Omit<TopInputs, 'footOf' | 'across'>): boolean {
  const { half, front, opening, style, rules } = inputs;
  const points = topLinePoints(half, front, style, inputs);
  const bust = heightOn(half, 'bust', half.axis);
  const peak = Math.min(points.centre.y, points.side.y);
  const { legs } =
    style.shaping === 'princess'
      ? princessAbove(half.axis, bust, opening, peak)
      : topDart(half.axis, bust, opening, peak, rules.dartClearance);
  const tip = style.shaping === 'princess' ? bust : bust - rules.dartClearance;
  return tip - topLine(points, legs).crossing >= backEdgeOver;
}

const openingOf = (
  half: Half,
  wanted: number,
  height: number,
  centre: TopOpening['centre'],
  outer: TopOpening['outer'],
): readonly TopOpening[] =>
  wanted > 0 ? [{ side: half.side, wanted, height, centre, outer }] : [];
