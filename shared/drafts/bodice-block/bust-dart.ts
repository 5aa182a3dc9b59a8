import type { Body } from '../../body/card.ts';
import type { BodyLevels } from '../../body/levels.ts';
import { dartAngle } from '../../drafting/dart-angle.ts';
import { type Said, deg, mm, said } from '../../units/said.ts';
import type { BustDartRule } from './style-card.ts';

/** Angle of the bust dart at the bust point, degrees, and how it was found. */
export type BustDartAngle = {
  readonly angle: number;
  readonly how: Said;
  readonly measures: readonly string[];
};

/** An angle kept within bounds, degrees. */
const within = (least: number, most: number, angle: number): number =>
  Math.min(most, Math.max(least, angle));

/** Method section 5, our rule: an eighth of a degree for each millimetre of bust less under-bust, 8 to 32. */
export const angleByCup = (bust: number, underbust: number): number =>
  within(8, 32, (bust - underbust) / 8);

/**
 * Width of the shoulder dart by the bust, mm: two straight lines through Aldrich's sizes 8 to 18 (from
 * memory), worked out here; the table itself is not shipped.
 */
export const shoulderDartWidth = (bust: number): number =>
  bust <= 920 ? 58 + 0.15 * (bust - 800) : 76 + 0.12 * (bust - 920);

/** That width opened at the side neck point, its legs running to the bust point. */
export const angleByShoulderTable = (bust: number, sideNeckToBustPoint: number): number =>
  dartAngle(shoulderDartWidth(bust), sideNeckToBustPoint);

/** Bunka's new bodice (from memory): a quarter of the bust in cm, less 2.5, in degrees. Best for busts of 780 to 920. */
export const angleByProportion = (bust: number): number => bust / 40 - 2.5;

/**
 * The dart takes what the front is longer than the back from the side neck to the waist, opened at the side
 * (a sewing blog of 2012, seen). Right only where both lengths were measured.
 */
export const angleByLengths = (front: number, back: number, bustPointToSide: number): number =>
  dartAngle(Math.max(0, front - back), bustPointToSide);

/** Angles a front can be drawn with (our rule). */
export const leastAngle = 5;
const most = 35;

/** The angle of the bust dart by the rule chosen by name; a handbook's is kept within 5 to 35 degrees. */
export function bustDartAngle(
  rule: BustDartRule,
  body: Body,
  levels: BodyLevels,
  figures: { readonly backRise: number; readonly bustQuarter: number },
): BustDartAngle {
  const { bustGirth, underbustGirth, sideNeckToBustPoint, frontWaistLength, backWaistLength } =
    body.measures;
  const kept = (angle: number, how: Said, measures: readonly string[]): BustDartAngle => {
    const held = within(leastAngle, most, angle);
    const note = held === angle ? said`` : said`, kept at ${deg(held)}`;
    return { angle: held, how: said`${how} makes ${deg(angle)}${note}`, measures };
  };
  if (rule === 'cup') {
    const angle = angleByCup(bustGirth, underbustGirth);
    return {
      angle,
      how: said`bust ${mm(bustGirth)} less under-bust ${mm(underbustGirth)} is ${mm(bustGirth - underbustGirth)}; an eighth of a degree for each millimetre, within ${deg(8)} and ${deg(32)}, makes ${deg(angle)}`,
      measures: ['bustGirth', 'underbustGirth'],
    };
  }
  if (rule === 'shoulderTable') {
    const width = shoulderDartWidth(bustGirth);
    return kept(
      angleByShoulderTable(bustGirth, sideNeckToBustPoint),
      said`bust ${mm(bustGirth)} takes a shoulder dart ${mm(width)} wide (after Aldrich, from memory), which on legs of ${mm(sideNeckToBustPoint)}`,
      ['bustGirth', 'sideNeckToBustPoint'],
    );
  }
  if (rule === 'proportional') {
    return kept(
      angleByProportion(bustGirth),
      said`a quarter of the bust ${mm(bustGirth)} counted in centimetres, less 2.5 (after Bunka, from memory),`,
      ['bustGirth'],
    );
  }
  const back = backWaistLength + figures.backRise;
  const reach = figures.bustQuarter - levels.bustPointX;
  const guessed = 'backWaistLength' in body.estimated ? ' (estimated)' : '';
  return kept(
    angleByLengths(frontWaistLength, back, reach),
    said`front waist length ${mm(frontWaistLength)} less the back's ${mm(back)}${guessed} is ${mm(frontWaistLength - back)}, opened at the side ${mm(reach)} from the bust point,`,
    ['frontWaistLength', 'backWaistLength'],
  );
}
