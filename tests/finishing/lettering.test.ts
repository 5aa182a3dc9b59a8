import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Lettering, Piece } from '#shared/drafting/piece.ts';
import { lettering } from '#shared/finishing/lettering.ts';
import { cubic, line } from '#shared/geometry/path.ts';
import { type Point, point } from '#shared/geometry/point.ts';
import { isInside, sampled } from '../support/outline-check.ts';
import { curvedBack, dartedFront, flareSector } from '../support/sample-pieces.ts';

const facts = {
  cardName: 'Ada Lind',
  date: '2026-11-14',
  draftNumber: '4F2A',
  cloth: 'cloth',
};

const outline = (piece: Piece): readonly Point[] =>
  piece.edges.flatMap((edge) => sampled(edge.path));

/** The corners of the box a line of lettering fills; 0.5 em a letter is a usual sans-serif's mean. */
function corners({ text, at, size }: Lettering): readonly Point[] {
  const right = at.x + 0.5 * size * Array.from(text).length;
  return [at, point(right, at.y), point(at.x, at.y - size), point(right, at.y - size)];
}

/** A piece with straight edges and nothing on it. */
function bare(path: readonly Point[]): Piece {
  const edges = path.map((from, i) => ({
    name: `edge-${i}`,
    kind: 'seam' as const,
    path: [line(from, path[(i + 1) % path.length] ?? from)],
  }));
  return {
    ...dartedFront,
    edges,
    darts: [],
    drills: [],
    grain: { from: point(-9, 0), to: point(-9, 9) },
  };
}

describe('the label of a piece', () => {
  it('says what a cutter has to know', () => {
    expect(lettering(dartedFront, facts).map(({ text }) => text)).toEqual([
      'Front, waist to knee',
      'cut 1 on fold',
      'Ada Lind · 2026-11-14',
      'draft 4F2A · cloth',
      'seam line dashed · cut on the solid line',
      'print at 100 %',
    ]);
  });

  it.each([dartedFront, curvedBack, flareSector])('lies inside the finished $name', (piece) => {
    const chain = outline(piece);
    const lines = lettering(piece, facts);
    expect(lines.length).toBeGreaterThan(0);
    for (const each of lines) {
      for (const corner of corners(each)) expect(isInside(chain, corner)).toBe(true);
    }
  });

  it('stands clear of the dart and the grain line', () => {
    for (const each of lettering(dartedFront, facts)) {
      const [start, end] = [each.at.x, corners(each)[1]?.x ?? 0];
      expect(start > 60 || end < 60).toBe(true);
      const touchesDart = each.at.y - each.size < 110 && start < 115 && end > 115;
      expect(touchesDart).toBe(false);
    }
  });

  it('is 4 to 7 mm high and inside the outline on pieces of any width, or is left out', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 10, max: 300, noNaN: true }),
        fc.double({ min: 10, max: 600, noNaN: true }),
        fc.double({ min: -0.3, max: 0.3, noNaN: true }),
        fc.string({ unit: 'grapheme', maxLength: 80 }),
        (width, height, lean, cardName) => {
          const piece = bare([
            point(0, 0),
            point(width, 0),
            point(width + lean * height, height),
            point(lean * height, height),
          ]);
          for (const each of lettering(piece, { ...facts, cardName })) {
            expect(each.size).toBeGreaterThanOrEqual(4);
            expect(each.size).toBeLessThanOrEqual(7);
            const chain = outline(piece);
            for (const corner of corners(each)) expect(isInside(chain, corner)).toBe(true);
          }
        },
      ),
      { numRuns: 300 },
    );
  });

  it('is broken into more lines on a narrow panel', () => {
    const panel = bare([point(0, 0), point(80, 0), point(80, 240), point(0, 240)]);
    const lines = lettering(panel, facts);
    expect(lines.length).toBeGreaterThan(6);
    expect(lines.map(({ text }) => text).join(' ')).toContain('print at 100 %');
  });

  it('shortens a long name with an ellipsis and keeps it on one line', () => {
    const cardName = `Ada\n\u202eLind ${'of the long street '.repeat(9)}`;
    const card = lettering(flareSector, { ...facts, cardName }).find(({ text }) =>
      text.includes('Ada'),
    );
    expect(card?.text.startsWith('Ada Lind of the long street')).toBe(true);
    expect(card?.text).toContain('…');
    expect(card?.text).not.toMatch(/[\p{C}]/u);
  });

  it('keeps to the wide part of a piece with a waist', () => {
    const hourglass: Piece = {
      ...bare([point(0, 0), point(1, 0), point(1, 1)]),
      edges: [
        { name: 'top', kind: 'seam', path: [line(point(0, 0), point(120, 0))] },
        {
          name: 'princess',
          kind: 'seam',
          path: [cubic(point(120, 0), point(20, 150), point(20, 150), point(120, 300))],
        },
        { name: 'hem', kind: 'seam', path: [line(point(120, 300), point(0, 300))] },
        { name: 'centre', kind: 'seam', path: [line(point(0, 300), point(0, 0))] },
      ],
    };
    const chain = outline(hourglass);
    for (const each of lettering(hourglass, facts)) {
      for (const corner of corners(each)) expect(isInside(chain, corner)).toBe(true);
    }
  });
});
