import type { Row } from './chalk-rows.ts';
import type { Mark } from './drawing.ts';
import { pens, stroke, strokes, words } from './marks.ts';
import { shorten } from './type-width.ts';

/** A column of the page that rows run down; mm. */
export type Column = {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly bottom: number;
};

/** Type size for a line step, mm. */
const sizeFor = (step: number): number => Math.min(2.8, step * 0.82);

/** Height of a row in steps; a heading stands off from what is above it. */
const heightOf = (row: Row): number => (row.kind === 'heading' ? 1.9 : 1);

function drawRow(row: Row, x: number, y: number, width: number, step: number): readonly Mark[] {
  const size = sizeFor(step);
  const line = y + size * 0.95;
  switch (row.kind) {
    case 'heading': {
      const base = line + step * 0.5;
      return [
        words(shorten(row.text, size * 1.12, width), x, base, size * 1.12, { heavy: true }),
        strokes(pens.hairline, stroke(x, base + 0.9, x + width, base + 0.9)),
      ];
    }
    case 'note':
      return [words(shorten(row.text, size, width), x, line, size, { grey: 0.3 })];
    case 'pair':
      return [
        words(shorten(row.name, size, width * 0.7), x, line, size),
        words(row.value, x + width, line, size, { anchor: 'end' }),
      ];
    case 'point': {
      const [number, what, across, level] = row.cells;
      const look = number === '' ? { grey: 0.3 } : {};
      return [
        words(number, x + size * 1.4, line, size, { ...look, anchor: 'end', heavy: true }),
        words(shorten(what, size, width * 0.5), x + size * 1.9, line, size, look),
        words(across, x + width * 0.74, line, size, { ...look, anchor: 'end' }),
        words(level, x + width * 0.79, line, size, look),
      ];
    }
  }
}

type Set = { readonly row: Row; readonly x: number; readonly y: number; readonly width: number };

/** Rows set in columns, those that found no room, and the room left below the last of them. */
export type Flow = {
  readonly sets: readonly Set[];
  readonly rest: readonly Row[];
  readonly room: readonly Column[];
};

/** Sets rows down the columns one after another with this line step; a heading keeps two rows with it. */
export function flowRows(rows: readonly Row[], columns: readonly Column[], step: number): Flow {
  const sets: Set[] = [];
  let index = 0;
  let column = columns[0];
  let y = column?.y ?? 0;
  for (const [i, row] of rows.entries()) {
    const own = heightOf(row) * step;
    const need = row.kind === 'heading' ? own + 2 * step : own;
    while (column && y + need > column.bottom) {
      index += 1;
      column = columns[index];
      y = column?.y ?? 0;
    }
    if (!column) return { sets, rest: rows.slice(i), room: [] };
    sets.push({ row, x: column.x, y, width: column.width });
    y += own;
  }
  return { sets, rest: [], room: column ? [{ ...column, y }, ...columns.slice(index + 1)] : [] };
}

/** The marks of rows that were set with this line step. */
export const drawRows = ({ sets }: Flow, step: number): readonly Mark[] =>
  sets.flatMap(({ row, x, y, width }) => drawRow(row, x, y, width, step));
