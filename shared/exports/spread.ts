import type { FinishedPiece, Side } from '../drafting/piece.ts';
import { flatten } from '../geometry/curve.ts';
import { type Point, point } from '../geometry/point.ts';
import { type Box, boxOf } from '../sheets/layout.ts';

/** A piece and the shift that lays it on the table. */
export type SpreadPiece = { readonly piece: FinishedPiece; readonly translate: Point };

/** The pieces side by side on a table whose top left corner is 0, 0; mm. */
export type Spread = {
  readonly placed: readonly SpreadPiece[];
  readonly width: number;
  readonly height: number;
};

/** Between pieces, and round all of them, mm. */
const gap = 40;
const border = 20;

type Boxed = { readonly piece: FinishedPiece; readonly box: Box };

const rightOf = ({ box }: Boxed): number => box.x + box.width;
const footOf = ({ box }: Boxed): number => box.y + box.height;

/** One half of the body: its top pieces in a row, its middle under them on the same centre line. */
function column(pieces: readonly Boxed[], side: Side, left: number, lift: number): SpreadPiece[] {
  const own = pieces.filter(({ piece }) => piece.side === side);
  const middles = own.filter(({ piece }) => piece.part === 'middle');
  const tops = own.filter(({ piece }) => piece.part === 'top');
  const onCentre = [...middles.slice(0, 1), ...tops.slice(0, 1)];
  const centre = left - Math.min(...onCentre.map(({ box }) => box.x));
  return [
    { row: tops, y: -lift },
    { row: middles, y: 0 },
  ].flatMap(({ row, y }) => {
    let x = centre;
    return row.map((each, index) => {
      const before = row[index - 1];
      if (before) x += rightOf(before) + gap - each.box.x;
      return { piece: each.piece, translate: point(x, y) };
    });
  });
}

/** What belongs to no half in columns as high as the rest of the gown, or as the highest of them. */
function columnsBeside(
  others: readonly Boxed[],
  left: number,
  top: number,
  height: number,
): SpreadPiece[] {
  const high = Math.max(height, ...others.map(({ box }) => box.height));
  let [x, y, right] = [left, top, left];
  return others.map((each) => {
    if (y > top && y + each.box.height > top + high) [x, y] = [right + gap, top];
    const translate = point(x - each.box.x, y - each.box.y);
    y += each.box.height + gap;
    right = Math.max(right, x + each.box.width);
    return { piece: each.piece, translate };
  });
}

/** The smallest box round pieces where they lie. */
function round(placed: readonly SpreadPiece[], boxes: ReadonlyMap<FinishedPiece, Box>): Box {
  return boxOf(
    placed.flatMap(({ piece, translate }) => {
      const box = boxes.get(piece);
      if (!box) return [];
      const corner = point(box.x + translate.x, box.y + translate.y);
      return [corner, point(corner.x + box.width, corner.y + box.height)];
    }),
  );
}

/**
 * How the pieces of a draft lie beside each other on the drafting table and in the SVG: front, back,
 * then flares, bands and what lies inside; tops lifted off their middles, every level at one height across front and back. The
 * same pieces always lie the same way.
 */
export function spread(pieces: readonly FinishedPiece[]): Spread {
  const boxed = pieces.map((piece) => ({ piece, box: boxOf(flatten(piece.cutLine, 0.5)) }));
  const boxes = new Map(boxed.map(({ piece, box }) => [piece, box]));
  const tops = boxed.filter(({ piece }) => piece.part === 'top');
  const middles = boxed.filter(({ piece }) => piece.part === 'middle');
  const others = (['flare', 'sleeve', 'inner'] as const).flatMap((part) =>
    boxed.filter(({ piece }) => piece.part === part),
  );
  const overlap =
    tops.length > 0 && middles.length > 0
      ? Math.max(...tops.map(footOf)) - Math.min(...middles.map(({ box }) => box.y)) + gap
      : 0;
  const lift = Math.max(0, overlap);
  const placed: SpreadPiece[] = [];
  for (const side of ['front', 'back'] as const) {
    const left = placed.length > 0 ? rightEdge(round(placed, boxes)) + gap : 0;
    placed.push(...column([...tops, ...middles], side, left, lift));
  }
  const bodies = round(placed, boxes);
  const left = placed.length > 0 ? rightEdge(bodies) + gap : 0;
  placed.push(...columnsBeside(others, left, bodies.y, bodies.height));
  const all = round(placed, boxes);
  return {
    placed: placed.map(({ piece, translate }) => ({
      piece,
      translate: point(translate.x - all.x + border, translate.y - all.y + border),
    })),
    width: all.width + 2 * border,
    height: all.height + 2 * border,
  };
}

const rightEdge = (box: Box): number => box.x + box.width;
