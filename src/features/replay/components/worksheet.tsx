import type { Sent } from '#shared/api/endpoint.ts';
import { printWorksheet } from '#shared/api/worksheet.ts';
import type { DraftedInputs } from '#shared/engine/drafted.ts';
import type { Unit } from '#shared/units/said.ts';

import { callForFile } from '../../../lib/call.ts';
import { failureWords } from '../../../lib/failure-words.ts';
import { printsOnLetter } from '../../../lib/reader.ts';
import { useSentFile } from '../../../lib/use-sent-file.ts';
import { Button } from '../../../ui/button.tsx';

type WorksheetProps = { readonly inputs: DraftedInputs; readonly unit: Unit };

type Order = Sent<typeof printWorksheet>;

/** Every step with its figure on paper, for the learner's folder. */
export const Worksheet = ({ inputs, unit }: WorksheetProps) => {
  const file = useSentFile<Order>({
    fetchFile: (order, signal) => callForFile(printWorksheet, order, signal),
    fallbackName: () => 'ellwand-worksheet.pdf',
  });
  const paper = printsOnLetter() ? 'Letter' : 'A4';
  const words = file.waiting
    ? 'Writing the worksheet…'
    : file.saved === undefined
      ? `Worksheet, ${paper}`
      : '✓ Worksheet saved';
  return (
    <>
      <Button
        kind="quiet"
        slim
        disabled={file.waiting}
        onClick={() => file.order({ inputs, unit, paper })}
      >
        {words}
      </Button>
      <span role="status" className="text-sm text-madder">
        {file.refused !== null && failureWords(file.refused, unit)}
      </span>
    </>
  );
};
