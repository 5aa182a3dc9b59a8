import { draftJson } from '#shared/exports/json.ts';

import { failureWords } from '../../../lib/failure-words.ts';
import { saveFile } from '../../../lib/save-file.ts';
import { Button } from '../../../ui/button.tsx';
import type { PrintOrder } from '../queries.ts';
import { usePrint } from '../use-print.ts';

type FilesToKeepProps = { readonly order: Omit<PrintOrder, 'kind'> };

/** The pieces for other programs: SVG drawn by the server, the draft itself as JSON. */
export const FilesToKeep = ({ order }: FilesToKeepProps) => {
  const svg = usePrint();
  const { draft } = order;
  return (
    <div className="mt-3 flex flex-wrap items-center gap-3">
      <span className="text-slate">Files</span>
      <Button disabled={svg.waiting} onClick={() => svg.order({ ...order, kind: 'pieces.svg' })}>
        SVG, true scale
      </Button>
      <Button
        onClick={() =>
          saveFile(
            new Blob([draftJson(draft)], { type: 'application/json' }),
            `ellwand-${draft.number}.json`,
          )
        }
      >
        JSON, draft and proof
      </Button>
      <p role="status" className="w-full text-sm">
        {svg.waiting && 'Writing the SVG…'}
        {svg.saved !== undefined && (
          <span className="text-verdigris">{`✓ saved as ${svg.saved.name}`}</span>
        )}
        {svg.refused !== null && (
          <span className="text-madder">{failureWords(svg.refused, order.unit)}</span>
        )}
      </p>
    </div>
  );
};
