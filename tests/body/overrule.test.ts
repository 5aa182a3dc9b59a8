import { describe, expect, test } from 'vitest';
import type { MeasureCard } from '#shared/body/card.ts';
import { checkCard } from '#shared/body/check-card.ts';
import { mayOverrule, overruling, withReasons } from '#shared/body/overrule.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { readInputs } from '#shared/api/read-body.ts';
import { middleBody } from '../support/middle-body.ts';

/** A waist as large as the bust: unusual, and a real body all the same. */
const straight: MeasureCard = { ...middleBody, waistGirth: 925, hipGirth: 1040 };
const [about] = checkCard(straight).filter(({ code }) => code === 'waist-not-under-bust');

describe('a warning the maker overrules', () => {
  test('a waist larger than the bust is a warning, never an error', () => {
    expect(checkCard(straight).every(({ severity }) => severity === 'warning')).toBe(true);
    expect(about && mayOverrule(about)).toBe(true);
  });

  test('stays among the warnings of the draft, with the reason given on the card', () => {
    if (!about) throw new Error('no warning');
    const card = { ...straight, overruled: [overruling(about, 'Measured three times.')] };
    const { warnings } = draftGown({ card, style: {}, rules: balanced });
    const kept = warnings.find(({ code }) => code === 'waist-not-under-bust');
    expect(kept?.overruled).toBe('Measured three times.');
    expect(warnings.filter(({ overruled }) => overruled !== undefined)).toHaveLength(1);
  });

  test('is overruled by nothing that is about another field, has no reason, or is an error', () => {
    if (!about) throw new Error('no warning');
    const reasonsAfter = (overruled: MeasureCard['overruled']) =>
      withReasons([about], { overruled }).map((each) => each.overruled);
    expect(reasonsAfter([{ ...overruling(about, 'Yes.'), field: 'card.hipGirth' }])).toEqual([
      undefined,
    ]);
    expect(reasonsAfter([overruling(about, '  ')])).toEqual([undefined]);
    const asError = { ...about, severity: 'error' as const };
    expect(withReasons([asError], { overruled: [overruling(about, 'No.')] })).toEqual([asError]);
  });

  test('travels over the wire with the card, and nothing else is taken with it', () => {
    if (!about) throw new Error('no warning');
    const entry = overruling(about, 'Measured three times.');
    const sent = { card: { ...straight, overruled: [entry] } };
    const read = readInputs(JSON.parse(JSON.stringify(sent)));
    expect('inputs' in read && read.inputs.card.overruled).toEqual([entry]);
    const long = { card: { ...straight, overruled: [{ ...entry, reason: 'x'.repeat(201) }] } };
    const refused = readInputs(long);
    expect('problems' in refused && refused.problems[0]?.field).toBe('card.overruled.0.reason');
    const more = readInputs({ card: { ...straight, overruled: [{ ...entry, by: 'me' }] } });
    expect('problems' in more && more.problems[0]?.code).toBe('unknown-field');
  });
});
