import type { Body } from '../../body/card.ts';
import type { BodyLevels } from '../../body/levels.ts';
import { measureGuide } from '../../body/measure-guide.ts';
import type { Construction, Handle, TopOpening, WantedGirth } from '../../drafting/construction.ts';
import type { DraftingTable } from '../../drafting/drafting-table.ts';
import type { HouseRules } from '../../drafting/house-rules.ts';
import { type Quantity, taken } from '../../drafting/quantity.ts';
import type { LevelName, Piece, Side } from '../../drafting/piece.ts';
import { pathLength } from '../../geometry/curve.ts';
import { xAt } from '../../geometry/profile.ts';
import { mm, said } from '../../units/said.ts';
import { type BelowKnee, belowKnee } from './below-knee.ts';
import { closeGown } from './closure.ts';
import { backEdgeIsHigh, drawTop } from './draw-top.ts';
import { openingTurns } from './contour.ts';
import { evenHems } from './even-hems.ts';
import { warnOfShare } from './fair-side.ts';
import { gownHandles } from './handles.ts';
import type { Half } from './half.ts';
import { fitOut } from './inner.ts';
import { middlePiece } from './middle.ts';
import { narrateHalf, warnOfShift } from './narrate-halves.ts';
import { type PairInputs, type PairedHalves, pairHalves } from './pair-halves.ts';
import { finishedQuarters, wantedGirths } from './quarters.ts';
import type { SideHeights } from './side-line.ts';
import { skirtPanels } from './skirt-panel.ts';
import { type TopEdges, setInBands } from './sleeve.ts';
import { type GownStyle, isOffShoulder } from './style-card.ts';
import { seamUnderBust } from './style-limits.ts';
import { topPartner } from './top.ts';
import { type Walking, walking } from './walking.ts';

/** A gown drawn: pieces without allowances, and what proof and screens need to know of them. */
export type DrawnGown = {
  readonly pieces: readonly Piece[];
  readonly levels: { readonly [L in LevelName]: number };
  readonly construction: Construction;
  readonly handles: readonly Handle[];
  readonly walking: Walking;
};

/** Height of the waist seam: raised by the style's choice but clear of the under-bust, or at the waist. */
function waistSeamLevel(table: DraftingTable, levels: BodyLevels, style: GownStyle): number {
  const paper = table.part('Levels', 'both');
  // A seam in the waist itself, or none at all: what the seam would hold is held at the waist.
  if (style.waistSeam !== 'raised') return levels.waist;
  const raised = levels.waist - style.waistSeamRise;
  const highest = levels.underbust + seamUnderBust;
  return raised > highest + 1e-6
    ? paper.level('Waist seam', said`Raised ${mm(style.waistSeamRise)} above the waist`, raised, [])
    : paper.level(
        'Waist seam',
        said`${mm(seamUnderBust)} under the under-bust, as high as a seam may lie, which is ${mm(levels.waist - highest)} above the waist`,
        highest,
        [],
        ['sideNeckToUnderbust'],
      );
}

/** Draws the gown on the table: levels, halves, tops, middles and flare, in drafting order. */
export function drawGown(
  table: DraftingTable,
  body: Body,
  bodyLevels: BodyLevels,
  style: GownStyle,
  rules: HouseRules,
): DrawnGown {
  const seam = waistSeamLevel(table, bodyLevels, style);
  const knee = table
    .part('Levels', 'both')
    .level(
      'Knee seam',
      style.kneeLevel < 0.5 ? said`At the knee` : said`${mm(style.kneeLevel)} above the knee`,
      bodyLevels.knee - style.kneeLevel,
      [],
    );
  const levels: SideHeights = { ...bodyLevels, seam, knee };
  const quarters = {
    front: finishedQuarters('front', body, style, rules, bodyLevels, seam),
    back: finishedQuarters('back', body, style, rules, bodyLevels, seam),
  };
  const across = acrossWhereItEnds(body, rules);
  const pair = pairOpened(
    { quarters, levels, style, rules, frontAxis: bodyLevels.bustPointX },
    across.back.value / 2,
  );
  const { front, back } = pair;
  const panels = {
    front: skirtPanels('front', style, kneeOf(front)),
    back: skirtPanels('back', style, kneeOf(back)),
  };
  const below = belowKnee(table, { style, rules, panels });
  const shared: Shared = { pair, quarters, below, style, rules, across };
  const sides = [drawSide(table, 'front', shared), drawSide(table, 'back', shared)] as const;
  warnOfShift(table, pair);
  warnOfShare(table, pair.sideShare, rules.sideShare);
  const wanted = [
    ...wantedGirths(
      body,
      style,
      bodyLevels,
      seam,
      2 * (quarters.front.seam.value + quarters.back.seam.value),
    ),
    { level: 'hem', wanted: below.hem, estimated: false } as const,
  ];
  const sewn = evenHems(sides.flatMap((each) => [...each.pieces, ...below.pieces(each.side)]));
  const [{ edges: frontEdges }, { edges: backEdges }] = sides;
  const pieces = isOffShoulder(style)
    ? setInBands(table, body, style, { front: frontEdges, back: backEdges }, sewn)
    : sewn;
  const closed = closeGown(table, pieces, { body, levels: bodyLevels, pair, style });
  const walked = walking(table.part('Flare', 'flare'), body, bodyLevels, knee, style);
  return {
    pieces: fitOut(table, closed.pieces, { body, levels: bodyLevels, style }),
    levels: {
      chest: bodyLevels.underarm,
      bust: bodyLevels.bust,
      underbust: bodyLevels.underbust,
      'waist-seam': seam,
      waist: bodyLevels.waist,
      'top-hip': bodyLevels.topHip,
      hip: bodyLevels.hip,
      'knee-seam': knee,
      hem: knee + style.flareLength,
    },
    construction: {
      wanted: rules.intakes ? withChestLeft(table, wanted, pair) : wanted,
      chestSide: { front: chestSide(front), back: chestSide(back) },
      topOpenings: sides.flatMap((each) => each.openings),
      opening: closed.opening,
      ...(closed.gaps && { gaps: closed.gaps }),
      knees: {
        standing: body.measures.bothKneesGirth,
        step: walked.step,
        caution: walked.caution,
      },
      ...(rules.intakes && { intakesGiven: true }),
    },
    handles: gownHandles(
      style.closure === 'laced' ? closed.pieces : pieces,
      style,
      openingTurns(pair.front, style.shaping, rules),
    ),
    walking: walked,
  };
}

