import type { Drafted } from '../engine/drafted.ts';
import { type Paper, type PaperName, papers } from '../sheets/papers.ts';
import { printerMargin } from '../sheets/tile-grid.ts';
import type { Unit } from '../units/said.ts';
import { chalkCautions } from './cautions.ts';
import { drawHalf, levelLetters, quarter } from './chalk-half.ts';
import type { ChalkLayout } from './chalk-layout.ts';
import { struckLevels } from './chalk-points.ts';
import { layChalkTables } from './chalk-tables.ts';
import { draftLine } from './cover.ts';
import type { Mark, PrintJob } from './drawing.ts';
import { pens, stroke, strokes, words } from './marks.ts';
import { rod } from './rod.ts';
import { paragraph } from './text-block.ts';
import { shorten, wrap } from './type-width.ts';

export type ChalkChoice = { readonly paper: PaperName; readonly unit: Unit };

const cautionSize = 2.4;

/** Levels as ticks at both edges of a half, and their letters before the front. */
function levelTicks(draft: Drafted, { front, back, yOf }: ChalkLayout): readonly Mark[] {
  return struckLevels(draft.levels).flatMap(([level, height]) => {
    const y = yOf(height);
    const ticks = [front, back].flatMap(({ x, right }) => [
      stroke(x, y, x + 2.5, y),
      stroke(right - 12, y, right, y),
    ]);
    return [
      strokes(pens.hairline, ...ticks),
      words(levelLetters[level], front.x - 0.8, y + 0.9, 2.6, { anchor: 'end', heavy: true }),
    ];
  });
}

function sheet(draft: Drafted, paper: Paper, unit: Unit): readonly Mark[] {
  const left = printerMargin;
  const width = paper.width - 2 * printerMargin;
  const cautions = wrap(chalkCautions(unit), cautionSize, width).length * cautionSize * 1.32;
  const bottom = paper.height - printerMargin - cautions - 2;
  const { layout, marks } = layChalkTables(draft, paper, bottom, unit);
  return [
    ...rod(left, printerMargin, width, unit, quarter),
    words('Chalk sheet', left, 23, 7.5, { heavy: true }),
    words(shorten(draftLine(draft), 3.6, width - 75), left + 42, 23, 3.6),
    words('Ellwand', left + width, 23, 6, { anchor: 'end', heavy: true, grey: 0.3 }),
    words('Quarter scale, do not cut.', left, 29, 4, { heavy: true }),
    words(
      layout.shortened
        ? 'Drawn shorter below the hip. Figures are full size: out from the centre line, ↑ or ↓ from the level.'
        : 'Figures are full size: out from the centre line, then up ↑ or down ↓ from the level.',
      left + 48,
      29,
      3.4,
    ),
    ...levelTicks(draft, layout),
    ...[layout.front, layout.back].flatMap(drawHalf),
    ...marks,
    ...paragraph(chalkCautions(unit), left, bottom + 2, width, cautionSize).marks,
  ];
}

/**
 * The chalk sheet of method section 11: every point of every piece as its distance from the centre
 * line and from its level, the flare as radius and length; one page at quarter scale, enough to draft
 * straight onto cloth with tape and chalk.
 */
export function chalkSheetJob(draft: Drafted, { paper, unit }: ChalkChoice): PrintJob {
  return {
    title: `Ellwand chalk sheet, draft ${draft.number}`,
    ...(draft.inputs.card.date === undefined ? {} : { date: draft.inputs.card.date }),
    paper: papers[paper],
    drawings: [],
    pages: [sheet(draft, papers[paper], unit)],
  };
}
