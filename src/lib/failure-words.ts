import type { Unit } from '#shared/units/said.ts';
import { speak } from '#shared/units/speak.ts';

import { CallFailed } from './call.ts';

/** What went wrong with a call, for a person: each sentence once. */
export function failureWords(error: unknown, unit: Unit = 'cm'): string {
  if (!(error instanceof CallFailed)) return 'That did not work. Try again.';
  const said = error.problems.map((problem) => speak(problem.said, unit));
  return [error.message, ...said.filter((each) => !error.message.includes(each))].join(' ');
}

/** What the server says of one field, if anything. */
export function fieldWords(error: unknown, field: string): string | undefined {
  if (!(error instanceof CallFailed)) return undefined;
  const found = error.problems.find((problem) => problem.field === field);
  return found === undefined ? undefined : speak(found.said, 'cm');
}
