import { describe, expect, it } from 'vitest';
import { svgPathProperties } from 'svg-path-properties';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { piecesSvg } from '#shared/exports/svg.ts';
import { finishPiece } from '#shared/finishing/finish-piece.ts';
import { paperCard, paperDraft } from '../support/paper-draft.ts';
import { curvedBack, dartedFront, flareSector, withEdge } from '../support/sample-pieces.ts';
import { type Read, ofClass, readXml } from './svg-reader.ts';

const facts = { cardName: 'Ada Lind', date: '2026-11-14', draftNumber: '4F2A', cloth: 'cloth' };

const finished = [dartedFront, curvedBack, flareSector].map((piece) =>
  finishPiece(piece, balanced, facts),
);
const svg = readXml(piecesSvg(paperDraft(finished), 'cm'));

const pieceNamed = (root: Read, name: string): Read => {
  const found = ofClass(root, 'piece').find(({ attributes }) => attributes['data-piece'] === name);
  if (!found) throw new Error(`No piece ${name}`);
  return found;
};

const front = pieceNamed(svg, 'front-middle');
const back = pieceNamed(svg, 'back-middle');

const edge = (piece: Read, name: string): Record<string, string | undefined> =>
  ofClass(piece, 'seam-line').find(({ attributes }) => attributes['data-edge'] === name)
    ?.attributes ?? {};

const ends = (d: string): { from: string; to: string } => {
  const path = new svgPathProperties(d);
  const shown = ({ x, y }: { x: number; y: number }): string => `${x.toFixed(3)} ${y.toFixed(3)}`;
  return {
    from: shown(path.getPointAtLength(0)),
    to: shown(path.getPointAtLength(path.getTotalLength())),
  };
};

describe('the exported SVG', () => {
  it('is one millimetre to the unit', () => {
    const { width, height, viewBox } = svg.attributes;
    expect(viewBox).toBe(`0 0 ${parseFloat(width ?? '')} ${parseFloat(height ?? '')}`);
    expect(width).toMatch(/^\d+mm$/);
    expect(height).toMatch(/^\d+mm$/);
  });

  it('holds every piece once, in its own coordinates under one shift', () => {
    const pieces = ofClass(svg, 'piece');
    expect(pieces.map(({ attributes }) => attributes['data-piece']).sort()).toEqual([
      'back-middle',
      'flare-front',
      'front-middle',
    ]);
    for (const piece of pieces) {
      expect(piece.attributes.transform).toMatch(/^translate\(-?[\d.]+ -?[\d.]+\)$/);
      for (const inside of piece.inside) expect(inside.attributes.transform).toBeUndefined();
    }
    expect(front.attributes).toMatchObject({
      'data-side': 'front',
      'data-cut': '1 on fold',
      'data-copies': '1',
    });
    expect(back.attributes).toMatchObject({ 'data-side': 'back', 'data-copies': '2' });
  });

  it('has the cutting line closed', () => {
    for (const piece of ofClass(svg, 'piece')) {
      const cut = ofClass(piece, 'cut-line');
      expect(cut).toHaveLength(1);
      expect(cut[0]?.attributes.d).toMatch(/Z$/);
    }
  });

  it('has the seam line edge after edge, closed in document order', () => {
    for (const piece of ofClass(svg, 'piece')) {
      const walked = ofClass(piece, 'seam-line').map(({ attributes }) => ends(attributes.d ?? ''));
      walked.forEach(({ to }, index) => {
        expect(walked[(index + 1) % walked.length]?.from).toBe(to);
      });
    }
  });

  it('names what each edge joins, how, and what stays open', () => {
    expect(edge(front, 'side')).toMatchObject({
      'data-joins': 'back-middle:side',
      'data-ease': '0',
    });
    expect(edge(front, 'waist-mouth')).toMatchObject({ 'data-open': 'true' });
    expect(edge(front, 'waist-mouth')['data-joins']).toBeUndefined();
    expect(edge(front, 'centre')).toMatchObject({ 'data-fold': 'true' });
    expect(edge(back, 'zip')).toMatchObject({ 'data-joins': 'self' });
    const eased = withEdge(curvedBack, 'side', {
      ease: 4,
      easeBetween: ['hip', 'knee'],
      ratio: 1.5,
      corner: 120,
    });
    const root = readXml(piecesSvg(paperDraft([finishPiece(eased, balanced, facts)]), 'cm'));
    expect(edge(pieceNamed(root, 'back-middle'), 'side')).toMatchObject({
      'data-ease': '4',
      'data-ease-between': 'hip,knee',
      'data-ratio': '1.5',
      'data-corner': '120',
    });
  });

  it('has the dart as a closed polygon from one leg to the other', () => {
    const [dart] = ofClass(front, 'dart');
    expect(dart?.attributes).toMatchObject({
      'data-dart': 'waist',
      'data-tip': 'below',
      'data-legs': 'side-leg,centre-leg',
      d: 'M130 0L115 110L100 0Z',
    });
  });

  it('has levels from the centre to the side, grain, notches and lettering', () => {
    const levels = ofClass(front, 'level').map(({ attributes }) => attributes);
    expect(levels.map((each) => each['data-level'])).toEqual(['waist', 'hip']);
    expect(levels[1]?.d).toBe('M0 200L260 200');
    expect(ofClass(front, 'grain')[0]?.attributes.d).toBe('M60 60L60 260');
    expect(ofClass(front, 'notch')[0]?.attributes).toMatchObject({
      'data-notch': 'hip',
      'data-edge': 'side',
    });
    const text = front.inside.filter(({ name }) => name === 'text').map((each) => each.text);
    expect(text).toContain('cut 1 on fold');
    expect(text).toContain('print at 100 %');
  });

  it('shows the trade its lines: cut solid, seams dashed, fold bracketed', () => {
    expect(ofClass(front, 'cut-line')[0]?.attributes['stroke-dasharray']).toBeUndefined();
    expect(edge(front, 'side')['stroke-dasharray']).toBeDefined();
    expect(ofClass(front, 'fold-bracket')).toHaveLength(1);
    expect(ofClass(back, 'fold-bracket')).toHaveLength(0);
  });

  it('writes numbers to a thousandth of a millimetre', () => {
    expect(piecesSvg(paperDraft(finished), 'cm')).not.toMatch(/\d\.\d{4}/);
  });

  it('stays well formed whatever name is typed on the card', () => {
    const cardName = `<script>alert('1')</script> & "Co" ]]> \u0000\u0007\ud800`;
    const piece = finishPiece(flareSector, balanced, { ...facts, cardName });
    const root = readXml(piecesSvg(paperDraft([piece]), 'in'));
    const texts = pieceNamed(root, 'flare-front').inside.map((each) => each.text);
    expect(texts.join('\n')).toContain(`<script>alert('1')</script> & "Co" ]]>`);
    expect(pieceNamed(root, 'flare-front').inside.some(({ name }) => name === 'script')).toBe(
      false,
    );
  });

  it('states the allowances in the reader’s unit', () => {
    const legend = (unit: 'cm' | 'in'): string =>
      ofClass(readXml(piecesSvg(paperDraft(finished), unit)), 'legend')
        .map(({ text }) => text)
        .join(' ');
    expect(legend('cm')).toContain('seams 1.5 cm');
    expect(legend('in')).toContain('side seams 1 in');
  });

  it('is the same file for the same inputs', () => {
    const draw = (): string =>
      piecesSvg(draftGown({ card: paperCard, style: {}, rules: balanced }), 'cm');
    expect(draw()).toBe(draw());
  });
});
