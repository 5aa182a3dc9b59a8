import { speak } from '#shared/units/speak.ts';
import type { Problem } from '#shared/units/problem.ts';
import type { Unit } from '#shared/units/said.ts';

import type { FieldKey } from './fields.ts';

/** What stands under a field; a combination that cannot be is said once, under the one of its fields it names first. */
export function messageFor(
  field: FieldKey,
  problems: readonly Problem[],
  unit: Unit,
): string | undefined {
  const found = problems.find((each) => each.severity === 'error' && each.field === field);
  return found === undefined ? undefined : speak(found.said, unit);
}
