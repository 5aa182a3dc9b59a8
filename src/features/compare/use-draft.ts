import { useMemo } from 'react';

import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { type Drafted, type DraftedInputs, draftAny } from '#shared/engine/drafted.ts';
import type { Problem } from '#shared/units/problem.ts';

/** A draft, or what stands in its way. */
export type Tried = { readonly draft: Drafted } | { readonly problems: readonly Problem[] };

/** Something drafted, or the problems that name what to change. */
export function orProblems<T>(
  make: () => T,
): { readonly made: T } | { readonly problems: readonly Problem[] } {
  try {
    return { made: make() };
  } catch (error) {
    if (error instanceof DraftingError) return { problems: error.problems };
    throw error;
  }
}

/** The draft of some inputs; none without them. The same inputs are drafted once. */
export function useDraft(inputs: DraftedInputs | undefined): Tried | undefined {
  const written = inputs && JSON.stringify(inputs);
  return useMemo(() => {
    if (inputs === undefined) return undefined;
    const tried = orProblems(() => draftAny(inputs));
    return 'made' in tried ? { draft: tried.made } : tried;
    // The same inputs are often made anew.
  }, [written]);
}
