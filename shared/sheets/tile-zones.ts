/**
 * Sheets share strips with their neighbours, so along each axis the drawing falls into zones: 2k is the
 * strip between sheets k - 1 and k, 2k + 1 what sheet k alone shows.
 */
export type Stride = { readonly step: number; readonly overlap: number };

/** The zone of a place along an axis; mm. */
export function zoneAt(place: number, { step, overlap }: Stride): number {
  const sheet = Math.floor(place / step);
  return 2 * sheet + (place - sheet * step <= overlap ? 0 : 1);
}

/** A sheet by its column and row. */
export type Cell = { readonly column: number; readonly row: number };

/** Sheets that a piece may lie across; wider ones would be fifteen sheets either way, and nobody's to glue. */
export const mostAcross = 14;

const wide = 4096;

/** Column and row of a zone as one number. */
export const zoneKey = (x: number, y: number): number => y * wide + x;
const zoneOf = (key: number): readonly [number, number] => [key % wide, Math.floor(key / wide)];

/** A sheet's key is its column and row packed the same way. */
const sheetKey = zoneKey;

const odd = (zone: number): boolean => zone % 2 === 1;

/** The sheets that show a zone, from the top left: one, two where a strip is shared, four at a corner. */
function sheetsAt(x: number, y: number): readonly number[] {
  const [column, row] = [x >> 1, y >> 1];
  const columns = odd(x) || column === 0 ? [column] : [column - 1, column];
  const rows = odd(y) || row === 0 ? [row] : [row - 1, row];
  return rows.flatMap((each) => columns.map((one) => sheetKey(one, each)));
}

/** Two sheets that hang together at a corner only get a third: nothing would hold the glue. */
function joinAtCorner(chosen: Set<number>, x: number, y: number): void {
  const [right, below] = [x >> 1, y >> 1];
  if (right === 0 || below === 0) return;
  const aboveLeft = chosen.has(sheetKey(right - 1, below - 1));
  const aboveRight = chosen.has(sheetKey(right, below - 1));
  const belowLeft = chosen.has(sheetKey(right - 1, below));
  const belowRight = chosen.has(sheetKey(right, below));
  if (aboveLeft && belowRight && !aboveRight && !belowLeft) chosen.add(sheetKey(right, below - 1));
  if (aboveRight && belowLeft && !aboveLeft && !belowRight) chosen.add(sheetKey(right, below));
}

/**
 * The sheets that show one piece: those that alone show some of it; for a strip that none of these shows,
 * one of the sheets that share it, rather one of `already`, which are printed for other pieces; and no two
 * that hang together at a corner only. Zones from 0; sheets row by row.
 */
export function sheetsShowing(
  zones: Iterable<number>,
  already: ReadonlySet<number>,
): readonly Cell[] {
  const chosen = new Set<number>();
  const strips: number[] = [];
  const corners: number[] = [];
  for (const key of zones) {
    const [x, y] = zoneOf(key);
    if (odd(x) && odd(y)) chosen.add(sheetKey(x >> 1, y >> 1));
    else (odd(x) || odd(y) ? strips : corners).push(key);
  }
  for (const key of [...strips, ...corners]) {
    const [x, y] = zoneOf(key);
    const able = sheetsAt(x, y);
    if (able.some((each) => chosen.has(each))) continue;
    const pick = able.find((each) => already.has(each)) ?? able[0];
    if (pick !== undefined) chosen.add(pick);
  }
  for (const key of corners) joinAtCorner(chosen, ...zoneOf(key));
  return [...chosen]
    .sort((a, b) => a - b)
    .map((key) => ({ column: key % wide, row: Math.floor(key / wide) }));
}
