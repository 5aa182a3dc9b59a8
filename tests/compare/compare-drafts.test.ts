import { describe, expect, it } from 'vitest';
import { alignPoints, placeOf } from '#shared/compare/alignment.ts';
import { compareDrafts, sharedEdges } from '#shared/compare/compare-drafts.ts';
import { movedPiece } from '#shared/compare/moved-piece.ts';
import { morphAt, tracksOf } from '#shared/compare/morph.ts';
import { balanced, quarterRule } from '#shared/drafting/house-rule-presets.ts';
import { draftAny } from '#shared/engine/drafted.ts';
import { startOf } from '#shared/geometry/curve.ts';
import { shift } from '#shared/geometry/motion.ts';
import { line } from '#shared/geometry/path.ts';
import { point } from '#shared/geometry/point.ts';
import { areaOf, hatch, overlapOf } from '#shared/geometry/region.ts';
import { middleBody } from '../support/middle-body.ts';

const card = middleBody;
const plain = draftAny({ card, style: {}, rules: quarterRule });
const offset = draftAny({ card, style: {}, rules: balanced });
const darted = draftAny({ card, style: { shaping: 'darts' }, rules: balanced });
const at = { on: 'point', point: 'centre-waist' } as const;

const square = (x: number, y: number, size: number) =>
  [point(x, y), point(x + size, y), point(x + size, y + size), point(x, y + size)].map(
    (from, k, all) => line(from, all[(k + 1) % 4] ?? from),
  );

describe('the area between two outlines', () => {
  it('is what each covers alone', () => {
    // Two squares of 10, the second 3 to the right: a strip of 3 by 10 on either side.
    const { firstArea, secondArea, first } = overlapOf(square(0, 0, 10), square(3, 0, 10));
    expect(firstArea).toBeCloseTo(30, 6);
    expect(secondArea).toBeCloseTo(30, 6);
    expect(areaOf(first)).toBeCloseTo(30, 6);
  });

  it('takes off a hole', () => {
    expect(overlapOf(square(0, 0, 10), square(2, 2, 4)).firstArea).toBeCloseTo(84, 6);
  });

  it('is filled by strokes that stay inside it', () => {
    const { first } = overlapOf(square(0, 0, 10), square(2, 2, 4));
    const strokes = hatch(first, 'rising', 0.5);
    const inHole = ({ x, y }: { x: number; y: number }) =>
      x > 2.01 && x < 5.99 && y > 2.01 && y < 5.99;
    for (const { from, to } of strokes) {
      expect(inHole({ x: (from.x + to.x) / 2, y: (from.y + to.y) / 2 })).toBe(false);
    }
    // Strokes half a millimetre apart cover the area twice over in length.
    const whole = strokes.reduce(
      (sum, { from, to }) => sum + Math.hypot(to.x - from.x, to.y - from.y),
      0,
    );
    expect(whole * 0.5).toBeGreaterThan(80);
    expect(whole * 0.5).toBeLessThan(88);
  });
});

describe('two drafts over each other', () => {
  it('show nothing between a draft and itself, on whatever they are laid together', () => {
    for (const wanted of alignPoints) {
      const { pairs } = compareDrafts(offset, offset, { on: 'point', point: wanted });
      for (const { between } of pairs) {
        expect((between?.firstArea ?? 1) + (between?.secondArea ?? 1)).toBe(0);
      }
    }
  });

  it('lie together at the point that was chosen', () => {
    const taller = draftAny({
      card: { ...card, frontWaistLength: 445 },
      style: {},
      rules: balanced,
    });
    for (const wanted of alignPoints) {
      const { pairs } = compareDrafts(offset, taller, { on: 'point', point: wanted });
      const front = pairs.find(({ name }) => name === 'front-middle')?.second;
      const by = front && startOf(front.edges[0]?.path ?? []);
      const own = startOf(
        taller.pieces.find(({ name }) => name === 'front-middle')?.edges[0]?.path ?? [],
      );
      const [to, from] = [placeOf(offset, 'front', wanted), placeOf(taller, 'front', wanted)];
      if (!by || !own || !to || !from) throw new Error('a place is missing');
      expect(by.x - own.x, wanted).toBeCloseTo(to.x - from.x, 9);
      expect(by.y - own.y, wanted).toBeCloseTo(to.y - from.y, 9);
    }
  });

  it('lie together along the seam that was chosen', () => {
    const { pairs } = compareDrafts(plain, offset, { on: 'seam', edge: 'side' });
    const pair = pairs.find(({ name }) => name === 'front-middle');
    const starts = [pair?.first, pair?.second].map((piece) =>
      startOf(piece?.edges.find(({ name }) => name === 'side')?.path ?? []),
    );
    expect(starts[1]?.x).toBeCloseTo(starts[0]?.x ?? Number.NaN, 9);
    expect(starts[1]?.y).toBeCloseTo(starts[0]?.y ?? Number.NaN, 9);
    expect(sharedEdges(plain, offset)).toContain('side');
  });

  it('quarter rule and balanced: what the front gains at the bust the back gives', () => {
    const { rows } = compareDrafts(plain, offset, at);
    const change = (key: string) => {
      const row = rows.find((each) => each.key === key);
      return (row?.second ?? Number.NaN) - (row?.first ?? Number.NaN);
    };
    expect(change('girth:bust')).toBeCloseTo(0, 6);
    expect(change('quarter:front:bust')).toBeGreaterThan(5);
    expect(change('quarter:front:bust')).toBeCloseTo(-change('quarter:back:bust'), 6);
  });

  it('a piece that one of them has not is shown alone', () => {
    const { pairs, rows } = compareDrafts(offset, darted, at);
    const lone = pairs.filter(({ between }) => between === undefined);
    expect(lone.map(({ name }) => name)).toContain('front-top-side');
    expect(rows.some(({ first, second }) => first === undefined || second === undefined)).toBe(
      true,
    );
  });

  it('an area carried elsewhere keeps its size', () => {
    const [piece] = offset.pieces;
    if (!piece) throw new Error('no piece');
    const away = movedPiece(piece, shift(1000, 20));
    expect(away.cutLine[0]?.from.x).toBeCloseTo((piece.cutLine[0]?.from.x ?? 0) + 1000, 9);
    expect(away.lettering[0]?.text).toBe(piece.lettering[0]?.text);
  });
});

describe('the way from one draft to the other', () => {
  const { pairs } = compareDrafts(offset, darted, at);

  it('starts as the first and ends as the second, and lines without a partner fade', () => {
    for (const pair of pairs) {
      const tracks = tracksOf(pair);
      for (const [share, piece] of [
        [0, pair.first],
        [1, pair.second],
      ] as const) {
        const shown = morphAt(tracks, share).filter(({ presence }) => presence > 0);
        expect(
          shown
            .filter(({ kind }) => kind === 'edge')
            .map(({ name }) => name)
            .sort(),
        ).toEqual((piece?.edges ?? []).map(({ name }) => name).sort());
        for (const edge of piece?.edges ?? []) {
          const drawn = shown.find(({ name, kind }) => name === edge.name && kind === 'edge');
          expect(drawn?.chain[0]?.x).toBeCloseTo(startOf(edge.path)?.x ?? Number.NaN, 6);
        }
      }
      const half = morphAt(tracks, 0.5);
      expect(half.every(({ presence }) => presence === 1 || presence === 0.5)).toBe(true);
    }
  });
});
