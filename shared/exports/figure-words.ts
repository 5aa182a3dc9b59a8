import type { FigureRow } from '../compare/figures.ts';
import type { FinishedPiece } from '../drafting/piece.ts';
import { formatFine } from '../units/format-length.ts';
import type { Unit } from '../units/said.ts';
import { readInches } from '../units/speak.ts';
import { levelTitles } from './level-titles.ts';

const capital = (text: string): string => text.charAt(0).toUpperCase() + text.slice(1);

/** What a figure is called: a girth by its level, a seam by piece and edge, an area by its piece. */
export function figureTitle(
  row: Pick<FigureRow, 'kind' | 'level' | 'side' | 'piece' | 'edge'>,
  titles: ReadonlyMap<string, string>,
): string {
  const level = row.level === undefined ? '' : levelTitles[row.level];
  const piece = titles.get(row.piece ?? '') ?? row.piece ?? '';
  switch (row.kind) {
    case 'girth':
      return capital(level);
    case 'quarter':
      return `${capital(row.side ?? '')} half, ${level}`;
    case 'seam':
      return `${piece}, ${(row.edge ?? '').replaceAll('-', ' ')}`;
    case 'area':
      return piece;
  }
}

/** Titles of pieces by name, the first draft's before the second's. */
export const pieceTitles = (
  ...drafts: readonly { readonly pieces: readonly FinishedPiece[] }[]
): ReadonlyMap<string, string> =>
  new Map(
    drafts.toReversed().flatMap(({ pieces }) => pieces.map(({ name, title }) => [name, title])),
  );

const squareInch = 25.4 * 25.4;

/** An area in the reader's unit: cm² whole, square inches to a tenth. */
export const formatArea = (squareMm: number, unit: Unit): string =>
  unit === 'cm'
    ? `${Math.round(squareMm / 100)} cm\u00b2`
    : `${(squareMm / squareInch).toFixed(1)} sq in`;

/** A figure in the reader's unit: a length to a tenth of a millimetre, or as a tape in inches reads. */
export function formatFigure(kind: FigureRow['kind'], value: number, unit: Unit): string {
  if (kind === 'area') return formatArea(value, unit);
  return unit === 'in' ? readInches(value) : formatFine(value, unit);
}

/** A difference with its sign; nothing where it would read as nought. */
export function formatChange(kind: FigureRow['kind'], change: number, unit: Unit): string {
  const text = formatFigure(kind, Math.abs(change), unit);
  if (!/[1-9]/.test(text.replace('\u00b2', ''))) return '0';
  return change > 0 ? `+${text}` : `\u2212${text}`;
}

/** Headings of the kinds of figures, in the order they are shown. */
export const figureKinds = [
  { kind: 'girth', title: 'Finished girths' },
  { kind: 'quarter', title: 'Widths of a half' },
  { kind: 'seam', title: 'Lengths of edges' },
  { kind: 'area', title: 'Areas inside the seam line' },
] as const;
