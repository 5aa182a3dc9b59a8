import type { Step } from '../drafting/step.ts';

/** Place of a step by its id; the first step where there is none of that id. */
export const placeOf = (steps: readonly Step[], id: string | undefined): number =>
  Math.max(
    0,
    steps.findIndex((each) => each.id === id),
  );

/** Where another draft of the same style stands at a step, and whether it has that very step. */
export type SameStep = { readonly place: number; readonly exact: boolean };

/**
 * The step of another body's draft to show beside a tutor's: the same one, or, where that body did
 * not need it, the last one before it that both have.
 */
export function sameStep(tutors: readonly Step[], place: number, own: readonly Step[]): SameStep {
  for (let back = Math.min(place, tutors.length - 1); back >= 0; back -= 1) {
    const found = own.findIndex((each) => each.id === tutors[back]?.id);
    if (found >= 0) return { place: found, exact: back === place };
  }
  return { place: 0, exact: false };
}
