import type { Body, MeasureKey } from '../../body/card.ts';
import type { BodyLevels } from '../../body/levels.ts';
import type { DraftingTable } from '../../drafting/drafting-table.ts';
import { taken } from '../../drafting/quantity.ts';
import { type Said, mm, said } from '../../units/said.ts';

/** Underarm nearer to the bust point than this is set `raisedBy` above it (method section 3). */
const nearest = 10;
const raisedBy = 20;

/** Heights of the body below the side neck point, by method section 3. */
export function gownLevels(table: DraftingTable, body: Body): BodyLevels {
  const paper = table.part('Levels', 'both');
  const m = body.measures;
  const measured = (name: string, key: MeasureKey): Said =>
    taken(name, key, m[key], key in body.estimated).how;

  const sideNeckX = m.neckGirth / 5 - 7;
  const bustPointX = m.bustSpan / 2;
  paper.draw(
    'Side neck point',
    said`A fifth of the ${measured('neck girth', 'neckGirth')} less ${mm(7)} = ${mm(sideNeckX, ['neckGirth'])} out from the centre. Everything hangs from its height.`,
    { points: { 'side-neck': { x: sideNeckX, y: 0 } }, measures: ['neckGirth'] },
  );
  const across = bustPointX - sideNeckX;
  const bust = paper.level(
    'Bust',
    said`Half the ${measured('bust span', 'bustSpan')} puts the bust point ${mm(bustPointX, ['bustSpan'])} out; ${measured('side neck to bust point', 'sideNeckToBustPoint')}, measured on the slant, then falls`,
    Math.sqrt(m.sideNeckToBustPoint ** 2 - across ** 2),
    ['bustSpan', 'sideNeckToBustPoint'],
  );
  const underbust = paper.level(
    'Under-bust',
    said`${measured('Side neck to under-bust', 'sideNeckToUnderbust')} less ${measured('side neck to bust point', 'sideNeckToBustPoint')} hangs it ${mm(m.sideNeckToUnderbust - m.sideNeckToBustPoint, ['sideNeckToUnderbust', 'sideNeckToBustPoint'])} under the bust level`,
    bust + m.sideNeckToUnderbust - m.sideNeckToBustPoint,
    ['sideNeckToUnderbust', 'sideNeckToBustPoint'],
  );
  const waist = paper.level(
    'Waist',
    said`${measured('Front waist length', 'frontWaistLength')} less ${measured('side neck to bust point', 'sideNeckToBustPoint')} hangs it ${mm(m.frontWaistLength - m.sideNeckToBustPoint, ['frontWaistLength', 'sideNeckToBustPoint'])} under the bust level`,
    bust + m.frontWaistLength - m.sideNeckToBustPoint,
    ['frontWaistLength', 'sideNeckToBustPoint'],
  );
  const nape = waist - m.backWaistLength;
  const underarm = underarmLevel(table, body, bust, waist);
  const topHip = paper.level(
    'Top hip',
    said`${measured('Waist to top hip', 'waistToTopHip')} down from the waist`,
    waist + m.waistToTopHip,
    ['waistToTopHip'],
  );
  const hip = paper.level(
    'Hip',
    said`${measured('Waist to hip', 'waistToHip')} down from the waist`,
    waist + m.waistToHip,
    ['waistToHip'],
  );
  const knee = paper.level(
    'Knee',
    said`${measured('Waist to knee', 'waistToKnee')} down from the waist`,
    waist + m.waistToKnee,
    ['waistToKnee'],
  );
  const floor = paper.level(
    'Floor',
    said`${measured('Waist to floor', 'waistToFloor')} down from the waist, barefoot`,
    waist + m.waistToFloor,
    ['waistToFloor'],
  );
  return {
    sideNeckX,
    bustPointX,
    bust,
    underbust,
    underarm,
    nape,
    waist,
    topHip,
    hip,
    knee,
    floor,
  };
}

function underarmLevel(table: DraftingTable, body: Body, bust: number, waist: number): number {
  const paper = table.part('Levels', 'both');
  const up = body.measures.underarmToWaist;
  const measured = (name: string): Said =>
    taken(name, 'underarmToWaist', up, 'underarmToWaist' in body.estimated).how;
  const level = waist - up;
  if (bust - level >= nearest) {
    return paper.level(
      'Underarm',
      said`${measured('Underarm to waist')} up from the waist`,
      level,
      ['underarmToWaist'],
    );
  }
  table.warn({
    code: 'underarm-below-bust',
    severity: 'warning',
    field: 'card.underarmToWaist',
    with: ['card.frontWaistLength'],
    said: said`Underarm to waist ${mm(up)} against front waist length ${mm(body.measures.frontWaistLength)} puts the armpit at or under the bust point; it was set ${mm(raisedBy)} above it. Measure both again.`,
  });
  return paper.level(
    'Underarm',
    said`${measured('Underarm to waist')} would come out level with the bust point; it is set ${mm(raisedBy)} above it`,
    bust - raisedBy,
    ['underarmToWaist'],
    [],
  );
}
