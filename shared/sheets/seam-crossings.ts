import { type Motion, moved } from '../geometry/motion.ts';
import type { Placement, Spot } from './layout.ts';

/** Nearer than this to a seam a mark is as good as parted, mm. */
const near = 1.5;

/** Distances from one seam between sheets to the next, mm; the first lies one step in. */
export type Seams = { readonly x: number; readonly y: number };

/** Whether a stretch along an axis reaches a seam. */
function meets(a: number, b: number, step: number): boolean {
  const [from, to] = [Math.min(a, b) - near, Math.max(a, b) + near];
  return Math.floor(to / step) >= 1 && Math.floor(to / step) > Math.floor(from / step);
}

/** How many of these marks a seam runs through, laid by a motion. */
export const parted = (spots: readonly Spot[], motion: Motion, seams: Seams): number =>
  spots.reduce((sum, [from, to]) => {
    const [a, b] = [moved(from, motion), moved(to, motion)];
    return sum + (meets(a.x, b.x, seams.x) || meets(a.y, b.y, seams.y) ? 1 : 0);
  }, 0);

/** How many marks of a layout a seam runs through. */
export const partedIn = (placements: readonly Placement[], seams: Seams): number =>
  placements.reduce((sum, { shape, motion }) => sum + parted(shape.spots ?? [], motion, seams), 0);
