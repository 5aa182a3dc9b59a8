import { speak } from '#shared/units/speak.ts';
import type { Problem } from '#shared/units/problem.ts';
import type { Unit } from '#shared/units/said.ts';

import type { FieldKey } from './fields.ts';

/** What stands under a field: its own fault, or that of an impossible combination it takes part in. */
export function messageFor(
  field: FieldKey,
  problems: readonly Problem[],
  unit: Unit,
): string | undefined {
  const found = problems.find((each) => each.severity === 'error' && concerns(each, field));
  return found === undefined ? undefined : speak(found.said, unit);
}

const concerns = (problem: Problem, field: FieldKey): boolean =>
  problem.field === field || (problem.with?.includes(field) ?? false);
