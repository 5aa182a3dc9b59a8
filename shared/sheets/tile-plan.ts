import type { Point } from '../geometry/point.ts';
import { inkedTiles } from './inked-tiles.ts';
import type { Layout } from './layout.ts';
import type { Paper } from './papers.ts';
import { type TileGrid, tileGrid } from './tile-grid.ts';

/** Names of the sheets at the four edges of a tile; absent where nothing is printed there. */
export type Neighbours = {
  readonly left?: string;
  readonly right?: string;
  readonly above?: string;
  readonly below?: string;
};

export type Tile = {
  /** Row letter and column number: `B3`. */
  readonly name: string;
  /** Where the top left corner of the printed area stands on the drawing. */
  readonly at: Point;
  readonly neighbours: Neighbours;
  /** The piece this sheet lies wholly inside of, where none of its outline crosses it. */
  readonly inside?: string;
};

export type TilePlan = TileGrid & {
  readonly paper: Paper;
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

/** The sheets a layout is printed on, row by row; blank ones are left out and are nobody's neighbour. */
export function planTiles(layout: Layout, paper: Paper): TilePlan {
  const grid = tileGrid(layout, paper);
  const { rows, columns, step } = grid;
  const ink = inkedTiles(layout, grid);
  const name = (row: number, column: number): string | undefined =>
    row >= 0 && row < rows && column >= 0 && column < columns && ink[row * columns + column]
      ? tileName(row, column)
      : undefined;
  const neighboursOf = (row: number, column: number): Neighbours => {
    const left = name(row, column - 1);
    const right = name(row, column + 1);
    const above = name(row - 1, column);
    const below = name(row + 1, column);
    return {
      ...(left ? { left } : {}),
      ...(right ? { right } : {}),
      ...(above ? { above } : {}),
      ...(below ? { below } : {}),
    };
  };
  const tiles = ink.flatMap((each, index): readonly Tile[] => {
    if (!each) return [];
    const row = Math.floor(index / columns);
    const column = index % columns;
    return [
      {
        name: tileName(row, column),
        at: { x: column * step.x, y: row * step.y },
        neighbours: neighboursOf(row, column),
        ...each,
      },
    ];
  });
  const glueSeams = tiles.reduce(
    (sum, { neighbours }) => sum + (neighbours.right ? 1 : 0) + (neighbours.below ? 1 : 0),
    0,
  );
  return { ...grid, paper, tiles, glueSeams };
}
