import { formatLength } from '#shared/units/format-length.ts';
import type { GirthRow } from '#shared/proof/proof.ts';
import type { Unit } from '#shared/units/said.ts';

import { levelTitles } from '#shared/exports/level-titles.ts';

type GirthAuditProps = { readonly rows: readonly GirthRow[]; readonly unit: Unit };

const capital = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);

/** What the body measures, what ease was asked for, and what the pieces give, level by level. */
export const GirthAudit = ({ rows, unit }: GirthAuditProps) => (
  <div>
    <h3 className="heading">{`Girth audit, ${unit}`}</h3>
    <table className="figures w-full">
      <thead className="text-sm text-slate">
        <tr className="border-b border-rule">
          <th className="py-1 text-left font-normal">Level</th>
          <th className="py-1 text-right font-normal">Body</th>
          <th className="py-1 text-right font-normal">Ease</th>
          <th className="py-1 text-right font-normal">Pieces give</th>
        </tr>
      </thead>
      <tbody>
        {rows.map((row) => (
          <tr key={row.level} className="border-b border-rule">
            <th scope="row" className="py-1 text-left font-normal">
              {capital(levelTitles[row.level])}
            </th>
            <td className="py-1 text-right">
              {row.body === undefined ? '—' : formatLength(row.body, unit)}
              {row.estimated && row.body !== undefined && (
                <span className="text-sm text-slate"> est.</span>
              )}
            </td>
            <td className="py-1 text-right">
              {row.ease === undefined ? '' : signed(row.ease, unit)}
            </td>
            <td
              className={`py-1 text-right ${Math.abs(row.pieces - row.wanted) <= 0.5 ? '' : 'font-semibold text-madder'}`}
            >
              {formatLength(row.pieces, unit)}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  </div>
);

const signed = (ease: number, unit: Unit): string =>
  ease > 0 ? `+${formatLength(ease, unit)}` : formatLength(ease, unit);
