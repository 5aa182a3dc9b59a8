import type { Step } from '../drafting/step.ts';
import type { FinishedPiece } from '../drafting/piece.ts';
import { flatten } from '../geometry/curve.ts';
import type { Path } from '../geometry/path.ts';
import { type Point, point } from '../geometry/point.ts';
import { type Box, boxOf } from '../sheets/layout.ts';
import type { Told } from './told.ts';

/** A named point; `now` where this step fixed it. */
export type NamedPoint = { readonly name: string; readonly at: Point; readonly now: boolean };

/** A piece whose outline is complete; `now` where this step completed it. */
export type CutPiece = { readonly piece: FinishedPiece; readonly now: boolean };

/**
 * What lies on the paper when a step has been done, in the half-body frame it was done in, mm; steps
 * of other frames are left out. `frame` is `pieces` where the step is about the pieces themselves.
 */
export type StepPicture = {
  readonly frame: 'front' | 'back' | 'flare' | 'pieces';
  /** Construction lines of earlier steps. */
  readonly before: readonly Path[];
  /** Lines this step drew, in the order it drew them. */
  readonly now: readonly Path[];
  /** Points of this step, and of earlier ones. */
  readonly points: readonly NamedPoint[];
  readonly cut: readonly CutPiece[];
  /** Where the step is about pieces: which, to be laid beside each other. */
  readonly laid: readonly FinishedPiece[];
  /** Where to look at this step. */
  readonly near: Box;
  /** All of the frame that is drawn by the end. */
  readonly whole: Box;
};

/** Flattened this coarsely a box is true to a millimetre. */
const coarse = 1;
/** A look is never closer than this, mm: a hand's breadth of neighbours shows where one is. */
const closest = 190;
/** Room about what is looked at, as a part of its size. */
const margin = 0.14;

/** Levels stand in both halves and are first seen on the front; what draws nothing speaks of pieces. */
const frameOf = (step: Step): StepPicture['frame'] => {
  if (drawsNothing(step)) return 'pieces';
  return step.side === 'both' ? 'front' : step.side;
};

/** The pieces a step is about: those it completes, those below the knee, or all. */
function laidFor({ pieces }: Told, step: Step): readonly FinishedPiece[] {
  const own = pieces.filter(({ name }) => step.pieces?.includes(name) === true);
  if (own.length > 0) return own;
  const flares = step.side === 'flare' ? pieces.filter(({ part }) => part === 'flare') : [];
  return flares.length > 0 ? flares : pieces;
}

const drawsNothing = ({ lines, points }: Step): boolean =>
  lines.length === 0 && Object.keys(points).length === 0;

const standsIn = (frame: StepPicture['frame'], step: Step): boolean =>
  step.side === frame || (step.side === 'both' && (frame === 'front' || frame === 'back'));

const pointsOf = ({ lines, points }: Step): readonly Point[] => [
  ...lines.flatMap((path) => flatten(path, coarse)),
  ...Object.values(points),
];

/** A box grown about its middle to at least so wide and high, with a margin. */
function roomy({ x, y, width, height }: Box): Box {
  const w = Math.max(closest, width * (1 + 2 * margin));
  const h = Math.max(closest, height * (1 + 2 * margin));
  return { x: x - (w - width) / 2, y: y - (h - height) / 2, width: w, height: h };
}

/** Where a step is looked at: what it drew; a level with the point everything hangs from. */
const nearOf = (step: Step, cut: readonly CutPiece[], whole: Box): Box => {
  const now = cut
    .filter((each) => each.now)
    .flatMap(({ piece }) => piece.edges.flatMap(({ path }) => flatten(path, coarse)));
  const seen = [...pointsOf(step), ...now];
  if (seen.length === 0) return roomy(whole);
  return roomy(boxOf(step.side === 'both' ? [point(0, 0), ...seen] : seen));
};

/** Pieces complete by a step, those of its own frame; of a flare, which is struck anew each time, the first gore. */
function cutBy(told: Told, place: number, frame: StepPicture['frame']): readonly CutPiece[] {
  return told.steps.slice(0, place + 1).flatMap((step, at) => {
    if (step.side !== frame) return [];
    if (frame === 'flare' && at !== place) return [];
    const names = frame === 'flare' ? step.pieces?.slice(0, 1) : step.pieces;
    return told.pieces
      .filter(({ name }) => names?.includes(name) === true)
      .map((piece) => ({ piece, now: at === place }));
  });
}

/**
 * The picture of a step, and of all that was drawn before it in its frame. Pure: the same step gives
 * the same picture from wherever one comes. No answer beyond the last step.
 */
export function stepPicture(told: Told, place: number): StepPicture | undefined {
  const step = told.steps[place];
  if (!step) return undefined;
  const frame = frameOf(step);
  const own = told.steps.filter((each) => standsIn(frame, each) && !drawsNothing(each));
  const earlier = told.steps.slice(0, place).filter((each) => standsIn(frame, each));
  const cut = cutBy(told, place, frame);
  const whole = boxOf(
    own.filter((each) => step.side === 'both' || each.side !== 'both').flatMap(pointsOf),
  );
  return {
    frame,
    before: earlier.flatMap((each) => each.lines),
    now: step.lines,
    points: [...earlier.flatMap((each) => named(each, false)), ...named(step, true)],
    cut,
    laid: frame === 'pieces' ? laidFor(told, step) : [],
    near: nearOf(step, cut, whole),
    whole: roomy(whole),
  };
}

const named = ({ points }: Step, now: boolean): readonly NamedPoint[] =>
  Object.entries(points).map(([name, at]) => ({ name: name.replaceAll('-', ' '), at, now }));
