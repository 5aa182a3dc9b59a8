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

/** Stretches drawn for a whole half. */
const stretchesAHalf = 16;

/**
 * A level hem lengthened into a train: every place moves down the way the cloth falls there, by its
 * part of the train. It leaves centre and side as squarely as the level hem did. From one share of
 * the half to another, outwards.
 */
export function trainedHem(
  level: (share: number) => HemPlace,
  train: number,
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
    const more = train * trainShare(share);
    return {
      at: add(at, scale(down, more)),
      handle: scale(
        add(add(along, scale(down, train * trainSlope(share))), scale(aside, more * turn)),
        third,
      ),
    };
  });
  return stations.slice(1).flatMap((to, i): readonly Cubic[] => {
    const start = stations[i];
    if (!start) return [];
    return [cubic(start.at, add(start.at, start.handle), add(to.at, scale(to.handle, -1)), to.at)];
  });
}
