import { expect, test } from 'vitest';

import { checkMeasure } from '#shared/body/check-card.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { checkStyle } from '#shared/drafts/gown/style-check.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import type { Unit } from '#shared/units/said.ts';

import { nothingDrawn } from '../../../../src/features/drafting-table/drawn-table.ts';
import { readEntry } from '../../../../src/features/drafting-table/fields.ts';
import { messageFor } from '../../../../src/features/drafting-table/problem-words.ts';
import { seamWord } from '../../../../src/features/drafting-table/seams.ts';
import { middleBody } from '../../../support/middle-body.ts';

const told = (text: string, unit: Unit): string | undefined => {
  const entry = readEntry('card.waistGirth', text, unit);
  if (!('value' in entry)) throw new Error(`${text} is a length`);
  const problems = checkMeasure('waistGirth', entry.value);
  const entries = { 'card.waistGirth': entry };
  return messageFor('card.waistGirth', problems, { entries, unit, drawn: nothingDrawn });
};

test('a figure that would do in the other unit is asked about, both ways', () => {
  expect(told('72.4', 'in')?.replaceAll('\u00a0', ' ')).toMatch(
    /^Waist 72 3⁄8 in: did you mean 72\.4 cm = 28 1⁄2 in\? It must lie between 21 1⁄4 in and/,
  );
  expect(told('28.5', 'cm')?.replaceAll('\u00a0', ' ')).toMatch(
    /^Waist 28\.5 cm: did you mean 28 1⁄2 in = 72\.4 cm\? It must lie between 54\.0 cm and/,
  );
});

test('the style card asks the same', () => {
  const draft = draftGown({ card: middleBody, style: {}, rules: balanced });
  const entry = readEntry('style.kneeFinished', '30', 'cm');
  const problems = checkStyle({ kneeFinished: 300 }, draft.body, draft.bodyLevels);
  const words = messageFor('style.kneeFinished', problems, {
    entries: { 'style.kneeFinished': entry },
    unit: 'cm',
    drawn: { draft, fresh: false, problems },
  });
  expect(words).toMatch(/^Finished knee 30\.0 cm: did you mean 30 in = 76\.2 cm\?/);
});

test('a figure that would do in neither is only told its bounds', () => {
  expect(told('980', 'cm')).not.toMatch(/did you mean/);
  expect(told('3', 'in')).not.toMatch(/did you mean/);
});

test('seams are called by their trade words, their stretches by place', () => {
  const draft = draftGown({ card: middleBody, style: { shaping: 'darts' }, rules: balanced });
  const words = draft.proof.seams.map((row) => seamWord(row, draft));
  expect(words).toContain('Waist seam, at the centre');
  expect(words).toContain('Waist seam, between');
  expect(words).toContain('Waist seam, at the side');
  expect(words).toContain('Side seam');
  expect(words).toContain('Centre back seam');
  expect(words.join()).not.toMatch(/ [a-z](?:,|$)/);
});
