import { describe, expect, test } from 'vitest';
import { balanced, quarterRule } from '#shared/drafting/house-rule-presets.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { piecesSvg } from '#shared/exports/svg.ts';
import { middleBody } from '../support/middle-body.ts';
import { remeasure } from '../exports/remeasure.ts';

/** Whole girths the sample gown must have: body of the card and ease of method section 4, mm. */
const wanted = {
  bust: 920 + 0,
  underbust: 770 - 15,
  waist: 730 - 10,
  hip: 990 + 20,
};

describe.each(['princess', 'darts'] as const)('the sample gown, shaped by %s', (shaping) => {
  // Common practice, derived: twice the widths of front and back, darts closed, make girth and ease.
  // Asked to 0.05 cm.
  test.each([
    ['balanced', balanced],
    ['quarter rule', quarterRule],
  ])('twice front and back make body and ease at every level, %s', (_, rules) => {
    const draft = draftGown({ card: middleBody, style: { shaping }, rules });
    const { girths } = remeasure(piecesSvg(draft, 'cm'));
    for (const [level, mm] of Object.entries(wanted)) {
      const found = girths.filter((each) => each.level === level);
      expect(found.length, level).toBeGreaterThan(0);
      for (const { girth } of found) expect(Math.abs(girth - mm)).toBeLessThanOrEqual(0.5);
    }
  });

  // CSS Values and SVG (from memory): 1 in = 96 px, 1 cm = 37.7953 px; A4 is 793.70 by 1122.52 px.
  test('its SVG stands in a browser at 37.7953 px to the centimetre (± 0.01)', () => {
    const svg = piecesSvg(
      draftGown({ card: middleBody, style: { shaping }, rules: balanced }),
      'cm',
    );
    const width = /<svg[^>]* width="([\d.]+)mm"/.exec(svg)?.[1];
    const units = /<svg[^>]* viewBox="0 0 ([\d.]+) /.exec(svg)?.[1];
    const pixelsPerUnit = ((Number(width) / 25.4) * 96) / Number(units);
    expect(Math.abs(10 * pixelsPerUnit - 37.7953)).toBeLessThanOrEqual(0.01);
    expect(Math.abs(210 * pixelsPerUnit - 793.7)).toBeLessThanOrEqual(0.01);
    expect(Math.abs(297 * pixelsPerUnit - 1122.52)).toBeLessThanOrEqual(0.01);
  });
});
