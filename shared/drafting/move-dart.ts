import { endOf, pathCrossings, startOf } from '../geometry/curve.ts';
import { type Motion, moved, movedPath, turnAbout } from '../geometry/motion.ts';
import { line } from '../geometry/path.ts';
import { type Point, add, between, cross, distance, dot, subtract } from '../geometry/point.ts';
import { onDartAxis, reachOnAxis } from './dart-axis.ts';
import { turnedLevels } from './level-turned.ts';
import type { Dart, Edge, Notch, Piece } from './piece.ts';
import {
  type Stretch,
  cutStretch,
  lastSide,
  lettered,
  mergeStretches,
  seamOf,
  stretchesOf,
  withOutline,
} from './seam-stretches.ts';

/** Where a dart goes: so far along an edge, in the order of the outline, or into another dart at the same point. */
export type DartPlace = { readonly edge: string; readonly at: number } | { readonly dart: string };

const origin: Point = { x: 0, y: 0 };
const same = 1e-6;

/** The outline from behind the old mouth round to it, laid open at the new place. */
type Opened = { readonly after: readonly Stretch[]; readonly before: readonly Stretch[] };

function openAt(ring: readonly Stretch[], piece: Piece, to: DartPlace): Opened | undefined {
  const other = 'dart' in to ? piece.darts.find((each) => each.name === to.dart) : undefined;
  const name = 'edge' in to ? to.edge : other?.mouth;
  const index = ring.findIndex(({ edge }) => edge.name === name);
  const stretch = ring[index];
  if (!stretch) return undefined;
  if (!('edge' in to)) return { after: ring.slice(0, index), before: ring.slice(index + 1) };
  const cut = stretch.edge.open === true ? undefined : cutStretch(stretch, to.at);
  return (
    cut && {
      after: [...ring.slice(0, index), cut[0]],
      before: [cut[1], ...ring.slice(index + 1)],
    }
  );
}

const isCentre = ({ edge }: Stretch): boolean => edge.kind === 'fold' || edge.joins === 'self';

const turnedNotch = (notch: Notch, motion: Motion): Notch => ({
  ...notch,
  at: moved(notch.at, motion),
  outward: moved(notch.outward, { ...motion, dx: 0, dy: 0 }),
});

const turnedStretch = ({ edge, notches }: Stretch, motion: Motion): Stretch => ({
  edge: { ...edge, path: movedPath(edge.path, motion) },
  notches: notches.map((notch) => turnedNotch(notch, motion)),
});

const turnedDart = (dart: Dart, motion: Motion): Dart => ({
  ...dart,
  centreLeg: movedPath(dart.centreLeg, motion),
  sideLeg: movedPath(dart.sideLeg, motion),
});

/** Whether a place lies on one of these edges. */
function liesOn(outline: readonly Stretch[], at: Point): boolean {
  return outline.some(({ edge }) =>
    [add(at, { x: 1, y: 0 }), add(at, { x: 0, y: 1 })].some((aside) =>
      pathCrossings(edge.path, at, aside).some((station) => distance(station.at, at) < 1e-3),
    ),
  );
}

/** Drill points as they lie on the darts of another drawing of the piece. */
const drillsOn = (before: Piece, darts: readonly Dart[]): readonly Point[] =>
  before.drills.flatMap((drill) => {
    const own = before.darts.find((dart) => reachOnAxis(dart, drill) !== undefined);
    if (!own) return [drill];
    const now = darts.find((dart) => dart.name === own.name);
    return now ? onDartAxis(now, reachOnAxis(own, drill) ?? 0) : [];
  });

/** The outline begun again behind its centre edge, as every piece is listed. */
function fromCentre(ring: readonly Stretch[]): readonly Stretch[] {
  const centre = ring.findIndex(isCentre);
  return [...ring.slice(centre + 1), ...ring.slice(0, centre + 1)];
}

/** Closes what the old dart left: two stretches of one seam that meet there become one. */
function sewnUp(ring: readonly Stretch[]): readonly Stretch[] {
  const last = ring.at(-1);
  const first = ring[0];
  if (!last || !first || first.edge.open === true || last.edge.open === true) return ring;
  if (seamOf(first.edge.name) !== seamOf(last.edge.name)) return ring;
  return [mergeStretches(last, first), ...ring.slice(1, -1)];
}

/** Seams in which a dart lies level and is pressed down; every other dart is pressed to the centre. */
const downTheBody = new Set(['side']);

