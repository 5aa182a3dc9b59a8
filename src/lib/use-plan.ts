import { useCallback, useEffect, useRef, useState } from 'react';

import type { FinishedPiece } from '#shared/drafting/piece.ts';
import type { PlanProgress, PrintOrder } from '#shared/sheets/print-order.ts';
import type { SheetPlan } from '#shared/sheets/sheet-plan.ts';
import type { Problem } from '#shared/units/problem.ts';

import type { PlanNews, PlanTask } from './plan-messages.ts';

/** How the plan for an order stands. */
export type Planning =
  /** There is no order to plan: something chosen has to be mended first. */
  | { readonly kind: 'waiting' }
  | { readonly kind: 'arranging'; readonly progress: PlanProgress | undefined }
  | { readonly kind: 'planned'; readonly key: string; readonly plan: SheetPlan }
  | { readonly kind: 'refused'; readonly problem: Problem }
  | { readonly kind: 'called off' }
  | { readonly kind: 'failed' };

/** Choices often come in twos and threes; only the last is arranged, ms. */
const pause = 200;

/**
 * What tells plans apart: the draft's number stands for its pieces. How lines are drawn, and whether there
 * are marks to glue by, moves no piece.
 */
export const planKey = (draftNumber: string, order: PrintOrder): string =>
  JSON.stringify([draftNumber, { ...order, glueMarks: true, inkSaving: false, leftOut: [] }]);

/**
 * The plan for an order, arranged in a thread of its own as soon as the order is settled; a new order ends
 * the one on its way. The last plan stays to be looked at meanwhile.
 */
export function usePlan(
  pieces: readonly FinishedPiece[],
  draftNumber: string,
  order: PrintOrder | undefined,
) {
  const [planning, setPlanning] = useState<Planning>({ kind: 'waiting' });
  const [last, setLast] = useState<SheetPlan>();
  const [turn, setTurn] = useState(0);
  const worker = useRef<Worker>(undefined);
  const stop = useCallback(() => {
    worker.current?.terminate();
    worker.current = undefined;
  }, []);
  const key = order === undefined ? undefined : planKey(draftNumber, order);
  const asked = useRef<PlanTask>(undefined);
  asked.current = order === undefined ? undefined : { pieces, order };

  useEffect(() => {
    if (key === undefined) {
      setPlanning({ kind: 'waiting' });
      return undefined;
    }
    setPlanning({ kind: 'arranging', progress: undefined });
    const timer = setTimeout(() => {
      worker.current = arrange(asked.current, (news) => {
        if (news?.kind === 'progress') {
          setPlanning({ kind: 'arranging', progress: news.progress });
          return;
        }
        stop();
        if (news === undefined) setPlanning({ kind: 'failed' });
        else if (news.kind === 'refused') setPlanning(news);
        else {
          setPlanning({ kind: 'planned', key, plan: news.plan });
          setLast(news.plan);
        }
      });
    }, pause);
    return () => {
      clearTimeout(timer);
      stop();
    };
  }, [key, turn, stop]);

  return {
    planning,
    last,
    cancel: () => {
      stop();
      setPlanning({ kind: 'called off' });
    },
    again: () => setTurn((now) => now + 1),
  };
}

/** Begins a thread that tells of its plan; `undefined` is told where the thread breaks. */
function arrange(task: PlanTask | undefined, tell: (news: PlanNews | undefined) => void): Worker {
  const begun = new Worker(new URL('./plan-worker.ts', import.meta.url), { type: 'module' });
  begun.addEventListener('message', (event: MessageEvent<unknown>) => tell(newsOf(event.data)));
  begun.addEventListener('error', () => tell(undefined));
  begun.postMessage(task);
  return begun;
}

/** Only our own worker answers. */
function newsOf(data: unknown): PlanNews {
  return data as PlanNews;
}
