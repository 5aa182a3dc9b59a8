import { describe, expect, test } from 'vitest';
import { furtherMeasures } from '#shared/body/card.ts';
import { completeCard } from '#shared/body/complete-card.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { balanced, quarterRule } from '#shared/drafting/house-rule-presets.ts';
import type { Step } from '#shared/drafting/step.ts';
import { bustDartRules, dartPlaces } from '#shared/drafts/bodice-block/style-card.ts';
import { styleChoices } from '#shared/drafts/gown/style-card.ts';
import { type DraftedInputs, draftAny } from '#shared/engine/drafted.ts';
import { speak } from '#shared/units/speak.ts';
import { middleBody } from '../support/middle-body.ts';

/**
 * Every sentence of every draft as a class reads it. The file of the snapshot is read by a person
 * whenever it changes; `npx vitest run tests/lesson -u` writes it anew.
 */
const base = { card: middleBody, rules: balanced } as const;

/** The same body with every measure taken, so that no estimate is spoken of. */
const { measures } = completeCard(middleBody);
const measuredCard = {
  ...middleBody,
  ...Object.fromEntries(furtherMeasures.map((key) => [key, measures[key]])),
  waistSeamGirth: 760,
};

const told = (step: Step): readonly string[] => {
  const [cm, inches] = [speak(step.said, 'cm'), speak(step.said, 'in')];
  return [
    `${step.part} · ${step.title}`,
    `  ${cm}`,
    ...(inches === cm ? [] : [`  ${inches}`]),
    ...(step.why === undefined ? [] : [`  why: ${speak(step.why, 'cm')}`]),
  ];
};

function stepsOf(inputs: DraftedInputs): readonly string[] {
  try {
    return draftAny(inputs).steps.map((step) => told(step).join('\n'));
  } catch (error) {
    if (!(error instanceof DraftingError)) throw error;
    return error.problems.map(({ field, said }) => `refused ${field}: ${speak(said, 'cm')}`);
  }
}

/** A draft's sentences as far as they differ from another's. */
const besides = (inputs: DraftedInputs, from: DraftedInputs): string => {
  const known = new Set(stepsOf(from));
  return stepsOf(inputs)
    .filter((each) => !known.has(each))
    .join('\n');
};

describe('every sentence, in centimetres and in inches', () => {
  const gown: DraftedInputs = { garment: 'gown', ...base, style: {} };

  test('of the demo gown', () => {
    expect(stepsOf(gown).join('\n')).toMatchSnapshot();
  });

  test('of a body with every measure taken', () => {
    expect(besides({ ...gown, card: measuredCard }, gown)).toMatchSnapshot();
  });

  test('by the quarter rule', () => {
    expect(besides({ ...gown, rules: quarterRule }, gown)).toMatchSnapshot();
  });

  test.each(
    Object.entries(styleChoices).flatMap(([choice, values]) =>
      values.slice(1).map((value) => [choice, value] as const),
    ),
  )('of the demo gown with %s %s', (choice, value) => {
    expect(besides({ ...gown, style: { [choice]: value } }, gown)).toMatchSnapshot();
  });

  const bodice: DraftedInputs = { garment: 'bodice-block', ...base, style: {} };
  test('of the bodice block', () => {
    expect(stepsOf(bodice).join('\n')).toMatchSnapshot();
  });

  test.each(dartPlaces.slice(1))('of the bodice block with its dart in the %s', (bustDart) => {
    expect(besides({ ...bodice, style: { bustDart } }, bodice)).toMatchSnapshot();
  });

  test.each(bustDartRules.slice(1))('of the bodice block, dart by %s', (bustDartRule) => {
    expect(besides({ ...bodice, style: { bustDartRule } }, bodice)).toMatchSnapshot();
  });

  test('of the skirt block', () => {
    const skirt: DraftedInputs = { garment: 'skirt-block', ...base, style: {} };
    expect(stepsOf(skirt).join('\n')).toMatchSnapshot();
  });
});
