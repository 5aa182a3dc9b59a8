import type { Drafted } from '#shared/engine/drafted.ts';
import type { PrintOrder } from '#shared/sheets/print-order.ts';
import type { Unit } from '#shared/units/said.ts';

import { useSentFile } from '../../lib/use-sent-file.ts';
import { fetchSheets, sheetsName, type SheetsAsked } from './queries.ts';

const source = { fetchFile: fetchSheets, fallbackName: sheetsName };

/** The two files of the print room, each on its way by itself: the sheets as PDF, the pieces as SVG. */
export function useSheetsFiles(draft: Drafted, unit: Unit) {
  const pdf = useSentFile<SheetsAsked>(source);
  const svg = useSentFile<SheetsAsked>(source);
  return {
    pdf,
    svg,
    ask: (kind: SheetsAsked['kind'], order: PrintOrder) => {
      const wanted = { inputs: draft.inputs, unit, order };
      (kind === 'pdf' ? pdf : svg).order({ kind, draftNumber: draft.number, wanted });
    },
  };
}
