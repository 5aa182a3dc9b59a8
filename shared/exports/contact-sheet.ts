import type { FinishedPiece } from '../drafting/piece.ts';
import { endOf } from '../geometry/curve.ts';
import type { Path } from '../geometry/path.ts';
import { type Point, point } from '../geometry/point.ts';
import { spread } from './spread.ts';
import { element, escapeXml } from './xml.ts';

/** One drawing of a contact sheet: its pieces and what is wrong with it, or why there are none. */
export type Contact = {
  readonly pieces: readonly FinishedPiece[];
  readonly fault?: string | undefined;
};

/** A choice of the style card, drawn on each of the bodies. */
export type ContactRow = { readonly title: string; readonly contacts: readonly Contact[] };

/** Margins and lettering of the sheet, in its own units. */
const border = 24;
const titleSize = 15;
const rowHead = 26;
const gap = 18;
const cellWidth = 460;
/** A row is drawn no larger than this and no higher, so that small garments do not swell. */
const largest = 0.6;
const highest = 330;
/** Lettering of a piece, and its breadth a letter. */
const nameSize = 6.5;
const letter = 0.52;

const ink = '#1E2A32';
const slate = '#5B6A72';
const madder = '#A3303A';

const words = (
  text: string,
  x: number,
  y: number,
  size: number,
  fill = ink,
  weight = 400,
): string =>
  element('text', { x, y, 'font-size': size, fill, 'font-weight': weight }, escapeXml(text));

/** A path at the sheet's scale, to a tenth of its unit. */
function scaled(path: Path, { x, y }: Point, by: number): string {
  const at = (p: Point): string =>
    `${Math.round((p.x + x) * by * 10) / 10} ${Math.round((p.y + y) * by * 10) / 10}`;
  let last = '';
  return path
    .map((each) => {
      const from = at(each.from);
      const start = from === last ? '' : `M${from}`;
      last = at(each.to);
      return each.kind === 'line'
        ? `${start}L${last}`
        : `${start}C${at(each.c1)} ${at(each.c2)} ${last}`;
    })
    .join('');
}

type Ink = { readonly class: string; readonly d: string };

/** The lines of a drawing, those with one pen in one path. */
function inks(pieces: readonly FinishedPiece[], by: number): readonly Ink[] {
  const { placed } = spread(pieces);
  const all = (pathsOf: (piece: FinishedPiece) => readonly Path[]): string =>
    placed
      .map(({ piece, translate }) =>
        pathsOf(piece)
          .map((path) => scaled(path, translate, by))
          .join(''),
      )
      .join('');
  return [
    { class: 'cut', d: all(({ cutLine }) => [cutLine]) },
    {
      class: 'seam',
      d: all(({ edges }) => edges.filter((edge) => edge.open !== true).map((edge) => edge.path)),
    },
    {
      class: 'dart',
      d: all(({ darts }) => darts.flatMap((dart) => [dart.centreLeg, dart.sideLeg])),
    },
    { class: 'inner', d: all(({ lines }) => (lines ?? []).map(({ path }) => path)) },
  ].filter(({ d }) => d !== '');
}

/** Part of the way down a piece at which its name stands clear of darts. */
const clearOfDarts = 0.62;

/** Names the pieces inside their centre lines, where a piece is wide enough to hold its name. */
const pieceNames = (pieces: readonly FinishedPiece[], by: number): string =>
  spread(pieces)
    .placed.map(({ piece, translate }) => {
      const end = endOf(piece.edges.at(-1)?.path ?? []) ?? point(0, 0);
      const title = piece.title.replace(/^(Bodice|Skirt) block, /, '');
      const xs = piece.cutLine.map(({ to }) => to.x);
      const ys = piece.cutLine.map(({ to }) => to.y);
      const down = Math.min(...ys) + clearOfDarts * (Math.max(...ys) - Math.min(...ys));
      const room = (Math.max(...xs) - end.x) * by - 8;
      if (title.length * letter * nameSize > room) return '';
      const [x, y] = [(end.x + translate.x) * by + 5, (down + translate.y) * by];
      return words(title, x, y, nameSize, slate);
    })
    .join('');

const sizeOf = ({ pieces }: Contact): { readonly width: number; readonly height: number } =>
  pieces.length === 0 ? { width: 0, height: 0 } : spread(pieces);

/** A sentence broken into lines of a cell. */
function brokenInto(text: string, letters: number): readonly string[] {
  const lines: string[] = [];
  for (const word of text.split(' ')) {
    const last = lines.at(-1);
    if (last !== undefined && last.length + word.length < letters) {
      lines[lines.length - 1] = `${last} ${word}`;
    } else lines.push(word);
  }
  return lines;
}

const faultWords = (fault: string | undefined, y: number): string =>
  fault === undefined
    ? ''
    : brokenInto(fault, 52)
        .map((line, k) => words(line, 2, y + 13 * k, 10, madder))
        .join('');

const style =
  `.cut{fill:#FBFAF6;stroke:${slate};stroke-width:.5}.seam{fill:none;stroke:${ink};stroke-width:.9}` +
  `.dart{fill:none;stroke:${ink};stroke-width:.6}.inner{fill:none;stroke:${slate};stroke-width:.5;stroke-dasharray:3 2}`;

/**
 * A contact sheet as SVG: a row a choice, a column a body, one scale a row; cutting and seam
 * lines, darts and inner lines. What could not be drawn, or does not hold, says so in its place.
 */
export function contactSheet(
  title: string,
  columns: readonly string[],
  rows: readonly ContactRow[],
): string {
  const width = 2 * border + columns.length * (cellWidth + gap) - gap;
  const left = (column: number): number => border + column * (cellWidth + gap);
  let y = border + 62;
  const drawn = rows.flatMap((row) => {
    const sizes = row.contacts.map(sizeOf);
    const by = Math.min(
      largest,
      cellWidth / Math.max(1, ...sizes.map(({ width }) => width)),
      highest / Math.max(1, ...sizes.map(({ height }) => height)),
    );
    const high = Math.max(40, ...row.contacts.map((contact) => sizeOf(contact).height * by));
    const head = words(row.title, border, y + titleSize, titleSize, ink, 600);
    const cells = row.contacts.map((contact, column) => {
      const lines = inks(contact.pieces, by).map((each) => element('path', { ...each }));
      const inside = [
        ...lines,
        pieceNames(contact.pieces, by),
        faultWords(contact.fault, contact.pieces.length === 0 ? 12 : high + 6),
      ].join('');
      const at = `translate(${left(column)} ${Math.round(y + rowHead)})`;
      return inside === '' ? '' : element('g', { transform: at }, inside);
    });
    const faults = row.contacts.some(({ fault }) => fault !== undefined) ? 40 : 0;
    y += rowHead + high + faults + gap;
    return [head, ...cells];
  });
  const height = Math.ceil(y + border);
  return `${element(
    'svg',
    {
      xmlns: 'http://www.w3.org/2000/svg',
      viewBox: `0 0 ${width} ${height}`,
      width,
      height,
      'font-family': "'Source Sans 3', 'Helvetica Neue', Arial, sans-serif",
    },
    [
      `<style>${style}</style>`,
      element('rect', { width, height, fill: '#FFFFFF' }),
      words(title, border, border + 20, 22, ink, 600),
      ...columns.map((name, column) => words(name, left(column), border + 50, 13, slate, 600)),
      ...drawn,
    ].join('\n'),
  )}\n`;
}
