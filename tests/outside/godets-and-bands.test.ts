import { describe, expect, test } from 'vitest';
import type { Piece } from '#shared/drafting/piece.ts';
import { pleatedBand } from '#shared/drafts/gown/band-pieces.ts';
import { type BandInputs, planBand, pleatsFor, shapeBand } from '#shared/drafts/gown/band.ts';
import { flareRadius, partOfCircle } from '#shared/drafts/gown/flare-plan.ts';
import { godetPieces } from '#shared/drafts/gown/godet-pieces.ts';
import { godetAngle } from '#shared/drafts/gown/godets.ts';
import { skirtPanels } from '#shared/drafts/gown/skirt-panel.ts';
import { endOf, pathLength, startOf } from '#shared/geometry/curve.ts';
import { distance } from '#shared/geometry/point.ts';

/*
 * Check values of the trade reference, its numbers beside each: all derived from plane geometry, common
 * practice; centimetres as its tables give them. The worked band is common practice, no source, in inches.
 */

const cm = 10;
const inch = 25.4;
const degrees = 180 / Math.PI;

const near = (value: number, expected: number, tolerance: number): void => {
  expect(Math.abs(value - expected)).toBeLessThanOrEqual(tolerance);
};

/** A godet of the side seam, drawn with this radius and angle in cloth that is wide enough. */
function sideGodet(radius: number, angle: number): Piece {
  const place = { axis: 100, quarter: 190, knee: 0 };
  const style = { waistSeam: 'raised', shaping: 'princess' } as const;
  const panels = (['front', 'back'] as const).flatMap((side) => skirtPanels(side, style, place));
  const plan = { depth: radius, train: 0, angle, places: ['side'], room: 1e6, panels } as const;
  const [godet] = godetPieces(plan);
  if (!godet) throw new Error('no godet was drawn');
  return godet;
}

/** Arc and chord of its hem. */
function hemOf(piece: Piece): { readonly arc: number; readonly chord: number } {
  const path = piece.edges.find(({ kind }) => kind === 'hem')?.path ?? [];
  const [from, to] = [startOf(path), endOf(path)];
  if (!from || !to) throw new Error('the godet has no hem');
  return { arc: pathLength(path), chord: distance(from, to) };
}

describe('godets, measured on the piece', () => {
  test('14: radius 40 and 90 degrees make an arc of 62.83 and a chord of 56.57 (± 0.01)', () => {
    const { arc, chord } = hemOf(sideGodet(40 * cm, 90 / degrees));
    near(arc / cm, 62.83, 0.01);
    near(chord / cm, 56.57, 0.01);
  });

  test('15: four godets of radius 40 that add 120 take 42.97 degrees each (± 0.05)', () => {
    near(godetAngle(120 * cm, 4, 40 * cm) * degrees, 42.97, 0.05);
  });

  test('16: radius 50 and 60 degrees make an arc of 52.36 and a chord of 50.00 (± 0.01)', () => {
    const { arc, chord } = hemOf(sideGodet(50 * cm, 60 / degrees));
    near(arc / cm, 52.36, 0.01);
    near(chord / cm, 50, 0.01);
  });

  test('a radius of 50 opened 30, 45, 60 or 90 degrees adds 26.2, 39.3, 52.4 or 78.5 (± 0.05)', () => {
    const arcs = [30, 45, 60, 90].map(
      (angle) => hemOf(sideGodet(50 * cm, angle / degrees)).arc / cm,
    );
    [26.2, 39.3, 52.4, 78.5].forEach((arc, i) => {
      near(arcs[i] ?? 0, arc, 0.05);
    });
  });
});

describe('an A-line', () => {
  test('12: a seam of 92 and a hem of 233.4 over 45 are struck at 29.28 (± 0.05), half a circle', () => {
    const part = partOfCircle(92 * cm, 233.4 * cm, 45 * cm);
    near(part, 0.5, 0.001);
    near(flareRadius(92 * cm, part) / cm, 29.28, 0.05);
  });
});

describe('pleats', () => {
  test('35: 40 finished in pleats 2.5 wide and 2.5 deep are 16 and take 120.0 of cloth (± 0.01)', () => {
    const { count, width, depth } = pleatsFor(40 * cm, 3);
    expect(count).toBe(16);
    near(width / cm, 2.5, 0.001);
    near(depth / cm, 2.5, 0.001);
    near((count * (width + 2 * depth)) / cm, 120, 0.01);
  });

  test('laid, fold line on place line, they leave the finished length', () => {
    for (const ratio of [1.2, 1.5, 2, 3]) {
      const { lines } = pleatsFor(254, ratio);
      const taken = lines.reduce((sum, { place, fold }) => sum + fold - place, 0);
      near(254 * ratio - taken, 254, 1e-9);
    }
  });
});

const band: BandInputs = {
  girth: 2 * (10 * inch + 160 + 170),
  arm: 12 * inch,
  frontTop: 160,
  backTop: 170,
  frontArmhole: 250,
  backArmhole: 250,
  height: 6 * inch,
  pleated: true,
};

describe('a sleeve band', () => {
  test.each([
    [1.5, 15],
    [2, 20],
  ])(
    'pleated %s to 1 over an opening of 10 in takes %s in of cloth, 12 in deep before folding',
    (ratio, cloth) => {
      const [piece] = pleatedBand(planBand(band), ratio, { front: 'front-top', back: 'back-top' });
      const upper = piece?.edges.find(({ name }) => name === 'upper');
      const ends = piece?.edges.filter(({ name }) => name === 'front' || name === 'back') ?? [];
      near(pathLength(upper?.path ?? []) / inch, cloth, 0.001);
      expect(upper?.ratio).toBe(ratio);
      expect(piece?.edges.find(({ name }) => name === 'lower')?.kind).toBe('fold');
      for (const end of ends) near((2 * pathLength(end.path)) / inch, 12, 0.001);
    },
  );

  test('plain is a sector: angle (lower - upper) / height, struck at upper x height / (lower - upper)', () => {
    const plan = planBand({
      ...band,
      pleated: false,
      arm: 300,
      frontArmhole: 120,
      backArmhole: 120,
      height: 120,
    });
    const shape = shapeBand(plan);
    if (!shape) throw new Error('the band was not shaped');
    const angle = (plan.lower - plan.path) / 120;
    near(shape.angle, angle, 1e-6);
    near(pathLength(shape.upper), plan.path, 0.001);
    near(pathLength(shape.lower), plan.lower, 0.001);
    const [from, to] = [startOf(shape.upper), endOf(shape.upper)];
    const radius = (plan.path * 120) / (plan.lower - plan.path);
    near(from && to ? distance(from, to) : 0, 2 * radius * Math.sin(angle / 2), 0.001);
  });
});
