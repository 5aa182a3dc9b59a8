import { useState } from 'react';
import { Link } from 'react-router-dom';

import type { Drafted } from '#shared/engine/drafted.ts';
import { garmentTitles } from '#shared/exports/garment-titles.ts';
import { presetOrder } from '#shared/sheets/print-order.ts';
import type { PaperName } from '#shared/sheets/papers.ts';

import { printsOnLetter } from '../../../lib/reader.ts';
import { usePlan, type Planning } from '../../../lib/use-plan.ts';
import { Dialog } from '../../../ui/dialog.tsx';
import { Segmented } from '../../../ui/segmented.tsx';
import { lastGoodFigures } from '../last-good-figures.ts';
import type { TableState } from '../table-state.ts';
import { FilesToKeep } from './files-to-keep.tsx';
import { countedSheets, PrintRow } from './print-row.tsx';

type PrintDialogProps = {
  readonly draft: Drafted;
  readonly state: TableState;
  readonly open: boolean;
  readonly onClose: () => void;
};

/** Chalk sheet, bodice toile or whole gown, each with its number of sheets before anything is printed. */
export const PrintDialog = ({ open, onClose, ...rest }: PrintDialogProps) => (
  <Dialog title="Print" open={open} onClose={onClose}>
    <PrintChoices {...rest} />
  </Dialog>
);

const PrintChoices = ({ draft, state }: Omit<PrintDialogProps, 'open' | 'onClose'>) => {
  const [paper, setPaper] = useState<PaperName>(() => (printsOnLetter() ? 'Letter' : 'A4'));
  const toile = usePlan(draft.pieces, draft.number, presetOrder(paper, 'bodice-toile'));
  const gown = usePlan(draft.pieces, draft.number, presetOrder(paper, 'whole-gown'));
  const { unit, drawn } = state;
  const order = { draft, unit, paper };
  return (
    <>
      {!drawn.fresh && (
        <div className="mt-3 text-madder">
          <p className="font-semibold">This prints the last good draft:</p>
          <ul className="figures">
            {lastGoodFigures(state, draft).map((line) => (
              <li key={line}>{line}</li>
            ))}
          </ul>
        </div>
      )}
      {!draft.proof.holds && (
        <p className="mt-3 font-semibold text-madder">
          These pieces do not yet sew together: see Proof before you cut.
        </p>
      )}
      <div className="mt-4 flex items-center gap-3">
        <span>Paper</span>
        <Segmented
          legend="Paper"
          choices={[
            { value: 'A4', label: 'A4' },
            { value: 'Letter', label: 'Letter' },
          ]}
          value={paper}
          onChoose={setPaper}
        />
      </div>
      <div className="mt-2">
        <PrintRow
          title="Chalk sheet"
          note="Every point as a distance, at quarter scale: draft straight onto paper or cloth."
          sheets={countedSheets(1)}
          order={{ ...order, kind: 'chalk-sheet' }}
        />
        {draft.garment === 'gown' ? (
          <>
            <PrintRow
              title="Bodice toile"
              note="The top at true scale, to try on in calico first."
              sheets={sheetsIn(toile.planning)}
              order={{ ...order, kind: 'bodice-toile' }}
            />
            <PrintRow
              title="Whole gown"
              note="Every piece at true scale, to glue together."
              sheets={sheetsIn(gown.planning)}
              order={{ ...order, kind: 'whole-gown' }}
            />
          </>
        ) : (
          <PrintRow
            title={garmentTitles[draft.garment]}
            note="Front and back at true scale, to glue together."
            sheets={sheetsIn(gown.planning)}
            order={{ ...order, kind: 'whole-gown' }}
          />
        )}
      </div>
      <div className="flex flex-wrap items-center justify-between gap-x-4 gap-y-1 border-b border-rule py-3 sm:flex-nowrap">
        <p className="basis-full text-sm text-slate sm:basis-auto">
          Every paper, piece by piece, with a page plan before you print, and a scale check after.
        </p>
        <Link
          to="print"
          className="ml-auto inline-flex min-h-10 w-32 shrink-0 items-center justify-center rounded-one border border-rule bg-paper px-2"
        >
          Print room
        </Link>
      </div>
      <FilesToKeep order={order} />
      <p className="mt-4 text-sm text-slate">
        Print at 100 %, not “fit to page”, and measure the test squares on the cover before you cut.
      </p>
    </>
  );
};

/** Sheets of a plan in words, once they are counted; a print can be ordered before. */
function sheetsIn(planning: Planning): string | undefined {
  if (planning.kind === 'planned') return countedSheets(planning.plan.sheets);
  return planning.kind === 'refused' ? 'too many sheets' : undefined;
}
