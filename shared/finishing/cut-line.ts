import type { HouseRules } from '../drafting/house-rules.ts';
import type { Edge, Piece } from '../drafting/piece.ts';
import { clearLoops, crossesItself } from '../geometry/clear-loops.ts';
import {
  type Joined,
  type Run,
  endAtLine,
  joinAtFold,
  joinRuns,
  lines,
  startAtLine,
} from '../geometry/corner.ts';
import { endTangent, startTangent } from '../geometry/curve.ts';
import { parallel, withoutSpecks } from '../geometry/offset.ts';
import { type Path, type Segment, line } from '../geometry/path.ts';
import {
  type Point,
  add,
  cross,
  distance,
  dot,
  scale,
  subtract,
  turnLeft,
  unit,
} from '../geometry/point.ts';
import { allowanceOf, pressedOpen } from './allowance.ts';
import { dartCap } from './dart-cap.ts';

/** Inner angles wider than 98 and narrower than 140 degrees have their allowance end mirrored. */
const leastMirrored = (40 * Math.PI) / 180;
const mostMirrored = (82 * Math.PI) / 180;

/** A corner at a fold sharper than 54 degrees is half of one across it, radians of turn. */
const leastAtFold = 2.2;

/** Ends no farther apart than this are one point: a tenth of a hair, mm. */
const joint = 0.01;

type Corner = { readonly a: Run; readonly b: Run; readonly at: Point };

/**
 * The end of an allowance that is folded back along the first edge, cut as the second edge's cutting
 * line shows through the fold, so that it reaches that line again when pressed open.
 */
function mirroredEnd({ a, b, at }: Corner, turn: number): Joined | undefined {
  const after = startAtLine(b, at, at, a.along);
  const valley = after?.[0]?.from;
  if (!after || !valley) return undefined;
  const tip = add(
    valley,
    add(scale(a.along, a.distance / Math.tan(turn)), scale(turnLeft(a.along), a.distance)),
  );
  const end = add(at, scale(turnLeft(a.along), a.distance));
  return { before: a.path, between: lines([end, tip, valley]), after, folded: false };
}

/** The same at the start of the second edge, when that is the one folded back. */
function mirroredStart({ a, b, at }: Corner, turn: number): Joined | undefined {
  const before = endAtLine(a, at, at, b.along);
  const valley = before?.at(-1)?.to;
  if (!before || !valley) return undefined;
  const tip = add(
    valley,
    add(scale(b.along, -b.distance / Math.tan(turn)), scale(turnLeft(b.along), b.distance)),
  );
  const start = add(at, scale(turnLeft(b.along), b.distance));
  return { before, between: lines([valley, tip, start]), after: b.path, folded: false };
}

/** A corner of the piece: mitred, squared, or mirrored where an allowance is folded back over it. */
function turnCorner(corner: Corner, first: Edge, second: Edge): Joined {
  const { a, b, at } = corner;
  const turn = Math.atan2(cross(a.along, b.along), dot(a.along, b.along));
  const folds = [first, second].map((edge) => edge.kind === 'hem' || pressedOpen(edge));
  if (
    turn > leastMirrored &&
    turn < mostMirrored &&
    first.kind !== 'fold' &&
    second.kind !== 'fold'
  ) {
    // A hem is turned up after the seams that run into it, so there the hem is the fold.
    const firstFolds = folds[0] && second.kind !== 'hem' && !(folds[1] && first.kind !== 'hem');
    const secondFolds = folds[1] && first.kind !== 'hem' && !(folds[0] && second.kind !== 'hem');
    const joined = firstFolds
      ? mirroredEnd(corner, turn)
      : secondFolds
        ? mirroredStart(corner, turn)
        : undefined;
    if (joined) return joined;
  }
  const oneFold = (first.kind === 'fold') !== (second.kind === 'fold');
  return oneFold && turn > leastAtFold ? joinAtFold(a, b, at) : joinRuns(a, b, at);
}

