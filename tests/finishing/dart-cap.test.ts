import { describe, expect, it } from 'vitest';
import { cutLine } from '#shared/finishing/cut-line.ts';
import { type Path, line } from '#shared/geometry/path.ts';
import { type Point, distance, point } from '#shared/geometry/point.ts';
import { dartedFront, sampleRules } from '../support/sample-pieces.ts';

const has = (path: Path, wanted: Point, within = 0.005): boolean =>
  path.some(({ from }) => distance(from, wanted) < within);

const straight = (from: Point, to: Point): Path => [line(from, to)];

describe('the cap of a dart', () => {
  it('peaks on the middle of the dart as the folded paper is cut', () => {
    // Worked by hand: legs (100, 0) and (130, 0) to (115, 110); half the mouth 15, so a leg leans by
    // atan(15 / 110) = 7.765 degrees. The waist's cutting line y = -15 meets the leg's line at
    // x = 100 - 15 * 15 / 110 = 97.955. Mirrored about the leg it climbs at 2 * 7.765 = 15.53 degrees
    // and meets the middle x = 115 at y = -15 - 17.045 * tan(15.53) = -19.737.
    const cut = cutLine(dartedFront, sampleRules);
    expect(has(cut, point(97.955, -15))).toBe(true);
    expect(has(cut, point(115, -19.737))).toBe(true);
    expect(has(cut, point(132.045, -15))).toBe(true);
  });

  it('is the same cap whichever way a dart across a level waist is pressed', () => {
    const toSide = {
      ...dartedFront,
      darts: dartedFront.darts.map((dart) => ({ ...dart, pressed: 'side' as const })),
    };
    const [a, b] = [dartedFront, toSide].map((piece) => cutLine(piece, sampleRules));
    expect(a?.length).toBe(b?.length);
    for (const { from } of a ?? []) expect(has(b ?? [], from, 1e-6)).toBe(true);
  });

  it('is level where the legs are upright and the waist is level', () => {
    const upright = {
      ...dartedFront,
      darts: dartedFront.darts.map((dart) => ({
        ...dart,
        centreLeg: [
          ...straight(point(100, 0), point(100, 40)),
          line(point(100, 40), point(115, 110)),
        ],
        sideLeg: [
          ...straight(point(130, 0), point(130, 40)),
          line(point(130, 40), point(115, 110)),
        ],
      })),
    };
    const above = cutLine(upright, sampleRules).filter(({ from }) => from.y < 0);
    for (const { from } of above) expect(from.y).toBeCloseTo(-15, 9);
  });

  it('follows the waist it is laid over: pressed to the centre, mirrored from the centre side', () => {
    // The waist falls by 1 in 10 towards the side; upright legs, so that closing is a plain shift.
    const fall = (x: number): Point => point(x, x < 115 ? x / 10 : (x - 30) / 10);
    const sloping = {
      ...dartedFront,
      edges: dartedFront.edges.map((edge) => {
        if (edge.name === 'waist-a') return { ...edge, path: straight(fall(0), fall(100)) };
        if (edge.name === 'waist-mouth') return { ...edge, path: straight(fall(100), fall(130)) };
        if (edge.name === 'waist-b') return { ...edge, path: straight(fall(130), fall(260)) };
        if (edge.name === 'side') return { ...edge, path: straight(fall(260), point(260, 300)) };
        if (edge.name === 'centre') return { ...edge, path: straight(point(0, 300), fall(0)) };
        return edge;
      }),
      darts: dartedFront.darts.map((dart) => ({
        ...dart,
        centreLeg: [...straight(fall(100), point(100, 50)), line(point(100, 50), point(115, 110))],
        sideLeg: [...straight(fall(130), point(130, 50)), line(point(130, 50), point(115, 110))],
      })),
    };
    const lift = 15 * Math.hypot(1, 0.1);
    const onLeg = point(100, 10 - lift);
    const toCentre = cutLine(sloping, sampleRules);
    const toSide = cutLine(
      { ...sloping, darts: sloping.darts.map((dart) => ({ ...dart, pressed: 'side' as const })) },
      sampleRules,
    );
    // Mirrored about the centre leg the centre's line, which falls towards the leg, climbs again.
    expect(has(toCentre, onLeg)).toBe(true);
    expect(has(toCentre, point(115, onLeg.y - 1.5))).toBe(true);
    // Mirrored about the side leg the side's line, which falls away from it, falls.
    expect(has(toSide, point(115, onLeg.y + 1.5))).toBe(true);
  });
});
