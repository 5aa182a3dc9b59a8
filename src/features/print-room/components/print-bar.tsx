import type { PrintOrder } from '#shared/sheets/print-order.ts';
import type { Draft } from '#shared/engine/draft.ts';
import type { Unit } from '#shared/units/said.ts';

import { failureWords } from '../../../lib/failure-words.ts';
import { useSentFile } from '../../../lib/use-sent-file.ts';
import { Button } from '../../../ui/button.tsx';
import { FileState } from '../../../ui/file-state.tsx';
import { fetchSheets, sheetsName, type SheetsAsked } from '../queries.ts';

type PrintBarProps = {
  readonly draft: Draft;
  readonly unit: Unit;
  /** The order of the plan that lies here; none while there is no plan. */
  readonly order: PrintOrder | undefined;
};

/** The sheets as a PDF, the pieces as SVG: asked for, waited for, saved, or why there are none. */
export const PrintBar = ({ draft, unit, order }: PrintBarProps) => {
  const pdf = useSentFile<SheetsAsked>({ fetchFile: fetchSheets, fallbackName: sheetsName });
  const svg = useSentFile<SheetsAsked>({ fetchFile: fetchSheets, fallbackName: sheetsName });
  const { card, style, rules } = draft.inputs;
  const ask = (kind: SheetsAsked['kind'], file: typeof pdf) => {
    if (order === undefined) return;
    const wanted = { inputs: { card, style, rules }, unit, order };
    file.order({ kind, draftNumber: draft.number, wanted });
  };
  return (
    <div className="ml-auto">
      <p className="flex items-center justify-end gap-2">
        <Button
          disabled={order === undefined || svg.waiting}
          aria-label="SVG of the pieces"
          onClick={() => ask('svg', svg)}
        >
          SVG
        </Button>
        <Button
          kind="primary"
          disabled={order === undefined || pdf.waiting}
          onClick={() => ask('pdf', pdf)}
        >
          Make the PDF
        </Button>
      </p>
      {(
        [
          ['Sheets', pdf],
          ['Pieces', svg],
        ] as const
      ).map(([title, file]) => (
        <FileState
          key={title}
          title={title}
          waiting={file.waiting}
          saved={file.saved}
          refused={file.refused === null ? undefined : failureWords(file.refused, unit)}
          onCancel={file.cancel}
        />
      ))}
    </div>
  );
};
