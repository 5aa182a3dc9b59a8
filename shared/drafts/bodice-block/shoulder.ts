import type { Body } from '../../body/card.ts';
import type { BodyLevels } from '../../body/levels.ts';
import { type Motion, moved, turnAbout } from '../../geometry/motion.ts';
import { type Path, cubic } from '../../geometry/path.ts';
import { type Point, add, between, point, scale } from '../../geometry/point.ts';

const degrees = Math.PI / 180;

/**
 * The front shoulder slopes this much less than the body's and the back one as much more, degrees:
 * Aldrich's size 12 (from memory) has 15.9 in front with its dart closed and 22.2 behind.
 */
export const shoulderTilt = 3;

/** Depth of the front neck: a fifth of the neck girth less 2 mm (Aldrich, from memory). */
export const frontNeckDepth = (neckGirth: number): number => neckGirth / 5 - 2;
/** Width of the back neck: the same figure (Aldrich, from memory). */
export const backNeckWidth = (neckGirth: number): number => neckGirth / 5 - 2;
/** Rise of the back neck from the nape to the side neck: a third of its width (Bunka, from memory). */
export const backNeckRise = (neckGirth: number): number => backNeckWidth(neckGirth) / 3;

/** The upper edge of a half as its shoulder and neck are drawn, any dart in it closed. */
export type Shoulder = {
  readonly centreNeck: Point;
  readonly sideNeck: Point;
  readonly neck: Path;
  /** Radians below level. */
  readonly slope: number;
  readonly along: Point;
  readonly length: number;
  readonly tip: Point;
};

/** A curve from level at the centre line to square to the shoulder: a quarter turn within its corner. */
function neckCurve(centre: Point, side: Point, slope: number, fullness: number): Path {
  const corner = point(side.x - (centre.y - side.y) * Math.tan(slope), centre.y);
  return [cubic(centre, between(centre, corner, fullness), between(side, corner, fullness), side)];
}

function shoulderFrom(
  centreNeck: Point,
  sideNeck: Point,
  slope: number,
  length: number,
  fullness: number,
): Shoulder {
  const along = point(Math.cos(slope), Math.sin(slope));
  return {
    centreNeck,
    sideNeck,
    neck: neckCurve(centreNeck, sideNeck, slope, fullness),
    slope,
    along,
    length,
    tip: add(sideNeck, scale(along, length)),
  };
}

/** Neck and shoulder of the front, bust dart closed. */
export const frontShoulder = ({ measures }: Body, levels: BodyLevels): Shoulder =>
  shoulderFrom(
    point(0, frontNeckDepth(measures.neckGirth)),
    point(levels.sideNeckX, 0),
    (measures.shoulderSlope - shoulderTilt) * degrees,
    measures.shoulderLength,
    0.6,
  );

/** Neck and shoulder of the back, the shoulder longer by its ease. */
export const backShoulder = ({ measures }: Body, levels: BodyLevels, ease: number): Shoulder =>
  shoulderFrom(
    point(0, levels.nape),
    point(backNeckWidth(measures.neckGirth), levels.nape - backNeckRise(measures.neckGirth)),
    (measures.shoulderSlope + shoulderTilt) * degrees,
    measures.shoulderLength + ease,
    0.55,
  );

/** A shoulder opened for the bust dart: what lies outside of it is turned out about the bust point. */
export type OpenedShoulder = {
  readonly bustPoint: Point;
  readonly motion: Motion;
  readonly nearMouth: Point;
  readonly farMouth: Point;
  readonly tip: Point;
  readonly slope: number;
};

/** The dart goes to the middle of the shoulder (common practice, no source). */
const dartShare = 0.5;

/** Opens the front shoulder by the bust dart's angle, degrees: the opening is added to the width. */
export function openShoulder(shoulder: Shoulder, bustPoint: Point, angle: number): OpenedShoulder {
  const turn = angle * degrees;
  const motion = turnAbout(bustPoint, turn);
  const nearMouth = add(shoulder.sideNeck, scale(shoulder.along, dartShare * shoulder.length));
  return {
    bustPoint,
    motion,
    nearMouth,
    farMouth: moved(nearMouth, motion),
    tip: moved(shoulder.tip, motion),
    slope: shoulder.slope + turn,
  };
}
