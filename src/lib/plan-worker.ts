import { SheetLimitError, refuseTooManySheets } from '#shared/sheets/sheet-limit.ts';
import { planSheets } from '#shared/sheets/sheet-plan.ts';

import type { PlanNews, PlanTask } from './plan-messages.ts';

/*
 * Lays pieces on sheets in a thread of its own, with the very function the server prints by. It is called
 * off by ending the thread: while it works it hears nothing.
 */

addEventListener('message', (event: MessageEvent<unknown>) => {
  tell(planned(taskOf(event.data)));
});

const tell = (news: PlanNews) => postMessage(news);

function planned({ pieces, order }: PlanTask): PlanNews {
  try {
    const plan = planSheets(pieces, order, {
      onProgress: (progress) => tell({ kind: 'progress', progress }),
    });
    refuseTooManySheets(plan);
    return { kind: 'plan', plan };
  } catch (error) {
    if (error instanceof SheetLimitError) return { kind: 'refused', problem: error.problem };
    throw error;
  }
}

/** Only the page of this very build sends tasks. */
function taskOf(data: unknown): PlanTask {
  return data as PlanTask;
}
