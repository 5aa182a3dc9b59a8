import { describe, expect, test } from 'vitest';
import { sampleCards } from '#shared/body/sample-cards.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { draftAny } from '#shared/engine/drafted.ts';
import { piecesSvg } from '#shared/exports/svg.ts';
import { contactStyles } from '#server/ops/contact-styles.ts';
import { remeasure } from '../exports/remeasure.ts';

/*
 * Every choice of the style cards on the five bodies of the contact sheet, measured again from the exported SVG by a
 * general path library: nothing here is shared with the engine.
 */
const rows = Object.values(contactStyles)
  .flat()
  .map((style) => [style.title, style] as const);

describe.each(Object.entries(sampleCards))('%s', (_name, card) => {
  test.each(rows)('%s: joined edges agree within half a millimetre', (_title, { inputs }) => {
    const draft = draftAny(inputs(card, balanced));
    expect(draft.proof.holds).toBe(true);
    const { edges } = remeasure(piecesSvg(draft, 'cm'));
    const off = edges.filter(({ difference }) => Math.abs(difference) > 0.5);
    expect(off).toEqual([]);
    expect(edges.length).toBeGreaterThan(2);
  });
});
