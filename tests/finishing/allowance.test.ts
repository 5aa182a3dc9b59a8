import { describe, expect, test } from 'vitest';
import { fillRules, houseRules } from '#shared/api/rules.ts';
import { checkRules } from '#shared/drafting/check-rules.ts';
import { edgeAllowance } from '#shared/drafting/edge-allowance.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import type { HouseRules } from '#shared/drafting/house-rules.ts';
import { edge } from '#shared/drafting/outline.ts';
import { lettering } from '#shared/finishing/lettering.ts';
import { arc } from '#shared/geometry/arc.ts';
import { line } from '#shared/geometry/path.ts';
import { point } from '#shared/geometry/point.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { middleBody } from '../support/middle-body.ts';

const straight = [line(point(0, 0), point(300, 0))];
const rules: HouseRules = {
  ...balanced,
  allowance: {
    seam: 15,
    side: 25,
    zip: 26,
    top: 10,
    hem: 9,
    waist: 12,
    princess: 20,
    armhole: 8,
    facing: 5,
    straightHem: 40,
  },
};

describe('what an edge is cut with', () => {
  test('the waist seam, princess seams and the free edge of a facing have allowances of their own', () => {
    expect(edgeAllowance(edge('waist-b', 'seam', straight), rules)).toBe(12);
    expect(edgeAllowance(edge('princess', 'seam', straight), rules)).toBe(20);
    expect(edgeAllowance(edge('back-princess', 'seam', straight), rules)).toBe(20);
    expect(edgeAllowance(edge('knee', 'seam', straight), rules)).toBe(15);
    expect(edgeAllowance(edge('armhole', 'armhole', straight), rules)).toBe(8);
    expect(edgeAllowance(edge('lower', 'facing', straight), rules)).toBe(5);
    expect(edgeAllowance(edge('centre', 'fold', straight), rules)).toBeUndefined();
  });

  test('a circular hem takes little, one that hardly bends is turned up like a straight one', () => {
    const hem = (radius: number) => edge('hem', 'hem', arc(point(0, 0), radius, 0, 0.3));
    expect(edgeAllowance(edge('hem', 'hem', straight), rules)).toBe(40);
    expect(edgeAllowance(hem(2000), rules)).toBe(40);
    expect(edgeAllowance(hem(900), rules)).toBe(9);
  });

  test('rules kept before there were so many kinds still read, and cut as they did', () => {
    const { allowance, armholeAt: _since, ...rest } = balanced;
    const { seam, side, zip, top, hem } = allowance;
    const older = houseRules.parse({ ...rest, allowance: { seam, side, zip, top, hem } });
    expect(checkRules(older)).toEqual([]);
    expect(edgeAllowance(edge('waist-a', 'seam', straight), older)).toBe(seam);
    expect(edgeAllowance(edge('princess', 'seam', straight), older)).toBe(seam);
    expect(edgeAllowance(edge('armhole', 'armhole', straight), older)).toBe(top);
    expect(edgeAllowance(edge('hem', 'hem', straight), older)).toBe(hem);
  });

  test('a rules file may name one of them, and the others stay the preset’s', () => {
    const filled = fillRules({ preset: 'quarterRule', allowance: { princess: 22 } });
    expect(filled.allowance).toEqual({ ...balanced.allowance, princess: 22 });
    expect(filled.armholeAt).toBe('shoulder');
  });

  test('a circular hem wider than 20 is refused with its bounds', () => {
    const [problem] = checkRules({ ...rules, allowance: { ...rules.allowance, hem: 30 } });
    expect(problem?.field).toBe('rules.allowance.hem');
  });
});

describe('what a label says', () => {
  const piece = draftGown({ card: middleBody, style: {}, rules }).pieces.find(
    ({ name }) => name === 'back-middle',
  );
  const facts = { cardName: 'Ann', date: '2026-11-14', draftNumber: 'ABCDE', cloth: 'cloth' };
  const textOf = (more: object): string =>
    piece
      ? lettering(piece, { ...facts, ...more })
          .map(({ text }) => text)
          .join(' | ')
      : '';

  test('all of it, unless the house leaves lines out', () => {
    const all = textOf({ size: 'made to measure' });
    for (const each of ['Ann', 'ABCDE', 'made to measure', 'dashed', '100 %', 'cut 2', 'cloth'])
      expect(all).toContain(each);
    const few = textOf({ size: 'made to measure', says: ['draft'] });
    expect(few).toContain('ABCDE');
    for (const each of ['Ann', 'made to measure', 'dashed', '100 %'])
      expect(few).not.toContain(each);
    expect(few).toContain('cut 2');
  });

  test('what it is cut from, where that is not the gown’s own cloth', () => {
    if (!piece) throw new Error('no piece');
    const lined = lettering({ ...piece, cloth: 'lining' }, facts);
    expect(lined.some(({ text }) => text.includes('lining'))).toBe(true);
  });
});
