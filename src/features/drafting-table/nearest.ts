import { completeCard } from '#shared/body/complete-card.ts';
import { DraftingError } from '#shared/drafting/drafting-error.ts';
import { openTable } from '#shared/drafting/drafting-table.ts';
import { houseRuleFigures } from '#shared/drafting/house-rule-figures.ts';
import { choiceWords, type OptionWords } from '#shared/drafts/gown/choice-words.ts';
import { gownLevels } from '#shared/drafts/gown/levels.ts';
import { styleKeys, styleLimits } from '#shared/drafts/gown/style-limits.ts';
import { formatWithUnit } from '#shared/units/format-length.ts';
import type { Problem } from '#shared/units/problem.ts';

import { drawn, nothingDrawn } from './drawn-table.ts';
import { fieldKeys, kindOf, marked, valueOf, writeValue, type FieldKey } from './fields.ts';
import { partLabel } from './part-words.ts';
import { withParts, type Parts } from './parts.ts';
import { styleChoiceKeys } from './style-choices.ts';
import { cardOf, hasCoreMeasures, styleOf } from './table-inputs.ts';
import type { TableState } from './table-state.ts';

/** A way out of what cannot be drawn: what it says, and what it puts in place. */
export type WayOut = { readonly words: string; readonly parts: Parts };

/** So many ways are tried at most: each is drawn. */
const most = 12;

/**
 * The nearest gown that can be drawn: one figure moved to its bound or left open, or one choice made otherwise, among
 * those the refusal names; the body is never touched. Found by drawing, so it holds. None where nothing
 * is refused, or no single change helps.
 */
export function nearest(state: TableState): WayOut | undefined {
  const refused = state.drawn.problems.filter(({ severity }) => severity === 'error');
  const [first] = refused;
  if (first === undefined || state.drawn.fresh) return undefined;
  return waysOut(state, first)
    .slice(0, most)
    .find(
      ({ parts }) =>
        drawn({ ...state, ...withParts(state, parts, state.unit) }, nothingDrawn).fresh,
    );
}

/** Everything that might help, the least change first: the figures named, then the choices. */
function waysOut(state: TableState, problem: Problem): readonly WayOut[] {
  const named = [problem.field, ...(problem.with ?? [])];
  const figures = fieldKeys.filter((key) => named.includes(key) && !key.startsWith('card.'));
  const choices = styleChoiceKeys.filter((choice) => named.includes(`style.${choice}`));
  return [
    ...figures.flatMap((field) => [...atBounds(state, field), ...leftOpen(state, field)]),
    ...choices.flatMap((choice) => {
      const { label, options } = choiceWords[choice];
      return Object.entries<OptionWords>(options)
        .filter(([option]) => option !== state[choice])
        .map(([option, { word }]) => ({
          words: `${label}: take ${word}`,
          parts: { [choice]: option },
        }));
    }),
  ];
}

function atBounds(state: TableState, field: FieldKey): readonly WayOut[] {
  const value = valueOf(state.entries[field]);
  const bounds = boundsOf(state, field);
  if (value === undefined || bounds === undefined) return [];
  const held = Math.min(bounds.max, Math.max(bounds.min, value));
  if (held === value) return [];
  const worded =
    kindOf(field) === 'length' ? formatWithUnit(held, state.unit) : marked(field, held, state.unit);
  const entry = { text: writeValue(field, held, state.unit), value: held };
  return [{ words: `${partLabel(field)}: take ${worded}`, parts: { [field]: entry } }];
}

const leftOpen = (state: TableState, field: FieldKey): readonly WayOut[] =>
  state.entries[field] === undefined
    ? []
    : [{ words: `${partLabel(field)}: leave it open`, parts: { [field]: null } }];

type Bounds = { readonly min: number; readonly max: number };

function boundsOf(state: TableState, field: FieldKey): Bounds | undefined {
  const rule = houseRuleFigures.find(({ key }) => field === `rules.${key}`);
  const style = styleKeys.find((key) => field === `style.${key}`);
  return style === undefined ? rule : limitsOf(state)?.[style];
}

/** The bounds on the body as it stands in the fields; none where the card itself cannot be drawn. */
function limitsOf(state: TableState): ReturnType<typeof styleLimits> | undefined {
  const card = cardOf(state);
  if (!hasCoreMeasures(card)) return undefined;
  try {
    const body = completeCard(card);
    return styleLimits(body, gownLevels(openTable(), body), styleOf(state));
  } catch (error) {
    if (error instanceof DraftingError) return undefined;
    throw error;
  }
}
