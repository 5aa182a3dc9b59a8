import type { Body, FurtherMeasure } from '../body/card.ts';
import { measureGuide } from '../body/measure-guide.ts';
import type { DraftingTable } from '../drafting/drafting-table.ts';
import { warning } from '../units/problem.ts';
import { said } from '../units/said.ts';

/** Warns of the estimates among the measures a block leans on most: it shows them on the body as they are. */
export function warnOfEstimates(
  table: DraftingTable,
  body: Body,
  block: string,
  keys: readonly FurtherMeasure[],
): void {
  const [first, ...others] = keys.filter((key) => key in body.estimated);
  if (first === undefined) return;
  const names = [first, ...others].map((key) => measureGuide[key].label.toLowerCase()).join(', ');
  table.warn(
    warning({
      code: 'block-leans-on-estimates',
      field: `card.${first}`,
      with: others.map((key) => `card.${key}`),
      said: said`The ${block} leans on measures that are estimated: ${names}. Take them before you cut, or fit a toile first.`,
    }),
  );
}
