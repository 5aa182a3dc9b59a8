import { coreMeasures, furtherMeasures } from '#shared/body/card.ts';
import { checkMeasure } from '#shared/body/check-card.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { draftAny, type Drafted, type DraftedInputs } from '#shared/engine/drafted.ts';
import type { Problem } from '#shared/units/problem.ts';

import { fieldKeys } from './fields.ts';
import { applies } from './style-choices.ts';
import { cardOf, hasCoreMeasures, inputsOf, type Choices } from './table-inputs.ts';

/** What lies on the table: the last draft that could be drawn, and what stands in the way of the next. */
export type Drawn = {
  readonly draft?: Drafted;
  /** Whether the draft is that of the figures now in the fields. */
  readonly fresh: boolean;
  readonly problems: readonly Problem[];
};

export const nothingDrawn: Drawn = { fresh: false, problems: [] };

const measures = [...coreMeasures, ...furtherMeasures];

/** Draws the figures in the fields; where they cannot be drawn the last drawing stays, no longer fresh. */
export function drawn(choices: Choices, last: Drawn): Drawn {
  const stale = (problems: readonly Problem[]): Drawn => ({ ...last, fresh: false, problems });

  const unread = fieldKeys.flatMap((field): Problem[] => {
    const entry = choices.entries[field];
    if (entry === undefined || !('unread' in entry) || !applies(field, choices)) return [];
    return [{ code: 'not-read', severity: 'error', field, said: entry.unread }];
  });
  if (unread.length > 0) return stale(unread);

  const card = cardOf(choices);
  if (!hasCoreMeasures(card)) return stale(measures.flatMap((key) => checkMeasure(key, card[key])));
  try {
    const draft = draftAny(inputsOf(choices, card));
    return { draft, fresh: true, problems: draft.warnings };
  } catch (error) {
    if (error instanceof DraftingError) return stale(error.problems);
    throw error;
  }
}

/** What lay on the table last, drawn anew from the inputs it was drawn from; nothing where it no longer can be. */
export function lastDrawing(inputs: DraftedInputs): Drawn {
  try {
    return { draft: draftAny(inputs), fresh: false, problems: [] };
  } catch (error) {
    if (error instanceof DraftingError) return nothingDrawn;
    throw error;
  }
}
