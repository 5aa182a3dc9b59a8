import { moved } from '../geometry/motion.ts';
import type { Point } from '../geometry/point.ts';
import { type Layout, boxOf } from './layout.ts';
import { type TileGrid, overlap } from './tile-grid.ts';

/** Half a cutting line, and a little: ink reaches this far beyond the line it is drawn on. */
const inkReach = 0.5;

/** Longest stretch of line looked at in one go; longer ones would claim sheets they only pass. */
const stride = 8;

/** What a tile shows: a piece's outline, or the inside of a piece, by name. */
export type Ink = { readonly inside?: string };

type Span = { readonly first: number; readonly last: number };

/** Which tile answers for a place: strips shared by two tiles belong to the one left of or above. */
const ownerOf = (at: number, step: number, count: number): number =>
  Math.min(count - 1, Math.max(0, Math.ceil((at - overlap) / step) - 1));

const owners = (a: number, b: number, step: number, count: number): Span => ({
  first: ownerOf(Math.min(a, b) - inkReach, step, count),
  last: ownerOf(Math.max(a, b) + inkReach, step, count),
});

/** Whether a closed chain goes round a place. */
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

/** Marks the tiles that a straight stroke crosses. */
function crossTiles(a: Point, b: Point, grid: TileGrid, mark: (tile: number) => void): void {
  const parts = Math.max(1, Math.ceil(Math.hypot(b.x - a.x, b.y - a.y) / stride));
  for (let i = 0; i < parts; i += 1) {
    const [from, to] = [i / parts, (i + 1) / parts];
    const across = owners(
      a.x + (b.x - a.x) * from,
      a.x + (b.x - a.x) * to,
      grid.step.x,
      grid.columns,
    );
    const down = owners(a.y + (b.y - a.y) * from, a.y + (b.y - a.y) * to, grid.step.y, grid.rows);
    for (let row = down.first; row <= down.last; row += 1) {
      for (let column = across.first; column <= across.last; column += 1) {
        mark(row * grid.columns + column);
      }
    }
  }
}

/**
 * The tiles of a grid that show something of a layout, row by row from the top left. A tile counts
 * when a piece reaches into the part of it that no tile before it shows; paper inside a piece counts
 * too, or the pattern would have holes.
 */
export function inkedTiles(layout: Layout, grid: TileGrid): readonly (Ink | undefined)[] {
  const found = new Array<Ink | undefined>(grid.rows * grid.columns).fill(undefined);
  const chains = layout.placements.map(({ shape, motion }) => ({
    name: shape.piece,
    chain: shape.chain.map((each) => moved(each, motion)),
  }));
  const outlined: Ink = {};
  for (const { chain } of chains) {
    let before = chain[chain.length - 1];
    for (const here of chain) {
      if (before) {
        crossTiles(before, here, grid, (tile) => {
          found[tile] = outlined;
        });
      }
      before = here;
    }
  }
  for (const { name, chain } of chains) {
    const { x, y, width, height } = boxOf(chain);
    const across = owners(x, x + width, grid.step.x, grid.columns);
    const down = owners(y, y + height, grid.step.y, grid.rows);
    for (let row = down.first; row <= down.last; row += 1) {
      for (let column = across.first; column <= across.last; column += 1) {
        const tile = row * grid.columns + column;
        const middle = {
          x: column * grid.step.x + grid.use.width / 2,
          y: row * grid.step.y + grid.use.height / 2,
        };
        if (found[tile] === undefined && surrounds(chain, middle)) found[tile] = { inside: name };
      }
    }
  }
  return found;
}
