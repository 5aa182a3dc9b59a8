import type { Handle } from '#shared/drafting/construction.ts';
import type { DraftInputs } from '#shared/engine/draft.ts';
import type { Point } from '#shared/geometry/point.ts';

import type { Shifts } from './moved-pieces.ts';

/** What is to be drafted while a handle is held: the inputs as they stand, with its value moved. */
export type DragOrder = {
  readonly inputs: DraftInputs;
  readonly key: Handle['key'];
  readonly value: number;
  readonly shifts: Shifts;
};

/** The pieces in lines on the paper, as SVG writes them, and where the handle has come to lie. */
export type DragPicture = {
  readonly at: Point;
  readonly cut: string;
  readonly seams: string;
  readonly darts: string;
};

/** What comes back; nothing to show where the value cannot be drawn. */
export type DragReply = {
  readonly value: number;
  readonly picture: DragPicture | undefined;
};
