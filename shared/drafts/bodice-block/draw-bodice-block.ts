import type { Body } from '../../body/card.ts';
import type { BodyLevels } from '../../body/levels.ts';
import { DraftingError } from '../../drafting/drafting-error.ts';
import type { DraftingTable } from '../../drafting/drafting-table.ts';
import type { HouseRules } from '../../drafting/house-rules.ts';
import type { Side } from '../../drafting/piece.ts';
import { type Point, point } from '../../geometry/point.ts';
import { deg, said } from '../../units/said.ts';
import { blockQuarter } from '../block-quarter.ts';
import type { DrawnBlock } from '../drawn-block.ts';
import { warnOfEstimates } from '../lean-on.ts';
import { type BustDartAngle, bustDartAngle, leastAngle } from './bust-dart.ts';
import { blockUnderarm, narrateHalf, narratePlace } from './narrate.ts';
import { backWidthEase, pairArmholes, warnOfTightArmhole } from './pair-armholes.ts';
import { type BodiceHalf, type BodiceQuarters, backPiece, frontPiece } from './pieces.ts';
import { backToMatch, placeBustDart } from './place-dart.ts';
import { type BlockHeights, type HalfFigures, planHalves } from './plan-halves.ts';
import {
  type OpenedShoulder,
  type Shoulder,
  backNeckRise,
  backShoulder,
  frontShoulder,
  openShoulder,
} from './shoulder.ts';
import type { BodiceBlockStyle } from './style-card.ts';

const leansOn = [
  'neckGirth',
  'shoulderLength',
  'shoulderSlope',
  'acrossFront',
  'acrossBack',
  'backWaistLength',
  'underarmToWaist',
] as const;

/** The back waist dart ends this far under the armhole, and no higher than the bust line (common practice, no source). */
const underArmhole = 20;
/** A second waist dart ends this much lower (method section 6); in front it stops short of the bust as well. */
const secondLower = 20;

function quartersOf(
  side: Side,
  body: Body,
  style: BodiceBlockStyle,
  rules: HouseRules,
): BodiceQuarters {
  return {
    bust: blockQuarter(side, body, rules, {
      name: 'bust',
      girth: 'bustGirth',
      ease: style.ease.bust,
      balance: 'bust',
    }),
    waist: blockQuarter(side, body, rules, {
      name: 'waist',
      girth: 'waistGirth',
      ease: style.ease.waist,
      balance: 'waist',
    }),
  };
}

/** What each half is planned from: in front the darts stand under the bust point, behind at half the back width. */
function figuresOf(
  { front, back }: { readonly front: BodiceQuarters; readonly back: BodiceQuarters },
  body: Body,
  bustPoint: Point,
  heights: BlockHeights,
  rules: HouseRules,
): { readonly front: HalfFigures; readonly back: HalfFigures } {
  const backTip = Math.max(heights.bust, heights.underarm + underArmhole);
  return {
    front: {
      bust: front.bust.value,
      waist: front.waist.value,
      axis: bustPoint.x,
      tip: bustPoint.y,
      secondTip: bustPoint.y + rules.dartClearance + secondLower,
    },
    back: {
      bust: back.bust.value,
      waist: back.waist.value,
      axis: (body.measures.acrossBack / 2 + backWidthEase) / 2,
      tip: backTip,
      secondTip: backTip + secondLower,
    },
  };
}

/** A dart is narrowed by a degree at a time, at most by so many, where it would turn the shoulder out over the arm. */
const mostNarrowed = 12;

/**
 * The shoulder opened by as much of the bust dart as leaves room for an armhole beside it; where even twelve
 * degrees less do not, the refusal of the whole dart stands (our rule).
 */
