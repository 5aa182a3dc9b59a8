import { shift } from '#shared/geometry/motion.ts';
import { type Layout, type Placement, type Shape, boxOf, gap } from '#shared/sheets/layout.ts';

/** As wide as a cutting table, mm. */
const table = 1900;

/** Pieces as drafted and in their order, side by side in rows as wide as a table: nothing is tried twice. */
export function plainRows(shapes: readonly Shape[]): Layout {
  const edge = 1.5;
  const placements: Placement[] = [];
  let [x, y, high, width] = [edge, edge, 0, 0];
  for (const shape of shapes) {
    const box = boxOf(shape.chain);
    if (x > edge && x + box.width > table) [x, y, high] = [edge, y + high + gap, 0];
    placements.push({ shape, motion: shift(x - box.x, y - box.y) });
    x += box.width + gap;
    high = Math.max(high, box.height);
    width = Math.max(width, x);
  }
  return { width, height: y + high + edge, placements };
}
