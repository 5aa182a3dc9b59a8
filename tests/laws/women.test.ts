import { expect, test } from 'vitest';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { women } from '../support/women.ts';
import { draftOrRefusal, reasonOf } from './random-gown.ts';

/*
 * 130 women of the open body data set (tests/support/data, with its notice), their cards completed by
 * named rules.
 */

/** What becomes of each woman's gown in this shaping: `sewn`, or why not. */
function gownsOf(shaping: 'princess' | 'darts'): readonly string[] {
  const ends = women().map((card) => {
    const draft = draftOrRefusal({ card, style: { shaping }, rules: balanced });
    if (draft instanceof DraftingError) return reasonOf(draft);
    return draft.proof.holds ? 'sewn' : `the proof fails for ${card.name ?? ''}`;
  });
  for (const end of new Set(ends)) {
    const count = ends.filter((each) => each === end).length;
    process.stdout.write(`women with ${shaping}: ${count} of ${ends.length} ${end}\n`);
  }
  return ends;
}

test('of 130 measured women at least 125 get a princess gown that sews together', () => {
  const ends = gownsOf('princess');
  expect(ends).toHaveLength(130);
  expect(ends.filter((end) => end === 'sewn').length).toBeGreaterThanOrEqual(125);
});

test('a gown with darts sews together for every woman whose bust darts can shape', () => {
  // A dart wider than 30 degrees at its tip is refused, and the princess seam named (method section 6).
  const ends = gownsOf('darts');
  const others = ends.filter((end) => end !== 'sewn' && end !== 'style.shaping darts-too-wide');
  expect(others).toEqual([]);
  expect(ends.filter((end) => end === 'sewn').length).toBeGreaterThan(65);
});
