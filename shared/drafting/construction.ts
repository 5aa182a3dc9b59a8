import type { Point } from '../geometry/point.ts';
import type { LevelName } from './piece.ts';

/** Style-card keys of the points a maker may move by hand, from the top of the gown down. */
export const handleKeys = [
  'neckDepth',
  'neckWidth',
  'topDrop',
  'sideDepth',
  'backDepth',
  'waistSeamRise',
  'dartLength',
  'kneeLevel',
  'kneeFinished',
  'flareLength',
  'train',
] as const;

/** A point a maker may move by hand, and the style-card key it stands for. */
export type Handle = {
  readonly key: (typeof handleKeys)[number];
  readonly piece: string;
  readonly at: Point;
  /** Unit direction in which the value grows. */
  readonly along: Point;
  /** How much the value grows for a millimetre of travel along it. */
  readonly perMillimetre: number;
};

/** A girth the draft promised: body and ease, whole-body millimetres. */
export type WantedGirth = {
  readonly level: LevelName;
  /** Absent at the knee seam, where the style card gives the girth outright. */
  readonly body?: number;
  readonly ease?: number;
  readonly wanted: number;
  /** Whether the body girth is an estimate. */
  readonly estimated: boolean;
};

/** An opening above the bust: the gap between two straight legs at a height, and its share of R. */
export type TopOpening = {
  readonly side: 'front' | 'back';
  readonly wanted: number;
  /** y at which the gap is taken; the legs run straight there and may be carried on to it. */
  readonly height: number;
  readonly centre: { readonly piece: string; readonly edge: string };
  readonly outer: { readonly piece: string; readonly edge: string };
};

/** What the proof needs to know of the construction that the pieces alone do not tell. */
export type Construction = {
  readonly wanted: readonly WantedGirth[];
  /** x of the side seam lines carried up to chest level, front and back. */
  readonly chestSide: { readonly front: number; readonly back: number };
  readonly topOpenings: readonly TopOpening[];
};
