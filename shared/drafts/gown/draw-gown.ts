import type { Body } from '../../body/card.ts';
import type { BodyLevels } from '../../body/levels.ts';
import type { Construction, Handle, TopOpening } from '../../drafting/construction.ts';
import type { DraftingTable } from '../../drafting/drafting-table.ts';
import type { HouseRules } from '../../drafting/house-rules.ts';
import type { LevelName, Piece, Side } from '../../drafting/piece.ts';
import { xAt } from '../../geometry/profile.ts';
import { mm, said } from '../../units/said.ts';
import { type FlarePlan, flarePieces, flareRadius, planFlare } from './flare.ts';
import { backEdgeIsHigh, drawTop } from './draw-top.ts';
import { gownHandles } from './handles.ts';
import type { Half } from './half.ts';
import { kneeStretches, oneSkirt } from './knee-stretches.ts';
import { middlePiece } from './middle.ts';
import { narrateHalf, warnOfShift } from './narrate-halves.ts';
import { type PairInputs, type PairedHalves, pairHalves } from './pair-halves.ts';
import { finishedQuarters, wantedGirths } from './quarters.ts';
import type { SideHeights } from './side-line.ts';
import type { GownStyle } from './style-card.ts';
import { seamUnderBust } from './style-limits.ts';
import { topPartner } from './top.ts';
import { topNames } from './top-names.ts';
import { type Walking, walking } from './walking.ts';
import { wholeSkirt } from './whole.ts';

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
        said`${mm(seamUnderBust)} under the under-bust, as high as a seam may lie: ${mm(levels.waist - highest)} above the waist`,
        highest,
        ['sideNeckToUnderbust', 'frontWaistLength'],
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
      style.kneeLevel === 0 ? said`At the knee` : said`${mm(style.kneeLevel)} above the knee`,
      bodyLevels.knee - style.kneeLevel,
      [],
      ['waistToKnee'],
    );
  const levels: SideHeights = { ...bodyLevels, seam, knee };
  const quarters = {
    front: finishedQuarters('front', body, style, rules, bodyLevels, seam),
    back: finishedQuarters('back', body, style, rules, bodyLevels, seam),
  };
  const acrossOf = halfAcross(body);
  const pair = pairOpened(
    { quarters, levels, style, rules, frontAxis: bodyLevels.bustPointX },
    acrossOf.back,
  );
  const depth = style.flareLength;
  const inner = flareRadius(style.kneeFinished, style.flareFraction);
  const gores = rules.counts?.gores;
  const flare = {
    front: planFlare(quarters.front.knee.value, inner, depth, style.clothWidth, gores?.front),
    back: planFlare(quarters.back.knee.value, inner, depth, style.clothWidth, gores?.back),
  };
  const sides = (['front', 'back'] as const).map((side) =>
    drawSide(table, side, { pair, quarters, flare, style, rules, acrossOf }),
  );
  warnOfShift(table, pair);
  const { front, back } = pair;
  return {
    pieces: sides.flatMap((each) => each.pieces),
    levels: {
      chest: bodyLevels.underarm,
      bust: bodyLevels.bust,
      underbust: bodyLevels.underbust,
      'waist-seam': seam,
      waist: bodyLevels.waist,
      'top-hip': bodyLevels.topHip,
      hip: bodyLevels.hip,
      'knee-seam': knee,
      hem: knee + depth,
    },
    construction: {
      wanted: wantedGirths(
        body,
        style,
        bodyLevels,
        seam,
        2 * (quarters.front.seam.value + quarters.back.seam.value),
      ),
      chestSide: { front: chestSide(front), back: chestSide(back) },
      topOpenings: sides.flatMap((each) => each.openings),
    },
    handles: gownHandles(
      sides.flatMap((each) => each.pieces),
      style,
    ),
    walking: walking(table.part('Flare', 'flare'), body, bodyLevels, knee, style.kneeFinished),
  };
}

/** Half the width of the body where a gown off the shoulder ends, front and back. */
type Across = { readonly front: number; readonly back: number };

const halfAcross = ({ measures }: Body): Across => ({
  front: measures.acrossFront / 2,
  back: measures.acrossBack / 2,
});

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

type Shared = {
  readonly pair: PairedHalves;
  readonly quarters: {
    readonly front: ReturnType<typeof finishedQuarters>;
    readonly back: ReturnType<typeof finishedQuarters>;
  };
  readonly flare: { readonly front: FlarePlan; readonly back: FlarePlan };
  readonly style: GownStyle;
  readonly rules: HouseRules;
  readonly acrossOf: Across;
};

function drawSide(
  table: DraftingTable,
  side: Side,
  shared: Shared,
): { readonly pieces: readonly Piece[]; readonly openings: readonly TopOpening[] } {
  const { pair, style, rules, flare } = shared;
  const half = pair[side];
  const contour = pair.contour[side];
  const paper = narrateHalf(table, half, shared.quarters[side], contour, pair.contour.moved);
  const whole = style.waistSeam === 'none';
  const knees = kneeStretches(
    flare[side],
    whole ? wholeSkirt(style, topNames(side, style), half.axis) : oneSkirt(side),
  );
  const top = drawTop(table, paper, {
    half,
    front: pair.front,
    opening: contour.opening,
    halfAcross: shared.acrossOf[side],
    knees,
    style,
    rules,
  });
  const middle = whole ? [] : [middlePiece(paper, half, knees, topPartner(side, style))];
  const other = flare[side === 'front' ? 'back' : 'front'];
  const gores = flarePieces(table.part('Flare', 'flare'), side, flare[side], other.gores, knees);
  return { pieces: [...top.pieces, ...middle, ...gores], openings: top.openings };
}
