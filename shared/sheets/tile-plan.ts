import type { Point } from '../geometry/point.ts';
import { inkedTiles } from './inked-tiles.ts';
import type { Layout } from './layout.ts';
import type { Paper } from './papers.ts';
import { type SheetEdges, type TileGrid, tileGrid } from './tile-grid.ts';

/** The four edges of a sheet. */
export const sheetSides = ['left', 'right', 'above', 'below'] as const;
export type SheetSide = (typeof sheetSides)[number];

/** Names of the sheets at the four edges of a tile; absent where nothing is printed there. */
export type Neighbours = { readonly [S in SheetSide]?: string };

export type Tile = {
  /** Row letter and column number: `B3`. */
  readonly name: string;
  /** Where the top left corner of the printed area stands on the drawing. */
  readonly at: Point;
  readonly neighbours: Neighbours;
  /** Edges across which a piece runs on: there the two sheets are glued. */
  readonly glued: readonly SheetSide[];
  /** What is drawn on it: placements of the layout, by their number. */
  readonly shows: readonly number[];
  /** The piece this sheet lies wholly inside of, where none of its outline crosses it. */
  readonly inside?: string;
  /** Not printed, as the order says; nobody's neighbour. */
  readonly leftOut?: true;
};

export type TilePlan = TileGrid & {
  /** The paper as it lies; of a roll, the length that is printed. */
  readonly paper: Paper;
  /** Every sheet with something on it, row by row, those left out too. */
  readonly tiles: readonly Tile[];
  /** Edges where two printed sheets are glued. */
  readonly glueSeams: number;
};

/** `A1` at the top left; rows go on after Z with AA. */
export function tileName(row: number, column: number): string {
  let letters = '';
  for (let left = row; left >= 0; left = Math.floor(left / 26) - 1) {
    letters = String.fromCharCode(65 + (left % 26)) + letters;
  }
  return `${letters}${column + 1}`;
}

/** The tiles of a plan that are printed. */
export const printedTiles = ({ tiles }: TilePlan): readonly Tile[] =>
  tiles.filter((each) => each.leftOut !== true);

const sidesOf = (row: number, column: number) =>
  [
    ['left', row, column - 1],
    ['right', row, column + 1],
    ['above', row - 1, column],
    ['below', row + 1, column],
  ] as const;

/** The sheets a layout is printed on, row by row; blank ones are left out and are nobody's neighbour. */
export function planTiles(
  layout: Layout,
  paper: Paper,
  edges?: SheetEdges,
  leftOut: readonly string[] = [],
): TilePlan {
  const grid = tileGrid(layout, paper, edges);
  const { rows, columns, step } = grid;
  const ink = inkedTiles(layout, grid);
  const isPrinted = (row: number, column: number): boolean =>
    row >= 0 &&
    row < rows &&
    column >= 0 &&
    column < columns &&
    ink.tiles[row * columns + column] !== undefined &&
    !leftOut.includes(tileName(row, column));
  const isGlued = (side: SheetSide, row: number, column: number): boolean => {
    const at = row * columns + column;
    if (side === 'right') return ink.gluedRight[at] ?? false;
    if (side === 'below') return ink.gluedBelow[at] ?? false;
    return (side === 'left' ? ink.gluedRight[at - 1] : ink.gluedBelow[at - columns]) ?? false;
  };
  const tiles = ink.tiles.flatMap((each, index): readonly Tile[] => {
    if (!each) return [];
    const [row, column] = [Math.floor(index / columns), index % columns];
    const beside = isPrinted(row, column)
      ? sidesOf(row, column).filter(([, nextRow, nextColumn]) => isPrinted(nextRow, nextColumn))
      : [];
    return [
      {
        name: tileName(row, column),
        at: { x: column * step.x, y: row * step.y },
        neighbours: Object.fromEntries(
          beside.map(([side, nextRow, nextColumn]) => [side, tileName(nextRow, nextColumn)]),
        ),
        glued: beside.flatMap(([side]) => (isGlued(side, row, column) ? [side] : [])),
        ...each,
        ...(isPrinted(row, column) ? {} : { leftOut: true as const }),
      },
    ];
  });
  const glueSeams = tiles.reduce(
    (sum, { glued }) => sum + glued.filter((side) => side === 'right' || side === 'below').length,
    0,
  );
  return { ...grid, paper, tiles, glueSeams };
}
