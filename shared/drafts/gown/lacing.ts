import { DraftingError } from '../../drafting/drafting-error.ts';
import { edge, notchAtHeight } from '../../drafting/outline.ts';
import type { Edge, InnerLine, LevelLine, LevelName, Piece } from '../../drafting/piece.ts';
import {
  endOf,
  flatten,
  pathCrossings,
  pathLength,
  pointAt,
  reverse,
  splitPath,
  startOf,
  stationAtLength,
} from '../../geometry/curve.ts';
import { type Path, type Segment, line } from '../../geometry/path.ts';
import { type Point, point } from '../../geometry/point.ts';
import { type Profile, cubicProfile, profilePath, xAt } from '../../geometry/profile.ts';
import { mm, said } from '../../units/said.ts';
import { type Closed, isBody, isCentreBack } from './zips.ts';

/** The centre back edges stand apart by this from the top edge to the waist (common practice, no source). */
const lacingGap = 50;
/** On a narrow back they stand nearer, but not nearer than this: less could not be drawn in (our rule). */
const leastGap = 20;
/** Eyelets stand this far in from the edge, and as far apart as this or a little less (common practice, no source). */
const eyeletsIn = 15;
const eyeletsApart = 25;
/** First and last eyelet lie this far from the ends. */
const eyeletEnds = 10;
/** A bone lies on each side of the eyelets, this far from the edge. */
const bonesIn = [6, 24] as const;
/** The panel behind reaches this far under each edge, and below the lacing. */
const underlap = 50;
const below = 30;

/** A lacing: half its gap, its top and where it ends; the gap is whole down to the waist. */
type Lacing = {
  readonly half: number;
  readonly top: number;
  readonly waist: number;
  readonly end: number;
};

/** Half the gap by height: whole down to the waist, then closing smoothly to the end. */
const halfGap = ({ half, top, waist, end }: Lacing): Profile => [
  { from: top - 1000, to: waist, a: half, b: 0, c: 0, d: 0 },
  ...cubicProfile({ y: waist, x: half }, { y: end, x: 0 }, 0, 0),
];

const offAt = (lacing: Lacing, y: number): number =>
  y >= lacing.end ? 0 : xAt(halfGap(lacing), y);

/** The bone farther in needs a little cloth beside it before the next seam or dart (our rule). */
const leastCloth = bonesIn[1] + 4;
/** Curves are looked at by chords this near to them. */
const chord = 0.2;

/** A back whose seams or darts come so near the centre that nothing is left to lace. */
const noRoomForLacing = (): DraftingError =>
  new DraftingError([
    {
      code: 'no-room-for-lacing',
      severity: 'error',
      field: 'style.closure',
      with: ['style.shaping', 'card.underbustGirth'],
      said: said`A lacing stands at least ${mm(leastGap / 2)} off the centre back and needs ${mm(leastCloth)} of cloth beside it; the next seam or dart of the back comes nearer. Close the gown with a zip at the centre back.`,
    },
  ]);

/**
 * Half the gap on these back pieces, whole mm: the usual one, or as much as leaves the bones their cloth beside
 * the next seam or dart.
 * @throws DraftingError where not even the least gap does.
 */
function halfFor(pieces: readonly Piece[], { top, waist, end }: Omit<Lacing, 'half'>): number {
  const shape = { half: 1, top, waist, end };
  const rooms = pieces
    .flatMap(({ edges, darts }) => [
      ...edges.filter(({ name }) => /^(side|princess)\b/.test(name)).map(({ path }) => path),
      ...darts.map(({ centreLeg }) => centreLeg),
    ])
    .flatMap((path) => flatten(path, chord))
    .filter(({ y }) => y > top && y < end)
    .map(({ x, y }) => ({ room: x - leastCloth, open: offAt(shape, y) }))
    .filter(({ open }) => open > 0)
    .map(({ room, open }) => room / open);
  const half = Math.floor(Math.min(lacingGap / 2, ...rooms));
  if (half < leastGap / 2) throw noRoomForLacing();
  return half;
}

