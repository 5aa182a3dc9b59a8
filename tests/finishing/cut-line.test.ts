import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Piece } from '#shared/drafting/piece.ts';
import { allowanceOf } from '#shared/finishing/allowance.ts';
import { cutLine } from '#shared/finishing/cut-line.ts';
import { type Path, cubic, line } from '#shared/geometry/path.ts';
import { type Point, distance, point } from '#shared/geometry/point.ts';
import { clockwiseArea, finely, isSimple, nearest, sampled } from '../support/outline-check.ts';
import {
  curvedBack,
  dartedFront,
  flareSector,
  sampleRules,
  withEdge,
} from '../support/sample-pieces.ts';

const has = (path: Path, wanted: Point, within = 1e-6): boolean =>
  path.some(({ from }) => distance(from, wanted) < within);

const straight = (from: Point, to: Point): Path => [line(from, to)];

/** A piece with straight edges, each seam except as named. */
function straightPiece(
  corners: readonly Point[],
  names: readonly { name: string; kind: 'seam' | 'side' | 'hem' | 'top' | 'fold' }[],
): Piece {
  const edges = names.map(({ name, kind }, i) => {
    const from = corners[i] ?? point(0, 0);
    const to = corners[(i + 1) % corners.length] ?? from;
    return { name, kind, path: straight(from, to) };
  });
  return { ...dartedFront, edges, darts: [], levels: [], notches: [] };
}

const amount = (least: number, most: number): fc.Arbitrary<number> =>
  fc.double({ min: least, max: most, noNaN: true });

/** Skirt-like pieces: waist that falls or rises, a side that swells, a knee, centre on the fold. */
const skirt = fc
  .record({
    waist: amount(150, 260),
    rise: amount(-30, 30),
    hip: amount(200, 320),
    knee: amount(170, 300),
    length: amount(400, 700),
    start: amount(-0.4, 0.4),
  })
  .map(({ waist, rise, hip, knee, length, start }): Piece => {
    const side = point(waist, rise);
    const middle = point(hip, length * 0.4);
    const foot = point(knee, length);
    const [first, last] = [middle.y - side.y, foot.y - middle.y].map((each) => each / 3);
    return {
      ...curvedBack,
      edges: [
        {
          name: 'waist',
          kind: 'seam',
          path: [cubic(point(0, 0), point(waist / 3, 0), point(waist * 0.66, rise * 0.7), side)],
        },
        {
          name: 'side',
          kind: 'side',
          path: [
            cubic(
              side,
              point(side.x + (first ?? 0) * Math.tan(start), side.y + (first ?? 0)),
              point(middle.x, middle.y - (first ?? 0)),
              middle,
            ),
            cubic(
              middle,
              point(middle.x, middle.y + (last ?? 0)),
              point(foot.x, foot.y - (last ?? 0)),
              foot,
            ),
          ],
        },
        { name: 'knee', kind: 'seam', path: straight(foot, point(0, length)) },
        { name: 'centre', kind: 'fold', path: straight(point(0, length), point(0, 0)) },
      ],
    };
  });

/** Asserts all that a cutting line has to be, seen from outside. */
function expectCuttable(piece: Piece): void {
  const cut = cutLine(piece, sampleRules);
  cut.forEach((segment, i) => {
    const next = cut[(i + 1) % cut.length];
    expect(next && distance(segment.to, next.from)).toBeLessThan(1e-6);
  });
  const chain = sampled(cut);
  expect(isSimple(chain)).toBe(true);
  expect(clockwiseArea(chain)).toBeGreaterThan(0);
  const own = piece.edges.filter((edge) => edge.kind !== 'mouth');
  for (const edge of own) {
    const wanted = allowanceOf(edge, sampleRules);
    const seam = finely(edge.path);
    const beside = chain.map((place) => nearest(seam, place)).filter(({ inside }) => inside);
    const closest = Math.min(...beside.map(({ away }) => away));
    expect(closest).toBeGreaterThan(wanted - 0.2);
    if (edge.path.length > 1) expect(closest).toBeLessThan(wanted + 0.2);
  }
}

