import type { Motion } from '../geometry/motion.ts';
import type { Path } from '../geometry/path.ts';
import type { Point } from '../geometry/point.ts';

/** How a line is drawn; lengths in mm, grey 0 (ink) to 1 (paper). */
export type Pen = {
  readonly width: number;
  readonly dash?: readonly number[];
  readonly grey?: number;
};

/** Lines that share a pen are one mark, so that a drawing stays short. */
export type Strokes = {
  readonly kind: 'strokes';
  readonly paths: readonly Path[];
  readonly pen: Pen;
  readonly closed?: boolean;
};

export type Area = {
  readonly kind: 'area';
  readonly corners: readonly Point[];
  readonly grey: number;
};

/** One line of lettering; `at` is on its base line, `size` mm from line to line of the type. */
export type Words = {
  readonly kind: 'words';
  readonly text: string;
  readonly at: Point;
  readonly size: number;
  readonly anchor?: 'start' | 'middle' | 'end';
  readonly heavy?: boolean;
  readonly grey?: number;
  /** Degrees clockwise about `at`. */
  readonly turn?: number;
};

/** A drawing used by name, laid by a rigid motion. */
export type Use = { readonly kind: 'use'; readonly drawing: string; readonly motion: Motion };

/** What lies within a box, cut off at its edges. */
export type Window = {
  readonly kind: 'window';
  readonly box: {
    readonly x: number;
    readonly y: number;
    readonly width: number;
    readonly height: number;
  };
  readonly marks: readonly Mark[];
};

/** What belongs to a layer that a viewer can show and hide. */
export type Layered = {
  readonly kind: 'layer';
  readonly layer: string;
  readonly marks: readonly Mark[];
};

export type Mark = Strokes | Area | Words | Use | Window | Layered;

/** A drawing that several pages use: written into the file once. */
export type Drawing = { readonly name: string; readonly marks: readonly Mark[] };

/** Pages of one paper, ready to be written as bytes; x runs right, y down, mm from the top left corner. */
export type PrintJob = {
  readonly title: string;
  /** Day of the measure card, so that the same inputs give the same file; absent where nobody gave one. */
  readonly date?: string;
  readonly paper: { readonly width: number; readonly height: number };
  readonly drawings: readonly Drawing[];
  /** Names of the layers, in the order a viewer lists them; absent where there are none. */
  readonly layers?: readonly string[];
  readonly pages: readonly (readonly Mark[])[];
};
