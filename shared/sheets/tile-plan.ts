import type { Point } from '../geometry/point.ts';
import { type Layout, boxOf, placedChain } from './layout.ts';
import type { Paper } from './papers.ts';

/** What home printers leave white round a sheet, and what neighbouring sheets share, mm. */
export const printerMargin = 10;
export const overlap = 10;

/** Half a cutting line, and a little: ink reaches this far beyond the line it is drawn on. */
const inkReach = 0.5;

/** Longest stretch of line looked at in one go; longer ones would claim sheets they only pass. */
const stride = 8;

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
  readonly row: number;
  readonly column: number;
  /** Where the top left corner of the printed area stands on the drawing. */
  readonly at: Point;
  readonly neighbours: Neighbours;
  /** The piece this sheet lies wholly inside of, where none of its outline crosses it. */
  readonly inside?: string;
};

export type TilePlan = {
  readonly paper: Paper;
  /** Printed area of one sheet. */
  readonly use: { readonly width: number; readonly height: number };
  readonly rows: number;
  readonly columns: number;
  readonly tiles: readonly Tile[];
  /** Edges where two printed sheets are glued. */
  readonly glueSeams: number;
};

/** The part of a sheet that a home printer reaches. */
export const printedArea = (paper: Paper): { readonly width: number; readonly height: number } => ({
  width: paper.width - 2 * printerMargin,
  height: paper.height - 2 * printerMargin,
});

/** How many printed areas of length `use`, sharing `overlap`, cover a length; mm, at least one. */
export const tilesAlong = (length: number, use: number): number =>
  Math.max(1, Math.ceil((length - overlap) / (use - overlap) - 1e-9));

/** `A1` at the top left; rows go on after Z with AA. */
export function tileName(row: number, column: number): string {
  let letters = '';
  for (let left = row; left >= 0; left = Math.floor(left / 26) - 1) {
    letters = String.fromCharCode(65 + (left % 26)) + letters;
  }
  return `${letters}${column + 1}`;
}

/** Which tile answers for a place: strips shared by two tiles belong to the one left of or above. */
const ownerOf = (at: number, step: number, count: number): number =>
  Math.min(count - 1, Math.max(0, Math.ceil((at - overlap) / step) - 1));

function surrounds(chain: readonly Point[], at: Point): boolean {
  let within = false;
  let before = chain[chain.length - 1];
  for (const here of chain) {
    if (before && here.y > at.y !== before.y > at.y) {
      const share = (at.y - here.y) / (before.y - here.y);
      if (at.x < here.x + share * (before.x - here.x)) within = !within;
    }
    before = here;
  }
  return within;
}

/** Row by row, `true` where a line crosses, the piece's name where the tile lies inside it. */
function claims(layout: Layout, rows: number, columns: number, use: TilePlan['use']) {
  const stepX = use.width - overlap;
  const stepY = use.height - overlap;
  const found = new Array<true | string | undefined>(rows * columns).fill(undefined);
  const claim = (a: Point, b: Point): void => {
    const left = ownerOf(Math.min(a.x, b.x) - inkReach, stepX, columns);
    const right = ownerOf(Math.max(a.x, b.x) + inkReach, stepX, columns);
    const top = ownerOf(Math.min(a.y, b.y) - inkReach, stepY, rows);
    const bottom = ownerOf(Math.max(a.y, b.y) + inkReach, stepY, rows);
    for (let row = top; row <= bottom; row += 1) {
      for (let column = left; column <= right; column += 1) found[row * columns + column] = true;
    }
  };
  const laid = layout.placements.map((each) => ({
    name: each.shape.piece,
    chain: placedChain(each),
  }));
  for (const { chain } of laid) {
    let before = chain[chain.length - 1];
    for (const here of chain) {
      if (before) {
        const parts = Math.ceil(Math.hypot(here.x - before.x, here.y - before.y) / stride);
        const along = (share: number, from: Point): Point => ({
          x: from.x + (here.x - from.x) * share,
          y: from.y + (here.y - from.y) * share,
        });
        for (let i = 0; i < parts; i += 1)
          claim(along(i / parts, before), along((i + 1) / parts, before));
      }
      before = here;
    }
  }
  for (const { name, chain } of laid) {
    const box = boxOf(chain);
    for (
      let row = ownerOf(box.y, stepY, rows);
      row <= ownerOf(box.y + box.height, stepY, rows);
      row += 1
    ) {
      const last = ownerOf(box.x + box.width, stepX, columns);
      for (let column = ownerOf(box.x, stepX, columns); column <= last; column += 1) {
        const middle = { x: column * stepX + use.width / 2, y: row * stepY + use.height / 2 };
        if (found[row * columns + column] === undefined && surrounds(chain, middle)) {
          found[row * columns + column] = name;
        }
      }
    }
  }
  return found;
}

/** How many sheets of a paper a layout takes; the same figure as `planTiles`, without its names. */
export function countTiles(layout: Layout, paper: Paper): number {
  const use = printedArea(paper);
  const rows = tilesAlong(layout.height, use.height);
  const columns = tilesAlong(layout.width, use.width);
  return claims(layout, rows, columns, use).filter((each) => each !== undefined).length;
}

/**
 * The sheets a layout is printed on. A tile is printed when some piece reaches into the part of it
 * that no tile before it shows; paper inside a piece is kept, or the pattern would have holes.
 */
export function planTiles(layout: Layout, paper: Paper): TilePlan {
  const use = printedArea(paper);
  const rows = tilesAlong(layout.height, use.height);
  const columns = tilesAlong(layout.width, use.width);
  const found = claims(layout, rows, columns, use);
  const printed = (row: number, column: number): string | undefined =>
    row >= 0 &&
    row < rows &&
    column >= 0 &&
    column < columns &&
    found[row * columns + column] !== undefined
      ? tileName(row, column)
      : undefined;
  const tiles: Tile[] = [];
  for (let row = 0; row < rows; row += 1) {
    for (let column = 0; column < columns; column += 1) {
      const claim = found[row * columns + column];
      if (claim === undefined) continue;
      const left = printed(row, column - 1);
      const right = printed(row, column + 1);
      const above = printed(row - 1, column);
      const below = printed(row + 1, column);
      tiles.push({
        name: tileName(row, column),
        row,
        column,
        at: { x: column * (use.width - overlap), y: row * (use.height - overlap) },
        neighbours: {
          ...(left ? { left } : {}),
          ...(right ? { right } : {}),
          ...(above ? { above } : {}),
          ...(below ? { below } : {}),
        },
        ...(claim === true ? {} : { inside: claim }),
      });
    }
  }
  const glueSeams =
    tiles.filter((each) => each.neighbours.right).length +
    tiles.filter((each) => each.neighbours.below).length;
  return { paper, use, rows, columns, tiles, glueSeams };
}
