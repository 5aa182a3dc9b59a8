import type { Point } from '#shared/geometry/point.ts';
import { boxOf, placedChain } from '#shared/sheets/layout.ts';
import type { SheetPlan } from '#shared/sheets/sheet-plan.ts';
import type { Tile } from '#shared/sheets/tile-plan.ts';

/** A piece where it lies on the plan, mm. */
type LaidOutline = {
  readonly piece: string;
  /** As SVG writes it. */
  readonly path: string;
  /** A place well inside it, for its number. */
  readonly middle: Point;
};

/** The outlines of a plan's pieces as they lie on its sheets. */
export const laidOutlines = ({ layout }: SheetPlan): readonly LaidOutline[] =>
  layout.placements.map((placement) => {
    const chain = placedChain(placement);
    return {
      piece: placement.shape.piece,
      path: `M${chain.map(({ x, y }) => `${x.toFixed(1)} ${y.toFixed(1)}`).join('L')}Z`,
      middle: middleOf(chain),
    };
  });

/** The middle of the widest stretch inside an outline at half its height: a centroid may lie outside a curved piece. */
function middleOf(chain: readonly Point[]): Point {
  const { x, y, width, height } = boxOf(chain);
  const at = y + height / 2;
  const crossings = chain
    .flatMap((from, i) => {
      const to = chain[(i + 1) % chain.length];
      if (to === undefined || from.y > at === to.y > at) return [];
      return [from.x + ((at - from.y) / (to.y - from.y)) * (to.x - from.x)];
    })
    .sort((a, b) => a - b);
  let best = { width: 0, x: x + width / 2 };
  for (let i = 0; i + 1 < crossings.length; i += 2) {
    const [left = 0, right = 0] = [crossings[i], crossings[i + 1]];
    if (right - left > best.width) best = { width: right - left, x: (left + right) / 2 };
  }
  return { x: best.x, y: at };
}

/** Sheet to sheet with the arrow keys: the nearest one in a direction, if there is any. */
export function sheetBeside(tiles: readonly Tile[], from: Tile, { x, y }: Point): Tile | undefined {
  const ahead = tiles.filter(({ at }) => {
    const [dx, dy] = [at.x - from.at.x, at.y - from.at.y];
    return x === 0 ? dy * y > 0 : dx * x > 0 && dy === 0;
  });
  const far = ({ at }: Tile): number =>
    Math.abs(at.y - from.at.y) * 1e3 + Math.abs(at.x - from.at.x);
  return ahead.reduce<Tile | undefined>(
    (best, each) => (best === undefined || far(each) < far(best) ? each : best),
    undefined,
  );
}
