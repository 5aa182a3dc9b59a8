import type { Piece } from '../drafting/piece.ts';
import { flatten } from '../geometry/curve.ts';
import type { Path } from '../geometry/path.ts';
import { type Point, add, scale, subtract, turnRight, unit } from '../geometry/point.ts';

/** A stretch of x, mm, that nothing crosses. */
export type Span = { readonly left: number; readonly right: number };

/** The free stretches of a piece at evenly spaced heights, from its top down. */
export type FreeRows = {
  readonly top: number;
  readonly spacing: number;
  readonly rows: readonly (readonly Span[])[];
};

/** A free rectangle in which lettering may stand. */
export type FreePlace = Span & { readonly top: number };

const rowsAtMost = 32;
const leastSpacing = 5;
/** Kept clear of the outline and of darts, grain line and drill points, mm. */
const clearOfOutline = 9;
const clearOfMarks = 3;
/** Room a fold bracket and its words take beside the fold, and a drill point round itself, mm. */
const foldBracket = 18;
const drillMark = 3;

type Chain = readonly Point[];

/** Seams between sheets of paper that a label is not to lie across: upright and level lines, mm. */
export type PaperSeams = { readonly x: readonly number[]; readonly y: readonly number[] };

/** Kept clear of a seam between sheets on either side, mm. */
const clearOfSeams = 2;

/** Evenly spaced heights, mm. */
type Heights = { readonly top: number; readonly spacing: number; readonly count: number };

/** Visits every place where a closed chain of points crosses one of the heights. */
function cross(chain: Chain, heights: Heights, visit: (row: number, x: number) => void): void {
  const { top, spacing, count } = heights;
  let before = chain.at(-1);
  for (const p of chain) {
    if (before && before.y !== p.y) {
      const [upper, lower] = before.y < p.y ? [before, p] : [p, before];
      const slope = (lower.x - upper.x) / (lower.y - upper.y);
      const first = Math.max(0, Math.ceil((upper.y - top) / spacing - 0.5));
      const last = Math.min(count - 1, Math.ceil((lower.y - top) / spacing - 0.5) - 1);
      for (let row = first; row <= last; row += 1) {
        visit(row, upper.x + (top + (row + 0.5) * spacing - upper.y) * slope);
      }
    }
    before = p;
  }
}

/** The free stretches of each row inside a closed chain. */
function insideOf(outline: Chain, heights: Heights, clear: number): (readonly Span[])[] {
  const met: number[][] = Array.from({ length: heights.count }, () => []);
  cross(outline, heights, (row, x) => met[row]?.push(x));
  return met.map((row) => {
    row.sort((a, b) => a - b);
    const spans: Span[] = [];
    for (let i = 1; i < row.length; i += 2) {
      const left = (row[i - 1] ?? 0) + clear;
      const right = (row[i] ?? 0) - clear;
      if (right > left) spans.push({ left, right });
    }
    return spans;
  });
}

function without(spans: readonly Span[], left: number, right: number): readonly Span[] {
  const kept: Span[] = [];
  for (const span of spans) {
    if (span.right <= left || span.left >= right) kept.push(span);
    else {
      if (left - span.left > 1) kept.push({ left: span.left, right: left });
      if (span.right - right > 1) kept.push({ left: right, right: span.right });
    }
  }
  return kept;
}

/** Takes a mark's width, and a little on either side, out of the rows it crosses. */
function takeOut(rows: (readonly Span[])[], mark: Chain, heights: Heights): void {
  const left: number[] = [];
  const right: number[] = [];
  cross(mark, heights, (row, x) => {
    left[row] = Math.min(left[row] ?? x, x);
    right[row] = Math.max(right[row] ?? x, x);
  });
  left.forEach((x, row) => {
    rows[row] = without(rows[row] ?? [], x - clearOfMarks, (right[row] ?? x) + clearOfMarks);
  });
}

const chainOf = (paths: readonly Path[]): Chain => paths.flatMap((path) => flatten(path, 2));

/** A straight mark as a thin chain there and back, so that it crosses a height like any outline. */
function strip(from: Point, to: Point, left: number, right: number): Chain {
  const across = turnRight(unit(subtract(to, from)));
  const shifted = (p: Point, by: number): Point => add(p, scale(across, by));
  return [shifted(from, -left), shifted(to, -left), shifted(to, right), shifted(from, right)];
}

