import type { PrintOrder } from '#shared/sheets/print-order.ts';
import type { Unit } from '#shared/units/said.ts';

import { failureWords } from '../../../lib/failure-words.ts';
import { Button } from '../../../ui/button.tsx';
import { FileState } from '../../../ui/file-state.tsx';
import type { useSheetsFiles } from '../use-sheets-files.ts';

type Files = ReturnType<typeof useSheetsFiles>;

type PrintBarProps = {
  readonly files: Files;
  /** The order of the plan that lies here; none while there is no plan. */
  readonly order: PrintOrder | undefined;
};

/** The two buttons: the sheets as a PDF, the pieces as SVG. */
export const PrintBar = ({ files: { pdf, svg, ask }, order }: PrintBarProps) => (
  <p className="ml-auto flex shrink-0 items-center gap-2">
    <Button
      className="max-sm:px-2"
      disabled={order === undefined || svg.waiting}
      aria-label="SVG of the pieces"
      onClick={() => order && ask('svg', order)}
    >
      SVG
    </Button>
    <Button
      kind="primary"
      className="max-sm:px-3"
      disabled={order === undefined || pdf.waiting}
      onClick={() => order && ask('pdf', order)}
    >
      Make the PDF
    </Button>
  </p>
);

/** How the files that were asked for stand. */
export const FileStates = ({ files, unit }: { readonly files: Files; readonly unit: Unit }) =>
  (
    [
      ['Sheets', files.pdf],
      ['Pieces', files.svg],
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
  ));
