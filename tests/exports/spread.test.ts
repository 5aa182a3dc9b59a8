import { describe, expect, it } from 'vitest';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { spread } from '#shared/exports/spread.ts';
import { paperCard } from '../support/paper-draft.ts';
import { oblong } from '../support/paper-pieces.ts';
import { sampled } from '../support/outline-check.ts';

const { pieces } = draftGown({ card: paperCard, style: {}, rules: balanced });
const laid = spread(pieces);

const boxes = laid.placed.map(({ piece, translate }) => {
  const chain = sampled(piece.cutLine);
  const xs = chain.map(({ x }) => x + translate.x);
  const ys = chain.map(({ y }) => y + translate.y);
  return {
    name: piece.name,
    piece,
    translate,
    left: Math.min(...xs),
    right: Math.max(...xs),
    top: Math.min(...ys),
    foot: Math.max(...ys),
  };
});

const named = (part: 'top' | 'middle' | 'flare', side: 'front' | 'back'): typeof boxes =>
  boxes.filter(({ piece }) => piece.part === part && piece.side === side);

describe('the pieces on the table', () => {
  it('all lie there, once', () => {
    expect(boxes.map(({ name }) => name).sort()).toEqual(pieces.map(({ name }) => name).sort());
  });

  it('lie at least 39 mm from each other', () => {
    boxes.forEach((a, index) => {
      for (const b of boxes.slice(index + 1)) {
        const across = Math.max(a.left - b.right, b.left - a.right);
        const down = Math.max(a.top - b.foot, b.top - a.foot);
        expect(Math.max(across, down)).toBeGreaterThan(39);
      }
    });
  });

  it('lie within the bounds that are given', () => {
    for (const { left, right, top, foot } of boxes) {
      expect(left).toBeGreaterThan(0);
      expect(top).toBeGreaterThan(0);
      expect(right).toBeLessThan(laid.width);
      expect(foot).toBeLessThan(laid.height);
    }
  });

  it('lie tops above middles, then the back, then the flares to the right', () => {
    for (const side of ['front', 'back'] as const) {
      const [middle] = named('middle', side);
      for (const top of named('top', side)) expect(top.foot).toBeLessThan(middle?.top ?? 0);
    }
    const rightOf = (each: typeof boxes): number => Math.max(...each.map(({ right }) => right));
    const leftOf = (each: typeof boxes): number => Math.min(...each.map(({ left }) => left));
    const front = [...named('top', 'front'), ...named('middle', 'front')];
    const back = [...named('top', 'back'), ...named('middle', 'back')];
    const flares = boxes.filter(({ piece }) => piece.part === 'flare');
    expect(rightOf(front)).toBeLessThan(leftOf(back));
    expect(rightOf(back)).toBeLessThan(leftOf(flares));
  });

  it('keep each level at one height across front and back', () => {
    for (const part of ['top', 'middle'] as const) {
      const heights = [...named(part, 'front'), ...named(part, 'back')].map(
        ({ translate }) => translate.y,
      );
      expect(new Set(heights).size).toBe(1);
    }
  });

  it('stack flare panels under each other where there are many', () => {
    const panels = ['a', 'b', 'c'].map((name) => oblong(name, 100, 200, { part: 'flare' }));
    const body = oblong('front-middle', 200, 450, { part: 'middle' });
    const { placed } = spread([body, ...panels]);
    const at = (name: string): { x: number; y: number } | undefined =>
      placed.find(({ piece }) => piece.name === name)?.translate;
    expect(at('b')).toEqual({ x: at('a')?.x, y: (at('a')?.y ?? 0) + 240 });
    expect(at('c')).toEqual({ x: (at('a')?.x ?? 0) + 140, y: at('a')?.y });
  });

  it('lie the same way every time', () => {
    expect(spread(pieces)).toEqual(laid);
  });
});
