import type { Body } from '../body/card.ts';
import type { FinishedPiece } from '../drafting/piece.ts';
import type { Step } from '../drafting/step.ts';

/** Of any draft, what a lesson tells: the steps in drafting order, the body they speak of, the pieces they end in. */
export type Told = {
  readonly steps: readonly Step[];
  readonly body: Body;
  readonly pieces: readonly FinishedPiece[];
};
