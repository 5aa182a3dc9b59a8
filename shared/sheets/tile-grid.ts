import type { Paper } from './papers.ts';

/** What home printers leave white round a sheet, and what neighbouring sheets share, mm. */
export const printerMargin = 10;
export const overlap = 10;

/** Sheets side by side and below one another over a drawing; mm. */
export type TileGrid = {
  /** Printed area of one sheet. */
  readonly use: { readonly width: number; readonly height: number };
  /** From one sheet's left (top) edge to the next one's. */
  readonly step: { readonly x: number; readonly y: number };
  readonly rows: number;
  readonly columns: number;
};

/** How many printed areas of length `use`, sharing `overlap`, cover a length; mm, at least one. */
export const tilesAlong = (length: number, use: number): number =>
  Math.max(1, Math.ceil((length - overlap) / (use - overlap) - 1e-9));

/** The sheets of a paper that cover a drawing of this size, blank ones counted. */
export function tileGrid(
  drawing: { readonly width: number; readonly height: number },
  paper: Paper,
): TileGrid {
  const use = {
    width: paper.width - 2 * printerMargin,
    height: paper.height - 2 * printerMargin,
  };
  return {
    use,
    step: { x: use.width - overlap, y: use.height - overlap },
    rows: tilesAlong(drawing.height, use.height),
    columns: tilesAlong(drawing.width, use.width),
  };
}
