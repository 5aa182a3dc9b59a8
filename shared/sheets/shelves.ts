import { type Motion, moved } from '../geometry/motion.ts';
import { inkedTiles } from './inked-tiles.ts';
import { type Layout, type Placement, type Shape, boxOf, gap } from './layout.ts';
import type { Paper } from './papers.ts';
import { edge } from './phases.ts';
import { type SheetEdges, tileGrid } from './tile-grid.ts';

/** More sheets side by side than this do not fit a cutting table. */
const widest = 10;

type Turn = 'as drafted' | 'upright' | 'lying';
type Laid = {
  readonly shape: Shape;
  readonly turned: boolean;
  readonly width: number;
  readonly height: number;
};

const size = (shape: Shape, turned: boolean): Laid => {
  const box = boxOf(shape.chain);
  return turned
    ? { shape, turned, width: box.height, height: box.width }
    : { shape, turned, width: box.width, height: box.height };
};

function lay(shape: Shape, turn: Turn, room: number): Laid {
  const straight = size(shape, false);
  if (shape.upright) return straight;
  const turned = size(shape, true);
  const wish =
    turn === 'as drafted' || (turn === 'upright') === straight.height >= straight.width
      ? straight
      : turned;
  const other = wish.turned ? straight : turned;
  return wish.width > room && other.width < wish.width ? other : wish;
}

function motionTo({ shape, turned }: Laid, x: number, y: number): Motion {
  const quarter: Motion = turned
    ? { cos: 0, sin: 1, dx: 0, dy: 0 }
    : { cos: 1, sin: 0, dx: 0, dy: 0 };
  const box = boxOf(shape.chain.map((each) => moved(each, quarter)));
  return { ...quarter, dx: x - box.x, dy: y - box.y };
}

/** Lays pieces in rows: tallest first, each on the first shelf with room for it. */
function shelve(shapes: readonly Shape[], turn: Turn, width: number): Layout {
  const room = width - 2 * edge;
  const sorted = shapes
    .map((shape, order) => ({ laid: lay(shape, turn, room), order }))
    .sort((a, b) => b.laid.height - a.laid.height || a.order - b.order);
  const shelves: { y: number; filled: number }[] = [];
  const placements: Placement[] = [];
  let bottom = edge;
  let right = 0;
  for (const { laid } of sorted) {
    let shelf = shelves.find((each) => each.filled + laid.width <= room + edge + 1e-9);
    if (!shelf) {
      shelf = { y: bottom, filled: edge };
      shelves.push(shelf);
      bottom += laid.height + gap;
    }
    placements.push({ shape: laid.shape, motion: motionTo(laid, shelf.filled, shelf.y) });
    shelf.filled += laid.width + gap;
    right = Math.max(right, shelf.filled - gap);
  }
  return { width: right + edge, height: bottom - gap + edge, placements };
}

/** Sheets of a paper that show something of a layout. */
export function sheetsOf(layout: Layout, paper: Paper, edges: SheetEdges): number {
  const { tiles } = inkedTiles(layout, tileGrid(layout, paper, edges));
  return tiles.filter((each) => each !== undefined).length;
}

/**
 * Row by row: rows of every width from one sheet to ten, pieces as drafted, upright or lying; the first
 * layout of fewest sheets wins, of as many the one that spreads least over the table.
 */
export function inRows(shapes: readonly Shape[], paper: Paper, edges: SheetEdges): Layout {
  let best: Layout = { width: 0, height: 0, placements: [] };
  let least = Infinity;
  if (shapes.length === 0) return best;
  const { use, step } = tileGrid(best, paper, edges);
  for (let columns = 1; columns <= widest; columns += 1) {
    for (const turn of ['as drafted', 'upright', 'lying'] as const) {
      const layout = shelve(shapes, turn, use.width + (columns - 1) * step.x);
      const grid = tileGrid(layout, paper, edges);
      const spread = (grid.columns * grid.step.x + grid.rows * grid.step.y) / 1e6;
      const price = sheetsOf(layout, paper, edges) + spread;
      if (price < least) [best, least] = [layout, price];
    }
  }
  return best;
}
