import { coreMeasures, furtherMeasures } from '#shared/body/card.ts';
import { measureGuide } from '#shared/body/measure-guide.ts';
import { isPlainNumber } from '#shared/drafts/gown/style-card.ts';
import { styleLabels } from '#shared/drafts/gown/style-labels.ts';
import { styleKeys, styleLimits } from '#shared/drafts/gown/style-limits.ts';
import { formatWithUnit } from '#shared/units/format-length.ts';
import { speak } from '#shared/units/speak.ts';
import type { Problem } from '#shared/units/problem.ts';
import type { Unit } from '#shared/units/said.ts';

import { fieldKeys, valueOf, type FieldKey } from './fields.ts';
import type { TableState } from './table-state.ts';

type Told = Pick<TableState, 'entries' | 'unit' | 'drawn'>;

/** A problem in the reader's unit; a figure that would do in the other unit is asked about. */
export const problemWords = (problem: Problem, table: Told): string =>
  otherUnit(problem, table) ?? speak(problem.said, table.unit);

/** What stands under a field; a combination that cannot be is said once, under the one of its fields it names first. */
export function messageFor(
  field: string,
  problems: readonly Problem[],
  table: Told,
): string | undefined {
  const found = problems.find((each) => each.severity === 'error' && each.field === field);
  return found === undefined ? undefined : problemWords(found, table);
}

const perOther: Record<Unit, { readonly unit: Unit; readonly times: number }> = {
  in: { unit: 'cm', times: 1 / 2.54 },
  cm: { unit: 'in', times: 2.54 },
};

/** `Waist 72 3⁄8 in: did you mean 72.4 cm = 28 1⁄2 in?` where the same figure would do in the other unit. */
function otherUnit({ code, field }: Problem, table: Told): string | undefined {
  const { entries, unit } = table;
  const key = fieldKeys.find((each) => field === each);
  const bounds = key && boundsOf(key, table);
  const value = key && valueOf(entries[key]);
  if (code !== 'out-of-range' || bounds === undefined || value === undefined) return undefined;
  const { label, min, max } = bounds;
  const other = perOther[unit];
  const meant = value * other.times;
  if (meant < min || meant > max) return undefined;
  const worded = (length: number, as: Unit = unit): string => formatWithUnit(length, as);
  return `${label} ${worded(value)}: did you mean ${worded(meant, other.unit)} = ${worded(meant)}? It must lie between ${worded(min)} and ${worded(max)}.`;
}

type Bounds = { readonly label: string; readonly min: number; readonly max: number };

/** Bounds of a length: those of a style hang on the body of the last good draft. */
function boundsOf(field: FieldKey, { drawn: { draft } }: Told): Bounds | undefined {
  const measure = [...coreMeasures, ...furtherMeasures].find((key) => field === `card.${key}`);
  if (measure !== undefined) {
    return measureGuide[measure].kind === 'length' ? measureGuide[measure] : undefined;
  }
  const style = styleKeys.find((key) => field === `style.${key}`);
  if (draft?.garment !== 'gown' || style === undefined || isPlainNumber(style)) return undefined;
  const limits = styleLimits(draft.body, draft.bodyLevels, draft.inputs.style);
  return { label: styleLabels[style], ...limits[style] };
}
