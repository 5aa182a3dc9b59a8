import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { type Drafted, type DraftedInputs, draftAny } from '#shared/engine/drafted.ts';
import type { Unit } from '#shared/units/said.ts';
import { refusalFor } from '../http/refusal.ts';

/** Problems of a value outside its bounds, rather than of a gown that does not come together. */
const boundsCodes = new Set(['out-of-range', 'disagree', 'not-a-number']);

/** Drafts whichever garment the inputs name; what cannot be drawn is a refusal that names the fields. */
export function draftAnyOrRefuse(inputs: DraftedInputs, unit: Unit): Drafted {
  try {
    return draftAny(inputs);
  } catch (error) {
    if (!(error instanceof DraftingError)) throw error;
    const outside = error.problems.every((each) => boundsCodes.has(each.code));
    throw refusalFor(outside ? 'bad-input' : 'not-drawable', error.problems, unit);
  }
}
