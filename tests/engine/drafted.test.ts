import { expect, test } from 'vitest';
import { houseRulePresets } from '#shared/drafting/house-rule-presets.ts';
import { draftAny, garments } from '#shared/engine/drafted.ts';
import { middleBody } from '../support/middle-body.ts';

const from = { card: middleBody, style: {}, rules: houseRulePresets.balanced };

test.each(garments)(
  '%s: the draft and the inputs it keeps name the garment they were asked for',
  (garment) => {
    const draft = draftAny({ ...from, garment });
    expect(draft.garment).toBe(garment);
    expect(draft.inputs.garment).toBe(garment);
    expect(draftAny(draft.inputs)).toEqual(draft);
  },
);

test("inputs saved before there were blocks are a gown's", () => {
  expect(draftAny(from).garment).toBe('gown');
});

test('the three garments are three drafts with numbers of their own', () => {
  const numbers = garments.map((garment) => draftAny({ ...from, garment }).number);
  expect(new Set(numbers).size).toBe(garments.length);
});
