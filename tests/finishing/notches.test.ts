import { describe, expect, it } from 'vitest';
import { finishPiece } from '#shared/finishing/finish-piece.ts';
import { distance, point } from '#shared/geometry/point.ts';
import { curvedBack, dartedFront, sampleRules } from '../support/sample-pieces.ts';

const facts = { draftNumber: '4F2A', cloth: 'cloth' };
const front = finishPiece(dartedFront, sampleRules, facts);
const back = finishPiece(curvedBack, sampleRules, facts);

describe('a notch', () => {
  it('is one stroke on the front, from the seam line to the cutting line', () => {
    const strokes = front.notchMarks[0]?.strokes ?? [];
    expect(strokes).toHaveLength(1);
    expect(strokes[0]?.from).toEqual(point(260, 200));
    expect(strokes[0]?.to).toEqual(point(285, 200));
  });

  it('is two strokes 6 mm apart on the back', () => {
    const strokes = back.notchMarks.find(({ name }) => name === 'hip')?.strokes ?? [];
    expect(strokes).toHaveLength(2);
    const [a, b] = strokes;
    expect(a && b && distance(a.from, b.from)).toBeCloseTo(6, 9);
    for (const stroke of strokes) expect(distance(stroke.from, stroke.to)).toBeCloseTo(25, 1);
  });

  it('ends on the cutting line on both sides of the step at the end of the zip', () => {
    const strokes = back.notchMarks.find(({ name }) => name === 'zip-end')?.strokes ?? [];
    expect(strokes.map(({ to }) => Math.round(to.x)).sort()).toEqual([-15, -25]);
  });

  it('runs into the piece on a fold, where there is no allowance', () => {
    const piece = {
      ...dartedFront,
      notches: [
        {
          name: 'hip',
          edge: 'centre',
          at: point(0, 200),
          outward: point(-1, 0),
          strokes: 1 as const,
        },
      ],
    };
    expect(finishPiece(piece, sampleRules, facts).notchMarks[0]?.strokes[0]?.to.x).toBe(5);
  });
});