/** What lettering keeps clear of: lines inside a piece, darts, the grain line and its word, fold brackets, drill points. */
function marks(piece: Piece, scale: number): readonly Chain[] {
  const darts = piece.darts.map((dart) => [
    ...flatten(dart.centreLeg, 2),
    ...flatten(dart.sideLeg, 2).toReversed(),
  ]);
  const folds = piece.edges.flatMap(({ kind, path }) => {
    const [from, to] = [path[0]?.from, path.at(-1)?.to];
    return kind === 'fold' && from && to ? [strip(from, to, 0, foldBracket * scale)] : [];
  });
  const drills = piece.drills.map(({ x, y }) =>
    strip({ x, y: y - drillMark }, { x, y: y + drillMark }, drillMark, drillMark),
  );
  const inner = (piece.lines ?? []).flatMap(({ path }) => {
    const [from, to] = [path[0]?.from, path.at(-1)?.to];
    return from && to ? [strip(from, to, 0.5, 0.5)] : [];
  });
  return [
    ...inner,
    ...darts,
    ...folds,
    strip(piece.grain.from, piece.grain.to, 4 * scale, 4 * scale),
    ...drills,
  ];
}

/** Takes seams between sheets out of the rows. */
function partAtSeams(
  rows: (readonly Span[])[],
  seams: PaperSeams,
  { top, spacing }: Heights,
): void {
  rows.forEach((spans, row) => {
    const middle = top + (row + 0.5) * spacing;
    const near = spacing / 2 + clearOfSeams;
    rows[row] = seams.y.some((y) => Math.abs(y - middle) < near)
      ? []
      : seams.x.reduce<readonly Span[]>(
          (left, x) => without(left, x - clearOfSeams, x + clearOfSeams),
          spans,
        );
  });
}

/**
 * The stretches at evenly spaced heights that lie inside the finished outline and clear of its marks;
 * printed at `scale`, on sheets whose `seams` part them.
 */
export function freeRows(piece: Piece, seams?: PaperSeams, scale = 1): FreeRows {
  const outline = chainOf(piece.edges.map((edge) => edge.path));
  let top = Infinity;
  let foot = -Infinity;
  for (const { y } of outline) {
    if (y < top) top = y;
    if (y > foot) foot = y;
  }
  const spacing = Math.max(leastSpacing * scale, (foot - top) / rowsAtMost);
  const heights = { top, spacing, count: Math.max(0, Math.floor((foot - top) / spacing)) };
  const rows = insideOf(outline, heights, clearOfOutline * scale);
  for (const mark of marks(piece, Math.max(scale, 0.6))) takeOut(rows, mark, heights);
  if (seams) partAtSeams(rows, seams, heights);
  return { top, spacing, rows };
}

function overlap(a: readonly Span[], b: readonly Span[]): readonly Span[] {
  const both: Span[] = [];
  for (const one of a) {
    for (const other of b) {
      const left = Math.max(one.left, other.left);
      const right = Math.min(one.right, other.right);
      if (right > left) both.push({ left, right });
    }
  }
  return both;
}

const widest = (spans: readonly Span[]): Span | undefined =>
  spans.reduce<Span | undefined>(
    (best, span) => (best && best.right - best.left >= span.right - span.left ? best : span),
    undefined,
  );

/** The widest stretch free over a whole block of rows, if it is wider than `least`. */
function freeOver(
  rows: FreeRows['rows'],
  start: number,
  count: number,
  least: number,
): Span | undefined {
  let spans = rows[start] ?? [];
  for (let row = start; row < start + count; row += 1) {
    if (row > start) spans = overlap(spans, rows[row] ?? []);
    if (!spans.some((span) => span.right - span.left >= least)) return undefined;
  }
  return widest(spans);
}

/**
 * The free place for a block of the given width and height, mm, nearest to two fifths of the way
 * down the piece; no answer where it fits nowhere.
 */
export function freePlace(free: FreeRows, width: number, height: number): FreePlace | undefined {
  const window = Math.ceil(height / free.spacing) + 1;
  const last = free.rows.length - window;
  const aim = Math.max(0, Math.min(last, Math.round(0.4 * free.rows.length - window / 2)));
  for (let away = 0; away <= last; away += 1) {
    for (const start of away === 0 ? [aim] : [aim - away, aim + away]) {
      if (start < 0 || start > last) continue;
      const span = freeOver(free.rows, start, window, width);
      if (span) return { ...span, top: free.top + (start + 0.5) * free.spacing };
    }
  }
  return undefined;
}
