import { describe, expect, it } from 'vitest';
import type { MeasureCard } from '#shared/body/card.ts';
import type { HouseRules } from '#shared/drafting/house-rules.ts';
import { quarterRule } from '#shared/drafting/house-rule-presets.ts';
import type { LevelName, Piece, Side } from '#shared/drafting/piece.ts';
import type { StyleCard } from '#shared/drafts/gown/style-card.ts';
import { flareRadius } from '#shared/drafts/gown/flare-plan.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { pathCrossings, pathLength, stationAtLength } from '#shared/geometry/curve.ts';
import { cross, distance, type Point, point, subtract } from '#shared/geometry/point.ts';
import { speak } from '#shared/units/speak.ts';

/*
 * The plain direct draft many dressmakers make on paper, by quarters and without ease, in inches
 * (common practice, no source). What the finished quarters come to is worked out by hand here.
 */
const inches = (value: number): number => value * 25.4;

const card: MeasureCard = {
  name: 'By hand',
  bustGirth: inches(36),
  underbustGirth: inches(28),
  waistSeamGirth: inches(32),
  waistGirth: inches(32),
  hipGirth: inches(40),
  bustSpan: inches(8),
  sideNeckToBustPoint: inches(10),
  sideNeckToUnderbust: inches(13),
  frontWaistLength: inches(19),
  waistToHip: inches(9),
  shoulderWidth: inches(14),
  underarmToWaist: inches(11),
  waistToFloor: inches(41),
};

const style: StyleCard = {
  sleeve: 'pleatedBand',
  topDrop: inches(5),
  neckDepth: inches(6),
  neckWidth: inches(3),
  sideDepth: inches(6.5),
  waistSeamRise: inches(3),
  dartLength: inches(4.5),
  kneeFinished: inches(30),
  flareFraction: 1,
  ease: { chest: 0, bust: 0, underbust: 0, waist: 0, topHip: 0, hip: 0 },
};

const rules: HouseRules = {
  ...quarterRule,
  allowance: { ...quarterRule.allowance, zip: inches(2) },
  intakes: { topLine: inches(1.5), underbust: inches(2), waistSeam: inches(2), waist: inches(1) },
};

const draft = draftGown({ card, style, rules });

const pieceNamed = (name: string): Piece => {
  const found = draft.pieces.find((piece) => piece.name === name);
  if (!found) throw new Error(`no piece ${name}`);
  return found;
};

/** Flat width of a half at a level, its intake with it: from the centre out to the side. */
function flatWidth(side: Side, level: LevelName): number {
  const ends = draft.pieces
    .filter((piece) => piece.side === side && piece.part !== 'flare')
    .flatMap((piece) => piece.levels.filter((each) => each.level === level))
    .flatMap(({ from, to }) => [from.x, to.x]);
  return Math.max(...ends) - Math.min(...ends);
}

/** Radius of the circle through three points: product of the sides over four times the area. */
const radiusThrough = (a: Point, b: Point, c: Point): number =>
  (distance(a, b) * distance(b, c) * distance(c, a)) /
  (2 * Math.abs(cross(subtract(b, a), subtract(c, a))));

const tenth = (found: number, wanted: number): void => {
  expect(Math.abs(found - wanted)).toBeLessThanOrEqual(0.1);
};

describe.each(['front', 'back'] as const)(
  'the %s quarter drawn by the plain quarter rule',
  (side) => {
    it.each([
      ['bust', 9],
      ['underbust', 7 + 2],
      ['waist', 8 + 1],
      ['hip', 10],
      ['knee-seam', 7.5],
    ] as const)('is at the %s %d inches wide, intake and all', (level, wanted) => {
      tenth(flatWidth(side, level), inches(wanted));
    });

    it('is 8 inches at the raised seam, and 2 of dart', () => {
      const skirt = pieceNamed(`${side}-middle`);
      const seam = skirt.edges.filter(({ name }) => /^waist-[a-c]$/.test(name));
      tenth(
        seam.reduce((sum, { path }) => sum + pathLength(path), 0),
        inches(8),
      );
      const mouth = skirt.edges.find(({ name }) => name === 'waist-mouth-a');
      tenth(pathLength(mouth?.path ?? []), inches(2));
    });
  },
);

