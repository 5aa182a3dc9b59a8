import { DraftingError } from '#shared/drafting/drafting-error.ts';
import type { Draft, DraftInputs } from '#shared/engine/draft.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import type { Unit } from '#shared/units/said.ts';
import { refusalFor } from '../http/refusal.ts';

/** Problems of a value outside its bounds, rather than of a gown that does not come together. */
const boundsCodes = new Set(['out-of-range', 'disagree', 'not-a-number']);

/** Drafts a gown; what cannot be drawn is a refusal that names the fields. */
export function draftOrRefuse(inputs: DraftInputs, unit: Unit): Draft {
  try {
    return draftGown(inputs);
  } catch (error) {
    if (!(error instanceof DraftingError)) throw error;
    const outside = error.problems.every((each) => boundsCodes.has(each.code));
    throw refusalFor(outside ? 'bad-input' : 'not-drawable', error.problems, unit);
  }
}
