import type { Body } from '../../body/card.ts';
import type { BodyLevels } from '../../body/levels.ts';
import type { HouseRules } from '../../drafting/house-rules.ts';
import { isOffShoulder, styleChoices } from './style-card.ts';
import type { EaseLevel, GownStyle, StyleCard, StyleLength } from './style-card.ts';
import { styleLimits } from './style-limits.ts';

/**
 * Makes every choice a style card leaves open, by the initial values of this body's limits. A flare length that is
 * given wins over the clearance, which then follows from it. Bounds are not checked here (`checkStyle`).
 */
export function resolveStyle(style: StyleCard, body: Body, levels: BodyLevels): GownStyle {
  const limits = styleLimits(body, levels, style);
  const length = (key: StyleLength): number => style[key] ?? limits[key].initial;
  const ease = (level: EaseLevel): number => style.ease?.[level] ?? limits[`ease.${level}`].initial;
  const flareLength = length('flareLength');
  return {
    topLine: style.topLine ?? styleChoices.topLine[0],
    shaping: style.shaping ?? styleChoices.shaping[0],
    waistSeam: style.waistSeam ?? styleChoices.waistSeam[0],
    flare: style.flare ?? styleChoices.flare[0],
    sleeve: style.sleeve ?? styleChoices.sleeve[0],
    closure: style.closure ?? styleChoices.closure[0],
    facing: style.facing ?? styleChoices.facing[0],
    lining: style.lining ?? styleChoices.lining[0],
    boning: style.boning ?? styleChoices.boning[0],
    cloth: style.cloth ?? styleChoices.cloth[0],
    topDrop: length('topDrop'),
    neckDepth: length('neckDepth'),
    neckWidth: length('neckWidth'),
    sideDepth: length('sideDepth'),
    backDepth: length('backDepth'),
    waistSeamRise: length('waistSeamRise'),
    dartLength: length('dartLength'),
    kneeLevel: length('kneeLevel'),
    kneeFinished: length('kneeFinished'),
    flareFraction: length('flareFraction'),
    hemSweep: length('hemSweep'),
    flareLength,
    floorClearance:
      style.flareLength === undefined
        ? length('floorClearance')
        : limits.flareLength.max - flareLength,
    heelHeight: length('heelHeight'),
    train: length('train'),
    bandHeight: length('bandHeight'),
    pleatRatio: length('pleatRatio'),
    armEase: length('armEase'),
    stretch: length('stretch'),
    shrinkage: length('shrinkage'),
    clothWidth: length('clothWidth'),
    ease: {
      chest: ease('chest'),
      bust: ease('bust'),
      underbust: ease('underbust'),
      waist: ease('waist'),
      topHip: ease('topHip'),
      hip: ease('hip'),
    },
  };
}

/** A style card with the house's drop where it leaves the peak open; kept within this body's limits. */
export function withHouseDrop(
  style: StyleCard,
  body: Body,
  levels: BodyLevels,
  { peakOverBust, shoulderDrop }: Pick<HouseRules, 'peakOverBust' | 'shoulderDrop'>,
): StyleCard {
  if (style.topDrop !== undefined) return style;
  const wished = isOffShoulder(style) ? shoulderDrop : levels.bust - peakOverBust;
  const { min, max } = styleLimits(body, levels, style).topDrop;
  return { ...style, topDrop: Math.min(max, Math.max(min, wished)) };
}