describe('the gown drawn by the plain quarter rule', () => {
  it('has its front dart 4 inches from the centre, running out 4 1/2 below the waist', () => {
    const dart = pieceNamed('front-middle').darts.find(({ name }) => name === 'waist');
    const [centre, side] = [dart?.centreLeg ?? [], dart?.sideLeg ?? []];
    const waist = draft.levels.waist;
    const at = (leg: typeof centre, y: number): number =>
      pathCrossings(leg, point(0, y), point(1, y))[0]?.at.x ?? NaN;
    tenth((at(centre, waist) + at(side, waist)) / 2, inches(4));
    tenth(at(side, waist) - at(centre, waist), inches(1));
    tenth((centre.at(-1)?.to.y ?? NaN) - waist, inches(4.5));
  });

  it.each(['front', 'back'] as const)(
    'ends the %s half the shoulder width out, and the dart of the drop line more',
    (side) => {
      const outer = pieceNamed(`${side}-top-side`).edges.find(({ name }) => name === 'top');
      const end = outer?.path.at(-1)?.to;
      tenth(end?.x ?? NaN, inches(7 + 1.5));
      tenth(end?.y ?? NaN, inches(6.5));
    },
  );

  it('opens 1 1/2 inches at the drop line, half on each side of the axis', () => {
    const leg = (name: string): number => {
      const path = pieceNamed(name).edges.find((edge) => edge.name === 'princess')?.path ?? [];
      // The peak stands on the centre panel: the legs are carried on straight to its height.
      const ends = path.flatMap(({ from, to }) => [from, to]).sort((a, b) => a.y - b.y);
      const [top, next] = [ends[0], ends.find(({ y }) => y > (ends[0]?.y ?? 0) + 20)];
      if (!top || !next) return NaN;
      return top.x + ((next.x - top.x) * (inches(5) - top.y)) / (next.y - top.y);
    };
    tenth(leg('front-top-side') - leg('front-top-centre'), inches(1.5));
  });

  it('cuts a full-circle flare for the 30 inch knee at 30 / 2 pi', () => {
    tenth(flareRadius(inches(30), 1), inches(30 / (2 * Math.PI)));
    const knee = pieceNamed('flare-front').edges.find(({ name }) => name.startsWith('knee'));
    const path = knee?.path ?? [];
    const [a, b, c] = [0, 0.5, 1].map(
      (share) => stationAtLength(path, share * pathLength(path))?.at,
    );
    tenth(a && b && c ? radiusThrough(a, b, c) : NaN, inches(30 / (2 * Math.PI)));
  });

  it('holds the zip extension outside the seam line: no girth counts it', () => {
    const narrow = draftGown({
      card,
      style,
      rules: { ...rules, allowance: quarterRule.allowance },
    });
    expect(draft.proof.girths).toEqual(narrow.proof.girths);
    const back = draft.pieces.find(({ name }) => name === 'back-middle');
    tenth(Math.min(...(back?.cutLine ?? []).map(({ to }) => to.x)), -inches(2));
  });

  it('says what the outright darts cost: the chest is not held', () => {
    expect(draft.warnings.map(({ code }) => code)).toContain('chest-not-held');
  });

  it('is narrated with these figures in inches', () => {
    const told = draft.steps.map((step) => `${step.id}: ${speak(step.said, 'in')}`).join('\n');
    expect(told).toContain(
      'front/bust-line: Square out from the centre: a quarter of (bust 36 in) = 9 in.',
    );
    expect(told).toContain('a quarter of (under-bust 28 in) = 7 in');
    expect(told).toContain('a quarter of (waist 32 in) = 8 in');
    expect(told).toContain('a quarter of (hip 40 in) = 10 in');
    expect(told).toMatch(/gap is 2 in at the under-bust and 2 in at the waist seam/);
    expect(told).toMatch(
      /One dart: 2 in at the waist seam, which the legs cross upright, 1 in at the waist, ending 4\s1⁄2 in below/,
    );
    expect(told).toMatch(/opens to 1\s1⁄2 in at/);
  });
});
