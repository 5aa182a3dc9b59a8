import { DraftingError } from '#shared/drafting/drafting-error.ts';
import type { Draft, DraftInputs } from '#shared/engine/draft.ts';
import { draftGown } from '#shared/engine/draft-gown.ts';
import { type Drafted, type DraftedInputs, draftAny } from '#shared/engine/drafted.ts';
import type { Unit } from '#shared/units/said.ts';
import { refusalFor } from '../http/refusal.ts';

/** Problems of a value outside its bounds, rather than of a gown that does not come together. */
const boundsCodes = new Set(['out-of-range', 'disagree', 'not-a-number']);

/** Drafts; what cannot be drawn is a refusal that names the fields. */
function orRefuse<D>(draft: () => D, unit: Unit): D {
  try {
    return draft();
  } catch (error) {
    if (!(error instanceof DraftingError)) throw error;
    const outside = error.problems.every((each) => boundsCodes.has(each.code));
    throw refusalFor(outside ? 'bad-input' : 'not-drawable', error.problems, unit);
  }
}

/** Drafts a gown, or refuses it. */
export const draftOrRefuse = (inputs: DraftInputs, unit: Unit): Draft =>
  orRefuse(() => draftGown(inputs), unit);

/** Drafts whichever garment the inputs name, or refuses it. */
export const draftAnyOrRefuse = (inputs: DraftedInputs, unit: Unit): Drafted =>
  orRefuse(() => draftAny(inputs), unit);
