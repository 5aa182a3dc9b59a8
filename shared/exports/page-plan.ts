import { movedPath } from '../geometry/motion.ts';
import type { Path } from '../geometry/path.ts';
import type { Point } from '../geometry/point.ts';
import type { FinishedPiece } from '../drafting/piece.ts';
import type { SheetPlan } from '../sheets/sheet-plan.ts';
import { overlap } from '../sheets/tile-grid.ts';
import type { Mark } from './drawing.ts';
import { box, outline, pens, words } from './marks.ts';

/** A path drawn smaller by `by` with its 0, 0 at `to`. */
export function shrink(path: Path, by: number, to: Point): Path {
  const small = (p: Point): Point => ({ x: to.x + p.x * by, y: to.y + p.y * by });
  return path.map((each) =>
    each.kind === 'line'
      ? { kind: 'line', from: small(each.from), to: small(each.to) }
      : {
          kind: 'cubic',
          from: small(each.from),
          c1: small(each.c1),
          c2: small(each.c2),
          to: small(each.to),
        },
  );
}

/** A small picture of which sheet goes where, with the pieces over it, inside a box on the page. */
export function pagePlan(
  { layout, plan }: SheetPlan,
  pieces: readonly FinishedPiece[],
  room: { readonly x: number; readonly y: number; readonly width: number; readonly height: number },
): readonly Mark[] {
  const stepX = plan.use.width - overlap;
  const stepY = plan.use.height - overlap;
  const by = Math.min(
    room.width / (plan.columns * stepX + overlap),
    room.height / (plan.rows * stepY + overlap),
  );
  const corner = { x: room.x, y: room.y };
  const letters = Math.min(5, stepX * by * 0.32);
  return [
    ...plan.tiles.flatMap((tile) => {
      const x = corner.x + tile.at.x * by;
      const y = corner.y + tile.at.y * by;
      return [
        box(pens.hairline, x, y, plan.use.width * by, plan.use.height * by),
        words(tile.name, x + (stepX * by) / 2, y + (stepY * by) / 2 + letters / 3, letters, {
          anchor: 'middle',
          grey: 0.45,
        }),
      ];
    }),
    ...layout.placements.flatMap(({ shape, motion }) => {
      const piece = pieces.find((each) => each.name === shape.piece);
      return piece
        ? [outline(pens.frame, shrink(movedPath(piece.cutLine, motion), by, corner))]
        : [];
    }),
  ];
}
