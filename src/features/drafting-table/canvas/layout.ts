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
  /** Where the lines of the levels stop: a flare lies in a frame of its own, which they say nothing about. */
  readonly levelsEnd: number;
  readonly box: Box;
};

/** Room between the frames of front, back and flare, mm. */
const gap = 90;

/** Room between flares, mm. */
const apart = 40;

/** Further room before the flares, for the names of the levels at the end of their lines, mm. */
const nameRoom = 140;

/** The levels stop so far before the flares, mm. */
const beforeFlares = 20;

/** The pieces as they were drafted: each side in one frame, front, back and flare side by side. */
export function asDrafted(pieces: readonly FinishedPiece[], aspect = 1): Layout {
  const groups = [
    pieces.filter((each) => each.part !== 'flare' && each.side === 'front'),
    pieces.filter((each) => each.part !== 'flare' && each.side === 'back'),
    pieces.filter((each) => each.part === 'flare'),
  ];
  let x = 0;
  const [front, back, flare] = groups.map((group) => {
    // The gores lie beside the first of them, wherever in their frame they were struck.
    const box = around((group === groups[2] ? group.slice(0, 1) : group).map(boxOf));
    const at = point(x - box.left, 0);
    x += box.right - box.left + gap + (group === groups[1] ? nameRoom : 0);
    return { at, placed: group.map((piece) => place(piece, at)) };
  });
  const origin = point(0, 0);
  const frames = {
    front: front?.at ?? origin,
    back: back?.at ?? origin,
    flare: flare?.at ?? origin,
  };
  return withFlares(
    [...(front?.placed ?? []), ...(back?.placed ?? [])],
    flare?.placed ?? [],
    frames,
    aspect,
  );
}

/** The pieces cut apart, as they lie in the SVG too, but with the flares so stacked that a screen shows all large. */
export function asCut(pieces: readonly FinishedPiece[], aspect = 1): Layout {
  const placed = spread(pieces).placed.map(({ piece, translate }) => place(piece, translate));
  const bodies = placed.filter(({ piece }) => piece.part !== 'flare');
  const flares = placed
    .filter(({ piece }) => piece.part === 'flare')
    .map(({ piece, at }) => place(piece, add(at, point(nameRoom, 0))));
  const origin = point(0, 0);
  return withFlares(bodies, flares, { front: origin, back: origin, flare: origin }, aspect);
}

/** Every gore in a place of its own, in so many columns that the whole fits a canvas of this width over height best. */
function withFlares(
  bodies: readonly Placed[],
  flares: readonly Placed[],
  frames: Layout['frames'],
  aspect: number,
): Layout {
  const all = laid([...bodies, ...inColumns(flares, 1)], frames);
  return flares
    .map((_, index) => laid([...bodies, ...inColumns(flares, index + 1)], frames))
    .reduce((best, each) => (side(each.box, aspect) < side(best.box, aspect) ? each : best), all);
}

/** Height of the canvas a box fits on. */
const side = (box: Box, aspect: number): number =>
  Math.max((box.right - box.left) / aspect, box.bottom - box.top);

/** Pieces from the first one's place on, so many under each other, then a further column. */
function inColumns(pieces: readonly Placed[], rows: number): Placed[] {
  let [x, y] = [pieces[0]?.box.left ?? 0, pieces[0]?.box.top ?? 0];
  const top = y;
  let right = x;
  return pieces.map(({ piece, at, box }, index) => {
    if (index > 0 && index % rows === 0) [x, y] = [right + apart, top];
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
      if (found !== undefined && piece.part !== 'flare')
        return [{ name, y: add(found.from, at).y }];
    }
    return [];
  });
  const flares = placed.filter(({ piece }) => piece.part === 'flare');
  const levelsEnd = Math.min(...flares.map(({ box }) => box.left)) - beforeFlares;
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
