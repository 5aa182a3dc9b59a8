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

/** How the garment is got into, whole-body mm. */
export type Opening = {
  readonly closure: 'centreBackZip' | 'sideZip' | 'laced';
  /** What must pass where it stays closed: the hips, as it is stepped into. */
  readonly hips: number;
  /** The least of hips and shoulders, which a closed upper edge must pass. */
  readonly least: number;
  /** Part by which the cloth may be stretched for that; none in a woven one. */
  readonly give: number;
  /** Girth of an upper edge that stays closed all round; absent where the opening reaches it. */
  readonly closedTop?: number;
};

/** What the proof needs to know of the construction that the pieces alone do not tell. */
export type Construction = {
  readonly wanted: readonly WantedGirth[];
  /** x of the side seam lines carried up to chest level, front and back. */
  readonly chestSide: { readonly front: number; readonly back: number };
  readonly topOpenings: readonly TopOpening[];
  readonly opening: Opening;
  /** Girth of both knees standing, the longest step the knee seam allows, and whether that is short; mm. */
  readonly knees: { readonly standing: number; readonly step: number; readonly caution: boolean };
  /** What lacing leaves open between the two centre back edges, by level, mm. */
  readonly gaps?: { readonly [L in LevelName]?: number };
  /** The house rules give intakes outright: the side seam takes the rest, and its bends are only said. */
  readonly intakesGiven?: boolean;
};