describe('the cutting line', () => {
  it.each([dartedFront, curvedBack, flareSector])('can be cut round $name', (piece) => {
    expectCuttable(piece);
  });

  it('is closed, simple, clockwise and never nearer than its allowance on any skirt', () => {
    fc.assert(fc.property(skirt, expectCuttable), { numRuns: 60 });
  });

  it('runs along the fold, with no cloth beyond it', () => {
    const cut = cutLine(dartedFront, sampleRules);
    expect(Math.min(...sampled(cut).map(({ x }) => x))).toBe(0);
    expect(has(cut, point(0, 315))).toBe(true);
    expect(has(cut, point(0, -15))).toBe(true);
  });

  it('meets in a mitre at a square corner of two allowances', () => {
    expect(has(cutLine(dartedFront, sampleRules), point(285, -15))).toBe(true);
  });

  it('steps out square where the zip begins', () => {
    const cut = cutLine(curvedBack, sampleRules);
    expect(has(cut, point(-15, 160))).toBe(true);
    expect(has(cut, point(-25, 160))).toBe(true);
  });

  it('is squared off at a very sharp corner, no nearer than the allowance', () => {
    const point40 = point(0, 0);
    const long = 300;
    const [a, b] = [20, -20].map((each) => (each * Math.PI) / 180);
    const sharp = straightPiece(
      [
        point40,
        point(-long * Math.cos(a ?? 0), long * Math.sin(a ?? 0)),
        point(-long * Math.cos(b ?? 0), long * Math.sin(b ?? 0)),
      ],
      [
        { name: 'princess', kind: 'seam' },
        { name: 'centre', kind: 'seam' },
        { name: 'waist', kind: 'seam' },
      ],
    );
    const cut = cutLine(sharp, sampleRules);
    const farthest = Math.max(...cut.map(({ from }) => from.x));
    // A mitre would reach 15 / sin 20 = 43.9 beyond the corner; squared it stands 15 off.
    expect(farthest).toBeCloseTo(15, 6);
    expect(cut.filter(({ from }) => Math.abs(from.x - farthest) < 1e-6)).toHaveLength(2);
  });

  it('mirrors the end of a pressed-open seam, so that it reaches the waist again', () => {
    // Waist level, side leaning out by 20 degrees: an inner corner of 110 degrees at the side.
    const lean = Math.tan((20 * Math.PI) / 180) * 300;
    const piece = straightPiece(
      [point(0, 0), point(200, 0), point(200 + lean, 300), point(0, 300)],
      [
        { name: 'waist', kind: 'seam' },
        { name: 'side', kind: 'side' },
        { name: 'hem', kind: 'hem' },
        { name: 'centre', kind: 'fold' },
      ],
    );
    const cut = cutLine(piece, sampleRules);
    // By hand: the waist's cutting line y = -15 meets the side's line at the valley; the tip of the
    // allowance, folded over the side's line, has to lie on y = -15 again.
    const along = point(Math.sin((20 * Math.PI) / 180), Math.cos((20 * Math.PI) / 180));
    const valley = point(200 - 15 * Math.tan((20 * Math.PI) / 180), -15);
    expect(has(cut, valley)).toBe(true);
    const tip = cut.find(
      ({ from }) => from.y < -16 && nearest(finely(piece.edges[1]?.path ?? []), from).away > 20,
    )?.from;
    expect(tip).toBeDefined();
    if (!tip) return;
    const out = point(tip.x - 200, tip.y);
    const foot = out.x * along.x + out.y * along.y;
    const folded = point(2 * foot * along.x - out.x, 2 * foot * along.y - out.y);
    expect(folded.y).toBeCloseTo(-15, 6);
    expect(out.x * along.y - out.y * along.x).toBeCloseTo(25, 6);
  });

  it('mirrors the ends of a hem about the hem line where the sides run in', () => {
    const lean = Math.tan((20 * Math.PI) / 180) * 300;
    const piece = straightPiece(
      [point(0, 0), point(200 + lean, 0), point(200, 300), point(0, 300)],
      [
        { name: 'waist', kind: 'seam' },
        { name: 'side', kind: 'side' },
        { name: 'hem', kind: 'hem' },
        { name: 'centre', kind: 'fold' },
      ],
    );
    const cut = cutLine(piece, {
      ...sampleRules,
      allowance: { ...sampleRules.allowance, hem: 40 },
    });
    const widths = cut
      .filter(({ from }) => Math.abs(from.y - 340) < 1e-6)
      .map(({ from }) => from.x);
    // Turned up, 40 mm above the hem the piece is 200 + 40 tan 20 wide, and the side's 25 allowance
    // stands 25 / cos 20 level beyond it.
    const tan = Math.tan((20 * Math.PI) / 180);
    expect(Math.max(...widths)).toBeCloseTo(200 + 40 * tan + 25 / Math.cos(Math.atan(tan)), 6);
  });

  it('clears the loops where an edge bends in more tightly than its allowance', () => {
    const scooped = withEdge(dartedFront, 'side', {
      path: [
        line(point(260, 0), point(260, 140)),
        cubic(point(260, 140), point(250, 140), point(248, 145), point(248, 150)),
        cubic(point(248, 150), point(248, 155), point(250, 160), point(260, 160)),
        line(point(260, 160), point(260, 300)),
      ],
    });
    expectCuttable(scooped);
  });
});
