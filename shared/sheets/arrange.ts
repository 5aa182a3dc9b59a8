import { rollField, sheetField } from './field.ts';
import { type Layout, type Placement, type Shape, boxOf, placedChain } from './layout.ts';
import { nest } from './nest.ts';
import type { Paper } from './papers.ts';
import { edge } from './phases.ts';
import type { PlanProgress } from './print-order.ts';
import { partedIn } from './seam-crossings.ts';
import { inRows, sheetsOf } from './shelves.ts';
import { type SheetEdges, tileGrid } from './tile-grid.ts';

/** Moves a search makes: about a second on a small machine for the pieces of a gown. */
export const fullSearch = 1000;

/** The drawing round some placements, its corner at 0, 0. */
function drawingOf(placements: readonly Placement[]): Layout {
  const { x, y, width, height } = boxOf(placements.flatMap(placedChain));
  return placements.length === 0
    ? { width: 0, height: 0, placements }
    : { width: x + width + edge, height: y + height + edge, placements };
}

const shifted = (placements: readonly Placement[], dx: number, dy: number): readonly Placement[] =>
  placements.map(({ shape, motion }) => ({
    shape,
    motion: { ...motion, dx: motion.dx + dx, dy: motion.dy + dy },
  }));

/** Farthest a whole drawing is shifted, mm, and by what steps. */
const slack = 12;

/**
 * The drawing shifted as a whole, as little as it takes, so that fewer notches lie on seams between
 * sheets; only where it needs no sheet more.
 */
function settled(layout: Layout, paper: Paper, edges: SheetEdges): Layout {
  const { step } = tileGrid(layout, paper, edges);
  const parts = partedIn(layout.placements, step);
  if (parts === 0) return layout;
  const sheets = sheetsOf(layout, paper, edges);
  const { x, y } = boxOf(layout.placements.flatMap(placedChain));
  const ways = Array.from({ length: 2 * slack + 1 }, (_, i) => i - slack);
  const tries = ways
    .flatMap((dx) => ways.map((dy) => ({ dx, dy })))
    .filter(({ dx, dy }) => x + dx >= edge && y + dy >= edge)
    .map((by) => ({
      ...by,
      parts: partedIn(shifted(layout.placements, by.dx, by.dy), step),
      away: Math.hypot(by.dx, by.dy),
    }))
    .filter((each) => each.parts < parts)
    .sort((a, b) => a.parts - b.parts || a.away - b.away || a.dx - b.dx);
  for (const { dx, dy } of tries) {
    const moved = drawingOf(shifted(layout.placements, dx, dy));
    if (sheetsOf(moved, paper, edges) <= sheets) return moved;
  }
  return layout;
}

/**
 * Lays pieces out on one drawing so that few sheets of the paper are needed, never more than row by row;
 * pieces are turned by quarters and take each other's hollows. Says after every move how far it is. The
 * same pieces, paper and moves always give the same drawing.
 */
export function* arrange(
  shapes: readonly Shape[],
  paper: Paper,
  edges: SheetEdges,
  moves: number,
): Generator<PlanProgress, Layout> {
  if (shapes.length === 0) return { width: 0, height: 0, placements: [] };
  const wanted = shapes.length === 1 ? 0 : moves;
  if (paper.roll) {
    const strip = yield* nest(shapes, rollField(paper, edges), wanted);
    if (strip) return drawingOf(strip);
  }
  const rows = inRows(shapes, paper, edges);
  const placements = yield* nest(shapes, sheetField(shapes, paper, edges), wanted);
  const nested = placements && drawingOf(placements);
  const better =
    nested && sheetsOf(nested, paper, edges) <= sheetsOf(rows, paper, edges) ? nested : rows;
  return settled(better, paper, edges);
}
