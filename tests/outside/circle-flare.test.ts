import { describe, expect, test } from 'vitest';
import type { Piece } from '#shared/drafting/piece.ts';
import { openTable } from '#shared/drafting/drafting-table.ts';
import { flarePieces } from '#shared/drafts/gown/flare.ts';
import { flareHem, flareRadius, planFlare } from '#shared/drafts/gown/flare-plan.ts';
import { kneeStretches } from '#shared/drafts/gown/knee-stretches.ts';
import { skirtPanels } from '#shared/drafts/gown/skirt-panel.ts';
import { cutLine } from '#shared/finishing/cut-line.ts';
import { pathLength } from '#shared/geometry/curve.ts';
import { plainRules } from '../proof/straight-band.ts';

/*
 * Check values of the trade for circle skirts and flounces. Source of every figure here: plane
 * geometry of the circle (r = W / 2 pi f, hem = W + 2 pi f d), as trade handbooks print it in
 * tables; the radius rule is common practice. Figures are in centimetres, as those tables give them.
 */

const cm = 10;

/** All pieces of a flare, in cloth no seam of it is too wide for. */
function flareOf(seam: number, fraction: number, depth: number): readonly Piece[] {
  const plan = planFlare({
    seam: seam / 4,
    inner: flareRadius(seam, fraction),
    depth,
    room: 1e6,
  });
  const paper = openTable().part('Flare', 'flare');
  const skirt = { axis: seam / 8, quarter: seam / 4, knee: 0 };
  return (['front', 'back'] as const).flatMap((side) => {
    const panels = skirtPanels(side, { waistSeam: 'raised', shaping: 'princess' }, skirt);
    return flarePieces(paper, side, plan, plan.gores, kneeStretches(plan, panels));
  });
}

/** Length round the whole flare of the edges whose names begin so. */
const roundOf = (pieces: readonly Piece[], name: string): number =>
  pieces
    .flatMap((piece) => piece.edges)
    .filter((edge) => edge.name.startsWith(name))
    .reduce((sum, edge) => sum + 2 * pathLength(edge.path), 0);

describe('inner radius of a circle flare', () => {
  test.each([
    [70, 1, 11.141],
    [70, 3 / 4, 14.854],
    [70, 1 / 2, 22.282],
    [70, 1 / 4, 44.563],
  ])('a seam of %s cm in %s of a circle is struck at %s cm (± 0.005)', (seam, fraction, radius) => {
    expect(Math.abs(flareRadius(seam * cm, fraction) / cm - radius)).toBeLessThanOrEqual(0.005);
  });

  test.each([
    [60, 9.55],
    [64, 10.19],
    [68, 10.82],
    [72, 11.46],
    [76, 12.1],
  ])('a seam of %s cm in a full circle is struck at %s cm (± 0.01)', (seam, radius) => {
    expect(Math.abs(flareRadius(seam * cm, 1) / cm - radius)).toBeLessThanOrEqual(0.01);
  });
});

describe('hem of a circle flare, measured on its pieces', () => {
  test.each([
    [1, 447.0],
    [1 / 2, 258.5],
    [1 / 4, 164.2],
  ])('70 cm of seam, 60 deep, in %s of a circle has a hem of %s cm (± 0.1)', (fraction, hem) => {
    const pieces = flareOf(70 * cm, fraction, 60 * cm);
    expect(Math.abs(roundOf(pieces, 'knee') / cm - 70)).toBeLessThanOrEqual(0.01);
    expect(Math.abs(roundOf(pieces, 'hem') / cm - hem)).toBeLessThanOrEqual(0.1);
    expect(Math.abs(flareHem(70 * cm, fraction, 60 * cm) / cm - hem)).toBeLessThanOrEqual(0.1);
  });

  test('a flounce of 92 cm, half a circle, 45 deep: radius 29.28, hem 233.4 (± 0.05)', () => {
    expect(Math.abs(flareRadius(92 * cm, 1 / 2) / cm - 29.28)).toBeLessThanOrEqual(0.05);
    const hem = roundOf(flareOf(92 * cm, 1 / 2, 45 * cm), 'hem') / cm;
    expect(Math.abs(hem - 233.4)).toBeLessThanOrEqual(0.05);
  });
});

describe('allowance at the inner edge of a full circle', () => {
  // The sew line keeps radius and angle; only the cutting line moves in (common practice).
  test('70 cm of seam with 1.5 cm of allowance is cut at 9.641 cm (± 0.005)', () => {
    const [front] = flareOf(70 * cm, 1, 60 * cm);
    if (!front) throw new Error('no flare was drawn');
    const nearest = cutLine(front, plainRules)
      .filter((segment) => segment.kind === 'cubic')
      .map(({ from }) => Math.hypot(from.x, from.y + flareRadius(70 * cm, 1)) / cm);
    expect(Math.abs(Math.min(...nearest) - 9.641)).toBeLessThanOrEqual(0.005);
  });
});
