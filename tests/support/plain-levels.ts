import type { Body } from '#shared/body/card.ts';
import type { BodyLevels } from '#shared/body/levels.ts';

/** The levels of method section 3 worked out plainly, apart from the draft's own, for tests of limits. */
export function plainLevels({ measures: m }: Body): BodyLevels {
  const sideNeckX = m.neckGirth / 5 - 7;
  const bustPointX = m.bustSpan / 2;
  const bust = Math.sqrt(m.sideNeckToBustPoint ** 2 - (bustPointX - sideNeckX) ** 2);
  const waist = bust + m.frontWaistLength - m.sideNeckToBustPoint;
  const underarm = waist - m.underarmToWaist;
  return {
    sideNeckX,
    bustPointX,
    bust,
    underbust: bust + m.sideNeckToUnderbust - m.sideNeckToBustPoint,
    underarm: underarm > bust - 10 ? bust - 20 : underarm,
    nape: waist - m.backWaistLength,
    waist,
    topHip: waist + m.waistToTopHip,
    hip: waist + m.waistToHip,
    knee: waist + m.waistToKnee,
    floor: waist + m.waistToFloor,
  };
}
