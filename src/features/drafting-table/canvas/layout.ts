import { spread } from '#shared/exports/spread.ts';
import {
  levelNames,
  type FinishedPiece,
  type LevelName,
  type Side,
} from '#shared/drafting/piece.ts';
import type { Path } from '#shared/geometry/path.ts';
import { add, point, type Point } from '#shared/geometry/point.ts';

import type { Box } from './view.ts';

export type Placed = { readonly piece: FinishedPiece; readonly at: Point; readonly box: Box };

/** Where the pieces lie on the table, and where the frames they were drafted in lie. */
export type Layout = {
  readonly placed: readonly Placed[];
  readonly frames: Readonly<Record<Side | 'flare', Point>>;
  readonly levels: readonly { readonly name: LevelName; readonly y: number }[];
  /** Where the lines of the levels stop: what is no body lies apart, where they say nothing. */
  readonly levelsEnd: number;
  readonly box: Box;
};

/** Room between the frames of front and back and what lies beside, mm. */
const gap = 90;

/** Room between pieces that are no body, mm. */
const apart = 40;

/** Further room before them, for the names of the levels at the end of their lines, mm. */
const nameRoom = 140;

/** The levels stop so far before them, mm. */
const beforeOthers = 20;

/** Whether a piece lies on the body's own levels: flares, bands and what goes inside lie beside. */
export const isBody = ({ part }: FinishedPiece): boolean => part === 'top' || part === 'middle';

/** The pieces as they were drafted: each side in one frame, front and back side by side, the others beside them. */
export function asDrafted(pieces: readonly FinishedPiece[], aspect = 1): Layout {
  const bodies = pieces.filter(isBody);
  let x = 0;
  const [front, back] = (['front', 'back'] as const).map((half) => {
    const group = bodies.filter(({ side }) => side === half);
    const box = around(group.map(boxOf));
    const at = point(x - box.left, 0);
    x += box.right - box.left + gap;
    return { at, placed: group.map((piece) => place(piece, at)) };
  });
  const origin = point(0, 0);
  // The gores lie beside the first of them, wherever in their frame they were struck.
  const struck = pieces.filter(({ part }) => part === 'flare').slice(0, 1);
  const frames = {
    front: front?.at ?? origin,
    back: back?.at ?? origin,
    flare: point(x + nameRoom - around(struck.map(boxOf)).left, 0),
  };
  return withOthers([...(front?.placed ?? []), ...(back?.placed ?? [])], pieces, frames, aspect);
}

/** The pieces cut apart, as they lie in the SVG too, but with what is no body so stacked that a screen shows all large. */
export function asCut(pieces: readonly FinishedPiece[], aspect = 1): Layout {
  const bodies = spread(pieces.filter(isBody)).placed.map(({ piece, translate }) =>
    place(piece, translate),
  );
  const origin = point(0, 0);
  return withOthers(bodies, pieces, { front: origin, back: origin, flare: origin }, aspect);
}

/** What is no body in columns beside, so high that the whole fits a canvas of this width over height best. */
function withOthers(
  bodies: readonly Placed[],
  pieces: readonly FinishedPiece[],
  frames: Layout['frames'],
  aspect: number,
): Layout {
  const others = pieces.filter((piece) => !isBody(piece)).map((piece) => place(piece, point(0, 0)));
  const { right, top } = around(bodies.map(({ box }) => box));
  const from = point(right + gap + nameRoom, top);
  const heights = others.map(({ box }) => box.bottom - box.top);
  const highest = Math.max(0, ...heights);
  // As high as the highest alone, as with the next under it, and so on.
  const tries = heights.map((_, index) =>
    heights.slice(0, index + 1).reduce((sum, each) => sum + each + apart, 0),
  );
  return [highest, ...tries.filter((each) => each > highest)]
    .map((most) => laid([...bodies, ...inColumns(others, from, most)], frames))
    .reduce((best, each) => (side(each.box, aspect) < side(best.box, aspect) ? each : best));
}

/** Height of the canvas a box fits on. */
const side = (box: Box, aspect: number): number =>
  Math.max((box.right - box.left) / aspect, box.bottom - box.top);

/** Pieces under each other up to a height, then in a further column. */
function inColumns(pieces: readonly Placed[], from: Point, most: number): Placed[] {
  let { x, y } = from;
  let right = x;
  return pieces.map(({ piece, at, box }) => {
    if (y > from.y && y + box.bottom - box.top > from.y + most) [x, y] = [right + apart, from.y];
    const placed = place(piece, add(at, point(x - box.left, y - box.top)));
    y += box.bottom - box.top + apart;
    right = Math.max(right, placed.box.right);
    return placed;
  });
}

const place = (piece: FinishedPiece, at: Point): Placed => ({
  piece,
  at,
  box: moved(boxOf(piece), at),
});

function laid(placed: readonly Placed[], frames: Layout['frames']): Layout {
  const levels = levelNames.flatMap((name) => {
    for (const { piece, at } of placed) {
      const found = piece.levels.find((each) => each.level === name);
      if (found !== undefined && isBody(piece)) return [{ name, y: add(found.from, at).y }];
    }
    return [];
  });
  const others = placed.filter(({ piece }) => !isBody(piece));
  const levelsEnd = Math.min(...others.map(({ box }) => box.left)) - beforeOthers;
  return { placed, frames, levels, levelsEnd, box: around(placed.map((each) => each.box)) };
}

const moved = (box: Box, by: Point): Box => ({
  left: box.left + by.x,
  right: box.right + by.x,
  top: box.top + by.y,
  bottom: box.bottom + by.y,
});

/** The box round a piece's cutting line, from the ends and handles of its stretches. */
function boxOf(piece: FinishedPiece): Box {
  return around(hull(piece.cutLine).map(({ x, y }) => ({ left: x, right: x, top: y, bottom: y })));
}

const hull = (path: Path): readonly Point[] =>
  path.flatMap((each) =>
    each.kind === 'line' ? [each.from, each.to] : [each.from, each.c1, each.c2, each.to],
  );

const around = (boxes: readonly Box[]): Box =>
  boxes.length === 0
    ? { left: 0, right: 0, top: 0, bottom: 0 }
    : {
        left: Math.min(...boxes.map((each) => each.left)),
        right: Math.max(...boxes.map((each) => each.right)),
        top: Math.min(...boxes.map((each) => each.top)),
        bottom: Math.max(...boxes.map((each) => each.bottom)),
      };
