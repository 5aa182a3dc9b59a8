import type { Draft } from '../engine/draft.ts';
import { type Paper, type PaperName, papers } from '../sheets/papers.ts';
import { printerMargin } from '../sheets/tile-grid.ts';
import type { Unit } from '../units/said.ts';
import { cuttingCautions } from './cautions.ts';
import { drawHalf, levelLetters, quarter } from './chalk-half.ts';
import { type ChalkLayout, type Half, layChalkSheet } from './chalk-layout.ts';
import { struckLevels } from './chalk-points.ts';
import {
  type Row,
  allowanceRows,
  flareRows,
  levelRows,
  pieceRows,
  pointRows,
} from './chalk-rows.ts';
import { draftLine } from './cover.ts';
import type { Mark, PrintJob } from './drawing.ts';
import { pens, stroke, strokes, words } from './marks.ts';
import { rod } from './rod.ts';
import { type Column, flowRows } from './row-flow.ts';
import { paragraph } from './text-block.ts';
import { shorten, wrap } from './type-width.ts';

export type ChalkChoice = { readonly paper: PaperName; readonly unit: Unit };

const cautionSize = 2.4;

/** Smallest line step at which a half's table is kept whole inside it rather than set larger and parted, mm. */
const wholeDownTo = 2.5;

/** Line steps tried, mm, from easy to read down to small print (5 pt) on the widest, tallest bodies. */
const steps = [3.4, 3.2, 3, 2.9, 2.8, 2.7, 2.6, 2.5, 2.4, 2.3, 2.2, 2.1, 2, 1.9];

/** Levels as ticks at both edges of a half, and their letters before the front. */
function levelTicks(draft: Draft, { front, back, yOf }: ChalkLayout): readonly Mark[] {
  return struckLevels.flatMap((level) => {
    const y = yOf(draft.levels[level]);
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

/** The first of some steps, largest first, at which everything fits. */
const largest = <T>(
  tried: readonly number[],
  set: (step: number) => T | undefined,
): T | undefined => tried.reduce<T | undefined>((found, step) => found ?? set(step), undefined);

const whole = (rows: readonly Row[], columns: readonly Column[]) => (step: number) => {
  const flow = flowRows(rows, columns, step);
  return flow.rest.length === 0 ? flow.marks : undefined;
};

/** Each half's points whole inside it, the other figures beside and below; none where that is too small. */
function tablesInside(
  halves: readonly Half[],
  columns: readonly Column[],
  facts: readonly Row[],
  unit: Unit,
) {
  const readable = steps.filter((each) => each >= wholeDownTo);
  const own = largest(readable, (step) => {
    const set = halves.map((half) =>
      whole(pointRows(half.title, half.points, unit), half.inside)(step),
    );
    return set.some((each) => !each) ? undefined : set.flatMap((each) => each ?? []);
  });
  const others = largest(readable, whole(facts, columns));
  return own && others ? [...own, ...others] : undefined;
}

/** Points inside the halves as far as they go, the rest wherever the page is free. */
const tablesParted =
  (halves: readonly Half[], columns: readonly Column[], facts: readonly Row[], unit: Unit) =>
  (step: number): readonly Mark[] | undefined => {
    const own = halves.map((half) =>
      flowRows(pointRows(half.title, half.points, unit), half.inside, step),
    );
    const over = own.flatMap((each) => each.rest);
    const continued: readonly Row[] =
      over.length === 0 ? [] : [{ kind: 'heading', text: `Points continued, ${unit}` }, ...over];
    const room = [...columns, ...own.flatMap((each) => each.room)];
    const free = whole([...facts, ...continued], room)(step);
    return free && [...own.flatMap((each) => each.marks), ...free];
  };

/** All tables in the largest print that fits; on the largest bodies without what the pieces repeat. */
function tables(draft: Draft, { front, back, columns }: ChalkLayout, unit: Unit): readonly Mark[] {
  const halves = [front, back];
  const flare = draft.pieces.filter((each) => each.part === 'flare');
  const needed = [...levelRows(draft, unit), ...flareRows(flare, unit)];
  const facts = [...needed, ...pieceRows(draft.pieces), ...allowanceRows(draft, unit)];
  const marks =
    tablesInside(halves, columns, facts, unit) ??
    largest(steps, tablesParted(halves, columns, facts, unit)) ??
    largest(steps, tablesParted(halves, columns, needed, unit));
  if (!marks) throw new Error('The chalk sheet has more figures than one page holds.');
  return marks;
}

function sheet(draft: Draft, paper: Paper, unit: Unit): readonly Mark[] {
  const left = printerMargin;
  const width = paper.width - 2 * printerMargin;
  const cautions = wrap(cuttingCautions, cautionSize, width).length * cautionSize * 1.32;
  const bottom = paper.height - printerMargin - cautions - 2;
  const layout = layChalkSheet(draft, paper, bottom);
  return [
    ...rod(left, printerMargin, width, unit, quarter),
    words('Chalk sheet', left, 23, 7.5, { heavy: true }),
    words(shorten(draftLine(draft), 3.6, width - 75), left + 42, 23, 3.6),
    words('Ellwand', left + width, 23, 6, { anchor: 'end', heavy: true, grey: 0.3 }),
    words('Quarter scale, do not cut.', left, 29, 4, { heavy: true }),
    words(
      'Figures are full size: out from the centre line, then up ↑ or down ↓ from the level.',
      left + 48,
      29,
      3.4,
    ),
    ...levelTicks(draft, layout),
    ...[layout.front, layout.back].flatMap((half) => drawHalf(half, layout.yOf(0))),
    ...tables(draft, layout, unit),
    ...paragraph(cuttingCautions, left, bottom + 2, width, cautionSize).marks,
  ];
}

/**
 * The chalk sheet of method section 11: every point of every piece as its distance from the centre
 * line and from its level, the flare as radius and length; one page at quarter scale, enough to draft
 * straight onto cloth with tape and chalk.
 */
export function chalkSheetJob(draft: Draft, { paper, unit }: ChalkChoice): PrintJob {
  return {
    title: `Ellwand chalk sheet, draft ${draft.number}`,
    ...(draft.inputs.card.date === undefined ? {} : { date: draft.inputs.card.date }),
    paper: papers[paper],
    drawings: [],
    pages: [sheet(draft, papers[paper], unit)],
  };
}
