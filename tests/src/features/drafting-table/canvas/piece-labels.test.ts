import { expect, test } from 'vitest';

import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';

import { asCut, asDrafted } from '../../../../../src/features/drafting-table/canvas/layout.ts';
import { pieceLabels } from '../../../../../src/features/drafting-table/canvas/piece-labels.ts';
import { shortTitle } from '../../../../../src/features/drafting-table/canvas/short-title.ts';
import { middleBody } from '../../../../support/middle-body.ts';

const gown = draftGown({ card: middleBody, style: { flareFraction: 1 }, rules: balanced });
const layout = asCut(gown.pieces);

const labelsAt = (scale: number) =>
  pieceLabels(layout, { scale, x: 40, y: 40 }, () => undefined).map(({ title }) => title.join(' '));

test('every piece has a short name of its own that says front or back', () => {
  const names = gown.pieces.map(shortTitle);
  expect(new Set(names).size).toBe(names.length);
  for (const name of names) expect(name).toMatch(/^(?:Front|Back|Flare [FB])/);
});

test('no piece loses its name, nor front and back, at any zoom', () => {
  for (const scale of [0.03, 0.1, 0.17, 0.3, 0.6, 2]) {
    const labels = labelsAt(scale);
    expect(labels).toHaveLength(gown.pieces.length);
    for (const label of labels)
      expect(label, `at ${scale}`).toMatch(/Front|Back|Flare [FB]|front|back/);
  }
});

test('with room the whole title stands on the piece with its cut', () => {
  expect(labelsAt(2)).toEqual(layout.placed.map(({ piece }) => piece.title));
});

test('a name without room on its piece hangs on a hairline', () => {
  const labels = pieceLabels(layout, { scale: 0.05, x: 40, y: 40 }, () => undefined);
  expect(labels.some(({ hairline }) => hairline !== undefined)).toBe(true);
});

test('the gores of a flare lie apart, and the levels stop before them', () => {
  for (const laid of [layout, asDrafted(gown.pieces)]) {
    const flares = laid.placed.filter(({ piece }) => piece.part === 'flare');
    expect(flares.length).toBeGreaterThan(2);
    for (const [index, { box }] of flares.entries()) {
      expect(laid.levelsEnd).toBeLessThan(box.left);
      for (const { box: other } of flares.slice(index + 1)) {
        const over =
          box.left < other.right &&
          other.left < box.right &&
          box.top < other.bottom &&
          other.top < box.bottom;
        expect(over).toBe(false);
      }
    }
  }
});

test('godets are told apart by the seam they stand in', () => {
  const gown = draftGown({
    card: middleBody,
    style: { flare: 'godets', waistSeam: 'none' },
    rules: balanced,
  });
  const names = gown.pieces.filter(({ name }) => name.startsWith('godet')).map(shortTitle);
  expect(new Set(names).size).toBe(names.length);
  expect(names).toContain('Godet side');
  expect(names).toContain('Godet CB');
});
