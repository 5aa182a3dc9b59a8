import { readFileSync } from 'node:fs';
import type { MeasureCard } from '#shared/body/card.ts';

/**
 * The 130 women of tests/support/data, completed into measure cards. Taken: upper chest, waist, hip, knee, shoulder girth,
 * wrist, upper arm (flexed) and height. Derived: what follows, by named rules with a spread drawn from the row's number,
 * so that the same woman always has the same card.
 */
type Row = Readonly<Record<string, number>>;

/** A number from -1 to 1 for a woman and a measure, spread evenly: an integer hash (Wang), no source of chance. */
function turn(woman: number, measure: number): number {
  let n = (woman * 31 + measure * 7919 + 61) >>> 0;
  n = (n ^ 61 ^ (n >>> 16)) >>> 0;
  n = (n + (n << 3)) >>> 0;
  n = (n ^ (n >>> 4)) >>> 0;
  n = Math.imul(n, 0x27d4eb2d) >>> 0;
  n = (n ^ (n >>> 15)) >>> 0;
  return (n / 0xffffffff) * 2 - 1;
}

/** The upper chest line of ASTM D5585-11e1 turned round (seen), spread by a cup either way. */
const bustFromUpperChest = (upperChest: number, spread: number): number =>
  (upperChest - 160.7) / 0.8157 + 20 + 25 * spread;

/** ASTM D5585-11e1 under-bust on bust, fitted (seen; within 12 mm of its row), spread by half a cup. */
const underbustFromBust = (bust: number, spread: number): number =>
  0.9346 * bust - 92 + 15 * spread;

/** ASTM D5585-95 bust span on bust, fitted (from memory). */
const spanFromBust = (bust: number, spread: number): number => 0.2045 * bust + 13.7 + 8 * spread;

/** ASTM D5585-95 neck to bust point on bust, fitted (from memory), longer on a tall woman (common practice, no source). */
const neckToBustPoint = (bust: number, height: number, spread: number): number =>
  0.2494 * bust + 32.2 + 0.08 * (height - 1650) + 8 * spread;

/** Under the breast: 75, and a tenth of bust less under-bust over 150 (common practice, no source). */
const bustPointToUnderbust = (bust: number, underbust: number, spread: number): number =>
  75 + (bust - underbust - 150) / 10 + 6 * spread;

/**
 * Front waist length: 0.265 of height on a middle bust, longer with a low bust point, a larger bust and a fuller cup
 * (common practice, no source; 0.27 follows from ASTM D5585-95 waist lengths, from memory).
 */
const frontWaist = (
  height: number,
  bust: number,
  toBustPoint: number,
  cup: number,
  spread: number,
): number =>
  0.265 * height + (toBustPoint - 265) / 2 + (bust - 920) / 20 + (cup - 150) / 8 + 8 * spread;

/** Aldrich's waist to floor, 0.634 of height (from memory). */
const waistToFloor = (height: number, spread: number): number => 0.634 * height + 10 * spread;

/** Aldrich's waist to hip, 0.125 of height (from memory). */
const waistToHip = (height: number, spread: number): number => 0.125 * height + 8 * spread;

const half = (value: number): number => Math.round(value * 2) / 2;

function womanCard(row: Row, index: number): MeasureCard {
  const taken = (column: string): number => Math.round((row[`${column}_cm`] ?? Number.NaN) * 10);
  const height = taken('height');
  const upperChestGirth = taken('chest_girth_above_breast');
  const bust = bustFromUpperChest(upperChestGirth, turn(index, 1));
  const underbust = underbustFromBust(bust, turn(index, 2));
  const toBustPoint = neckToBustPoint(bust, height, turn(index, 4));
  return {
    name: `Woman ${index + 1}`,
    bustGirth: half(bust),
    underbustGirth: half(underbust),
    waistGirth: taken('waist_girth'),
    hipGirth: taken('hip_girth'),
    bustSpan: half(spanFromBust(bust, turn(index, 3))),
    sideNeckToBustPoint: half(toBustPoint),
    sideNeckToUnderbust: half(toBustPoint + bustPointToUnderbust(bust, underbust, turn(index, 5))),
    frontWaistLength: half(frontWaist(height, bust, toBustPoint, bust - underbust, turn(index, 6))),
    waistToHip: half(waistToHip(height, turn(index, 7))),
    waistToFloor: half(waistToFloor(height, turn(index, 8))),
    upperChestGirth,
    shoulderGirth: taken('shoulder_girth'),
    kneeGirth: taken('knee_girth'),
    upperArmGirth: taken('bicep_girth_flexed'),
    wristGirth: taken('wrist_girth'),
    height,
  };
}

/** Reads the data beside this file: one card a woman, in the order of the data. */
export function women(): readonly MeasureCard[] {
  const text = readFileSync(new URL('data/women-girths.csv', import.meta.url), 'utf8').trim();
  const [head = '', ...lines] = text.split('\n');
  const columns = head.trim().split(',');
  return lines.map((line, index) => {
    const values = line.split(',').map(Number);
    return womanCard(
      Object.fromEntries(columns.map((column, at) => [column, values[at] ?? Number.NaN])),
      index,
    );
  });
}
