import { describe, expect, it } from 'vitest';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import type { Mark } from '#shared/exports/drawing.ts';
import { tilesJob } from '#shared/exports/tiles.ts';
import { presetOrder } from '#shared/sheets/print-order.ts';
import { planSheets } from '#shared/sheets/sheet-plan.ts';
import { sheetSides } from '#shared/sheets/tile-plan.ts';
import { speak } from '#shared/units/speak.ts';
import { middleBody } from '../support/middle-body.ts';

const draft = draftGown({ card: middleBody, style: {}, rules: balanced });
const order = presetOrder('A4', 'whole-gown');
const { plan } = planSheets(draft.pieces, order);
const job = tilesJob(draft, order, 'cm');

const texts = (marks: readonly Mark[]): readonly string[] =>
  marks.flatMap((mark) =>
    mark.kind === 'words' ? [mark.text] : mark.kind === 'window' ? texts(mark.marks) : [],
  );
const drawings = (marks: readonly Mark[]): readonly string[] =>
  marks.flatMap((mark) =>
    mark.kind === 'use' ? [mark.drawing] : mark.kind === 'window' ? drawings(mark.marks) : [],
  );
const cover = texts(job.pages[0] ?? []);

describe('the sheets of a gown', () => {
  it('each name themselves, their neighbours and the draft', () => {
    plan.tiles.forEach((tile, i) => {
      const said = texts(job.pages[i + 1] ?? []);
      expect(said).toContain(tile.name);
      for (const side of sheetSides) {
        const neighbour = tile.neighbours[side];
        if (neighbour === undefined) continue;
        const glued =
          side === 'right' || side === 'below'
            ? `glue under ${neighbour}`
            : `trim, lay on ${neighbour}`;
        const expected = tile.glued.includes(side) ? glued : `beside ${neighbour}, no glue`;
        expect(said).toContain(expected);
      }
      expect(said).toContain(`draft ${draft.number} · sheet ${i + 1} of ${plan.tiles.length}`);
    });
  });

  it('show every piece somewhere', () => {
    const shown = new Set(job.pages.flatMap(drawings));
    for (const piece of draft.pieces) expect(shown).toContain(piece.name);
  });

  it('carry each piece with its name, its cut and the grain', () => {
    const onSheets = job.pages.slice(1).flatMap(texts);
    for (const piece of draft.pieces) {
      const drawn = texts(job.drawings.find((each) => each.name === piece.name)?.marks ?? []);
      expect(onSheets.join(' ')).toContain(piece.title);
      expect(onSheets.join(' ')).toContain(piece.cut);
      expect(drawn).toContain('grain');
      if (piece.edges.some((each) => each.kind === 'fold'))
        expect(drawn).toContain('place on fold');
    }
  });
});

describe('the cover', () => {
  it('says how to print before anything else', () => {
    expect(cover).toContain('Print at 100 %, no fit to page.');
    expect(cover).toContain('100 mm square');
    expect(cover).toContain('4 in square');
    expect(cover).toContain(`${plan.tiles.length + 1} sheets of A4, this one counted`);
  });

  it('pictures every printed sheet by name', () => {
    for (const tile of plan.tiles) expect(cover).toContain(tile.name);
  });

  it('lists every piece with what to cut', () => {
    for (const piece of draft.pieces) {
      expect(cover).toContain(piece.title);
      expect(cover).toContain(piece.cut);
    }
  });

  it('marks the measures that nobody took', () => {
    const estimated = Object.keys(draft.body.estimated);
    expect(estimated.length).toBeGreaterThan(0);
    expect(cover.some((each) => each.startsWith('est. '))).toBe(true);
    expect(cover).toContain('92.0');
  });

  it('says what the walker and the cutter have to mind', () => {
    const said = cover.join(' ');
    const walking = speak(draft.walking.said, 'cm').split(' ').slice(0, 4).join(' ');
    expect(said).toContain(walking);
    for (const each of ['Shears', 'Irons', 'boning end', 'candles', 'stairs', 'Local rules']) {
      expect(said).toContain(each);
    }
  });
});
