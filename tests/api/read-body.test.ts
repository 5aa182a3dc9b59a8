import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { readBody, readInputs } from '#shared/api/read-body.ts';
import { printRequest } from '#shared/api/requests.ts';
import { balanced, quarterRule } from '#shared/drafting/house-rule-presets.ts';
import { speak } from '#shared/units/speak.ts';
import { middleBody } from '../support/middle-body.ts';

const heard = (value: unknown): readonly string[] => {
  const read = readInputs(value);
  return 'problems' in read
    ? read.problems.map((each) => `${each.code} ${each.field}: ${speak(each.said, 'cm')}`)
    : [];
};

const { bustGirth, ...withoutBust } = middleBody;

describe('what comes in from outside', () => {
  it.each<[string, unknown, readonly string[]]>([
    [
      'nothing',
      undefined,
      ['missing : The request is missing: give it as JSON with a “card” in it.'],
    ],
    [
      'a list',
      [],
      [
        'wrong-form : The request must be an object of keys and values, such as {"card": {"bustGirth": 920}}.',
      ],
    ],
    ['no card', {}, ['missing card: The measure card is missing: give it as “card”.']],
    [
      'a card of text',
      { card: 'middle' },
      [
        'wrong-form card: The measure card must be an object of keys and values, such as {"bustGirth": 920}.',
      ],
    ],
    [
      'no bust',
      { card: withoutBust },
      ['missing card.bustGirth: Bust is missing: measure it and give it as “card.bustGirth”.'],
    ],
    [
      'a bust in quotes',
      { card: { ...middleBody, bustGirth: '920' } },
      [
        'wrong-form card.bustGirth: Bust must be a plain number of millimetres, without quotes or a unit, such as 920.',
      ],
    ],
    [
      'an infinite bust',
      { card: { ...middleBody, bustGirth: Infinity } },
      [
        'wrong-form card.bustGirth: Bust must be a plain number of millimetres, without quotes or a unit, such as 920.',
      ],
    ],
    [
      'an angle of text',
      { card: { ...middleBody, shoulderSlope: '20' } },
      [
        'wrong-form card.shoulderSlope: Shoulder slope must be a plain number of degrees, without quotes or a unit, such as 20.',
      ],
    ],
    [
      'a measure nobody knows',
      { card: { ...middleBody, bust: 920 } },
      [
        'unknown-field card.bust: There is no field “card.bust”: take it out, or look up its name in the README.',
      ],
    ],
    [
      'a name of a hundred letters',
      { card: { ...middleBody, name: 'n'.repeat(100) } },
      ['wrong-form card.name: “card.name” is too long: keep it to 80 letters.'],
    ],
    [
      'a day that is none',
      { card: { ...middleBody, date: '14 November' } },
      [
        'wrong-form card.date: The date of the card must be a day written as year, month, day, such as 2026-11-14.',
      ],
    ],
    [
      'an unknown shaping',
      { card: middleBody, style: { shaping: 'gathers' } },
      ['wrong-form style.shaping: “style.shaping” must be one of “princess”, “darts”.'],
    ],
    [
      'a flare of text',
      { card: middleBody, style: { flareFraction: 'half' } },
      [
        'wrong-form style.flareFraction: Flare, part of a circle must be a plain number, without quotes, such as 0.5.',
      ],
    ],
    [
      'ease of text',
      { card: middleBody, style: { ease: { bust: 'none' } } },
      [
        'wrong-form style.ease.bust: Ease at the bust must be a plain number of millimetres, without quotes or a unit, such as 920.',
      ],
    ],
    [
      'an unknown preset',
      { card: middleBody, rules: { preset: 'mine' } },
      ['wrong-form rules.preset: “rules.preset” must be one of “balanced”, “quarterRule”.'],
    ],
  ])('%s is refused, naming the field and the remedy', (_case, value, messages) => {
    expect(heard(value)).toEqual(messages);
  });

  it('a card alone takes the open style and the balanced rules', () => {
    expect(readInputs({ card: middleBody })).toEqual({
      inputs: { card: middleBody, style: {}, rules: balanced },
    });
  });

  it('rules start from a preset and keep what differs from it', () => {
    const read = readInputs({
      card: middleBody,
      rules: { preset: 'quarterRule', sideShare: 0.5, allowance: { side: 20 } },
    });
    expect('inputs' in read && read.inputs.rules).toEqual({
      ...quarterRule,
      sideShare: 0.5,
      allowance: { ...quarterRule.allowance, side: 20 },
    });
  });

  it('inputs written out and read again are the same inputs', () => {
    const inputs = {
      card: middleBody,
      style: { kneeLevel: 80, ease: { bust: 5 } },
      rules: quarterRule,
    };
    expect(readInputs(JSON.parse(JSON.stringify(inputs)))).toEqual({ inputs });
  });

  it('a print says which paper it wants and of what', () => {
    const read = readBody(printRequest, {
      card: middleBody,
      unit: 'cm',
      paper: 'A3',
      pieces: 'whole-gown',
    });
    expect('problems' in read && read.problems.map(({ said }) => speak(said, 'cm'))).toEqual([
      '“paper” must be one of “A4”, “Letter”.',
    ]);
  });

  it('a body of nonsense gets a short answer', () => {
    const nonsense = Object.fromEntries(
      Array.from({ length: 5000 }, (_, index) => [`x${index}`.repeat(50), index]),
    );
    const read = readInputs({ card: { ...middleBody, ...nonsense } });
    expect('problems' in read && read.problems.length).toBeLessThanOrEqual(40);
    expect(JSON.stringify(read).length).toBeLessThan(20_000);
  });

  it('never throws, whatever it is given', () => {
    fc.assert(
      fc.property(
        fc.oneof(fc.anything(), fc.record({ card: fc.anything(), style: fc.anything() })),
        (value) => {
          const read = readInputs(value);
          return 'inputs' in read || read.problems.length > 0;
        },
      ),
    );
  });
});

it('the bust of the middle body is what the examples say', () => expect(bustGirth).toBe(920));
