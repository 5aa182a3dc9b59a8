import { useState } from 'react';

import type { FigureRow } from '#shared/compare/figures.ts';
import {
  figureKinds,
  figureTitle,
  formatChange,
  formatFigure,
} from '#shared/exports/figure-words.ts';
import type { Unit } from '#shared/units/said.ts';

type FigureTableProps = {
  readonly rows: readonly FigureRow[];
  readonly titles: ReadonlyMap<string, string>;
  readonly names: { readonly first: string; readonly second: string };
  readonly unit: Unit;
};

const changeOf = ({ kind, first, second }: FigureRow, unit: Unit): string =>
  first === undefined || second === undefined ? '' : formatChange(kind, second - first, unit);

/** Girths, widths, seam lengths and areas of two drafts beside each other. */
export const FigureTable = ({ rows, titles, names, unit }: FigureTableProps) => {
  const [all, setAll] = useState(false);
  const shown = rows.filter((row) => all || changeOf(row, unit) !== '0');
  return (
    <section aria-labelledby="figures">
      <div className="flex flex-wrap items-baseline justify-between gap-x-4">
        <h2 id="figures" className="heading">
          Figures
        </h2>
        <label className="flex items-center gap-2">
          <input
            type="checkbox"
            className="accent-brass"
            checked={all}
            onChange={() => setAll(!all)}
          />
          Also what is the same in both
        </label>
      </div>
      {figureKinds.map(({ kind, title }) => {
        const own = shown.filter((row) => row.kind === kind);
        if (own.length === 0) return null;
        return (
          <div key={kind} className="overflow-x-auto" tabIndex={0} role="group" aria-label={title}>
            <table className="figures mt-3 w-full">
              <caption className="text-left font-semibold">
                {kind === 'area' ? title : `${title}, ${unit}`}
              </caption>
              <thead>
                <tr className="text-right text-sm text-slate">
                  <td />
                  <th className="px-2 font-normal">{names.first}</th>
                  <th className="px-2 font-normal">{names.second}</th>
                  <th className="pl-2 font-normal">change</th>
                </tr>
              </thead>
              <tbody>
                {own.map((row) => (
                  <tr key={row.key} className="border-t border-rule">
                    <th scope="row" className="py-1 pr-2 text-left font-normal">
                      {figureTitle(row, titles)}
                    </th>
                    {[row.first, row.second].map((value, index) => (
                      <td key={index} className="px-2 py-1 text-right whitespace-nowrap">
                        {value === undefined ? 'none' : formatFigure(kind, value, unit)}
                      </td>
                    ))}
                    <td className="py-1 pl-2 text-right whitespace-nowrap">
                      {changeOf(row, unit)}
                    </td>
                  </tr>
                ))}
              </tbody>
            </table>
          </div>
        );
      })}
      {shown.length === 0 && <p className="mt-2">Nothing differs: both drafts are the same.</p>}
    </section>
  );
};