/**
 * Where the openings above the bust are given outright, the chest is what they leave; how far that is
 * from the body is said, not hidden.
 */
function withChestLeft(
  table: DraftingTable,
  wanted: readonly WantedGirth[],
  { front, back, contour }: PairedHalves,
): readonly WantedGirth[] {
  const left =
    2 * (chestSide(front) - contour.front.opening + chestSide(back) - contour.back.opening);
  return wanted.map((row) => {
    if (row.level !== 'chest') return row;
    table.warn({
      code: 'chest-not-held',
      severity: 'warning',
      field: 'rules.intakes.topLine',
      with: ['card.upperChestGirth', 'style.ease.chest'],
      said: said`The opening above the bust is given outright, so the chest is not held: with the openings closed the gown measures ${mm(left)} there, the upper chest with its ease ${mm(row.wanted)}. Try the edge in the toile, or let the opening be derived.`,
    });
    return { level: row.level, wanted: left, estimated: false };
  });
}

/** The width of the body where a gown off the shoulder ends, front and back. */
type Across = { readonly front: Quantity; readonly back: Quantity };

function acrossWhereItEnds(body: Body, { armholeAt }: HouseRules): Across {
  const measured = (key: 'shoulderWidth' | 'acrossFront' | 'acrossBack'): Quantity =>
    taken(measureGuide[key].label.toLowerCase(), key, body.measures[key], key in body.estimated);
  return armholeAt === 'shoulder'
    ? { front: measured('shoulderWidth'), back: measured('shoulderWidth') }
    : { front: measured('acrossFront'), back: measured('acrossBack') };
}

/** Opens the back above the bust where the top line then crosses high enough; else the front takes it. */
function pairOpened(inputs: Omit<PairInputs, 'backOpens'>, halfAcrossBack: number): PairedHalves {
  const opened = pairHalves({ ...inputs, backOpens: true });
  const { opening } = opened.contour.back;
  const { back: half, front } = opened;
  const { style, rules } = inputs;
  if (
    opening === 0 ||
    backEdgeIsHigh({ half, front, opening, halfAcross: halfAcrossBack, style, rules })
  )
    return opened;
  return pairHalves({ ...inputs, backOpens: false });
}

const chestSide = (half: Half): number => xAt(half.line, half.heights.underarm);

/** Where a half comes to the knee line. */
const kneeOf = ({ axis, line, heights: { knee } }: Half): Parameters<typeof skirtPanels>[2] => ({
  axis,
  quarter: xAt(line, knee),
  knee,
});

type Shared = {
  readonly pair: PairedHalves;
  readonly quarters: {
    readonly front: ReturnType<typeof finishedQuarters>;
    readonly back: ReturnType<typeof finishedQuarters>;
  };
  readonly below: BelowKnee;
  readonly style: GownStyle;
  readonly rules: HouseRules;
  readonly across: Across;
};

function drawSide(
  table: DraftingTable,
  side: Side,
  shared: Shared,
): {
  readonly side: Side;
  readonly pieces: readonly Piece[];
  readonly openings: readonly TopOpening[];
  readonly edges: TopEdges;
} {
  const { pair, style, rules, below } = shared;
  const half = pair[side];
  const contour = pair.contour[side];
  const paper = narrateHalf(
    table,
    half,
    shared.quarters[side],
    contour,
    pair.contour.moved,
    style.waistSeam,
  );
  const top = drawTop(table, paper, {
    half,
    front: pair.front,
    opening: contour.opening,
    across: shared.across[side],
    halfAcross: shared.across[side].value / 2,
    footOf: below.footOf,
    style,
    rules,
  });
  const middle =
    style.waistSeam === 'none'
      ? []
      : [middlePiece(paper, half, below.footOf(`${side}-middle`), topPartner(side, style))];
  return {
    side,
    pieces: [...top.pieces, ...middle],
    openings: top.openings,
    edges: { topEdge: top.topEdge, armhole: pathLength(top.armhole ?? []) },
  };
}
