import { formatFigure } from '#shared/exports/figure-words.ts';
import { levelTitles } from '#shared/exports/level-titles.ts';
import type { NestReport } from '#shared/regrade/nest-report.ts';
import { type Nest, sizeLabel } from '#shared/regrade/nest.ts';
import { styleLabels } from '#shared/drafts/gown/style-labels.ts';
import { formatWithUnit } from '#shared/units/format-length.ts';
import type { Unit } from '#shared/units/said.ts';
import { speak } from '#shared/units/speak.ts';

type NestReportProps = {
  readonly nest: Nest;
  readonly report: NestReport;
  readonly titles: ReadonlyMap<string, string>;
  readonly unit: Unit;
};

/** Depths that gave way in a size, and pieces made unlike the largest size's. */
const Notes = ({ nest, report, titles, unit }: NestReportProps) => (
  <ul>
    {nest.refused.map(({ step, problems }) => (
      <li key={step} className="text-madder">
        {`Size ${sizeLabel(step)} cannot be drawn. ${problems.map(({ said }) => speak(said, unit)).join(' ')}`}
      </li>
    ))}
    {nest.sizes.flatMap(({ step, held }) =>
      held.map(({ key, wanted, given }) => (
        <li key={`${step} ${key}`} className="text-slate">
          {`Size ${sizeLabel(step)}: ${styleLabels[key].toLowerCase()} ${formatWithUnit(wanted, unit)} does not fit that body; it is ${formatWithUnit(given, unit)}, the nearest that does.`}
        </li>
      )),
    )}
    {report.unlike.map(({ piece, steps }) => (
      <li key={piece} className="text-slate">
        {`${titles.get(piece) ?? piece} is made otherwise in ${steps.map(sizeLabel).join(', ')} than in the largest size.`}
      </li>
    ))}
  </ul>
);

/** Girths through the sizes, and what a maker should look at before cutting. */
export const NestReportView = (props: NestReportProps) => {
  const { nest, report, titles, unit } = props;
  return (
    <section aria-labelledby="nest-report" className="space-y-3">
      <h2 id="nest-report" className="heading">
        Report
      </h2>
      <Notes {...props} />
      <div className="overflow-x-auto" tabIndex={0} role="group" aria-label="Finished girths">
        <table className="figures w-full min-w-[34rem]">
          <caption className="text-left font-semibold">{`Finished girths, ${unit}`}</caption>
          <thead>
            <tr className="text-right text-sm text-slate">
              <td />
              {nest.sizes.map(({ step }) => (
                <th key={step} className="px-2 font-normal">
                  {sizeLabel(step)}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {report.girths.map(({ level, girths }) => (
              <tr key={level} className="border-t border-rule">
                <th scope="row" className="py-1 pr-2 text-left font-normal first-letter:uppercase">
                  {levelTitles[level]}
                </th>
                {nest.sizes.map(({ step }) => {
                  const found = girths.find((each) => each.step === step);
                  return (
                    <td key={step} className="px-2 py-1 text-right whitespace-nowrap">
                      {found === undefined ? 'none' : formatFigure('girth', found.girth, unit)}
                    </td>
                  );
                })}
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      <details>
        <summary className="w-fit font-semibold">
          {`Points off the straight line between smallest and largest (${report.off.length})`}
        </summary>
        {report.off.length === 0 ? (
          <p>{`None by more than ${formatWithUnit(1.5, unit)}.`}</p>
        ) : (
          <ul className="figures">
            {report.off.map(({ piece, title, step, off }) => (
              <li key={`${piece} ${title} ${step}`}>
                {`${titles.get(piece) ?? piece}, ${title}, size ${sizeLabel(step)}: ${formatFigure('seam', off, unit)} ${unit}`}
              </li>
            ))}
          </ul>
        )}
      </details>
    </section>
  );
};
