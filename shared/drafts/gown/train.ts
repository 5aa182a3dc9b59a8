import { pathLength, stationAtLength } from '../../geometry/curve.ts';
import { type Cubic, type Path, cubic } from '../../geometry/path.ts';
import { type Point, add, scale } from '../../geometry/point.ts';

/**
 * Part of the train that the hem is longer by, at a share of the back hem from the centre (0) to the
 * side seam (1): all of it, then nothing, level where it leaves both.
 */
export const trainShare = (share: number): number => 1 - 3 * share ** 2 + 2 * share ** 3;

/** How fast that part changes. */
const trainSlope = (share: number): number => 6 * share * (share - 1);

/** Steepest a hem may fall away to its train, 60 degrees off level (our rule). */
const steepestFall = Math.tan(Math.PI / 3);

/** Longest train a half hem of this length can lead into without falling more steeply, mm. */
export const longestTrain = (halfHem: number): number => (steepestFall / 1.5) * halfHem;

/** A level hem at a share of its half: the place, how it runs on there, and the lean of the cloth above it. */
export type HemPlace = {
  readonly at: Point;
  /** Rate of travel in the share. */
  readonly along: Point;
  /** Radians from straight down towards +x in which the cloth falls there, and how fast that turns. */
  readonly fall: number;
  readonly turn: number;
};

/** What a place of a hem is moved by, the way the cloth falls there, mm, and how fast that changes. */
type Drop = readonly [by: number, slope: number];

/** Stretches drawn for a whole half. */
const stretchesAHalf = 16;

/**
 * A level hem with every place moved the way the cloth falls there, from one share to another. Where the move does
 * not change it leaves its ends as squarely as the level hem did.
 */
export function droppedHem(
  level: (share: number) => HemPlace,
  drop: (share: number) => Drop,
  from: number,
  until: number,
): Path {
  const count = Math.max(3, Math.ceil(Math.abs(until - from) * stretchesAHalf));
  const third = (until - from) / count / 3;
  const stations = Array.from({ length: count + 1 }, (_, i) => {
    const share = from + ((until - from) * i) / count;
    const { at, along, fall, turn } = level(share);
    const down: Point = { x: Math.sin(fall), y: Math.cos(fall) };
    const aside: Point = { x: Math.cos(fall), y: -Math.sin(fall) };
    const [by, slope] = drop(share);
    return {
      at: add(at, scale(down, by)),
      handle: scale(add(add(along, scale(down, slope)), scale(aside, by * turn)), third),
    };
  });
  return stations.slice(1).flatMap((to, i): readonly Cubic[] => {
    const start = stations[i];
    if (!start) return [];
    return [cubic(start.at, add(start.at, start.handle), add(to.at, scale(to.handle, -1)), to.at)];
  });
}

/** A level hem lengthened into a train, from one share of the half to another, outwards. */
export const trainedHem = (
  level: (share: number) => HemPlace,
  train: number,
  from: number,
  until: number,
): Path =>
  droppedHem(level, (share) => [train * trainShare(share), train * trainSlope(share)], from, until);

/**
 * A hem as places: the cloth falls one way at its start and another at its end, turning smoothly between (radians from
 * straight down towards +x), so that it stays square to both.
 */
export function fallingHem(path: Path, start: number, end: number): (share: number) => HemPlace {
  const whole = pathLength(path);
  return (share) => {
    const station = stationAtLength(path, share * whole);
    return {
      at: station?.at ?? { x: 0, y: 0 },
      along: scale(station?.tangent ?? { x: 1, y: 0 }, whole),
      fall: start + (end - start) * (3 * share ** 2 - 2 * share ** 3),
      turn: (end - start) * 6 * share * (1 - share),
    };
  };
}
