import type { Choices } from './table-inputs.ts';
import { closed, recorded, redone, undone, type History } from './history.ts';
import { redrawn, tableState, type TableAction, type TableState } from './table-state.ts';

/** The table and the way back from it. */
export type Bench = { readonly table: TableState; readonly history: History };

export type BenchAction =
  | TableAction
  | { readonly type: 'undo' }
  | { readonly type: 'redo' }
  /** The hand has left a handle: what it does next is another change. */
  | { readonly type: 'released' }
  /** Everything replaced at once, by what was saved elsewhere or before. */
  | { readonly type: 'work laid'; readonly work: Choices };

/** The table after an action, and the change written down where there was one. */
export function bench(state: Bench, action: BenchAction): Bench {
  return isOfTable(action) ? edited(state, action) : stepped(state, action);
}

type Step = Exclude<BenchAction, TableAction>;

const steps: readonly BenchAction['type'][] = ['undo', 'redo', 'released', 'work laid'];

const isOfTable = (action: BenchAction): action is TableAction => !steps.includes(action.type);

function edited(state: Bench, action: TableAction): Bench {
  const { table, history } = state;
  const next = tableState(table, action);
  if (next === table) return state;
  return { table: next, history: followed(history, table, next, action) };
}

function stepped(state: Bench, action: Step): Bench {
  const { table, history } = state;
  switch (action.type) {
    case 'undo':
    case 'redo': {
      const turn = action.type === 'undo' ? undone : redone;
      const turned = turn(table, history, table.unit);
      if (turned === undefined) return state;
      return { table: redrawn({ ...table, ...turned.choices }), history: turned.history };
    }
    case 'released':
      return history.open === undefined ? state : { table, history: closed(history) };
    case 'work laid': {
      const next = redrawn({ ...table, ...action.work });
      return { table: next, history: recorded(closed(history), table, next) };
    }
  }
}

function followed(
  history: History,
  before: TableState,
  after: TableState,
  action: TableAction,
): History {
  switch (action.type) {
    case 'typed':
    case 'moved':
      return recorded(history, before, after, `${action.type} ${action.field}`);
    case 'named':
      return recorded(history, before, after, 'named');
    case 'chosen':
    case 'ruled':
    case 'put':
    case 'overruled':
    case 'gown laid':
    case 'cleared':
      return recorded(closed(history), before, after);
    case 'settled':
    case 'unit':
    case 'panel':
    case 'step':
      return history.open === undefined ? history : closed(history);
    case 'seam':
    case 'looked':
      return history;
  }
}
