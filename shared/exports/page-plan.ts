import { carriedPath } from '../drafting/carried-piece.ts';
import { movedPath } from '../geometry/motion.ts';
import type { Path } from '../geometry/path.ts';
import { type Point, point } from '../geometry/point.ts';
import type { Placement } from '../sheets/layout.ts';
import type { SheetPlan } from '../sheets/sheet-plan.ts';
import type { Tile, TilePlan } from '../sheets/tile-plan.ts';
import type { Mark, Window } from './drawing.ts';
import { box, chainOf, outline, pens, stroke, strokes, words } from './marks.ts';

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

/** How the drawing lies on the page: its corner, and how much smaller it is. */
type Shrunk = { readonly corner: Point; readonly by: number };

const shrink = (path: Path, { corner, by }: Shrunk): Path =>
  carriedPath(path, (p) => point(corner.x + p.x * by, corner.y + p.y * by));

/** Two short strokes across the middle of each seam that is glued. */
function glueTicks({ at, glued }: Tile, { use, step }: TilePlan, { corner, by }: Shrunk): Path[] {
  const half = Math.min(1.2, step.x * by * 0.1);
  const [x, y] = [corner.x + at.x * by, corner.y + at.y * by];
  const right = { x: x + step.x * by, y: y + (use.height * by) / 2 };
  const below = { x: x + (use.width * by) / 2, y: y + step.y * by };
  return [
    ...(glued.includes('right') ? [stroke(right.x - half, right.y, right.x + half, right.y)] : []),
    ...(glued.includes('below') ? [stroke(below.x, below.y - half, below.x, below.y + half)] : []),
  ];
}

/** A sheet with its name; one that is left out is crossed through. */
function sheet(tile: Tile, { use, step }: TilePlan, { corner, by }: Shrunk): readonly Mark[] {
  const [x, y] = [corner.x + tile.at.x * by, corner.y + tile.at.y * by];
  const [width, height] = [use.width * by, use.height * by];
  const letters = Math.min(5, step.x * by * 0.36, step.y * by * 0.5);
  const frame = box(pens.hairline, x, y, width, height);
  if (tile.leftOut) {
    const crossed = [stroke(x, y, x + width, y + height), stroke(x + width, y, x, y + height)];
    return [frame, strokes(pens.trim, ...crossed)];
  }
  const name = words(
    tile.name,
    x + (step.x * by) / 2,
    y + (step.y * by) / 2 + letters / 3,
    letters,
    { anchor: 'middle', grey: 0.45 },
  );
  return [frame, name];
}

const laidOutline = ({ shape, motion }: Placement): Path => movedPath(chainOf(shape.chain), motion);

/** A small picture of which sheet goes where, with the pieces over it, inside a box on the page. */
export function pagePlan({ layout, plan }: SheetPlan, room: Room): readonly Mark[] {
  const { use, step } = plan;
  const { count, rows, by, wide } = bandsFor(plan, room);
  const left = room.x + (room.width - count * wide - (count - 1) * bandGap) / 2;
  return Array.from({ length: count }, (_, band): Window => {
    const corner = { x: left + band * (wide + bandGap), y: room.y - band * rows * step.y * by };
    const shrunk = { corner, by };
    const tiles = plan.tiles.filter(({ at }) => Math.floor(at.y / step.y / rows + 1e-9) === band);
    const height = ((rows - 1) * step.y + use.height) * by;
    return {
      kind: 'window',
      box: { x: corner.x - 0.2, y: room.y - 0.2, width: wide + 0.4, height: height + 0.4 },
      marks: [
        ...tiles.flatMap((tile) => sheet(tile, plan, shrunk)),
        strokes({ width: 0.5 }, ...tiles.flatMap((tile) => glueTicks(tile, plan, shrunk))),
        ...layout.placements.map((each) => outline(pens.frame, shrink(laidOutline(each), shrunk))),
      ],
    };
  });
}
