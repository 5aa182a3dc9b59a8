import { type Laid, type Table, clearTable, putDown } from './laying.ts';

/** Pieces that hang together by sheets they share. */
type Group = {
  readonly members: readonly number[];
  readonly column: number;
  readonly row: number;
  readonly columns: number;
  readonly rows: number;
  readonly sheets: ReadonlySet<number>;
};

const sheetsOf = ({ group, column, row }: Laid, columns: number): readonly number[] =>
  group.sheets.map((each) => (row + each.row) * columns + column + each.column);

/** Which pieces share sheets, directly or by others between them. */
function groupsOf(laid: readonly Laid[], columns: number): readonly Group[] {
  const left = new Map(laid.map((each, which) => [which, sheetsOf(each, columns)]));
  const groups: Group[] = [];
  for (const [first] of left) {
    const members = [first];
    const sheets = new Set(left.get(first));
    left.delete(first);
    for (let found = true; found;) {
      found = false;
      for (const [which, own] of left) {
        if (!own.some((each) => sheets.has(each))) continue;
        members.push(which);
        for (const each of own) sheets.add(each);
        left.delete(which);
        found = true;
      }
    }
    const across = [...sheets].map((each) => each % columns);
    const down = [...sheets].map((each) => Math.floor(each / columns));
    const [column, row] = [Math.min(...across), Math.min(...down)];
    groups.push({
      members,
      sheets,
      column,
      row,
      columns: Math.max(...across) - column + 1,
      rows: Math.max(...down) - row + 1,
    });
  }
  return groups.sort((a, b) => b.sheets.size - a.sheets.size);
}

/** A piece moved by whole sheets. */
const moved = (laid: Laid, columns: number, rows: number, { field }: Table): Laid => ({
  ...laid,
  column: laid.column + columns,
  row: laid.row + rows,
  x: laid.x + columns * field.lattice.across.cells,
  y: laid.y + rows * field.lattice.down.cells,
});

type Spread = { readonly columns: number; readonly rows: number };

/** Where a group goes so that all sheets together spread least over the table. */
function placeFor(table: Table, { members, ...group }: Group, laid: readonly Laid[], so: Spread) {
  const { field, used, board } = table;
  let best:
    { readonly columns: number; readonly rows: number; readonly spread: number } | undefined;
  for (let row = 0; row + group.rows <= field.rows && row <= so.rows; row += 1) {
    for (let column = 0; column + group.columns <= field.columns; column += 1) {
      const [columns, rows] = [column - group.column, row - group.row];
      const wide = Math.max(so.columns, column + group.columns) * field.lattice.across.step;
      const high = Math.max(so.rows, row + group.rows) * field.lattice.down.step;
      const spread = wide * high + wide + high;
      if (best && spread >= best.spread) continue;
      const by = rows * field.columns + columns;
      const free =
        [...group.sheets].every((each) => used[each + by] === 0) &&
        members.every((which) => {
          const there = laid[which];
          if (!there) return true;
          const { turned, x, y } = moved(there, columns, rows, table);
          return board.free(turned.raster, x, y);
        });
      if (free) best = { columns, rows, spread };
    }
  }
  return best;
}

/**
 * Pieces that share no sheet moved together by whole sheets, so that the plan is small and can be read;
 * nobody's sheets change but in name. Off a roll nothing moves.
 */
export function gathered(laid: readonly Laid[], { field }: Table): readonly Laid[] {
  if (field.asLong) return laid;
  const table = clearTable(field);
  const out = [...laid];
  let spread: Spread = { columns: 0, rows: 0 };
  for (const group of groupsOf(laid, field.columns)) {
    const place = placeFor(table, group, laid, spread);
    if (!place) return laid;
    for (const which of group.members) {
      const there = laid[which];
      if (!there) continue;
      const now = moved(there, place.columns, place.rows, table);
      out[which] = now;
      putDown(table, now);
    }
    spread = {
      columns: Math.max(spread.columns, group.column + place.columns + group.columns),
      rows: Math.max(spread.rows, group.row + place.rows + group.rows),
    };
  }
  return out;
}
