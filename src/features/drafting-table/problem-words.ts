import { speak } from '#shared/units/speak.ts';
import type { Problem } from '#shared/units/problem.ts';
import type { Unit } from '#shared/units/said.ts';

import type { FieldKey } from './fields.ts';

export type FieldMessage = { readonly text: string; readonly tone: 'error' | 'warning' };

/** What stands under a field: its own problem, or that of an impossible combination it takes part in. */
export function messageFor(
  field: FieldKey,
  problems: readonly Problem[],
  unit: Unit,
): FieldMessage | undefined {
  const found = problems.find((each) => each.severity === 'error' && concerns(each, field));
  return found === undefined ? undefined : { text: speak(found.said, unit), tone: 'error' };
}

const concerns = (problem: Problem, field: FieldKey): boolean =>
  problem.field === field || (problem.with?.includes(field) ?? false);