function openedToFit<Armholes>(
  wished: BustDartAngle,
  shoulder: Shoulder,
  bustPoint: Point,
  armholesFor: (opened: OpenedShoulder) => Armholes,
): { readonly opened: OpenedShoulder; readonly armholes: Armholes; readonly angle: BustDartAngle } {
  let refusal: DraftingError | undefined;
  for (let less = 0; less <= Math.min(mostNarrowed, wished.angle - leastAngle); less += 1) {
    const angle = wished.angle - less;
    const opened = openShoulder(shoulder, bustPoint, angle);
    try {
      const armholes = armholesFor(opened);
      const how =
        less === 0
          ? wished.how
          : said`${wished.how}, narrowed to ${deg(angle)} so that an armhole fits beside it`;
      return { opened, armholes, angle: { ...wished, angle, how } };
    } catch (error) {
      if (!(error instanceof DraftingError)) throw error;
      refusal ??= error;
    }
  }
  throw refusal ?? new Error('a bust dart has an angle');
}

/**
 * Draws the bodice block on the table (method section 5): quarters, side seam and waist darts, neck and
 * shoulder, the bust dart opened outwards at the shoulder, armholes; last, the dart is turned to its seam.
 */
export function drawBodiceBlock(
  table: DraftingTable,
  body: Body,
  levels: BodyLevels,
  style: BodiceBlockStyle,
  rules: HouseRules,
): DrawnBlock {
  warnOfEstimates(table, body, 'bodice block', leansOn);
  const heights: BlockHeights = {
    bust: levels.bust,
    waist: levels.waist,
    nape: levels.nape,
    underarm: blockUnderarm(table, levels, style.armholeDrop),
  };
  const bustPoint = point(levels.bustPointX, levels.bust);
  const quarters = {
    front: quartersOf('front', body, style, rules),
    back: quartersOf('back', body, style, rules),
  };
  const plans = planHalves(figuresOf(quarters, body, bustPoint, heights, rules), heights, rules);
  const wished: BustDartAngle = bustDartAngle(style.bustDartRule, body, levels, {
    backRise: backNeckRise(body.measures.neckGirth),
    bustQuarter: quarters.front.bust.value,
  });
  const shoulders = {
    front: frontShoulder(body, levels),
    back: backShoulder(body, levels, style.shoulderEase),
  };
  const { opened, armholes, angle } = openedToFit(wished, shoulders.front, bustPoint, (dart) =>
    pairArmholes(
      body,
      levels.underarm,
      rules.allowance.top,
      { plan: plans.front, shoulder: shoulders.front, opened: dart },
      { plan: plans.back, shoulder: shoulders.back },
    ),
  );
  warnOfTightArmhole(table, body, armholes);
  const bustNotch = (heights.bust - heights.underarm) * Math.hypot(1, plans.front.lean);
  const half = (side: Side): BodiceHalf => ({
    plan: plans[side],
    shoulder: shoulders[side],
    armhole: armholes[side],
    heights,
    rules,
    bustNotch,
  });
  const asDrawn = frontPiece(half('front'), opened);
  const papers = {
    front: narrateHalf(table, body, half('front'), quarters.front, {
      opened,
      angle,
      place: style.bustDart,
    }),
    back: narrateHalf(table, body, half('back'), quarters.back, {
      shoulderEase: style.shoulderEase,
    }),
  };
  const { front, share } = placeBustDart(asDrawn, style.bustDart, {
    bustNotch,
    bustPoint,
    allowance: rules.allowance.top,
  });
  narratePlace(papers.front, front, style.bustDart, { angle: angle.angle, share, bustPoint });
  return {
    pieces: [front, backToMatch(backPiece(half('back'), style.shoulderEase), front)],
    levels: { chest: heights.underarm, bust: heights.bust, waist: heights.waist },
    wanted: [
      {
        level: 'bust',
        body: body.measures.bustGirth,
        ease: style.ease.bust,
        wanted: body.measures.bustGirth + style.ease.bust,
        estimated: false,
      },
      {
        level: 'waist',
        body: body.measures.waistGirth,
        ease: style.ease.waist,
        wanted: body.measures.waistGirth + style.ease.waist,
        estimated: false,
      },
    ],
    bustPoint,
  };
}
