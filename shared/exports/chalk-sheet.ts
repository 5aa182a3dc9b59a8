import type { Draft } from '../engine/draft.ts';
import { type Paper, type PaperName, papers } from '../sheets/papers.ts';
import { printerMargin } from '../sheets/tile-grid.ts';
import type { Unit } from '../units/said.ts';
import { chalkCautions } from './cautions.ts';
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

/** Room kept free for figures below the drawings, mm: none first, then more on bodies with many. */
const reserves = [0, 30, 60, 90];

type Laid = { readonly layout: ChalkLayout; readonly marks: readonly Mark[] };

/** Drawings and tables with the largest print that fits; on the largest bodies without what the pieces repeat. */
function layOut(draft: Draft, paper: Paper, bottom: number, unit: Unit): Laid {
  const flare = draft.pieces.filter((each) => each.part === 'flare');
  const needed = [...levelRows(draft, unit), ...flareRows(flare, unit)];
  const facts = [...needed, ...pieceRows(draft.pieces), ...allowanceRows(draft, unit)];
  const layouts = reserves.map((reserve) => layChalkSheet(draft, paper, bottom, reserve));
  const first = (set: (layout: ChalkLayout) => readonly Mark[] | undefined): Laid | undefined => {
    for (const layout of layouts) {
      const marks = set(layout);
      if (marks) return { layout, marks };
    }
    return undefined;
  };
  const parted = (rows: readonly Row[]): Laid | undefined =>
    largest(steps, (step) =>
      first(({ front, back, columns }) => tablesParted([front, back], columns, rows, unit)(step)),
    );
  const laid =
    first(({ front, back, columns }) => tablesInside([front, back], columns, facts, unit)) ??
    parted(facts) ??
    parted(needed);
  if (!laid) throw new Error('The chalk sheet has more figures than one page holds.');
  return laid;
}

function sheet(draft: Draft, paper: Paper, unit: Unit): readonly Mark[] {
  const left = printerMargin;
  const width = paper.width - 2 * printerMargin;
  const cautions = wrap(chalkCautions, cautionSize, width).length * cautionSize * 1.32;
  const bottom = paper.height - printerMargin - cautions - 2;
  const { layout, marks } = layOut(draft, paper, bottom, unit);
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
    ...paragraph(chalkCautions, left, bottom + 2, width, cautionSize).marks,
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
