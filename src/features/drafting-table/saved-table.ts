import { balanced, quarterRule } from '#shared/drafting/house-rule-presets.ts';
import type { Unit } from '#shared/units/said.ts';

import { browserStorage } from '../../lib/browser-storage.ts';
import { readersUnit, rememberedUnit } from '../../lib/reader.ts';
import { fieldKeys, readEntry, writeValue, type Entries, type FieldKey } from './fields.ts';
import { keptHistory, noHistory, type History } from './history.ts';
import { isRecord } from './is-record.ts';
import { readOverruled, readRules } from './parts.ts';
import { choicesFrom, tableChoiceKeys } from './style-choices.ts';
import { emptyTable, redrawn, tableState, type TableState } from './table-state.ts';

const key = 'ellwand.table';
const historyKey = 'ellwand.table.history';
const version = 1;

/**
 * The table as this browser kept it; an empty one in the reader's unit where nothing was kept or it
 * cannot be trusted.
 */
export function keptTable(
  unit: Unit,
  storage: Storage | undefined = browserStorage('local'),
): TableState {
  const empty = { ...emptyTable, unit };
  try {
    const text = storage?.getItem(key) ?? 'null';
    return fromKept(JSON.parse(text)) ?? empty;
  } catch {
    return empty;
  }
}

/** The table as this browser kept it, read in the unit that was last chosen at any place. */
export function readersTable(): TableState {
  const table = keptTable(readersUnit());
  const unit = rememberedUnit() ?? table.unit;
  return unit === table.unit ? table : tableState(table, { type: 'unit', unit });
}

/** Keeps the table in this browser; false where the browser does not allow it. */
export function keepTable(
  state: TableState,
  storage: Storage | undefined = browserStorage('local'),
): boolean {
  const { unit, name, date, overruled, rules, entries } = state;
  const made = Object.fromEntries(tableChoiceKeys.map((choice) => [choice, state[choice]]));
  try {
    if (storage === undefined) return false;
    storage.setItem(
      key,
      JSON.stringify({ version, unit, name, date, ...made, overruled, rules, entries }),
    );
    return true;
  } catch {
    return false;
  }
}

/** Forgets the table and how it came about: its gown is kept elsewhere now. */
export function clearKeptTable(): void {
  try {
    browserStorage('local')?.removeItem(key);
    browserStorage('local')?.removeItem(historyKey);
  } catch {
    // A browser that keeps nothing has nothing to forget.
  }
}

/** The changes that led to the kept table, as far as they still fit it. */
export function keptTableHistory(table: TableState): History {
  try {
    const text = browserStorage('local')?.getItem(historyKey) ?? 'null';
    return keptHistory(JSON.parse(text), table, table.unit);
  } catch {
    return noHistory;
  }
}

/** Keeps the changes beside the table; without room for them the table itself matters more. */
export function keepTableHistory({ past, future }: History): void {
  try {
    browserStorage('local')?.setItem(historyKey, JSON.stringify({ past, future }));
  } catch {
    // The way back ends with this page then.
  }
}

function fromKept(kept: unknown): TableState | undefined {
  if (!isRecord(kept) || kept['version'] !== version) return undefined;
  const unit: Unit = kept['unit'] === 'in' ? 'in' : 'cm';
  const entries = isRecord(kept['entries']) ? kept['entries'] : {};
  return redrawn({
    ...emptyTable,
    unit,
    name: typeof kept['name'] === 'string' ? kept['name'].slice(0, 60) : '',
    date: typeof kept['date'] === 'string' ? kept['date'] : undefined,
    ...choicesFrom((choice) => kept[choice]),
    overruled: readOverruled(kept['overruled']) ?? [],
    // Tables kept before house rules could be typed name a preset.
    rules: readRules(kept['rules']) ?? (kept['preset'] === 'quarterRule' ? quarterRule : balanced),
    entries: Object.fromEntries(
      fieldKeys.flatMap((field) => keptEntry(field, entries[field], unit)),
    ),
  });
}

/** A kept value is trusted as a number and written anew; text that was never read is read again. */
function keptEntry(
  field: FieldKey,
  entry: unknown,
  unit: Unit,
): readonly (readonly [FieldKey, Entries[FieldKey]])[] {
  if (!isRecord(entry)) return [];
  const { value, text } = entry;
  if (typeof value === 'number' && Number.isFinite(value)) {
    return [[field, { text: writeValue(field, value, unit), value }]];
  }
  return typeof text === 'string' ? [[field, readEntry(field, text.slice(0, 40), unit)]] : [];
}
