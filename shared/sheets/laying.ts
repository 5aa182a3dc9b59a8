import { type Board, emptyBoard } from './board.ts';
import type { Field, FieldGroup, Turned } from './field.ts';
import { takenOn } from './phases.ts';

/** A piece where it lies: which way turned, from which sheet on, at which cell. */
export type Laid = {
  readonly turned: Turned;
  readonly group: FieldGroup;
  readonly column: number;
  readonly row: number;
  readonly x: number;
  readonly y: number;
};

/** What lies on a field at a moment. */
export type Table = {
  readonly field: Field;
  readonly board: Board;
  /** Pieces on each sheet. */
  readonly used: Uint16Array;
  /** Cells still free on each sheet. */
  readonly free: Int32Array;
};

/** Room beyond the last sheet's step: its strip is printed too. */
const beyond = 8;

/** A field with nothing on it. */
export function clearTable(field: Field): Table {
  const { across, down } = field.lattice;
  const sheets = field.columns * field.rows;
  return {
    field,
    board: emptyBoard(field.columns * across.cells + beyond, field.rows * down.cells + beyond),
    used: new Uint16Array(sheets),
    free: new Int32Array(sheets).fill(across.cells * down.cells),
  };
}

function count({ field, used, free }: Table, laid: Laid, by: 1 | -1): void {
  const { across, down } = field.lattice;
  const phase = { x: laid.x - laid.column * across.cells, y: laid.y - laid.row * down.cells };
  for (const sheet of laid.group.sheets) {
    const at = (laid.row + sheet.row) * field.columns + laid.column + sheet.column;
    used[at] = (used[at] ?? 0) + by;
    free[at] = (free[at] ?? 0) - by * takenOn(laid.turned.raster, phase, sheet, field.lattice);
  }
}

/** Lays a piece down where it is free. */
export function putDown(table: Table, laid: Laid): void {
  table.board.turn(laid.turned.raster, laid.x, laid.y);
  count(table, laid, 1);
}

/** Takes up a piece that lies there. */
export function takeUp(table: Table, laid: Laid): void {
  table.board.turn(laid.turned.raster, laid.x, laid.y);
  count(table, laid, -1);
}

/** Rows of sheets down to the last one used. */
function reach({ used, field }: Table): number {
  let last = used.length - 1;
  while (last >= 0 && used[last] === 0) last -= 1;
  return last < 0 ? 0 : Math.floor(last / field.columns) + 1;
}

/** Sheets that show something; of a roll, strips of it. */
export function sheetsUsed(table: Table): number {
  if (table.field.asLong) return reach(table);
  let sheets = 0;
  for (const each of table.used) if (each > 0) sheets += 1;
  return sheets;
}

type Wish = {
  readonly turned: Turned;
  readonly group: FieldGroup;
  readonly column: number;
  readonly row: number;
};

/** Places as numbers in one list a price, threaded through each other: thousands are listed a move. */
type Wishes = {
  readonly wish: (which: number) => Wish | undefined;
  /** The last place of each price, and how many there are. */
  readonly last: readonly number[];
  readonly count: readonly number[];
  /** The place of the same price before a place; below zero where there is none. */
  readonly before: readonly number[];
};

/** Where a piece could go, by how many sheets more that takes; only where its cells may find room. */
function wishes(table: Table, ways: readonly Turned[]): Wishes {
  const { field, used, free } = table;
  const long = reach(table);
  // On sheets of its own a piece always finds a place, so nothing dearer is looked at.
  const alone = Math.min(...ways.map((each) => each.alone));
  const [turnedOf, groupOf, cornerOf]: [number[], number[], number[]] = [[], [], []];
  const [last, count, before]: [number[], number[], number[]] = [[], [], []];
  for (let way = 0; way < ways.length; way += 1) {
    const groups = ways[way]?.groups ?? [];
    for (let which = 0; which < groups.length; which += 1) {
      const group = groups[which];
      if (!group) continue;
      let fresh = false;
      const { offsets, needs } = group;
      const lastRow = Math.min(field.rows - group.rows, long);
      for (let row = 0; row <= lastRow; row += 1) {
        for (let column = 0; column + group.columns <= field.columns; column += 1) {
          let cost = 0;
          let room = true;
          const corner = row * field.columns + column;
          for (let i = 0; room && i < offsets.length; i += 1) {
            const at = corner + (offsets[i] ?? 0);
            if (used[at] === 0) cost += 1;
            room = (free[at] ?? 0) >= (needs[i] ?? 0) && (field.asLong || cost <= alone);
          }
          if (!room) continue;
          const untouched = !field.asLong && cost === offsets.length;
          if (untouched && fresh) continue;
          fresh ||= untouched;
          const price = field.asLong ? row + group.rows : cost;
          before.push(last[price] ?? -1);
          last[price] = cornerOf.length;
          count[price] = (count[price] ?? 0) + 1;
          turnedOf.push(way);
          groupOf.push(which);
          cornerOf.push(corner);
        }
      }
    }
  }
  const wish = (which: number): Wish | undefined => {
    const turned = ways[turnedOf[which] ?? -1];
    const group = turned?.groups[groupOf[which] ?? -1];
    const corner = cornerOf[which] ?? 0;
    const row = Math.floor(corner / field.columns);
    return turned && group && { turned, group, column: corner - row * field.columns, row };
  };
  return { wish, last, count, before };
}

/** The first free place of a wish, looked for from some place in its list. */
function place(
  { board, field: { lattice } }: Table,
  { turned, group, column, row }: Wish,
  from: number,
): Laid | undefined {
  const { phases } = group;
  const start = Math.floor(from * phases.length);
  const [left, top] = [column * lattice.across.cells, row * lattice.down.cells];
  for (let i = 0; i < phases.length; i += 1) {
    const phase = phases[(start + i) % phases.length];
    if (phase && board.free(turned.raster, left + phase.x, top + phase.y)) {
      return { turned, group, column, row, x: left + phase.x, y: top + phase.y };
    }
  }
  return undefined;
}

/**
 * Where a piece takes the fewest sheets more, hollows of other pieces included; among equals by lot. No
 * answer where it fits nowhere.
 */
export function bestPlace(
  table: Table,
  ways: readonly Turned[],
  lot: () => number,
): Laid | undefined {
  const draw = table.field.asLong ? () => 0 : lot;
  const { wish, last, count, before } = wishes(table, ways);
  for (let price = 0; price < last.length; price += 1) {
    const equal = count[price] ?? 0;
    const end = last[price] ?? -1;
    let at = end;
    for (let skipped = Math.floor(draw() * equal); skipped > 0; skipped -= 1) at = before[at] ?? -1;
    for (let i = 0; i < equal; i += 1) {
      const wanted = wish(at);
      const laid = wanted && place(table, wanted, draw());
      if (laid) return laid;
      at = before[at] ?? -1;
      if (at < 0) at = end;
    }
  }
  return undefined;
}
