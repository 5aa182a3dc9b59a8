import { describe, expect, it } from 'vitest';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { draftNumber } from '#shared/engine/draft-number.ts';
import { speak } from '#shared/units/speak.ts';
import { middleBody } from '../support/middle-body.ts';

const inputs = { card: middleBody, style: {}, rules: balanced };

describe('a gown drafted', () => {
  it('comes out byte for byte the same for the same inputs', () => {
    expect(JSON.stringify(draftGown(inputs))).toBe(JSON.stringify(draftGown(inputs)));
  });

  it('carries one number on every piece, another when a measure changes', () => {
    const first = draftGown(inputs).number;
    expect(first).toMatch(/^[2-9A-HJ-NP-Z]{5}$/);
    expect(draftGown({ ...inputs, card: { ...middleBody, hipGirth: 991 } }).number).not.toBe(first);
  });

  // Fowler, Noll and Vo, FNV-1a 32 bit: the empty text gives the offset basis 0x811c9dc5 (published, from memory).
  it('numbers by FNV-1a', () => {
    const letters = '23456789ABCDEFGHJKLMNPQRSTUVWXYZ';
    const basis = [0, 1, 2, 3, 4].map((k) => letters[(0x811c9dc5 >>> (5 * k)) & 31]).join('');
    expect(draftNumber('')).toBe(basis);
  });

  it('draws princess panels first, one piece a side with darts', () => {
    const names = (shaping: 'princess' | 'darts'): readonly string[] =>
      draftGown({ ...inputs, style: { shaping } }).pieces.map((piece) => piece.name);
    expect(draftGown(inputs).style.shaping).toBe('princess');
    expect(names('princess')).toEqual([
      'front-top-centre',
      'front-top-side',
      'front-middle',
      'flare-front',
      'back-top-centre',
      'back-top-side',
      'back-middle',
      'flare-back',
    ]);
    expect(names('darts')).toEqual([
      'front-top',
      'front-middle',
      'flare-front',
      'back-top',
      'back-middle',
      'flare-back',
    ]);
  });

  it('has a sentence for every step, and no step twice', () => {
    const { steps } = draftGown(inputs);
    expect(new Set(steps.map(({ id }) => id)).size).toBe(steps.length);
    for (const step of steps) {
      for (const unit of ['cm', 'in'] as const) {
        const sentence = speak(step.said, unit);
        expect(sentence).toMatch(/^[A-Z0-9].*\.$/s);
        expect(sentence).not.toMatch(/NaN|undefined|Infinity/);
      }
    }
  });

  it('names every core measure in some step', () => {
    const { steps } = draftGown(inputs);
    const named = new Set(steps.flatMap(({ measures }) => measures));
    for (const key of Object.keys(middleBody).filter((each) => !['name', 'date'].includes(each))) {
      expect(named).toContain(key);
    }
  });

  it('gives handles for neck depth, neck width and finished knee, each where its value lies', () => {
    const { handles, style, pieces } = draftGown(inputs);
    const at = (key: string) => handles.find((handle) => handle.key === key)?.at;
    expect(at('neckDepth')).toEqual({ x: 0, y: style.neckDepth });
    expect(at('neckWidth')?.x).toBeCloseTo(style.neckWidth, 6);
    const knee = pieces.find(({ name }) => name === 'front-middle')?.levels.at(-1)?.to;
    expect(at('kneeFinished')).toEqual(knee);
  });

  it('is refused with every field at fault named', () => {
    try {
      draftGown({ ...inputs, card: { ...middleBody, bustGirth: 9200, waistGirth: 72 } });
      expect.unreachable();
    } catch (error) {
      if (!(error instanceof DraftingError)) throw error;
      expect(error.problems.map(({ field }) => field)).toEqual([
        'card.bustGirth',
        'card.waistGirth',
      ]);
    }
  });
});
