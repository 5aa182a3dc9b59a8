import type { Body } from '../../body/card.ts';
import type { BodyLevels } from '../../body/levels.ts';
import type { WantedGirth } from '../../drafting/construction.ts';
import type { DraftingTable, PartTable } from '../../drafting/drafting-table.ts';
import type { HouseRules } from '../../drafting/house-rules.ts';
import type { Side } from '../../drafting/piece.ts';
import { type Quantity, amount, leastSaid, plus } from '../../drafting/quantity.ts';
import { pathLength } from '../../geometry/curve.ts';
import { line } from '../../geometry/path.ts';
import { point } from '../../geometry/point.ts';
import { xAt } from '../../geometry/profile.ts';
import { warning } from '../../units/problem.ts';
import { type Said, mm, said } from '../../units/said.ts';
import { blockQuarter } from '../block-quarter.ts';
import type { DrawnBlock } from '../drawn-block.ts';
import { warnOfEstimates } from '../lean-on.ts';
import { nameOf, sideOf, skirtPiece } from './pieces.ts';
import { type QuarterPlan, type SkirtHeights, planQuarters } from './plan-quarters.ts';
import type { SkirtBlockStyle } from './style-card.ts';

type Quarters = { readonly waist: Quantity; readonly hip: Quantity };

function quartersOf(side: Side, body: Body, style: SkirtBlockStyle, rules: HouseRules): Quarters {
  return {
    waist: blockQuarter(side, body, rules, {
      name: 'waist',
      girth: 'waistGirth',
      ease: style.ease.waist,
      balance: 'waist',
    }),
    hip: plus(
      blockQuarter(side, body, rules, {
        name: 'hip',
        girth: 'hipGirth',
        ease: style.ease.hip,
        balance: 'hip',
      }),
      'seat',
      (side === 'front' ? -1 : 1) * (style.seat / 2),
    ),
  };
}

/** Finished half girth at the top hip: flat widths less what the darts still hold there, mm. */
function halfAtTopHip(plans: readonly QuarterPlan[], topHip: number): number {
  return plans.reduce((sum, { curve, waist, tips }) => {
    const held = waist.mouths.reduce((all, { centre, side }, k) => {
      const tip = tips[k] ?? topHip;
      return all + Math.max(0, (side.x - centre.x) * ((tip - topHip) / (tip - centre.y)));
    }, 0);
    return sum + xAt(curve, topHip) - held;
  }, 0);
}

function warnOfTopHip(table: DraftingTable, body: Body, half: number): void {
  const girth = body.measures.topHipGirth;
  if (2 * half >= girth) return;
  const guessed = 'topHipGirth' in body.estimated ? ' (estimated)' : '';
  table.warn(
    warning({
      code: 'top-hip-tight',
      field: 'card.topHipGirth',
      with: ['style.ease.hip', 'style.ease.waist'],
      said: said`Finished top hip ${mm(2 * half)} is less than the body's ${mm(girth)}${guessed}: shorten the darts or give the hip more ease, and look at it on a toile.`,
    }),
  );
}

const countWords = ['no dart', 'one dart', 'two darts together'] as const;

