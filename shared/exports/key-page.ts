import { point } from '../geometry/point.ts';
import type { Paper } from '../sheets/papers.ts';
import type { Mark, Pen } from './drawing.ts';
import { box, chainOf, pens, strokes, words } from './marks.ts';
import { type Block, paragraph, stack } from './text-block.ts';

/** A line of a key: how it is drawn, and what it is. */
export type KeyLine = { readonly pen: Pen; readonly text: string };

/** A table: its heading, and rows of a title and figures. */
export type KeyTable = {
  readonly title: string;
  readonly heads: readonly string[];
  readonly rows: readonly (readonly string[])[];
};

/** White round a page, and measures of its type, mm. */
const margin = 15;
const rowHeight = 4.8;
const size = 3.4;

/** Side of the square that tells whether a printer kept the scale, mm. */
const square = 100;

const keyLine =
  ({ pen, text }: KeyLine, left: number, width: number) =>
  (y: number): Block => {
    const set = paragraph(text, left + 32, y, width - 32, size);
    const line = chainOf([point(left, y + size * 0.5), point(left + 28, y + size * 0.5)]);
    return { marks: [strokes(pen, line), ...set.marks], next: set.next };
  };

/** The first page of a print: what the lines are, what must be said, and the square to measure. */
export function keyPage(
  paper: Pick<Paper, 'width' | 'height'>,
  content: {
    readonly title: string;
    readonly said: readonly string[];
    readonly lines: readonly KeyLine[];
  },
): readonly Mark[] {
  const width = paper.width - 2 * margin;
  const { marks, next } = stack(
    [
      (y) => paragraph(content.title, margin, y, width, 7, { heavy: true }),
      ...content.said.map((text) => (y: number) => paragraph(text, margin, y, width, 3.8)),
      ...content.lines.map((each) => keyLine(each, margin, width)),
    ],
    margin,
    3,
  );
  const top = next + 8;
  return [
    ...marks,
    box(pens.frame, margin, top, square, square),
    words('10 cm: measure this square before anything else.', margin + 3, top + 8, size),
    words(
      'Where it is not, print again at 100 %, not fitted to the page.',
      margin + 3,
      top + 13,
      size,
    ),
  ];
}

type Row = { readonly cells: readonly string[]; readonly heavy: boolean };

/** Tables on as many pages as they need; figures stand to the right, under their heads. */
export function tablePages(
  paper: Pick<Paper, 'width' | 'height'>,
  tables: readonly KeyTable[],
): readonly (readonly Mark[])[] {
  const rows = tables
    .filter((table) => table.rows.length > 0)
    .flatMap(({ title, heads, rows: figures }): readonly Row[] => [
      { cells: [], heavy: false },
      { cells: [title, ...heads], heavy: true },
      ...figures.map((cells) => ({ cells, heavy: false })),
    ]);
  const perPage = Math.floor((paper.height - 2 * margin) / rowHeight);
  const pages: Mark[][] = [];
  rows.forEach(({ cells, heavy }, index) => {
    if (index % perPage === 0) pages.push([]);
    const y = margin + ((index % perPage) + 0.8) * rowHeight;
    const [title = '', ...figures] = cells;
    const column = Math.min(26, 90 / Math.max(1, figures.length));
    pages.at(-1)?.push(
      words(title, margin, y, size, { heavy }),
      ...figures.map((text, k) =>
        words(text, paper.width - margin - (figures.length - 1 - k) * column, y, size, {
          anchor: 'end',
          heavy,
        }),
      ),
    );
  });
  return pages;
}