/** An edge that meets the centre line at one end, cut where it meets the lacing's edge. */
function trimmed(path: Path, off: number, end: 'start' | 'end'): Path {
  const reaches = ({ from, to }: Segment): boolean => (from.x - off) * (to.x - off) <= 0;
  const index = end === 'start' ? path.findIndex(reaches) : path.findLastIndex(reaches);
  const segment = path[index];
  if (!segment) throw noRoomForLacing();
  // Halved until it is met: a seam that runs nearly level is nearly a line, whose cubic roots are lost in rounding.
  let [low, high] = [0, 1];
  const outwards = segment.to.x > segment.from.x;
  for (let i = 0; i < 60; i += 1) {
    const t = (low + high) / 2;
    if (pointAt(segment, t).x < off === outwards) low = t;
    else high = t;
  }
  const station = { index, t: low };
  const [before, after] = splitPath(path, station);
  return end === 'start' ? after : before;
}

/** How far a level's end stands off the centre line: where the level, which may slant, meets the lacing's edge. */
function offOn({ from, to }: LevelLine, lacing: Lacing): number {
  const slant = (to.y - from.y) / (to.x - from.x);
  let off = offAt(lacing, from.y);
  for (let i = 0; i < 20; i += 1) off = offAt(lacing, from.y + slant * off);
  return off;
}

function trimmedLevel(level: LevelLine, lacing: Lacing): LevelLine {
  const { from, to } = level;
  const off = offOn(level, lacing);
  if (Math.abs(from.x) > 1e-6 || off === 0) return level;
  return { ...level, from: point(off, from.y + ((to.y - from.y) * off) / (to.x - from.x)) };
}

type Laced = { readonly piece: Piece; readonly edge: Edge };

/** A back piece at the centre, its edge moved off the centre line as far as the lacing goes. */
function lacedPiece(piece: Piece, centre: Edge, lacing: Lacing): Laced | undefined {
  const index = piece.edges.indexOf(centre);
  const before = piece.edges.at(index - 1);
  const after = piece.edges[(index + 1) % piece.edges.length];
  const foot = startOf(centre.path);
  if (!before || !after || !foot) return undefined;
  const trimmedAfter = trimmed(after.path, lacing.half, 'start');
  const top = startOf(trimmedAfter);
  if (!top) return undefined;
  const whole = foot.y <= lacing.end;
  const trimmedBefore = whole ? trimmed(before.path, offAt(lacing, foot.y), 'end') : before.path;
  const low = whole ? (endOf(trimmedBefore) ?? foot) : point(0, lacing.end);
  const laced = edge('lacing', 'zip', upwards(lacing, top, low));
  const met = pathCrossings(centre.path, point(0, lacing.end), point(1, lacing.end))[0];
  const seam: readonly Edge[] =
    whole || !met ? [] : [{ ...centre, path: splitPath(centre.path, met)[0] }];
  const own = whole ? laced : { ...laced, corner: 180 };
  const edges = piece.edges.flatMap((each): readonly Edge[] =>
    each === centre
      ? [...seam, own]
      : each === after
        ? [{ ...each, path: trimmedAfter }]
        : each === before
          ? [{ ...each, path: trimmedBefore }]
          : [each],
  );
  const notches = piece.notches
    .filter(({ name }) => name !== 'zip-end')
    .flatMap((notch) =>
      notch.edge === centre.name && notch.at.y < lacing.end
        ? notchAtHeight(notch.name, own, notch.at.y, notch.strokes)
        : [notch],
    );
  const marks = seam.flatMap((each) => notchAtHeight('lace-end', each, lacing.end, 2));
  return {
    edge: own,
    piece: {
      ...piece,
      edges,
      notches: [...notches, ...marks],
      levels: piece.levels.map((level) => trimmedLevel(level, lacing)),
      drills: [...piece.drills, ...eyelets(own)],
      lines: [...(piece.lines ?? []), ...bonesBeside(own)],
    },
  };
}

/** The lacing's edge from its foot up to the top. */
const upwards = (lacing: Lacing, top: Point, foot: Point): Path =>
  foot.y <= lacing.waist
    ? [line(foot, top)]
    : reverse([
        ...(top.y < lacing.waist ? [line(top, point(lacing.half, lacing.waist))] : []),
        ...profilePath(halfGap(lacing), Math.max(top.y, lacing.waist), foot.y),
      ]);

