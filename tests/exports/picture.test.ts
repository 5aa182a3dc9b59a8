import { describe, expect, it } from 'vitest';
import { houseRulePresets } from '#shared/drafting/house-rule-presets.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { picturePath } from '#shared/exports/picture.ts';
import { spread } from '#shared/exports/spread.ts';
import { middleBody } from '../support/middle-body.ts';

const { pieces } = draftGown({ card: middleBody, style: {}, rules: houseRulePresets.balanced });

describe('the small picture of a gown', () => {
  it('is none without pieces', () => {
    expect(picturePath([])).toBeUndefined();
  });

  it('has a closed outline for every piece and stays under a kilobyte', () => {
    const picture = picturePath(pieces);
    expect(picture?.path.match(/M[^MZ]+Z/g)).toHaveLength(pieces.length);
    expect(picture?.path.length).toBeLessThan(1000);
  });

  it('keeps the proportions of the table, in its box', () => {
    const { width, height } = spread(pieces);
    const picture = picturePath(pieces);
    expect(Math.max(picture?.width ?? 0, picture?.height ?? 0)).toBe(160);
    expect((picture?.height ?? 0) / (picture?.width ?? 1)).toBeCloseTo(height / width, 1);
    for (const [, x, y] of picture?.path.matchAll(/(\d+) (\d+)/g) ?? []) {
      expect(Number(x)).toBeLessThanOrEqual(picture?.width ?? 0);
      expect(Number(y)).toBeLessThanOrEqual(picture?.height ?? 0);
    }
  });
});
