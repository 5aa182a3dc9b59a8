import type { Problem } from '../units/problem.ts';

/** A body or style that cannot be drawn: the problems say which fields to change, and how. */
export class DraftingError extends Error {
  constructor(readonly problems: readonly Problem[]) {
    super(problems.map((each) => `${each.field}: ${each.code}`).join('; '));
    this.name = 'DraftingError';
  }
}
