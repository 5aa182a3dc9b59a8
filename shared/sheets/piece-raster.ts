import type { Point } from '../geometry/point.ts';
import { type Run, runsBetween } from './runs.ts';

/** Cells of the squared paper that pieces are laid on; mm. */
export type CellSize = { readonly x: number; readonly y: number };

/** A piece on squared paper, its box's corner on a corner of the cells. */
export type Raster = {
  /** Stretches it covers in each row of cells, mm from its box. */
  readonly bands: readonly (readonly Run[])[];
  readonly width: number;
  readonly height: number;
  /** Cells taken with half the gap round it; the first row and column lie `border` cells outside the box. */
  readonly rows: number;
  readonly words: number;
  readonly bits: Uint32Array;
  /** Cells taken above and left of each corner, a column and a row more than there are cells. */
  readonly sums: Uint32Array;
  readonly columns: number;
  /** Rows in the order in which they are looked at: the middle first, then halves of halves. */
  readonly looks: readonly number[];
};

/** Cells outside the box that half the gap may reach into. */
export const border = 1;

/** A chain whose box starts at 0, 0 as cells; `reach` is half the gap between pieces, at most a cell. */
export function rasterOf(
  chain: readonly Point[],
  { width, height }: { readonly width: number; readonly height: number },
  cell: CellSize,
  reach: number,
): Raster {
  const count = Math.max(1, Math.ceil(height / cell.y - 1e-9));
  const bands = Array.from({ length: count }, (_, row) =>
    runsBetween(chain, row * cell.y, (row + 1) * cell.y),
  );
  const rows = count + 2 * border;
  const words = Math.ceil((Math.ceil(width / cell.x) + 2 * border) / 32) + 1;
  const bits = new Uint32Array(rows * words);
  for (let row = 0; row < rows; row += 1) {
    const top = (row - border) * cell.y;
    for (const [from, to] of runsBetween(chain, top - reach, top + cell.y + reach)) {
      const first = Math.floor((from - reach) / cell.x) + border;
      const last = Math.floor((to + reach) / cell.x) + border;
      for (let at = Math.max(0, first); at <= last; at += 1) {
        const word = row * words + (at >>> 5);
        bits[word] = (bits[word] ?? 0) | (1 << (at & 31));
      }
    }
  }
  const columns = Math.ceil(width / cell.x) + 2 * border;
  const sums = sumsOf({ rows, columns, words, bits });
  return { bands, width, height, rows, columns, words, bits, sums, looks: halving(rows) };
}

function sumsOf({
  rows,
  columns,
  words,
  bits,
}: Pick<Raster, 'rows' | 'columns' | 'words' | 'bits'>): Uint32Array {
  const across = columns + 1;
  const sums = new Uint32Array((rows + 1) * across);
  for (let row = 0; row < rows; row += 1) {
    let line = 0;
    for (let column = 0; column < columns; column += 1) {
      line += ((bits[row * words + (column >>> 5)] ?? 0) >>> (column & 31)) & 1;
      sums[(row + 1) * across + column + 1] = (sums[row * across + column + 1] ?? 0) + line;
    }
  }
  return sums;
}

/** Cells a piece takes between these lines of cells, counted from its box's corner. */
export function cellsTaken(
  { sums, columns, rows }: Raster,
  left: number,
  top: number,
  right: number,
  bottom: number,
): number {
  const across = columns + 1;
  const column = (x: number): number => Math.min(columns, Math.max(0, x + border));
  const row = (y: number): number => Math.min(rows, Math.max(0, y + border)) * across;
  const [a, b, c, d] = [column(left), column(right), row(top), row(bottom)];
  return (sums[d + b] ?? 0) - (sums[d + a] ?? 0) - (sums[c + b] ?? 0) + (sums[c + a] ?? 0);
}

/** 0 to count - 1, the middle first, then the middles of what is left. */
function halving(count: number): readonly number[] {
  const out: number[] = [];
  const queue: [number, number][] = [[0, count]];
  for (let i = 0; i < queue.length; i += 1) {
    const [from, to] = queue[i] ?? [0, 0];
    if (from >= to) continue;
    const middle = (from + to) >> 1;
    out.push(middle);
    queue.push([from, middle], [middle + 1, to]);
  }
  return out;
}
