import type { Handle } from '#shared/drafting/construction.ts';
import type { DraftInputs } from '#shared/engine/draft.ts';
import type { Unit } from '#shared/units/said.ts';

import type { Colours } from './colours.ts';
import type { Shifts } from './moved-pieces.ts';
import type { Size, View } from './view.ts';

/** A handle taken into the hand: the inputs as they stand, and how the paper is looked at. */
export type Hold = {
  readonly inputs: DraftInputs;
  readonly key: Handle['key'];
  readonly shifts: Shifts;
  readonly unit: Unit;
  readonly view: View;
  readonly size: Size;
  /** Pixels of the screen for one of the page. */
  readonly density: number;
  readonly colours: Colours;
};

/** What the page tells the drawing thread: once the canvas, at every grip the hold, at every move the value. */
export type DragOrder =
  | { readonly canvas: OffscreenCanvas }
  /** The number tells this grip's pictures from those of the one before. */
  | { readonly grip: number; readonly hold: Hold }
  | { readonly value: number };

/** The first picture of a grip is drawn. */
export type DragReply = { readonly shown: number };
