import type { PartTable } from '../../drafting/drafting-table.ts';
import { edge, notchAtLength, to } from '../../drafting/outline.ts';
import type { Dart, Edge, Notch, Piece, Side } from '../../drafting/piece.ts';
import {
  endOf,
  lengthBefore,
  pathCrossings,
  pathLength,
  reverse,
  splitPath,
  startOf,
  startTangent,
  stationAtLength,
} from '../../geometry/curve.ts';
import { type Motion, layOn, movedPath, shift } from '../../geometry/motion.ts';
import { type Path, cubic, line } from '../../geometry/path.ts';
import { type Point, add, distance, point, scale, turnRight } from '../../geometry/point.ts';
import { mm, said } from '../../units/said.ts';

/** Depth at the centre and at the side (reference.md 3h, common practice: 50 to 70). */
const depth = 60;
/** Over each cup the facing is shorter than the edge it lies under (reference.md 3e, common practice: 3 to 6). */
const heldIn = 4;
/** An edge shorter than this is not held in. */
const leastHeld = 30;

type UpperEdge = { readonly piece: Piece; readonly edge: Edge };

/** A stretch of the upper edge between the centre, seams or darts, and the side; the lines beside it travelled down. */
type Strip = { readonly uppers: readonly UpperEdge[]; readonly left: Path; readonly right: Path };

const isUpper = ({ kind }: Edge): boolean => kind === 'top' || kind === 'armhole';

const legAt = (darts: readonly Dart[], mouth: Edge, at: Point | undefined): Path => {
  const dart = darts.find((each) => each.mouth === mouth.name);
  const legs = dart ? [dart.centreLeg, dart.sideLeg] : [];
  return legs.find((leg) => at && distance(startOf(leg) ?? at, at) < 1e-6) ?? [];
};

function stripsOf(piece: Piece): readonly Strip[] {
  const { edges, darts } = piece;
  const strips: Strip[] = [];
  edges.forEach((first, k) => {
    const before = edges.at(k - 1);
    if (!isUpper(first) || !before || isUpper(before)) return;
    const run: Edge[] = [];
    let next = k;
    for (;;) {
      const each = edges[next % edges.length];
      if (!each || !isUpper(each) || run.length === edges.length) break;
      run.push(each);
      next += 1;
    }
    const after = edges[next % edges.length];
    const end = endOf(run.at(-1)?.path ?? []);
    if (!after) return;
    strips.push({
      uppers: run.map((each) => ({ piece, edge: each })),
      left: before.open ? legAt(darts, before, startOf(first.path)) : reverse(before.path),
      right: after.open ? legAt(darts, after, end) : after.path,
    });
  });
  return strips;
}

/** The upper edge of a half with its seams and darts closed: each strip laid on the one before it. */
type Laid = { readonly upper: UpperEdge; readonly path: Path; readonly short: number };

function layTogether(
  strips: readonly Strip[],
  hold: boolean,
): { laid: readonly Laid[]; right: Path } {
  const laid: Laid[] = [];
  let right: Path = [];
  strips.forEach((strip, k) => {
    const end = endOf(laid.at(-1)?.path ?? []);
    const start = startOf(strip.left);
    const motion: Motion =
      k === 0 || !end || !start
        ? shift(0, 0)
        : layOn(start, startTangent(strip.left), end, startTangent(right));
    strip.uppers.forEach((upper, n) => {
      const path = movedPath(upper.edge.path, motion);
      const length = pathLength(path);
      const holds =
        hold && k === 0 && n === strip.uppers.length - 1 && strips.length > 1 && length > leastHeld;
      const station = holds ? stationAtLength(path, length - heldIn) : undefined;
      laid.push({
        upper,
        path: station ? splitPath(path, station)[0] : path,
        short: station ? heldIn : 0,
      });
    });
    right = movedPath(strip.right, motion);
  });
  return { laid, right };
}

const letters = 'abcdefgh';
const upperName = (laid: readonly Laid[], k: number): string =>
  laid.length === 1 ? 'top' : `top-${letters[k] ?? String(k)}`;

/** The free edge from the side back to the centre: square to both. */
function lowerEdge(from: Point, along: Point, until: Point): Path {
  const reach = 0.36 * distance(from, until);
  return [
    cubic(from, add(from, scale(turnRight(along), reach)), point(until.x + reach, until.y), until),
  ];
}

/** The marks of an upper edge, where they meet the facing's edge; what it is held in by is spread along it. */
function marksOn({ upper: { piece, edge: own } }: Laid, on: Edge | undefined): readonly Notch[] {
  if (!on) return [];
  const shrunk = pathLength(on.path) / pathLength(own.path);
  return piece.notches
    .filter((notch) => notch.edge === own.name)
    .flatMap(({ name, at, outward, strokes }) => {
      const station = pathCrossings(own.path, at, add(at, outward))
        .toSorted((a, b) => distance(a.at, at) - distance(b.at, at))
        .at(0);
      return station
        ? notchAtLength(name, on, lengthBefore(own.path, station) * shrunk, strokes)
        : [];
    });
}

