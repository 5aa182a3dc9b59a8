import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import type { Draft } from '#shared/engine/draft.ts';
import { styleChoices } from '#shared/drafts/gown/style-card.ts';
import { draftAny, type Drafted } from '#shared/engine/drafted.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { chalkPoints } from '#shared/exports/chalk-points.ts';
import { allowanceRows, chalked } from '#shared/exports/chalk-rows.ts';
import { type ChalkChoice, chalkSheetJob } from '#shared/exports/chalk-sheet.ts';
import type { Words } from '#shared/exports/drawing.ts';
import { startOf } from '#shared/geometry/curve.ts';
import { type Point, distance } from '#shared/geometry/point.ts';
import { middleBody } from '../support/middle-body.ts';
import { bodyArbitrary } from '../support/random-body.ts';

const gown = (shaping: 'princess' | 'darts'): Draft =>
  draftGown({ card: middleBody, style: { shaping }, rules: balanced });

const lettered = (draft: Draft, choice: ChalkChoice): readonly Words[] =>
  chalkSheetJob(draft, choice).pages.flatMap((page) =>
    page.flatMap((mark) => (mark.kind === 'words' ? [mark] : [])),
  );

describe.each(['princess', 'darts'] as const)('the chalk sheet of a gown with %s', (shaping) => {
  const draft = gown(shaping);
  const halves = (['front', 'back'] as const).map((side) =>
    draft.pieces.filter((each) => each.side === side && each.part !== 'flare'),
  );

  it('names every corner and every dart tip of every piece', () => {
    for (const pieces of halves) {
      const points = chalkPoints(pieces, draft.levels, 1);
      const wanted = pieces.flatMap((piece) => [
        ...piece.edges.flatMap((edge) => startOf(edge.path) ?? []),
        ...piece.darts.flatMap((dart) => dart.centreLeg.at(-1)?.to ?? []),
      ]);
      expect(wanted.length).toBeGreaterThan(10);
      for (const corner of wanted) {
        expect(points.some(({ at }) => distance(at, corner) < 2)).toBe(true);
      }
    }
  });

  it('names where the zip ends, and marks every notch of its pieces', () => {
    for (const pieces of halves) {
      const points = chalkPoints(pieces, draft.levels, 1);
      const notches = pieces.flatMap((each) => each.notches);
      expect(notches.length).toBeGreaterThan(2);
      for (const { at, strokes } of notches) {
        const near = points.filter((each) => distance(each.at, at) < 4);
        expect(near.map((each) => each.notch)).toContain(strokes);
      }
    }
    const texts = lettered(draft, { paper: 'A4', unit: 'cm' }).map((each) => each.text);
    expect(texts).toContain('N zip ends');
  });

  it('gives each as its distance from the centre line and from a level struck on the table', () => {
    for (const pieces of halves) {
      for (const { at, level, offLevel } of chalkPoints(pieces, draft.levels, 1)) {
        expect(draft.levels[level] + offLevel).toBeCloseTo(at.y, 9);
        expect(Math.abs(offLevel)).toBeLessThan(160);
      }
    }
  });

  it('is one page that says at once it is quarter scale and not to be cut', () => {
    const job = chalkSheetJob(draft, { paper: 'A4', unit: 'cm' });
    expect(job.pages.length).toBe(1);
    const texts = lettered(draft, { paper: 'A4', unit: 'cm' }).map((each) => each.text);
    expect(texts).toContain('Quarter scale, do not cut.');
    expect(texts).toContain('Chalk sheet');
  });

  it('carries the flare as radius and length, as drawn', () => {
    const texts = lettered(draft, { paper: 'A4', unit: 'cm' }).map((each) => each.text);
    // A circle flare is struck at seam length over 2 pi times its part of the circle (plane geometry).
    const radius = draft.style.kneeFinished / (2 * Math.PI * draft.style.flareFraction);
    expect(texts).toContain(chalked(radius, 'cm'));
    expect(texts).toContain(chalked(draft.style.flareLength, 'cm'));
  });
});

describe('figures for tape and chalk', () => {
  it('are centimetres to a tenth, or inches to an eighth', () => {
    expect(chalked(241.3, 'cm')).toBe('24.1');
    expect(chalked(241.3, 'in').replace('\u00a0', ' ')).toBe('9 1⁄2');
    expect(chalked(244.5, 'in').replace('\u00a0', ' ')).toBe('9 5⁄8');
  });
});

/** What stands below the knee and on the arms in every combination, with a train where it is short enough. */
const styles = fc.record({
  shaping: fc.constantFrom('princess' as const, 'darts' as const),
  waistSeam: fc.constantFrom(...styleChoices.waistSeam),
  flare: fc.constantFrom(...styleChoices.flare),
  sleeve: fc.constantFrom(...styleChoices.sleeve),
  train: fc.constantFrom(0, 80),
});

describe('on any body', () => {
  it('all figures fit one page of either paper, no letter under 2 mm', () => {
    fc.assert(
      fc.property(bodyArbitrary, styles, (card, style) => {
        let draft: Draft;
        try {
          draft = draftGown({ card, style, rules: balanced });
        } catch (error) {
          if (error instanceof DraftingError) return;
          throw error;
        }
        for (const choice of [
          { paper: 'A4', unit: 'cm' },
          { paper: 'Letter', unit: 'in' },
        ] as const) {
          const { paper, pages } = chalkSheetJob(draft, choice);
          const within = ({ x, y }: Point): boolean =>
            x > 9 && x < paper.width - 9 && y > 9 && y < paper.height - 9;
          const astray = pages
            .flat()
            .filter((mark) => mark.kind === 'words' && (mark.size < 2 || !within(mark.at)));
          expect(astray).toEqual([]);
        }
      }),
      { numRuns: 60, seed: 20261114 },
    );
  }, 30_000);
});

describe('the allowances a chalk sheet tells', () => {
  const told = (draft: Drafted): readonly string[] =>
    allowanceRows(draft, 'cm').flatMap((row) =>
      row.kind === 'pair' ? [`${row.name} ${row.value}`] : [],
    );

  it('are those the pieces are cut with: a straight hem is turned up four centimetres', () => {
    const block = draftAny({
      garment: 'skirt-block',
      card: middleBody,
      style: {},
      rules: { ...balanced, allowance: { ...balanced.allowance, waist: 12 } },
    });
    expect(told(block)).toContain('straight hem 4.0');
    expect(told(block).filter((each) => each.startsWith('circular hem'))).toEqual([]);
  });

  it('name what only some gowns have', () => {
    const gown = draftAny({
      garment: 'gown',
      card: middleBody,
      style: { sleeve: 'pleatedBand', facing: 'faced' },
      rules: balanced,
    });
    expect(told(gown)).toContain('free edges of facings 0.6');
    expect(told(gown)).toContain('circular hem 1.0');
  });
});
