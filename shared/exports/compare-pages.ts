import type { Comparison, PiecePair } from '../compare/compare-drafts.ts';
import type { FigureRow } from '../compare/figures.ts';
import { levelFigures } from '../compare/level-figures.ts';
import { seamOutline } from '../compare/moved-piece.ts';
import type { FinishedPiece } from '../drafting/piece.ts';
import { reverse } from '../geometry/curve.ts';
import { hatch, overlapOf } from '../geometry/region.ts';
import { papers } from '../sheets/papers.ts';
import type { Unit } from '../units/said.ts';
import { type CompareNames, levelWords } from './compare-svg.ts';
import type { Mark, Pen, PrintJob } from './drawing.ts';
import { figureKinds, figureTitle, formatChange, formatFigure } from './figure-words.ts';
import { type KeyTable, keyPage, tablePages } from './key-page.ts';
import { area, outline, strokes, words } from './marks.ts';
import { type StackPaper, scaleWords, stackPages } from './stack-pages.ts';

const firstPen: Pen = { width: 0.5 };
const secondPen: Pen = { width: 0.5, dash: [7, 3] };
const shadePen: Pen = { width: 0.2 };

const dartPen = ({ dash }: Pen): Pen => ({ width: 0.25, ...(dash && { dash }) });

const pieceMarks = (piece: FinishedPiece, pen: Pen): readonly Mark[] => [
  outline(pen, seamOutline(piece)),
  strokes(
    dartPen(pen),
    ...piece.darts.map(({ centreLeg, sideLeg }) => [...centreLeg, ...reverse(sideLeg)]),
  ),
];

/** Strokes of the shading on paper, mm apart whatever the scale. */
const apart = 2;

function shading(first: FinishedPiece, second: FinishedPiece): readonly Mark[] {
  const between = overlapOf(seamOutline(first), seamOutline(second));
  return [
    ...[...between.first, ...between.second].map((rim) => area(0.88, ...rim)),
    strokes(
      shadePen,
      ...hatch(between.first, 'falling', apart).map((each) => [each]),
      ...hatch(between.second, 'rising', apart).map((each) => [each]),
    ),
  ];
}

/** A comparison's figures as tables. */
export function figureTables(
  rows: readonly FigureRow[],
  titles: ReadonlyMap<string, string>,
  names: CompareNames,
  unit: Unit,
): readonly KeyTable[] {
  const cell = (kind: FigureRow['kind'], value: number | undefined): string =>
    value === undefined ? '\u2013' : formatFigure(kind, value, unit);
  return figureKinds.map(({ kind, title }) => ({
    title: kind === 'area' ? title : `${title}, ${unit}`,
    heads: [names.first, names.second, 'change'],
    rows: rows
      .filter((row) => row.kind === kind)
      .map((row) => [
        figureTitle(row, titles),
        cell(kind, row.first),
        cell(kind, row.second),
        row.first === undefined || row.second === undefined
          ? ''
          : formatChange(kind, row.second - row.first, unit),
      ]),
  }));
}

/** What a comparison is printed with. */
export type ComparePrint = StackPaper & {
  readonly names: CompareNames;
  readonly titles: ReadonlyMap<string, string>;
  readonly unit: Unit;
};

/** Two drafts over each other as pages: what the lines are, the figures, then the pieces on sheets. */
export function comparePages(
  comparison: Comparison,
  { names, titles, unit, ...on }: ComparePrint,
): PrintJob {
  const paper = papers[on.paper];
  const figures = levelFigures(comparison);
  const stacks = comparison.pairs.map((pair) => ({
    name: pair.name,
    pair,
    pieces: [pair.first, pair.second].flatMap((each) => each ?? []),
  }));
  const draw = (
    { pair }: { readonly pair: PiecePair },
    scaled: (piece: FinishedPiece) => FinishedPiece,
  ): readonly Mark[] => {
    const [first, second] = [pair.first, pair.second].map((each) => each && scaled(each));
    const own = figures.filter(({ piece }) => piece === pair.name);
    return [
      ...(first && second ? shading(first, second) : []),
      ...(first ? pieceMarks(first, firstPen) : []),
      ...(second ? pieceMarks(second, secondPen) : []),
      ...own.map((each) =>
        words(levelWords(each, unit), each.at.x * on.scale - 2, each.at.y * on.scale - 1, 2.6, {
          anchor: 'end',
        }),
      ),
    ];
  };
  const before = [
    keyPage(paper, {
      title: `${names.first} and ${names.second}`,
      said: [
        `Two drafts over each other, ${scaleWords(on.scale)}. Seam lines, without allowances.`,
        'Widths written on the levels are those of a half, darts taken out.',
      ],
      lines: [
        { pen: firstPen, text: names.first },
        { pen: secondPen, text: names.second },
      ],
    }),
    ...tablePages(paper, figureTables(comparison.rows, titles, names, unit)),
  ];
  return stackPages(stacks, on, draw, {
    title: `Ellwand, ${names.first} and ${names.second}`,
    legend: `${names.first} and ${names.second}, ${scaleWords(on.scale)}`,
    before,
  });
}
