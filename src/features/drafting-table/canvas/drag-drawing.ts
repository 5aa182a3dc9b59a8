import { styleLabels } from '#shared/drafts/gown/style-labels.ts';
import { pathData } from '#shared/exports/path-data.ts';
import type { Path } from '#shared/geometry/path.ts';
import type { Point } from '#shared/geometry/point.ts';
import { formatLength } from '#shared/units/format-length.ts';

import type { Hold } from './drag-order.ts';
import { letterFamily } from './drag-typeface.ts';
import type { Placed } from './layout.ts';
import { toScreen } from './view.ts';

/** The canvas, cleared, and as large as the page shows it. */
export function cleared(
  canvas: OffscreenCanvas,
  { size, density }: Hold,
): OffscreenCanvasRenderingContext2D | undefined {
  const [width, height] = [size.width * density, size.height * density].map(Math.round);
  if (width === undefined || height === undefined) return undefined;
  // A canvas that is given a size, be it the same, has the page laid out anew.
  if (canvas.width !== width) canvas.width = width;
  if (canvas.height !== height) canvas.height = height;
  const pen = canvas.getContext('2d') ?? undefined;
  pen?.resetTransform();
  pen?.clearRect(0, 0, width, height);
  return pen;
}

type Pen = OffscreenCanvasRenderingContext2D;

/** The pieces in few lines, as they are looked at while a handle is dragged. */
export function drawPieces(pen: Pen, placed: readonly Placed[], hold: Hold): void {
  const { view, density, colours } = hold;
  const scale = view.scale * density;
  const stroke = (line: Path2D, colour: string, width: number, dash: readonly number[] = []) => {
    pen.strokeStyle = colour;
    pen.lineWidth = width / view.scale;
    pen.setLineDash(dash.map((each) => each / view.scale));
    pen.stroke(line);
  };
  for (const { piece, at } of placed) {
    const corner = toScreen(view, at);
    pen.setTransform(scale, 0, 0, scale, corner.x * density, corner.y * density);
    const outline = lineOf([piece.cutLine], true);
    pen.fillStyle = colours.paper;
    pen.fill(outline);
    stroke(outline, colours.ink, 1.4);
    stroke(lineOf(piece.edges.map(({ path }) => path)), colours.slate, 1, [5, 3]);
    const legs = piece.darts.flatMap(({ centreLeg, sideLeg }) => [centreLeg, sideLeg]);
    stroke(lineOf(legs), colours.slate, 0.8);
  }
}

/** The lozenge in the hand and what it stands for, at a place of the paper. */
export function drawHandle(pen: Pen, at: Point, value: number, hold: Hold): void {
  const { view, density, colours, key, unit } = hold;
  const { x, y } = toScreen(view, at);
  pen.setTransform(density, 0, 0, density, x * density, y * density);
  pen.setLineDash([]);
  pen.fillStyle = colours.brass;
  pen.fill(new Path2D('M0 -8L8 0L0 8L-8 0Z'));
  pen.font = `600 15px ${letterFamily()}`;
  pen.lineJoin = 'round';
  pen.lineWidth = 3;
  pen.strokeStyle = colours.paper;
  const words = `${styleLabels[key]} ${formatLength(value, unit)}`;
  pen.strokeText(words, 14, 5);
  pen.fillText(words, 14, 5);
}

const lineOf = (paths: readonly Path[], closed = false): Path2D =>
  new Path2D(paths.map((path) => pathData(path, closed)).join(''));
