import type { Shape } from './layout.ts';
import { type Laid, type Table, putDown, takeUp } from './laying.ts';
import { edge } from './phases.ts';
import { parted } from './seam-crossings.ts';

/**
 * Pieces where they lie, each moved as little as it takes to keep its notches off the seams between
 * sheets: only to places that need the same sheets and are free. Pieces that need no move stay.
 */
export function clearOfSeams(
  shapes: readonly Shape[],
  laid: readonly (Laid | undefined)[],
  table: Table,
): readonly Laid[] {
  const { lattice, asLong } = table.field;
  const seams = { x: lattice.across.step, y: lattice.down.step };
  const { cell } = lattice;
  const partedAt = (shape: Shape, { turned }: Laid, x: number, y: number): number => {
    const { motion } = turned;
    const [dx, dy] = [motion.dx + edge + x * cell.x, motion.dy + edge + y * cell.y];
    return parted(shape.spots ?? [], { ...motion, dx, dy }, seams);
  };
  return laid.flatMap((there, which) => {
    const shape = shapes[which];
    if (!there || !shape) return [];
    let least = asLong ? 0 : partedAt(shape, there, there.x, there.y);
    if (least === 0) return [there];
    let best = there;
    takeUp(table, there);
    const [left, top] = [there.column * lattice.across.cells, there.row * lattice.down.cells];
    const nearestFirst = there.group.phases
      .map((phase) => ({ x: left + phase.x, y: top + phase.y }))
      .map((at) => ({ ...at, away: Math.hypot(at.x - there.x, at.y - there.y) }))
      .sort((a, b) => a.away - b.away || a.y - b.y || a.x - b.x);
    for (const { x, y } of nearestFirst) {
      const crossed = partedAt(shape, there, x, y);
      if (crossed >= least || !table.board.free(there.turned.raster, x, y)) continue;
      [best, least] = [{ ...there, x, y }, crossed];
      if (least === 0) break;
    }
    putDown(table, best);
    return [best];
  });
}
