import { flatten } from '../geometry/curve.ts';
import { moved } from '../geometry/motion.ts';
import type { Point } from '../geometry/point.ts';
import type { DrawnPiece } from '../sheets/drawn-pieces.ts';
import { type Box, type Placement, placedChain } from '../sheets/layout.ts';
import type { Tile, TilePlan } from '../sheets/tile-plan.ts';
import type { Drawing } from './drawing.ts';
import { box, pens, words } from './marks.ts';

/** The test square of every sheet, mm. */
export const smallSide = 20;

/** White round it where there is room, and from the edge of the printed area, mm. */
const white = 2;
const inset = 3;

/** Lines are looked at in points so far apart, mm. */
const stride = 3;

/** The small square at 0, 0, used by every sheet. */
export const smallSquare: Drawing = {
  name: 'small-square',
  marks: [
    box(pens.hairline, 0, 0, smallSide, smallSide),
    words('20 mm', smallSide / 2, smallSide - 1.4, 2.6, { anchor: 'middle', grey: 0.35 }),
  ],
};

/** Points along a chain, none farther from the next than the stride. */
function dotted(chain: readonly Point[]): readonly Point[] {
  return chain.flatMap((from, i) => {
    const to = chain[(i + 1) % chain.length] ?? from;
    const parts = Math.max(1, Math.ceil(Math.hypot(to.x - from.x, to.y - from.y) / stride));
    return Array.from({ length: parts }, (_, n) => ({
      x: from.x + ((to.x - from.x) * n) / parts,
      y: from.y + ((to.y - from.y) * n) / parts,
    }));
  });
}

/** Points along all lines of a piece where it lies: its outline, its seams, its grain line. */
export function linesOf(placement: Placement, drawn: DrawnPiece | undefined): readonly Point[] {
  const outline = dotted(placedChain(placement));
  if (!drawn) return outline;
  const { edges, grain } = drawn.piece;
  const seams = edges.flatMap((each) => flatten(each.path, 0.5));
  const inner = [seams, [grain.from, grain.to]].map((chain) =>
    dotted(chain.map((each) => moved(each, placement.motion))),
  );
  return [...outline, ...inner.flat()];
}

const within = ({ x, y }: Point, at: Point): boolean =>
  x > at.x - white &&
  x < at.x + smallSide + white &&
  y > at.y - white &&
  y < at.y + smallSide + white;

const overlaps = (each: Box, at: Point): boolean =>
  each.x < at.x + smallSide + white &&
  each.x + each.width > at.x - white &&
  each.y < at.y + smallSide + white &&
  each.y + each.height > at.y - white;

/** Places in a sheet's window, from its lower left corner along its foot, then upwards. */
function places({ use, overlap }: TilePlan): readonly Point[] {
  const [right, foot] = [
    use.width - overlap - inset - smallSide,
    use.height - overlap - inset - smallSide,
  ];
  const along = (from: number, to: number): readonly number[] => {
    const steps = Math.max(1, Math.floor((to - from) / (smallSide + 2 * white)));
    return Array.from({ length: steps + 1 }, (_, i) => from + ((to - from) * i) / steps);
  };
  const columns = along(overlap + inset, right);
  return along(overlap + inset, foot)
    .toReversed()
    .flatMap((y) => columns.map((x) => ({ x, y })));
}

/**
 * Where the small square stands in a sheet's window, mm from its corner: the first place from the lower
 * left that no line and no lettering runs through, or the lower left where all are taken.
 */
export function smallSquareAt(
  tile: Tile,
  plan: TilePlan,
  lines: readonly Point[],
  lettered: readonly Box[],
): Point {
  const all = places(plan);
  const here = lines
    .map(({ x, y }) => ({ x: x - tile.at.x, y: y - tile.at.y }))
    .filter(({ x, y }) => x > -1 && y > -1 && x < plan.use.width + 1 && y < plan.use.height + 1);
  const clear = all.find(
    (at) =>
      !here.some((each) => within(each, at)) &&
      !lettered.some((each) =>
        overlaps({ ...each, x: each.x - tile.at.x, y: each.y - tile.at.y }, at),
      ),
  );
  return clear ?? all[0] ?? { x: inset, y: inset };
}
