import type { Overruled } from '#shared/body/card.ts';
import { balanced } from '#shared/drafting/house-rule-presets.ts';
import type { HouseRules } from '#shared/drafting/house-rules.ts';
import type { EdgeRef } from '#shared/drafting/piece.ts';
import type { Finding } from '#shared/proof/proof.ts';
import type { Unit } from '#shared/units/said.ts';

import { drawn, nothingDrawn, type Drawn } from './drawn-table.ts';
import {
  fieldKeys,
  readEntry,
  rewritten,
  writeValue,
  type Entries,
  type FieldKey,
} from './fields.ts';
import { withParts, type Parts } from './parts.ts';
import { choicesFrom, type MadeChoices } from './style-choices.ts';
import { givenFor, withoutRules, type Choices, type LaidGown } from './table-inputs.ts';

export type Panel = 'measures' | 'style' | 'steps' | 'proof' | 'pieces';

/** Everything on the drafting table; handles, fields and panels are views of this one state. */
export type TableState = Choices & {
  readonly unit: Unit;
  readonly panel: Panel;
  readonly step?: string | undefined;
  readonly seam?: EdgeRef | undefined;
  /** Places of the proof that are pointed at. */
  readonly looked?: Finding['where'] | undefined;
  readonly drawn: Drawn;
};

export type TableAction =
  | { readonly type: 'typed'; readonly field: FieldKey; readonly text: string }
  | { readonly type: 'settled'; readonly field: FieldKey }
  | { readonly type: 'moved'; readonly field: FieldKey; readonly value: number }
  | { readonly type: 'named'; readonly name: string }
  | { readonly type: 'chosen'; readonly choice: Partial<MadeChoices> }
  /** Other house rules: what was typed over the ones before goes with them. */
  | { readonly type: 'ruled'; readonly rules: HouseRules }
  | { readonly type: 'overruled'; readonly overruled: readonly Overruled[] }
  /** Several parts at once, such as a way out of a combination that cannot be drawn. */
  | { readonly type: 'put'; readonly parts: Parts }
  | { readonly type: 'unit'; readonly unit: Unit }
  | { readonly type: 'gown laid'; readonly gown: LaidGown }
  | { readonly type: 'cleared' }
  | { readonly type: 'panel'; readonly panel: Panel }
  | { readonly type: 'step'; readonly step: string | undefined }
  | { readonly type: 'seam'; readonly seam: EdgeRef | undefined }
  | { readonly type: 'looked'; readonly at: Finding['where'] };

export const emptyTable: TableState = {
  unit: 'cm',
  name: '',
  ...choicesFrom(() => undefined),
  overruled: [],
  rules: balanced,
  entries: {},
  panel: 'measures',
  drawn: nothingDrawn,
};

export function tableState(state: TableState, action: TableAction): TableState {
  switch (action.type) {
    case 'typed':
      return redrawn({ ...state, entries: withText(state, action.field, action.text) });
    case 'settled': {
      const entry = state.entries[action.field];
      if (entry === undefined) return state;
      const entries = {
        ...state.entries,
        [action.field]: rewritten(action.field, entry, state.unit),
      };
      return { ...state, entries };
    }
    case 'moved': {
      const text = writeValue(action.field, action.value, state.unit);
      const entries = { ...state.entries, [action.field]: { text, value: action.value } };
      return redrawn({ ...state, entries });
    }
    case 'named':
      return redrawn({ ...state, name: action.name });
    case 'chosen':
      return redrawn({ ...state, ...action.choice });
    case 'ruled':
      return redrawn({ ...state, rules: action.rules, entries: withoutRules(state.entries) });
    case 'overruled':
      return redrawn({ ...state, overruled: action.overruled });
    case 'put':
      return redrawn({ ...state, ...withParts(state, action.parts, state.unit) });
    case 'unit':
      return { ...state, unit: action.unit, entries: inUnit(state.entries, action.unit) };
    case 'gown laid':
      return redrawn(withGown(state, action.gown));
    case 'cleared':
      return { ...emptyTable, unit: state.unit };
    case 'panel':
      return { ...state, panel: action.panel, seam: undefined, looked: undefined };
    case 'step':
      return { ...state, step: action.step };
    case 'seam':
      return { ...state, seam: action.seam };
    case 'looked':
      return { ...state, looked: action.at };
  }
}

/** The state with its drawing made anew. */
export const redrawn = (state: TableState): TableState => ({
  ...state,
  drawn: drawn(state, state.drawn),
});

function withText(state: TableState, field: FieldKey, text: string): Entries {
  const { [field]: _, ...others } = state.entries;
  return text.trim() === '' ? others : { ...others, [field]: readEntry(field, text, state.unit) };
}

const inUnit = (entries: Entries, unit: Unit): Entries =>
  Object.fromEntries(
    fieldKeys.flatMap((field) => {
      const entry = entries[field];
      return entry === undefined ? [] : [[field, rewritten(field, entry, unit)] as const];
    }),
  );

/** A gown laid out is a fresh start: only the reader's unit stays. */
function withGown({ unit }: TableState, { card, style, rules }: LaidGown): TableState {
  const entries = Object.fromEntries(
    fieldKeys.flatMap((field) => {
      const value = givenFor(field, card, style);
      return value === undefined ? [] : [[field, { text: writeValue(field, value, unit), value }]];
    }),
  );
  return {
    ...emptyTable,
    unit,
    entries,
    name: card.name ?? '',
    date: card.date,
    overruled: card.overruled ?? [],
    rules,
    ...choicesFrom((choice): unknown => Reflect.get(style, choice)),
  };
}
