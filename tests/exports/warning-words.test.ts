import { expect, test } from 'vitest';
import { sampleCards } from '#shared/body/sample-cards.ts';
import { overruling } from '#shared/body/overrule.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { warningWords } from '#shared/exports/warning-words.ts';

test('an overruled warning is printed with the maker’s reason, another without', () => {
  const card = { ...sampleCards.judith, waistGirth: 925 };
  const [about] = draftGown({ card, style: {}, rules: balanced }).warnings;
  if (!about) throw new Error('no warning');
  expect(warningWords(about, 'cm')).not.toContain('Overruled');
  const kept = { ...card, overruled: [overruling(about, 'Taken three times.')] };
  const [again] = draftGown({ card: kept, style: {}, rules: balanced }).warnings;
  if (!again) throw new Error('no warning');
  expect(warningWords(again, 'cm')).toMatch(/Overruled by the maker: Taken three times\.$/);
});
