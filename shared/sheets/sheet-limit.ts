import { said } from '../units/said.ts';
import type { Problem } from '../units/problem.ts';
import type { SheetPlan } from './sheet-plan.ts';

/** Beyond this nobody glues sheets together; it keeps a printed file and the work on it bounded. */
export const mostSheets = 150;

/** A drawing too large for home paper. */
export class SheetLimitError extends Error {
  constructor(readonly problem: Problem) {
    super(`${problem.field}: ${problem.code}`);
    this.name = 'SheetLimitError';
  }
}

/** Throws `SheetLimitError` where a plan takes more sheets than anybody would glue together. */
export function refuseTooManySheets({ sheets, plan }: SheetPlan): void {
  if (sheets <= mostSheets) return;
  throw new SheetLimitError({
    code: 'too-many-sheets',
    severity: 'error',
    field: 'style.flareLength',
    said: said`This takes ${sheets} sheets of ${plan.paper.name}; at most ${mostSheets} are printed. Print the bodice toile or the chalk sheet, or shorten the flare.`,
  });
}
