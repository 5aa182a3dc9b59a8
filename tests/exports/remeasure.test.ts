import { describe, expect, it } from 'vitest';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { piecesSvg } from '#shared/exports/svg.ts';
import { finishPiece } from '#shared/finishing/finish-piece.ts';
import { paperCard, paperDraft } from '../support/paper-draft.ts';
import { dartedFront } from '../support/sample-pieces.ts';
import { remeasure } from './remeasure.ts';

/** Body and ease of the paper card, added by hand: whole girths, mm. */
const wanted = {
  bust: 920 + 0,
  underbust: 790 - 15,
  waist: 740 - 10,
  // Top hip is not on the card: waist + 2/3 (hip - waist) = 740 + 160 (method section 3), ease 5.
  'top-hip': 900 + 5,
  hip: 980 + 20,
  // The larger of 762 and 0.76 of the hip, 744.8 (method section 6).
  'knee-seam': 762,
};

describe.each(['princess', 'darts'] as const)(
  'a gown with %s, measured from its SVG',
  (shaping) => {
    const draft = draftGown({ card: paperCard, style: { shaping }, rules: balanced });
    const { edges, girths } = remeasure(piecesSvg(draft, 'cm'));
    const girth = (level: string, part: string): number | undefined =>
      girths.find((each) => each.level === level && each.part === part)?.girth;

    it('has every joined edge as long as its partner, within 0.5 mm', () => {
      expect(edges.filter(({ joins }) => joins !== 'self').length).toBeGreaterThan(7);
      for (const each of edges) expect(Math.abs(each.difference)).toBeLessThan(0.5);
    });

    it.each(Object.entries(wanted))('has the girth at the %s, within 0.5 mm', (level, mm) => {
      const found = girths.filter((each) => each.level === level);
      expect(found.length).toBeGreaterThan(0);
      for (const each of found) expect(Math.abs(each.girth - mm)).toBeLessThan(0.5);
    });

    it('has one waist seam, as long above it as below', () => {
      const [top, middle] = [girth('waist edges', 'top'), girth('waist edges', 'middle')];
      expect(top).toBeDefined();
      expect(top).toBeCloseTo(middle ?? 0, 1);
      // It lies between under-bust and waist, so its girth does too.
      expect(top).toBeGreaterThan(wanted.waist);
      expect(top).toBeLessThan(wanted.underbust);
    });
  },
);

describe('the tape laid on an SVG', () => {
  it('takes the dart out of a level that crosses it', () => {
    // By hand: 260 wide; at 60 of 110 mm below the mouth of 30 the dart is 30 * 50 / 110 = 13.636 wide.
    const piece = finishPiece(dartedFront, balanced, { draftNumber: '4F2A', cloth: 'cloth' });
    const { girths } = remeasure(piecesSvg(paperDraft([piece]), 'cm'));
    const at = (level: string): number => girths.find((each) => each.level === level)?.girth ?? 0;
    expect(at('waist')).toBeCloseTo(2 * (260 - 13.636), 2);
    expect(at('hip')).toBeCloseTo(2 * 260, 6);
    expect(at('waist edges')).toBeCloseTo(2 * (100 + 130), 6);
  });

  it('finds an edge a millimetre too long, and a partner that is missing', () => {
    const draft = draftGown({ card: paperCard, style: {}, rules: balanced });
    const svg = piecesSvg(draft, 'cm');
    const eased = remeasure(
      svg.replace(
        'data-joins="back-middle:side" data-ease="0"',
        'data-joins="back-middle:side" data-ease="1"',
      ),
    );
    const side = eased.edges.find(({ piece, edge }) => piece === 'front-middle' && edge === 'side');
    expect(Math.abs(side?.difference ?? 0)).toBeGreaterThan(0.9);
    const alone = remeasure(
      svg.replace('data-joins="back-middle:side"', 'data-joins="back-middle:none"'),
    );
    expect(alone.edges.some(({ difference }) => difference === Infinity)).toBe(true);
  });
});
