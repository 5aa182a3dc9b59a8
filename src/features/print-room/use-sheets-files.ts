import type { Draft } from '#shared/engine/draft.ts';
import type { PrintOrder } from '#shared/sheets/print-order.ts';
import type { Unit } from '#shared/units/said.ts';

import { useSentFile } from '../../lib/use-sent-file.ts';
import { fetchSheets, sheetsName, type SheetsAsked } from './queries.ts';

const source = { fetchFile: fetchSheets, fallbackName: sheetsName };

/** The two files of the print room, each on its way by itself: the sheets as PDF, the pieces as SVG. */
export function useSheetsFiles(draft: Draft, unit: Unit) {
  const pdf = useSentFile<SheetsAsked>(source);
  const svg = useSentFile<SheetsAsked>(source);
  const { card, style, rules } = draft.inputs;
  return {
    pdf,
    svg,
    ask: (kind: SheetsAsked['kind'], order: PrintOrder) => {
      const wanted = { inputs: { card, style, rules }, unit, order };
      (kind === 'pdf' ? pdf : svg).order({ kind, draftNumber: draft.number, wanted });
    },
  };
}
