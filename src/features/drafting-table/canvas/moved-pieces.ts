import { flatten } from '#shared/geometry/curve.ts';
import { add, subtract, type Point } from '#shared/geometry/point.ts';

import type { Layout, Placed } from './layout.ts';

/** How far each piece has been moved about on the table, mm. */
export type Shifts = { readonly [piece: string]: Point };

/** The layout with pieces where the maker has moved them. */
export function shifted(layout: Layout, shifts: Shifts): Layout {
  if (Object.keys(shifts).length === 0) return layout;
  const placed = layout.placed.map((each): Placed => {
    const by = shifts[each.piece.name];
    if (by === undefined) return each;
    const { left, right, top, bottom } = each.box;
    return {
      piece: each.piece,
      at: add(each.at, by),
      box: { left: left + by.x, right: right + by.x, top: top + by.y, bottom: bottom + by.y },
    };
  });
  return { ...layout, placed };
}

/** The piece that lies at a place of the paper; of pieces over each other the upper one. */
export const pieceAt = ({ placed }: Layout, at: Point): string | undefined =>
  placed.findLast((each) => inside(each, at))?.piece.name;

function inside({ piece, at, box }: Placed, place: Point): boolean {
  if (place.x < box.left || place.x > box.right || place.y < box.top || place.y > box.bottom) {
    return false;
  }
  const { x, y } = subtract(place, at);
  const outline = flatten(piece.cutLine, 1);
  let within = false;
  outline.forEach((a, index) => {
    const b = outline[(index + 1) % outline.length] ?? a;
    if (a.y > y !== b.y > y && x < a.x + ((y - a.y) / (b.y - a.y)) * (b.x - a.x)) within = !within;
  });
  return within;
}