function narrateQuarter(
  table: DraftingTable,
  plan: QuarterPlan,
  quarters: Quarters,
  heights: SkirtHeights,
  half: number,
): PartTable {
  const paper = table.part(plan.side === 'front' ? 'Front' : 'Back', plan.side);
  paper.squareAcross('Hip line', heights.hip, quarters.hip);
  paper.squareAcross('Waist line', heights.waist, quarters.waist);
  const { side, darts } = plan.intake;
  const { stretches, mouths } = plan.waist;
  const count = mouths.length === 0 ? countWords[0] : countWords[mouths.length === 1 ? 1 : 2];
  const taken: Said =
    darts === 0
      ? said`${count}`
      : said`${count} ${mouths.length === 1 ? 'takes' : 'take'} ${mm(darts)}`;
  paper.draw(
    'Suppression',
    said`Hip quarter ${mm(plan.figures.hip, ['hipGirth'])} less waist quarter ${mm(plan.figures.waist, ['waistGirth'])} is ${amount(plan.figures.hip - plan.figures.waist, ['hipGirth', 'waistGirth'])}: the side takes ${amount(side)}, ${taken}.`,
    {
      points: {
        'waist-quarter': point(plan.figures.waist, heights.waist),
        'hip-quarter': point(plan.figures.hip, heights.waist),
      },
      lines: [
        [line(point(plan.figures.waist, heights.waist), point(plan.figures.hip, heights.waist))],
      ],
      why: said`Front and back together take ${mm(half)}: up to ${mm(60)} one dart each, up to ${mm(100)} two in the back, then two each; none wider than ${mm(35)}.`,
      measures: ['hipGirth', 'waistGirth'],
    },
  );
  const path = sideOf(plan, heights);
  paper.draw(
    'Side seam',
    said`A fair curve from the waist to the hip, upright there, and straight down to the hem: ${mm(pathLength(path))} long, its top ${heights.waist - plan.sideTop < leastSaid ? said`level with` : said`${mm(heights.waist - plan.sideTop)} above`} the waist line.`,
    {
      why: said`The waist rises at the side so that it meets the slanting seam squarely, in front and back alike.`,
      points: { 'side-waist': point(xAt(plan.curve, plan.sideTop), plan.sideTop) },
      lines: [path],
    },
  );
  paper.draw(
    'Waist',
    said`Square to the centre line and to the side seam; sewn, it is ${mm(quarters.waist.value, quarters.waist.measures)} long, the waist quarter.`,
    {
      why: said`It meets the legs of each dart squarely, so it runs on as one smooth curve when the dart is closed.`,
      lines: [
        ...stretches,
        ...mouths.flatMap(({ centre, side: far }, k) => {
          const tip = point((centre.x + far.x) / 2, plan.tips[k] ?? centre.y);
          return [[line(centre, tip)], [line(far, tip)]];
        }),
      ],
      measures: ['waistGirth'],
      pieces: [nameOf[plan.side]],
    },
  );
  return paper;
}

/** Draws the skirt block on the table (method section 5): a straight skirt from the waist to the hem. */
export function drawSkirtBlock(
  table: DraftingTable,
  body: Body,
  levels: BodyLevels,
  style: SkirtBlockStyle,
  rules: HouseRules,
): DrawnBlock {
  warnOfEstimates(table, body, 'skirt block', ['topHipGirth', 'waistToKnee']);
  const hem = table
    .part('Levels', 'both')
    .level(
      'Hem',
      said`Skirt length ${mm(style.length)} down from the waist`,
      levels.waist + style.length,
      [],
    );
  const heights: SkirtHeights = { waist: levels.waist, hip: levels.hip, hem };
  const quarters = {
    front: quartersOf('front', body, style, rules),
    back: quartersOf('back', body, style, rules),
  };
  const figures = (side: Side) => ({
    waist: quarters[side].waist.value,
    hip: quarters[side].hip.value,
  });
  const plans = planQuarters({ front: figures('front'), back: figures('back') }, heights, rules);
  for (const side of ['front', 'back'] as const) {
    narrateQuarter(table, plans[side], quarters[side], heights, plans.half);
  }
  warnOfTopHip(table, body, halfAtTopHip([plans.front, plans.back], levels.topHip));
  const girth = (level: 'waist' | 'hip', measured: number, ease: number): WantedGirth => ({
    level,
    body: measured,
    ease,
    wanted: measured + ease,
    estimated: false,
  });
  const hip = girth('hip', body.measures.hipGirth, style.ease.hip);
  return {
    pieces: [
      skirtPiece(plans.front, heights, levels.topHip),
      skirtPiece(plans.back, heights, levels.topHip),
    ],
    levels: { waist: levels.waist, 'top-hip': levels.topHip, hip: levels.hip, hem },
    wanted: [
      girth('waist', body.measures.waistGirth, style.ease.waist),
      hip,
      { level: 'hem', wanted: hip.wanted, estimated: false },
    ],
  };
}
