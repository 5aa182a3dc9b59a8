import type { Problem } from '../units/problem.ts';
import type { MeasureCard, Overruled } from './card.ts';

/** Whether a warning can be overruled on the measure card: those about its own measures can, an error never. */
export const mayOverrule = ({ severity, field }: Problem): boolean =>
  severity === 'warning' && field.startsWith('card.');

const sameFields = (one: readonly string[] = [], other: readonly string[] = []): boolean =>
  one.length === other.length && one.every((field) => other.includes(field));

/** Whether an entry of the card is about this very warning. */
export const isAbout = (entry: Overruled, { code, field, with: others }: Problem): boolean =>
  entry.code === code && entry.field === field && sameFields(entry.with, others);

/** What the card keeps when a maker overrules a warning. */
export const overruling = ({ code, field, with: others }: Problem, reason: string): Overruled => ({
  code,
  field,
  ...(others && { with: others }),
  reason,
});

/**
 * The warnings with the maker's reasons by those she has overruled. An entry without a reason, or about a
 * warning the card no longer gives, changes nothing.
 */
export const withReasons = (
  problems: readonly Problem[],
  { overruled = [] }: Pick<MeasureCard, 'overruled'>,
): readonly Problem[] =>
  problems.map((problem) => {
    const entry = mayOverrule(problem)
      ? overruled.find((each) => isAbout(each, problem) && each.reason.trim() !== '')
      : undefined;
    return entry ? { ...problem, overruled: entry.reason } : problem;
  });
