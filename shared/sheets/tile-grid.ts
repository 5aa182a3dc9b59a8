import type { Paper } from './papers.ts';
import { plainOrder } from './print-order.ts';

/** White that home printers leave round a sheet, mm, where no order says otherwise. */
export const printerMargin = plainOrder.margin;

/** What stays white round a sheet, and what neighbouring sheets share, mm. */
export type SheetEdges = { readonly margin: number; readonly overlap: number };

/** Sheets side by side and below one another over a drawing; mm. */
export type TileGrid = SheetEdges & {
  /** Printed area of one sheet. */
  readonly use: { readonly width: number; readonly height: number };
  /** From one sheet's left (top) edge to the next one's. */
  readonly step: { readonly x: number; readonly y: number };
  readonly rows: number;
  readonly columns: number;
};

/** The sheets of a paper that cover a drawing of this size, blank ones counted. */
export function tileGrid(
  drawing: { readonly width: number; readonly height: number },
  paper: Paper,
  { margin, overlap }: SheetEdges = plainOrder,
): TileGrid {
  const use = { width: paper.width - 2 * margin, height: paper.height - 2 * margin };
  const along = (length: number, area: number): number =>
    Math.max(1, Math.ceil((length - overlap) / (area - overlap) - 1e-9));
  return {
    margin,
    overlap,
    use,
    step: { x: use.width - overlap, y: use.height - overlap },
    rows: along(drawing.height, use.height),
    columns: along(drawing.width, use.width),
  };
}