const endOf = (path: Path): Point | undefined => path.at(-1)?.to;

/** Adds a stretch to an outline; a straight one that runs on lengthens the one before it. */
function append(outline: Segment[], segment: Segment): void {
  const last = outline.at(-1);
  if (last?.kind === 'line' && segment.kind === 'line') {
    const along = unit(subtract(last.to, last.from));
    const ahead = subtract(segment.to, last.from);
    if (Math.abs(cross(along, ahead)) < 1e-6 && dot(along, subtract(segment.to, last.to)) > 0) {
      outline[outline.length - 1] = line(last.from, segment.to);
      return;
    }
  }
  outline.push(segment);
}

/**
 * Lays stretches end to end: gaps are bridged with straight pieces, and what rounding leaves between
 * two stretches is closed, so that no line laid through a joint slips between them.
 */
function closed(parts: readonly Path[]): Path {
  const outline: Segment[] = [];
  for (const segment of parts.flat()) {
    const last = outline.at(-1)?.to ?? segment.from;
    if (distance(last, segment.from) > joint) append(outline, line(last, segment.from));
    append(outline, { ...segment, from: outline.at(-1)?.to ?? segment.from });
  }
  const [start, end] = [outline[0]?.from, outline.at(-1)];
  if (start && end) {
    if (distance(end.to, start) > joint) append(outline, line(end.to, start));
    const last = outline.length - 1;
    const closing = outline[last];
    if (closing) outline[last] = { ...closing, to: start };
  }
  return outline;
}

/**
 * The closed cutting line of a piece, clockwise: every edge moved out by its allowance, corners
 * mitred, mirrored or squared, dart mouths capped. Where it would fold over itself the loops are
 * cleared away.
 */
export function cutLine(piece: Piece, rules: HouseRules): Path {
  const count = piece.edges.length;
  const own = piece.edges.map((edge) => allowanceOf(edge, rules));
  const reach = piece.edges.map((edge, index) =>
    edge.kind === 'mouth'
      ? Math.max(own[(index + count - 1) % count] ?? 0, own[(index + 1) % count] ?? 0)
      : (own[index] ?? 0),
  );
  const seams = piece.edges.map((edge) => withoutSpecks(edge.path));
  const sides = seams.map((seam, index) => parallel(seam, reach[index] ?? 0));
  const runs = sides.map((side) => side.path);
  const bridges: Path[] = piece.edges.map(() => []);
  const runAt = (index: number, end: 'start' | 'end'): Run => ({
    path: runs[index] ?? [],
    distance: reach[index] ?? 0,
    along: (end === 'start' ? startTangent : endTangent)(seams[index] ?? []),
  });

  const capped = new Set<number>();
  for (const [index, edge] of piece.edges.entries()) {
    const dart = edge.open ? piece.darts.find((each) => each.mouth === edge.name) : undefined;
    if (!dart) continue;
    const last = (index + count - 1) % count;
    const next = (index + 1) % count;
    const cap = dartCap(edge, dart, runAt(last, 'end'), runAt(next, 'start'));
    if (!cap) continue;
    [runs[last], runs[index], runs[next]] = [cap.before, cap.cap, cap.after];
    capped.add(index);
  }

  let folded = sides.some((side) => side.folded);
  for (const [index, edge] of piece.edges.entries()) {
    const next = (index + 1) % count;
    const following = piece.edges[next];
    const at = endOf(edge.path);
    if (!following || !at || capped.has(index) || capped.has(next)) continue;
    const corner = { a: runAt(index, 'end'), b: runAt(next, 'start'), at };
    const joined = turnCorner(corner, edge, following);
    if (joined.folded) folded = true;
    [runs[index], bridges[index], runs[next]] = [joined.before, joined.between, joined.after];
  }

  const outline = closed(runs.flatMap((run, index) => [run, bridges[index] ?? []]));
  return folded || crossesItself(outline) ? clearLoops(outline) : outline;
}
