import { movedPath } from '../geometry/motion.ts';
import type { Path } from '../geometry/path.ts';
import type { Point } from '../geometry/point.ts';
import type { FinishedPiece } from '../drafting/piece.ts';
import type { SheetPlan } from '../sheets/sheet-plan.ts';
import type { TilePlan } from '../sheets/tile-plan.ts';
import type { Mark, Window } from './drawing.ts';
import { box, outline, pens, words } from './marks.ts';

/** A path drawn smaller by `by` with its 0, 0 at `to`. */
function shrink(path: Path, by: number, to: Point): Path {
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

/** White between the bands of a long plan, mm. */
const bandGap = 5;

type Room = {
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
};

/** A long plan is shown in bands side by side, as many as make its sheets largest. */
function bandsFor({ use, step, rows, columns }: TilePlan, room: Room) {
  const wide = (columns - 1) * step.x + use.width;
  const inBands = (count: number) => {
    const each = Math.ceil(rows / count);
    const across = (room.width - (count - 1) * bandGap) / (count * wide);
    const by = Math.min(across, room.height / ((each - 1) * step.y + use.height));
    return { count: Math.ceil(rows / each), rows: each, by, wide: wide * by };
  };
  return [2, 3, 4]
    .map(inBands)
    .reduce((best, each) => (each.by > best.by ? each : best), inBands(1));
}

/** A small picture of which sheet goes where, with the pieces over it, inside a box on the page. */
export function pagePlan(
  { layout, plan }: SheetPlan,
  pieces: readonly FinishedPiece[],
  room: Room,
): readonly Mark[] {
  const { use, step } = plan;
  const { count, rows, by, wide } = bandsFor(plan, room);
  const letters = Math.min(5, step.x * by * 0.36);
  const left = room.x + (room.width - count * wide - (count - 1) * bandGap) / 2;
  return Array.from({ length: count }, (_, band): Window => {
    const corner = { x: left + band * (wide + bandGap), y: room.y - band * rows * step.y * by };
    const tiles = plan.tiles.filter(({ at }) => Math.floor(at.y / step.y / rows + 1e-9) === band);
    const height = ((rows - 1) * step.y + use.height) * by;
    return {
      kind: 'window',
      box: { x: corner.x - 0.2, y: room.y - 0.2, width: wide + 0.4, height: height + 0.4 },
      marks: [
        ...tiles.flatMap((tile) => {
          const x = corner.x + tile.at.x * by;
          const y = corner.y + tile.at.y * by;
          return [
            box(pens.hairline, x, y, use.width * by, use.height * by),
            words(tile.name, x + (step.x * by) / 2, y + (step.y * by) / 2 + letters / 3, letters, {
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
      ],
    };
  });
}
