import type { MeasureKey } from '#shared/body/card.ts';
import { measureGuide } from '#shared/body/measure-guide.ts';
import type { Unit } from '#shared/units/said.ts';

import { boundsWords, companyWords } from '../measure-words.ts';

type HowTakenProps = {
  /** The measure that is being typed. */
  readonly measure: MeasureKey | undefined;
  readonly unit: Unit;
};

/** How the current measure is taken, and what it is held against. */
export const HowTaken = ({ measure, unit }: HowTakenProps) => {
  if (measure === undefined) {
    return (
      <p id="how-taken" className="text-sm leading-snug text-slate">
        Ten measures make a gown. Type them as you read them off the tape: 36 1/2, 36.5 in, 92.7 cm.
        Enter goes to the next.
      </p>
    );
  }
  const { term, how } = measureGuide[measure];
  const company = companyWords(measure, unit);
  return (
    <div className="text-sm leading-snug">
      <p id="how-taken">
        <strong className="block font-semibold">{term}</strong>
        {how}
        <span className="figures block pt-1 text-slate">{boundsWords(measure, unit)}</span>
      </p>
      {company.length > 0 && (
        <details className="pt-1">
          <summary className="text-brass">What it must agree with</summary>
          <ul className="figures text-slate">
            {company.map((line) => (
              <li key={line}>{line}</li>
            ))}
          </ul>
        </details>
      )}
    </div>
  );
};
