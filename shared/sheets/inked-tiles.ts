import type { Point } from '../geometry/point.ts';
import { type Layout, boxOf, placedChain } from './layout.ts';
import { inkReach } from './phases.ts';
import type { TileGrid } from './tile-grid.ts';
import { type Stride, sheetsShowing, zoneAt, zoneKey } from './tile-zones.ts';

/** Longest stretch of line looked at in one go, mm; longer ones would claim sheets they only pass. */
const stride = 2;

/** What a tile shows: a piece's outline, or the inside of a piece, by name. */
export type Ink = {
  readonly inside?: string;
  /** The placements of the layout that need this tile, by their number. */
  readonly shows: readonly number[];
};

/** The tiles of a grid, row by row from the top left, and the seams between them that a piece runs across. */
export type InkedTiles = {
  readonly tiles: readonly (Ink | undefined)[];
  /** Whether the seam at the right of, or below, a tile must be glued for some piece. */
  readonly gluedRight: readonly boolean[];
  readonly gluedBelow: readonly boolean[];
};

/** Whether a closed chain goes round a place. */
function surrounds(chain: readonly Point[], at: Point): boolean {
  let within = false;
  let before = chain[chain.length - 1];
  for (const here of chain) {
    if (before && here.y > at.y !== before.y > at.y) {
      const share = (at.y - here.y) / (before.y - here.y);
      if (at.x < here.x + share * (before.x - here.x)) within = !within;
    }
    before = here;
  }
  return within;
}

type Axes = { readonly across: Stride; readonly down: Stride };

/** The zones that the outline of a chain inks. */
function outlineZones(chain: readonly Point[], { across, down }: Axes): ReadonlySet<number> {
  const zones = new Set<number>();
  let before = chain[chain.length - 1];
  for (const here of chain) {
    if (!before) continue;
    const parts = Math.max(1, Math.ceil(Math.hypot(here.x - before.x, here.y - before.y) / stride));
    for (let i = 0; i < parts; i += 1) {
      const [ax, bx] = [i, i + 1].map(
        (n) => (before?.x ?? 0) + ((here.x - (before?.x ?? 0)) * n) / parts,
      );
      const [ay, by] = [i, i + 1].map(
        (n) => (before?.y ?? 0) + ((here.y - (before?.y ?? 0)) * n) / parts,
      );
      mark(zones, [ax ?? 0, bx ?? 0], [ay ?? 0, by ?? 0], { across, down });
    }
    before = here;
  }
  return zones;
}

/** Adds the zones of a small box and of the ink round it. */
function mark(
  zones: Set<number>,
  [ax, bx]: readonly [number, number],
  [ay, by]: readonly [number, number],
  { across, down }: Axes,
): void {
  const left = zoneAt(Math.max(0, Math.min(ax, bx) - inkReach), across);
  const right = zoneAt(Math.max(ax, bx) + inkReach, across);
  const top = zoneAt(Math.max(0, Math.min(ay, by) - inkReach), down);
  const foot = zoneAt(Math.max(ay, by) + inkReach, down);
  for (let y = top; y <= foot; y += 1) {
    for (let x = left; x <= right; x += 1) zones.add(zoneKey(x, y));
  }
}

/** The middle of a zone along an axis. */
const middleOf = (zone: number, { step, overlap }: Stride): number =>
  (zone >> 1) * step + (zone % 2 === 0 ? overlap / 2 : (overlap + step) / 2);

/** The zones that lie inside a chain, its outline's zones left out. */
function insideZones(
  chain: readonly Point[],
  outlined: ReadonlySet<number>,
  { across, down }: Axes,
): readonly number[] {
  const { x, y, width, height } = boxOf(chain);
  const found: number[] = [];
  for (let row = zoneAt(y, down); row <= zoneAt(y + height, down); row += 1) {
    for (let column = zoneAt(x, across); column <= zoneAt(x + width, across); column += 1) {
      const key = zoneKey(column, row);
      const middle = { x: middleOf(column, across), y: middleOf(row, down) };
      if (!outlined.has(key) && surrounds(chain, middle)) found.push(key);
    }
  }
  return found;
}

/**
 * The tiles that a layout needs. A piece takes every tile that alone shows some of it, paper inside it
 * too, or the pattern would have holes; what two tiles share in their strip needs only one of them.
 */
export function inkedTiles(layout: Layout, grid: TileGrid): InkedTiles {
  const { rows, columns, step, overlap } = grid;
  const axes = { across: { step: step.x, overlap }, down: { step: step.y, overlap } };
  const tiles = new Array<{ inside?: string; shows: number[] } | undefined>(rows * columns).fill(
    undefined,
  );
  const gluedRight = tiles.map(() => false);
  const gluedBelow = tiles.map(() => false);
  const already = new Set<number>();
  const drawn = layout.placements.map((placement) => {
    const chain = placedChain(placement);
    const outlined = outlineZones(chain, axes);
    const zones = new Set([...outlined, ...insideZones(chain, outlined, axes)]);
    return { name: placement.shape.piece, outlined, zones };
  });
  const outlines = new Set(drawn.flatMap(({ outlined }) => [...outlined]));
  const shows = (zones: ReadonlySet<number>, column: number, row: number): boolean =>
    [0, 1, 2].some((dy) =>
      [0, 1, 2].some((dx) => zones.has(zoneKey(2 * column + dx, 2 * row + dy))),
    );
  for (const [which, { name, zones }] of drawn.entries()) {
    const sheets = sheetsShowing(zones, already);
    const own = new Set(sheets.map(({ column, row }) => zoneKey(column, row)));
    const strip = (x: number, y: number): boolean =>
      [-1, 0, 1].some((by) => zones.has(x % 2 === 0 ? zoneKey(x, y + by) : zoneKey(x + by, y)));
    for (const { column, row } of sheets) {
      already.add(zoneKey(column, row));
      if (column >= columns || row >= rows) continue;
      const at = row * columns + column;
      const tile = (tiles[at] ??= {
        ...(shows(outlines, column, row) ? {} : { inside: name }),
        shows: [],
      });
      tile.shows.push(which);
      if (own.has(zoneKey(column + 1, row)) && strip(2 * column + 2, 2 * row + 1)) {
        gluedRight[at] = true;
      }
      if (own.has(zoneKey(column, row + 1)) && strip(2 * column + 1, 2 * row + 2)) {
        gluedBelow[at] = true;
      }
    }
  }
  return { tiles, gluedRight, gluedBelow };
}
