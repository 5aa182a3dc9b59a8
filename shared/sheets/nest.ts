import { clearOfSeams } from './clear-of-seams.ts';
import { type Field, turnsOf } from './field.ts';
import { gathered } from './gathered.ts';
import { type Laid, bestPlace, clearTable, putDown, sheetsUsed, takeUp } from './laying.ts';
import { type Placement, type Shape, boxOf } from './layout.ts';
import { edge } from './phases.ts';
import type { PlanProgress } from './print-order.ts';
import { seeded } from './seeded.ts';

/** Pieces lifted in one move, at most. */
const liftedAtMost = 4;

/** How often a move that takes one sheet more is kept all the same, to get out of a corner. */
const keptThoughWorse = 0.02;

/** How far a search has come; sheets are counted as they lie now, at the best. */
type Search = Generator<PlanProgress, readonly Placement[] | undefined>;

function placementOf(shape: Shape, { turned, x, y }: Laid, { lattice }: Field): Placement {
  const { motion } = turned;
  return {
    shape,
    motion: {
      ...motion,
      dx: motion.dx + edge + x * lattice.cell.x,
      dy: motion.dy + edge + y * lattice.cell.y,
    },
  };
}

const largestFirst = (shapes: readonly Shape[]): readonly number[] =>
  shapes
    .map(({ chain }, which) => {
      const { width, height } = boxOf(chain);
      return { which, area: width * height };
    })
    .sort((a, b) => b.area - a.area || a.which - b.which)
    .map(({ which }) => which);

/** Some different numbers below `count`. */
function someOf(count: number, lot: () => number): readonly number[] {
  const wanted = Math.min(count, 1 + Math.floor(lot() * liftedAtMost));
  const some: number[] = [];
  while (some.length < wanted) {
    const which = Math.floor(lot() * count);
    if (!some.includes(which)) some.push(which);
  }
  return some;
}

/** Sheets first; of as many, what lies on the fewest sheets, or nearest to the start of a roll. */
const untidy = (laid: readonly (Laid | undefined)[], { asLong }: Field): number =>
  laid.reduce((sum, each) => {
    if (!each) return sum;
    return sum + (asLong ? each.row + each.group.rows : each.group.sheets.length);
  }, 0) / 10_000;

/**
 * Lays shapes on a field so that few sheets are needed: the large ones first, each where it takes the
 * fewest sheets more; then so many moves, each lifting a few pieces and laying them anew, kept where that
 * is no worse. Says after every move how far it is. The same shapes, field and moves give the same places.
 * No answer where a shape does not fit the field.
 */
export function* nest(shapes: readonly Shape[], field: Field, moves: number): Search {
  const lot = seeded(shapes.length);
  const known = new Map(shapes.map((shape) => [shape, turnsOf(shape, field)]));
  const ways = shapes.map((shape) => known.get(shape) ?? []);
  const table = clearTable(field);
  const laid: (Laid | undefined)[] = shapes.map(() => undefined);
  const lay = (which: number): boolean => {
    const found = bestPlace(table, ways[which] ?? [], lot);
    laid[which] = found;
    if (found) putDown(table, found);
    return found !== undefined;
  };
  const lift = (which: number): void => {
    const there = laid[which];
    if (there) takeUp(table, there);
    laid[which] = undefined;
  };
  const restore = (places: readonly (Laid | undefined)[]): void => {
    shapes.forEach((_, which) => {
      lift(which);
    });
    places.forEach((there, which) => {
      laid[which] = there;
      if (there) putDown(table, there);
    });
  };
  const costNow = (): number => sheetsUsed(table) + untidy(laid, field);

  if (!largestFirst(shapes).every(lay)) return undefined;
  let current = costNow();
  let best = { cost: current, laid: [...laid] };
  for (let move = 1; move <= moves; move += 1) {
    const lifted = someOf(shapes.length, lot);
    const before = lifted.map((which) => laid[which]);
    lifted.forEach(lift);
    const done = lifted.every(lay);
    const cost = costNow();
    if (done && cost <= current + (lot() < keptThoughWorse ? 1 : 0)) {
      current = cost;
      if (cost < best.cost) best = { cost, laid: [...laid] };
    } else {
      lifted.forEach(lift);
      lifted.forEach((which, i) => {
        const there = before[i];
        laid[which] = there;
        if (there) putDown(table, there);
      });
    }
    yield { moves: move, of: moves, sheets: Math.floor(best.cost) };
  }
  restore(best.laid);
  return gathered(clearOfSeams(shapes, laid, table), table).map((there, which) =>
    placementOf(shapes[which] ?? { piece: '', chain: [] }, there, field),
  );
}
