import { expect, it } from 'vitest';
import { deg, fine, mm, said } from '#shared/units/said.ts';
import { speak } from '#shared/units/speak.ts';

it('one sentence serves a maker in centimetres and a maker in inches', () => {
  const sentence = said`Bust line: quarter of ${mm(920)} = ${mm(230)}, turned ${deg(12.5)}.`;
  expect(speak(sentence, 'cm')).toBe('Bust line: quarter of 92.0 cm = 23.0 cm, turned 12.5°.');
  expect(speak(sentence, 'in')).toBe(
    'Bust line: quarter of 36\u00a01⁄4 in = 9\u00a01⁄16 in, turned 12.5°.',
  );
});

it('the proof reads to a tenth of a millimetre', () => {
  expect(speak(said`Side seam: front ${fine(565.23)}`, 'cm')).toBe('Side seam: front 56.52 cm');
});

it('a sentence taken into another keeps its lengths open, and a count is written as it is', () => {
  const inner = said`under-bust ${mm(770)}`;
  expect(said`The ${inner} needs ${2} darts`).toEqual([
    'The under-bust ',
    { mm: 770 },
    ' needs 2 darts',
  ]);
});
