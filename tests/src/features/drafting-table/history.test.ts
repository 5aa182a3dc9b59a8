import { describe, expect, it } from 'vitest';

import {
  bench,
  type Bench,
  type BenchAction,
} from '../../../../src/features/drafting-table/bench.ts';
import { keptHistory, noHistory } from '../../../../src/features/drafting-table/history.ts';
import { emptyTable } from '../../../../src/features/drafting-table/table-state.ts';

const empty: Bench = { table: emptyTable, history: noHistory };
const after = (actions: readonly BenchAction[], from = empty): Bench => actions.reduce(bench, from);
const typed = (text: string): BenchAction => ({ type: 'typed', field: 'card.bustGirth', text });
const bust = ({ table }: Bench) => table.entries['card.bustGirth'];
const settled: BenchAction = { type: 'settled', field: 'card.bustGirth' };
const undo: BenchAction = { type: 'undo' };
const redo: BenchAction = { type: 'redo' };

describe('taking back', () => {
  it('takes a figure back whole, however many letters it was typed in', () => {
    const done = after([typed('9'), typed('92'), settled, typed('93'), settled]);
    expect(done.history.past).toHaveLength(2);
    expect(bust(after([undo], done))).toMatchObject({ value: 920 });
    expect(bust(after([undo, undo], done))).toBeUndefined();
    expect(bust(after([undo, undo, redo, redo], done))).toMatchObject({ value: 930 });
  });

  it('takes a drag of a handle back as one, and the next grip as another', () => {
    const moved = (value: number): BenchAction => ({
      type: 'moved',
      field: 'style.neckDepth',
      value,
    });
    const released: BenchAction = { type: 'released' };
    const done = after([moved(200), moved(201), moved(202), released, moved(203), released]);
    expect(done.history.past).toHaveLength(2);
    expect(after([undo], done).table.entries['style.neckDepth']).toMatchObject({ value: 202 });
  });

  it('covers every choice, a cleared card and what was laid over it', () => {
    const done = after([
      typed('92'),
      { type: 'chosen', choice: { shaping: 'darts' } },
      { type: 'chosen', choice: { topLine: 'straight' } },
      { type: 'named', name: 'Ida' },
      { type: 'cleared' },
      { type: 'work laid', work: { ...emptyTable, name: 'from elsewhere' } },
    ]);
    expect(done.table.name).toBe('from elsewhere');
    const back = after([undo, undo], done).table;
    expect(back).toMatchObject({ name: 'Ida', shaping: 'darts', topLine: 'straight' });
    expect(after([undo, undo, undo, undo, undo, undo], done).table.entries).toEqual({});
  });

  it('leaves the unit alone, and writes what comes back in it', () => {
    const done = after([typed('92.7'), settled, typed('93'), { type: 'unit', unit: 'in' }, undo]);
    expect(done.table.unit).toBe('in');
    expect(bust(done)?.text).toBe('36\u00a01⁄2');
  });

  it('writes nothing down where nothing changed, and new work ends what could be done again', () => {
    const done = after([typed('92'), settled, typed('92.0'), settled]);
    expect(done.history.past).toHaveLength(1);
    expect(after([undo, typed('91')], done).history.future).toEqual([]);
  });

  it('forgets the oldest changes beyond a hundred', () => {
    const edits = Array.from({ length: 130 }, (_, index) => [typed(String(70 + index)), settled]);
    expect(after(edits.flat()).history.past).toHaveLength(100);
  });

  it('lasts across a reload, unless the table is another by then', () => {
    const done = after([typed('92'), settled, typed('ninety'), settled, typed('93'), undo]);
    const kept: unknown = JSON.parse(JSON.stringify(done.history));
    const history = keptHistory(kept, done.table, 'cm');
    expect(bust(after([undo], { ...done, history }))).toMatchObject({ value: 920 });
    expect(bust(after([redo], { ...done, history }))).toMatchObject({ value: 930 });
    expect(keptHistory(kept, emptyTable, 'cm')).toEqual(noHistory);
    expect(keptHistory('nonsense', emptyTable, 'cm')).toEqual(noHistory);
  });
});
