import type { Piece, Side } from '../drafting/piece.ts';
import type { Draft } from '../engine/draft.ts';
import { type Paper, type PaperName, papers } from '../sheets/papers.ts';
import { printerMargin } from '../sheets/tile-grid.ts';
import type { Unit } from '../units/said.ts';
import { cuttingCautions } from './cautions.ts';
import { drawHalf, levelLetters, quarter } from './chalk-half.ts';
import { type ChalkPoint, chalkPoints, struckLevels } from './chalk-points.ts';
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

/** Where the drawings begin, and the white between columns, mm. */
const drawingsTop = 46;
const gutter = 4.5;
const columnWidth = 43;
const cautionSize = 2.4;

/** Line steps tried, mm, from easy to read down to the smallest print that still reads (6 pt). */
const steps = [3.5, 3.3, 3.1, 2.9, 2.7, 2.6, 2.5, 2.4, 2.3, 2.2, 2.1, 2];

type Half = {
  readonly title: string;
  readonly pieces: readonly Piece[];
  readonly points: readonly ChalkPoint[];
};

function halfOf(draft: Draft, side: Side, first: number): Half {
  const pieces = draft.pieces.filter((each) => each.side === side && each.part !== 'flare');
  return {
    title: side === 'front' ? 'Front, from the fold' : 'Back, from centre back',
    pieces,
    points: chalkPoints(pieces, draft.levels, first),
  };
}

const widthOf = ({ points }: Half): number =>
  Math.max(0, ...points.map((each) => each.at.x)) * quarter;

/** The columns that the drawings leave free: beside them where there is room, and below them. */
function columnsBeside(
  paper: Paper,
  right: number,
  drawingsBottom: number,
  bottom: number,
): readonly Column[] {
  const left = printerMargin;
  const edge = paper.width - printerMargin;
  const fit = (from: number): number => Math.floor((edge - from + gutter) / (columnWidth + gutter));
  const columns = (from: number, y: number, until: number): readonly Column[] => {
    const count = fit(from);
    const width = (edge - from - (count - 1) * gutter) / count;
    return Array.from({ length: count }, (_, i) => ({
      x: from + i * (width + gutter),
      y,
      width,
      bottom: until,
    }));
  };
  const beside = fit(right + 6);
  const besideColumns = Array.from({ length: beside }, (_, i) => ({
    x: edge - (beside - i) * columnWidth - (beside - i - 1) * gutter,
    y: drawingsTop - 8,
    width: columnWidth,
    bottom: drawingsBottom,
  }));
  return [...besideColumns, ...columns(left, drawingsBottom + 4, bottom)];
}

function levelLines(
  draft: Draft,
  x: number,
  until: number,
  yOf: (y: number) => number,
): readonly Mark[] {
  return [
    strokes(
      pens.hairline,
      ...struckLevels.map((each) =>
        stroke(x, yOf(draft.levels[each]), until, yOf(draft.levels[each])),
      ),
    ),
    ...struckLevels.map((each) =>
      words(levelLetters[each], x - 0.8, yOf(draft.levels[each]) + 0.9, 2.6, {
        anchor: 'end',
        heavy: true,
      }),
    ),
  ];
}

function sheet(draft: Draft, paper: Paper, unit: Unit): readonly Mark[] {
  const left = printerMargin;
  const width = paper.width - 2 * printerMargin;
  const front = halfOf(draft, 'front', 1);
  const back = halfOf(draft, 'back', front.points.length + 1);
  const heights = [...front.points, ...back.points].map((each) => each.at.y);
  const top = Math.min(...heights);
  const yOf = (y: number): number => drawingsTop + (y - top) * quarter;
  const frontX = left + 5;
  const backX = frontX + widthOf(front) + 9;
  const right = backX + widthOf(back);
  const cautions = wrap(cuttingCautions, cautionSize, width).length * cautionSize * 1.32;
  const bottom = paper.height - printerMargin - cautions - 2;
  const columns = columnsBeside(paper, right, yOf(Math.max(...heights)), bottom);
  const rows: readonly Row[] = [
    ...levelRows(draft, unit),
    ...pieceRows(draft.pieces),
    ...allowanceRows(draft, unit),
    ...flareRows(
      draft.pieces.filter((each) => each.part === 'flare'),
      unit,
    ),
    ...pointRows(front.title, front.points, unit),
    ...pointRows(back.title, back.points, unit),
  ];
  const table = steps.reduce<readonly Mark[] | undefined>(
    (found, step) => found ?? flowRows(rows, columns, step),
    undefined,
  );
  return [
    ...rod(left, printerMargin, width, unit, quarter),
    words('Chalk sheet', left, 25, 9, { heavy: true }),
    words('Ellwand', left + width, 25, 6, { anchor: 'end', heavy: true, grey: 0.3 }),
    words(shorten(draftLine(draft), 3.6, width), left, 30.5, 3.6),
    words('Quarter scale, do not cut.', left, 35.6, 4, { heavy: true }),
    words(
      'Figures are full size: out from the centre line, then up ↑ or down ↓ from the level.',
      left + 48,
      35.6,
      3.4,
    ),
    ...levelLines(draft, frontX, right, yOf),
    ...drawHalf(front.title, front.pieces, front.points, frontX, yOf(0)),
    ...drawHalf(back.title, back.pieces, back.points, backX, yOf(0)),
    ...(table ?? []),
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
