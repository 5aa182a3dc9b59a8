import { describe, expect, it } from 'vitest';
import { checkRules } from '#shared/drafting/check-rules.ts';
import { balanced, houseRulePresets, quarterRule } from '#shared/drafting/house-rule-presets.ts';
import { speak } from '#shared/units/speak.ts';

describe('house rules', () => {
  it('of both presets pass', () => {
    for (const rules of Object.values(houseRulePresets)) expect(checkRules(rules)).toEqual([]);
  });

  it('of the quarter rule leave front and back quarters alike', () => {
    expect(Object.values(quarterRule.balance).every((balance) => balance === 0)).toBe(true);
  });

  it('of the balanced draft are those of the method', () => {
    // method section 4
    expect(balanced.balance).toEqual({
      chest: 6,
      bust: 10,
      underbust: -5,
      waist: 5,
      topHip: 2,
      hip: 0,
      knee: -5,
    });
  });

  it('outside their bounds are refused, each with both bounds', () => {
    const problems = checkRules({
      ...balanced,
      sideShare: 1.2,
      balance: { ...balanced.balance, waist: 80 },
      allowance: { ...balanced.allowance, top: Number.NaN },
    });
    expect(problems.map(({ field, said }) => `${field}: ${speak(said, 'cm')}`)).toEqual([
      'rules.balance.waist: Balance at the waist 8.0 cm must lie between −3.0 cm and 3.0 cm: change it in the house rules.',
      'rules.sideShare: Share of the side seam 1.2 must lie between 0 and 1: change it in the house rules.',
      'rules.allowance.top: Top edge allowance is not a number: type it again in the house rules.',
    ]);
  });
});
