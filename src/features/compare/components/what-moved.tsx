import { measureGuide } from '#shared/body/measure-guide.ts';
import {
  figureKinds,
  figureTitle,
  formatChange,
  formatFigure,
} from '#shared/exports/figure-words.ts';
import { styleLabels } from '#shared/drafts/gown/style-labels.ts';
import type { Cause, MovedFigure, MovedPoint, Regrade } from '#shared/regrade/what-moved.ts';
import { formatAngle, formatWithUnit } from '#shared/units/format-length.ts';
import type { Unit } from '#shared/units/said.ts';
import { speak } from '#shared/units/speak.ts';

type WhatMovedProps = {
  readonly regrade: Regrade;
  readonly titles: ReadonlyMap<string, string>;
  readonly unit: Unit;
};

const small = (text: string): string => text.toLowerCase();

const measureWords = ({ measure, from, to }: Cause, unit: Unit): string => {
  const { label, kind } = measureGuide[measure];
  const write = (value: number | undefined): string => {
    if (value === undefined) return 'not taken';
    return kind === 'angle' ? formatAngle(value) : formatWithUnit(value, unit);
  };
  return `${label}: ${write(from)} \u2192 ${write(to)}`;
};

/** Which measures moved a figure, farthest first, and what they leave to their interplay. */
function becauseOf({ kind, by, interplay }: MovedFigure, unit: Unit): string {
  const shares = by
    .map(({ measure, change }) => ({ measure, text: formatChange(kind, change, unit) }))
    .filter(({ text }) => text !== '0')
    .map(({ measure, text }) => `${small(measureGuide[measure].label)} ${text}`);
  const rest = formatChange(kind, interplay, unit);
  return [...shares, ...(rest === '0' ? [] : [`interplay ${rest}`])].join(', ');
}

const pointBecause = ({ by }: MovedPoint, unit: Unit): string =>
  by.length === 0
    ? 'interplay'
    : by
        .map(
          ({ measure, change }) =>
            `${small(measureGuide[measure].label)} ${formatChange('seam', change, unit)}`,
        )
        .join(', ');

const cell = 'px-2 py-1 text-right whitespace-nowrap';

/** The measures that changed, and those that no draft can be made of alone. */
const Causes = ({ causes, unit }: { causes: readonly Cause[]; unit: Unit }) => (
  <ul className="mt-2">
    {causes.map((cause) => (
      <li key={cause.measure}>
        {measureWords(cause, unit)}
        {cause.problems !== undefined && (
          <span className="block text-sm text-slate">
            {`Cannot change alone, so its part is in the interplay. ${cause.problems
              .map(({ said }) => speak(said, unit))
              .join(' ')}`}
          </span>
        )}
      </li>
    ))}
  </ul>
);

const FigureRows = ({
  figures,
  titles,
  unit,
}: Omit<WhatMovedProps, 'regrade'> & {
  readonly figures: readonly MovedFigure[];
}) =>
  figures.map((row) => (
    <tr key={row.key} className="border-t border-rule align-top">
      <th scope="row" className="py-1 pr-2 text-left font-normal">
        {figureTitle(row, titles)}
      </th>
      <td className={cell}>{formatFigure(row.kind, row.first, unit)}</td>
      <td className={cell}>{formatFigure(row.kind, row.second, unit)}</td>
      <td className={cell}>{formatChange(row.kind, row.second - row.first, unit)}</td>
      <td className="py-1 pl-2">{becauseOf(row, unit)}</td>
    </tr>
  ));

/** What a new card moved, by how much, and which measure moved it. */
export const WhatMoved = ({ regrade, titles, unit }: WhatMovedProps) => {
  const { causes, figures, points, held } = regrade;
  return (
    <section aria-labelledby="what-moved">
      <h2 id="what-moved" className="heading">
        What moved
      </h2>
      {causes.length === 0 ? (
        <p className="mt-2">Both cards have the same measures: nothing moves.</p>
      ) : (
        <Causes causes={causes} unit={unit} />
      )}
      {held.length > 0 && (
        <ul className="mt-2 text-slate">
          {held.map(({ key, wanted, given }) => (
            <li key={key}>
              {`${styleLabels[key]} ${formatWithUnit(wanted, unit)} does not fit this body: it is ${formatWithUnit(given, unit)}, the nearest that does.`}
            </li>
          ))}
        </ul>
      )}
      {figureKinds.map(({ kind, title }) => {
        const own = figures.filter((row) => row.kind === kind);
        if (own.length === 0) return null;
        return (
          <div key={kind} className="overflow-x-auto" tabIndex={0} role="group" aria-label={title}>
            <table className="figures mt-4 w-full min-w-[34rem]">
              <caption className="text-left font-semibold">
                {kind === 'area' ? title : `${title}, ${unit}`}
              </caption>
              <thead>
                <tr className="text-sm text-slate">
                  <td />
                  {['before', 'after', 'change'].map((head) => (
                    <th key={head} className="px-2 text-right font-normal">
                      {head}
                    </th>
                  ))}
                  <th className="pl-2 text-left font-normal">moved by</th>
                </tr>
              </thead>
              <tbody>
                <FigureRows figures={own} titles={titles} unit={unit} />
              </tbody>
            </table>
          </div>
        );
      })}
      {points.length > 0 && (
        <details className="mt-4">
          <summary className="w-fit font-semibold">{`Points that moved (${points.length})`}</summary>
          <div className="overflow-x-auto" tabIndex={0} role="group" aria-label="Points that moved">
            <table className="figures mt-2 w-full min-w-[34rem]">
              <thead>
                <tr className="text-sm text-slate">
                  <td />
                  <th className="px-2 text-right font-normal">{`across, ${unit}`}</th>
                  <th className="px-2 text-right font-normal">{`down, ${unit}`}</th>
                  <th className="pl-2 text-left font-normal">moved by, each alone</th>
                </tr>
              </thead>
              <tbody>
                {points.map((point) => (
                  <tr key={point.key} className="border-t border-rule align-top">
                    <th scope="row" className="py-1 pr-2 text-left font-normal">
                      {`${titles.get(point.piece) ?? point.piece}, ${point.title}`}
                    </th>
                    <td className={cell}>
                      {formatChange('seam', point.to.x - point.from.x, unit)}
                    </td>
                    <td className={cell}>
                      {formatChange('seam', point.to.y - point.from.y, unit)}
                    </td>
                    <td className="py-1 pl-2">{pointBecause(point, unit)}</td>
                  </tr>
                ))}
              </tbody>
            </table>
          </div>
        </details>
      )}
    </section>
  );
};