/** Eyelets at an even pitch beside an edge. */
function eyelets({ path }: Edge): readonly Point[] {
  const run = pathLength(path) - 2 * eyeletEnds;
  const count = Math.max(1, Math.ceil(run / eyeletsApart));
  return Array.from({ length: count + 1 }, (_, k) =>
    stationAtLength(path, eyeletEnds + (run * k) / count),
  ).flatMap((station) => (station ? [point(station.at.x + eyeletsIn, station.at.y)] : []));
}

const bonesBeside = ({ path }: Edge): readonly InnerLine[] =>
  bonesIn.map((off, k) => ({
    name: `bone-lacing-${k + 1}`,
    kind: 'boning',
    path: path.map((segment) =>
      segment.kind === 'line'
        ? line(beside(segment.from, off), beside(segment.to, off))
        : {
            ...segment,
            from: beside(segment.from, off),
            c1: beside(segment.c1, off),
            c2: beside(segment.c2, off),
            to: beside(segment.to, off),
          },
    ),
  }));

const beside = (at: Point, off: number): Point => point(at.x + off, at.y);

/** The panel that lies behind the lacing, half of it, on the fold. */
function modestyPanel({ half, top, end }: Lacing): Piece {
  const right = half + underlap;
  const foot = end + below;
  const corners = [point(0, top), point(right, top), point(right, foot), point(0, foot)] as const;
  const run = (from: Point, to: Point): Path => [line(from, to)];
  return {
    name: 'modesty-panel',
    title: 'Panel behind the lacing',
    side: 'back',
    part: 'inner',
    cut: 'cut 2 on fold',
    copies: 2,
    edges: [
      edge('top', 'seam', run(corners[0], corners[1])),
      edge('long', 'seam', run(corners[1], corners[2])),
      edge('foot', 'seam', run(corners[2], corners[3])),
      edge('centre', 'fold', run(corners[3], corners[0])),
    ],
    darts: [],
    levels: [],
    notches: [],
    grain: {
      from: point(right * 0.6, top + 0.2 * (foot - top)),
      to: point(right * 0.6, top + 0.8 * (foot - top)),
    },
    drills: [],
  };
}

/** What the lacing leaves open at a level, whole-body mm. */
export type Gaps = { readonly [L in LevelName]?: number };

function gapsOf(before: readonly Piece[], after: readonly Piece[], lacing: Lacing): Gaps {
  const gaps: { [L in LevelName]?: number } = {};
  for (const piece of before) {
    if (!piece.edges.some(isCentreBack) || !isBody(piece)) continue;
    for (const each of piece.levels) {
      const off = offOn(each, lacing);
      if (off > 0) gaps[each.level] = 2 * off;
    }
  }
  const seamOf = (pieces: readonly Piece[]): number =>
    pieces
      .filter(({ part, side }) => part === 'middle' && side === 'back')
      .flatMap(({ edges }) => edges.filter(({ name }) => name === 'waist-a'))
      .reduce((sum, { path }) => sum + pathLength(path), 0);
  const cutOff = seamOf(before) - seamOf(after);
  return cutOff === 0 ? gaps : { ...gaps, 'waist-seam': 2 * cutOff };
}

/** Laces the centre back from the top edge to a height, with a panel behind. */
export function laceBack(
  pieces: readonly Piece[],
  waist: number,
  end: number,
): Closed & { readonly gap: number; readonly gaps: Gaps; readonly eyelets: number } {
  const centres = pieces.filter((piece) => isBody(piece) && piece.edges.some(isCentreBack));
  const tops = centres
    .flatMap((piece) => piece.edges.filter(isCentreBack))
    .map(({ path }) => endOf(path)?.y ?? Infinity);
  const height = { top: Math.min(...tops), waist, end };
  const lacing = { half: halfFor(centres, height), ...height };
  const edges: Edge[] = [];
  let drills = 0;
  const laced = pieces.map((piece): Piece => {
    const centre = isBody(piece) ? piece.edges.find(isCentreBack) : undefined;
    const changed = centre && lacedPiece(piece, centre, lacing);
    if (!changed) return piece;
    edges.push(changed.edge);
    drills += eyelets(changed.edge).length;
    return changed.piece;
  });
  return {
    pieces: [...laced, modestyPanel(lacing)],
    gap: 2 * lacing.half,
    length: edges.reduce((sum, { path }) => sum + pathLength(path), 0),
    gaps: gapsOf(pieces, laced, lacing),
    eyelets: drills,
  };
}
