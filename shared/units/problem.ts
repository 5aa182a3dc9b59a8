import type { Said } from './said.ts';

/**
 * Something a person can act on: what is wrong, where, and the remedy, in one sentence.
 * `field` is the dotted key of the contract (`card.bustGirth`, `style.ease.waist`, `rules.share`);
 * `with` names the other fields of an impossible combination.
 */
export type Problem = {
  readonly code: string;
  readonly severity: 'error' | 'warning';
  readonly field: string;
  readonly with?: readonly string[];
  readonly said: Said;
  /** Why the maker keeps what a warning is about. */
  readonly overruled?: string;
};

type ProblemParts = Omit<Problem, 'severity'>;

/** A problem that keeps the gown from being drawn until it is mended. */
export const error = (parts: ProblemParts): Problem => ({ severity: 'error', ...parts });

/** A problem the maker may overrule. */
export const warning = (parts: ProblemParts): Problem => ({ severity: 'warning', ...parts });
