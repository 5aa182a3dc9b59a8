import type { Path } from '../geometry/path.ts';
import type { Point } from '../geometry/point.ts';
import type { Said } from '../units/said.ts';

/** One construction step, as the table recorded it while it computed. */
export type Step = {
  /** Unique in the draft: `front/bust-line`. */
  readonly id: string;
  /** The part it belongs to, as the steps panel groups it: `Levels`, `Front`, `Back`, `Flare`, `Finishing`. */
  readonly part: string;
  /** What was drawn, as a heading: `Bust line`. */
  readonly title: string;
  /** What was done, with the numbers of this body in it. */
  readonly said: Said;
  /** Why it is done so; absent where the sentence says it all. */
  readonly why?: Said;
  /** Named points this step fixed. */
  readonly points: Readonly<Record<string, Point>>;
  /** Lines this step added, in the frame of `side`. */
  readonly lines: readonly Path[];
  /** Which half-body frame the points and lines stand in; levels stand in both. */
  readonly side: 'front' | 'back' | 'both' | 'flare';
  /** Keys of the measures whose numbers the sentence uses. */
  readonly measures: readonly string[];
  /** Names of the pieces whose outline is complete with this step. */
  readonly pieces?: readonly string[];
};