const facingName = (side: Side): string => `facing-${side}`;

function facingOf(
  pieces: readonly Piece[],
  side: Side,
): { piece: Piece; laid: readonly Laid[] } | undefined {
  const tops = pieces.filter((piece) => piece.side === side && piece.part === 'top');
  const strips = tops
    .flatMap(stripsOf)
    .toSorted((a, b) => (startOf(a.left)?.x ?? 0) - (startOf(b.left)?.x ?? 0));
  const { laid, right } = layTogether(strips, side === 'front');
  const first = laid[0];
  const centreTop = startOf(first?.path ?? []);
  const foot = stationAtLength(right, Math.min(depth, pathLength(right) - 1));
  const centreOf = tops
    .flatMap(({ edges }) => edges)
    .find(({ path }) => {
      const end = endOf(path);
      return end && centreTop && distance(end, centreTop) < 1e-6;
    });
  if (!first || !centreTop || !foot) return undefined;
  const centreFoot = point(centreTop.x, centreTop.y + depth);
  const onFold = centreOf?.kind === 'fold';
  const name = facingName(side);
  const uppers = laid.map(({ upper, path, short }, k): Edge => {
    const free = upper.edge.joins === undefined;
    return {
      ...edge(
        upperName(laid, k),
        upper.edge.kind,
        path,
        free ? to(upper.piece.name, upper.edge.name) : undefined,
      ),
      ...(short === 0 ? {} : { ease: -short }),
      ...(k === 0 && upper.edge.corner !== undefined ? { corner: upper.edge.corner } : {}),
    };
  });
  const piece: Piece = {
    name,
    title: side === 'front' ? 'Front facing' : 'Back facing',
    side,
    part: 'inner',
    cut: onFold ? 'cut 1 on fold' : 'cut 2 (a pair)',
    copies: onFold ? 1 : 2,
    edges: [
      ...uppers,
      edge(
        'side',
        'side',
        splitPath(right, foot)[0],
        to(facingName(side === 'front' ? 'back' : 'front'), 'side'),
      ),
      edge('lower', 'facing', lowerEdge(foot.at, foot.tangent, centreFoot)),
      edge(
        'centre',
        onFold ? 'fold' : 'zip',
        [line(centreFoot, centreTop)],
        onFold || centreOf?.joins === undefined ? undefined : 'self',
      ),
    ],
    darts: [],
    levels: [],
    notches: laid.flatMap((each, k) => marksOn(each, uppers[k])),
    grain: {
      from: point(centreTop.x + 40, centreTop.y + 0.3 * depth),
      to: point(centreTop.x + 40, centreTop.y + 0.85 * depth),
    },
    drills: [],
  };
  return { piece, laid };
}

/** The gown's upper edges told what they are sewn to. */
function joinedTo(
  piece: Piece,
  facings: readonly { piece: Piece; laid: readonly Laid[] }[],
): Piece {
  const partner = (own: Edge): Edge => {
    for (const { piece: facing, laid } of facings) {
      const k = laid.findIndex(({ upper }) => upper.piece === piece && upper.edge === own);
      if (k >= 0 && own.joins === undefined)
        return { ...own, joins: to(facing.name, upperName(laid, k)) };
    }
    return own;
  };
  return { ...piece, edges: piece.edges.map(partner) };
}

/** Faces the upper edge: a facing a half, its seams and darts closed. */
export function faceGown(paper: PartTable, pieces: readonly Piece[]): readonly Piece[] {
  const facings = (['front', 'back'] as const).flatMap((side) => facingOf(pieces, side) ?? []);
  const held = facings.some(({ laid }) => laid.some(({ short }) => short > 0));
  const tapes = said`The edge is cut as long as the facing and not held in: the top line has no seam to take it from; stay it with tape cut ${mm(heldIn)} shorter over each cup.`;
  paper.draw(
    'Facing',
    said`Cut from the upper edge itself with its seams and darts closed, ${mm(depth)} deep at the centre and at the side. ${held ? said`Over each cup it is ${mm(heldIn)} shorter than the edge, which is eased onto it.` : tapes}`,
    {
      why: said`A facing that is a little short rolls the edge inwards and holds it against the body.`,
      lines: facings.flatMap(({ piece }) => piece.edges.map(({ path }) => path)),
      pieces: facings.map(({ piece }) => piece.name),
    },
  );
  return [...pieces.map((piece) => joinedTo(piece, facings)), ...facings.map(({ piece }) => piece)];
}