function dartIn(
  name: string,
  mouth: Edge,
  pivot: Point,
  outline: readonly Stretch[],
  seam: string,
): Dart {
  const from = startOf(mouth.path) ?? origin;
  const until = endOf(mouth.path) ?? origin;
  const index = outline.findIndex(({ edge }) => edge === mouth);
  const runsBack = lastSide(outline) >= 0 && index > lastSide(outline);
  const [centre, side] = runsBack ? [until, from] : [from, until];
  return {
    name,
    tip: pivot.y <= between(from, until, 0.5).y ? 'above' : 'below',
    centreLeg: [line(centre, pivot)],
    sideLeg: [line(side, pivot)],
    mouth: mouth.name,
    pressed: downTheBody.has(seam) ? 'down' : 'centre',
  };
}

/**
 * Moves a dart whose tip is the pivot (the bust point) to another place: the paper is cut from there
 * to the pivot and the part without the centre line is turned about it until the old dart is closed.
 * No seam changes its length, the angle stays; the stretches of the seams are lettered anew. A dart
 * without a mouth stays where it is. No answer where the piece has no such dart or place, where the
 * dart does not end at the pivot, or where the other dart does not.
 */
export function moveDart(
  piece: Piece,
  name: string,
  pivot: Point,
  to: DartPlace,
): Piece | undefined {
  const dart = piece.darts.find((each) => each.name === name);
  const all = stretchesOf(piece);
  const index = all.findIndex(({ edge }) => edge.name === dart?.mouth);
  const mouth = all[index]?.edge;
  const into = 'dart' in to ? piece.darts.find((each) => each.name === to.dart) : undefined;
  const tips = [dart, ...('dart' in to ? [into] : [])].map((each) => each && endOf(each.centreLeg));
  if (!mouth || tips.some((tip) => !tip || distance(tip, pivot) > same)) return undefined;
  const ring = [...all.slice(index + 1), ...all.slice(0, index)];
  const opened = openAt(ring, piece, to);
  const [m1, m2] = [startOf(mouth.path), endOf(mouth.path)];
  if (!opened || !m1 || !m2 || into === dart) return undefined;

  const arms = [subtract(m2, pivot), subtract(m1, pivot)] as const;
  const angle = Math.atan2(cross(...arms), dot(...arms));
  const turnsAfter = !opened.after.some(isCentre);
  const motion = turnAbout(pivot, turnsAfter ? angle : -angle);
  const turning = turnsAfter ? opened.after : opened.before;
  const q1 = endOf(opened.after.at(-1)?.edge.path ?? []) ?? pivot;
  const q2 = startOf(opened.before[0]?.edge.path ?? []) ?? pivot;
  const turns = (at: Point): boolean => liesOn(turning, at);

  const laid = turning.map((stretch) => turnedStretch(stretch, motion));
  const after = turnsAfter ? laid : opened.after;
  const before = turnsAfter ? opened.before : laid;
  const from = endOf(after.at(-1)?.edge.path ?? []) ?? pivot;
  const until = startOf(before[0]?.edge.path ?? []) ?? pivot;
  const newMouth: Edge = {
    name: into?.mouth ?? mouth.name,
    kind: 'mouth',
    path: [line(from, until)],
    open: true,
  };
  const seam = seamOf(before[0]?.edge.name ?? '');
  const seams = new Set([
    seam,
    seamOf(ring[0]?.edge.name ?? ''),
    seamOf(ring.at(-1)?.edge.name ?? ''),
  ]);
  const closed = fromCentre(sewnUp([...after, { edge: newMouth, notches: [] }, ...before]));
  const outline = lettered(closed, seams);

  const ownTurns = (each: Dart): boolean => {
    const mouthAt = startOf(each.centreLeg);
    return each.mouth !== undefined && mouthAt !== undefined && turns(mouthAt);
  };
  const moving = dartIn(into?.name ?? name, newMouth, pivot, outline, seam);
  const darts = piece.darts.flatMap((each) => {
    if (each === (into ?? dart)) return [moving];
    if (each === dart) return [];
    return [ownTurns(each) ? turnedDart(each, motion) : each];
  });
  const staysAt = turnsAfter ? ([m1, q2] as const) : ([m2, q1] as const);
  const turnsAt = turnsAfter ? ([m2, q1] as const) : ([m1, q2] as const);
  return {
    ...withOutline(piece, outline),
    darts,
    levels: turnedLevels(piece.levels, {
      pivot,
      motion,
      staying: staysAt,
      turning: turnsAt,
      turns,
    }),
    drills: drillsOn(piece, darts),
  };
}
