import { useId, useState } from 'react';

import type { Body } from '#shared/body/card.ts';
import type { Step } from '#shared/drafting/step.ts';
import { sourceSaid, spoken, type SpokenNumber } from '#shared/lesson/spoken.ts';
import type { Said, Unit } from '#shared/units/said.ts';
import { speak, speakQuantity } from '#shared/units/speak.ts';

type SentenceProps = {
  readonly step: Step;
  readonly sentence: Said;
  readonly body: Body;
  readonly unit: Unit;
  readonly className?: string;
};

/** A sentence whose numbers say, pointed at or focused, which measure they come from. */
export const Sentence = ({ step, sentence, body, unit, className = '' }: SentenceProps) => {
  const [pointed, setPointed] = useState<number>();
  const id = useId();
  const parts = spoken(sentence, step, body);
  const number = pointed === undefined ? undefined : parts[pointed];
  return (
    <div>
      <p className={`figures ${className}`}>
        {parts.map((part, index) =>
          typeof part === 'string' ? (
            <span key={index}>{part}</span>
          ) : (
            <button
              key={index}
              type="button"
              aria-describedby={pointed === index ? id : undefined}
              className={`rounded-one font-semibold whitespace-nowrap underline decoration-2 underline-offset-4 ${looks[part.from]} ${pointed === index ? 'bg-brass text-on-brass' : ''}`}
              onPointerEnter={() => setPointed(index)}
              onPointerLeave={() => setPointed(undefined)}
              onFocus={() => setPointed(index)}
              onBlur={() => setPointed(undefined)}
              onClick={() => setPointed(index)}
            >
              {speakQuantity(part.quantity, unit)}
            </button>
          ),
        )}
      </p>
      <p id={id} role="status" className="figures min-h-6 text-[0.85em] text-slate">
        {number !== undefined && typeof number !== 'string' && words(number, unit)}
      </p>
    </div>
  );
};

const words = (number: SpokenNumber, unit: Unit): string =>
  `${speakQuantity(number.quantity, unit)}: ${speak(sourceSaid(number), unit)}.`;

/** Told apart by the line under them as well: a measure, worked out from measures, from elsewhere. */
const looks = {
  measure: 'decoration-brass decoration-solid',
  measures: 'decoration-brass decoration-dashed',
  elsewhere: 'decoration-slate decoration-dotted',
} as const;
