import { memo, type Dispatch } from 'react';

import type { EdgeRef } from '#shared/drafting/piece.ts';
import type { Drafted } from '#shared/engine/drafted.ts';
import type { SeamRow } from '#shared/proof/proof.ts';
import { formatLength } from '#shared/units/format-length.ts';
import type { Unit } from '#shared/units/said.ts';
import { speak } from '#shared/units/speak.ts';

import { seamIndex, seamPieces, seamWord } from '../seams.ts';
import type { TableAction } from '../table-state.ts';
import { GirthAudit } from './girth-audit.tsx';
import { ProofCheck } from './proof-check.tsx';

type ProofPanelProps = {
  readonly draft: Drafted;
  /** Whether the draft is that of the figures now in the fields. */
  readonly fresh: boolean;
  /** The edge whose seam is lit. */
  readonly lit: EdgeRef | undefined;
  readonly unit: Unit;
  readonly dispatch: Dispatch<TableAction>;
};

/** The verdict first; the numbers it rests on under it. */
export const ProofPanel = memo(function ProofPanel({
  draft,
  fresh,
  lit,
  unit,
  dispatch,
}: ProofPanelProps) {
  const { proof } = draft;
  const litRow = seamIndex(draft, lit);
  const [verdict, ...rest] = sentences(speak(proof.verdict, unit));
  const holding = proof.lines.filter((line) => line.holds).length;
  return (
    <section className="space-y-6">
      <h2 className="sr-only">Proof</h2>
      <div className="flex items-start gap-3">
        <VerdictMark holds={proof.holds} fresh={fresh} />
        <div>
          {!fresh && <p className="font-semibold text-madder">Of the last good draft</p>}
          <p
            className={`text-xl leading-tight font-semibold ${fresh ? (proof.holds ? '' : 'text-madder') : 'text-slate'}`}
          >
            {verdict}
          </p>
          {!fresh && (
            <p className="text-slate">
              The figures now in the cards are not drawn, and not proven.
            </p>
          )}
          {rest.length > 0 && <p className="figures text-madder">{rest.join(' ')}</p>}
          <p className="text-slate">
            {`${holding} of ${proof.lines.length} checks hold, ${proof.seams.length} seams walked`}
          </p>
        </div>
      </div>
      <GirthAudit rows={proof.girths} unit={unit} />
      <div>
        <h3 className="heading">Seams walked</h3>
        <table className="figures w-full">
          <thead className="text-sm text-slate">
            <tr className="border-b border-rule">
              <th className="py-1 text-left font-normal">Seam</th>
              <th className="py-1 text-right font-normal whitespace-nowrap">{`Length, ${unit}`}</th>
              <th className="py-1 pl-3 text-right font-normal">Partner</th>
            </tr>
          </thead>
          <tbody>
            {proof.seams.map((row, index) => (
              <tr key={`${row.first.piece} ${row.first.edge}`} className="border-b border-rule">
                <th scope="row" className="py-1 text-left font-normal">
                  <button
                    type="button"
                    className="text-left underline decoration-rule underline-offset-4 aria-pressed:font-semibold"
                    aria-pressed={index === litRow}
                    onClick={() =>
                      dispatch({ type: 'seam', seam: index === litRow ? undefined : row.first })
                    }
                  >
                    {seamWord(row, draft)}
                  </button>
                  <span className="block text-sm leading-snug text-slate">
                    {seamPieces(row, draft)}
                  </span>
                </th>
                <td className="py-1 text-right align-top whitespace-nowrap">
                  {formatLength(row.first.length, unit)}
                </td>
                <td
                  className={`py-1 pl-3 text-right align-top ${row.holds ? 'text-verdigris' : 'font-semibold text-madder'}`}
                >
                  {partnerWords(row, unit)}
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      <div>
        <h3 className="heading">Checks</h3>
        {proof.lines.map((line) => (
          <ProofCheck key={line.number} line={line} unit={unit} dispatch={dispatch} />
        ))}
      </div>
    </section>
  );
});

const sentences = (text: string): string[] => text.split(/(?<=\.) /);

/** Two lengths nearer than the proof's own bound for seams are one, mm. */
const sameLength = 0.5;

function partnerWords(row: SeamRow, unit: Unit): string {
  const partner = formatLength(row.second.length, unit);
  if (!row.holds) return `${partner}: does not meet`;
  // Where both lengths stand and differ though the seam holds, one is gathered or pleated onto the other.
  const longer = row.first.length - row.second.length - row.ease;
  if (Math.abs(longer) > sameLength) return `${longer > 0 ? 'pleated into' : 'takes'} ${partner}`;
  return row.ease === 0 ? 'equal' : `eased ${formatLength(Math.abs(row.ease), unit)}`;
}

/** A tick where it holds, a mark of exclamation where not; neither speaks for figures that are not drawn. */
const VerdictMark = ({ holds, fresh }: { holds: boolean; fresh: boolean }) => {
  const stroke = fresh ? (holds ? 'stroke-verdigris' : 'stroke-madder') : 'stroke-slate';
  const sign = holds ? 'M12 20L18 26L29 14' : 'M20 10V23M20 27V30';
  return (
    <svg viewBox="0 0 40 40" className="h-10 w-10 shrink-0" aria-hidden="true">
      <circle cx={20} cy={20} r={18} strokeWidth={2} className={`fill-none ${stroke}`} />
      <path d={fresh ? sign : 'M12 20H28'} strokeWidth={3} className={`fill-none ${stroke}`} />
    </svg>
  );
};
