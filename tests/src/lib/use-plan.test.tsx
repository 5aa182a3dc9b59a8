import { act, cleanup, renderHook, waitFor } from '@testing-library/react';
import { afterEach, beforeEach, expect, test, vi } from 'vitest';

import { type PrintOrder, plainOrder } from '#shared/sheets/print-order.ts';
import { planSheets } from '#shared/sheets/sheet-plan.ts';

import { usePlan } from '../../../src/lib/use-plan.ts';

/** A thread that does what the test says. */
class FakeWorker extends EventTarget {
  static begun: FakeWorker[] = [];
  asked: unknown;
  ended = false;
  constructor() {
    super();
    FakeWorker.begun.push(this);
  }
  postMessage(task: unknown) {
    this.asked = task;
  }
  terminate() {
    this.ended = true;
  }
  tell(data: unknown) {
    act(() => void this.dispatchEvent(new MessageEvent('message', { data })));
  }
}

const plan = planSheets([], plainOrder, { effort: 'quick' });

beforeEach(() => {
  FakeWorker.begun = [];
  vi.stubGlobal('Worker', FakeWorker);
});
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

const open = (order: PrintOrder | undefined = plainOrder) =>
  renderHook(({ wanted }) => usePlan([], 'AB2C3', wanted), {
    initialProps: { wanted: order },
  });

const begun = async (count: number): Promise<FakeWorker> => {
  await waitFor(() => expect(FakeWorker.begun).toHaveLength(count));
  const worker = FakeWorker.begun.at(-1);
  if (worker === undefined) throw new Error('no thread was begun');
  return worker;
};

test('a plan tells how far it is, and its thread ends with it', async () => {
  const { result } = open();
  const worker = await begun(1);
  expect(worker.asked).toMatchObject({ order: plainOrder });
  const progress = { moves: 250, of: 1000, sheets: 31 };
  worker.tell({ kind: 'progress', progress });
  expect(result.current.planning).toEqual({ kind: 'arranging', progress });
  worker.tell({ kind: 'plan', plan });
  expect(result.current.planning).toMatchObject({ kind: 'planned', plan });
  expect(worker.ended).toBe(true);
});

test('called off, the thread is ended and nothing is planned until it is asked for again', async () => {
  const { result } = open();
  const worker = await begun(1);
  act(() => result.current.cancel());
  expect(worker.ended).toBe(true);
  expect(result.current.planning).toEqual({ kind: 'called off' });
  act(() => result.current.again());
  const next = await begun(2);
  next.tell({ kind: 'plan', plan });
  expect(result.current.planning.kind).toBe('planned');
});

test('another order ends the plan on its way; the last plan stays to be looked at', async () => {
  const { result, rerender } = open();
  (await begun(1)).tell({ kind: 'plan', plan });
  rerender({ wanted: { ...plainOrder, paper: 'A3' } });
  const second = await begun(2);
  expect(result.current.planning.kind).toBe('arranging');
  expect(result.current.last).toBe(plan);
  rerender({ wanted: { ...plainOrder, paper: 'A0' } });
  expect(second.ended).toBe(true);
  await begun(3);
});

test('marks to glue by and thinner lines move no piece, so nothing is arranged anew', async () => {
  const { result, rerender } = open();
  (await begun(1)).tell({ kind: 'plan', plan });
  rerender({ wanted: { ...plainOrder, glueMarks: false, inkSaving: true } });
  await new Promise((later) => setTimeout(later, 400));
  expect(FakeWorker.begun).toHaveLength(1);
  expect(result.current.planning.kind).toBe('planned');
});

test('a thread that breaks is told, and can be begun again', async () => {
  const { result } = open();
  const worker = await begun(1);
  act(() => void worker.dispatchEvent(new Event('error')));
  expect(result.current.planning).toEqual({ kind: 'failed' });
  act(() => result.current.again());
  await begun(2);
});
