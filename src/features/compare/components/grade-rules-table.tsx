import { useState } from 'react';

import type { MeasureKey } from '#shared/body/card.ts';
import { measureGuide } from '#shared/body/measure-guide.ts';
import { checkGradeRules, type GradeRules, starterRules } from '#shared/regrade/grade-rules.ts';
import { formatFine } from '#shared/units/format-length.ts';
import { parseAngle } from '#shared/units/parse-angle.ts';
import { parseLength } from '#shared/units/parse-length.ts';
import type { Unit } from '#shared/units/said.ts';
import { speak } from '#shared/units/speak.ts';

import { Button } from '../../../ui/button.tsx';
import { Field } from '../../../ui/field.tsx';
import { LengthInput } from '../../../ui/length-input.tsx';
import { gradedMeasures } from '../kept-grade-rules.ts';

type GradeRulesTableProps = {
  readonly rules: GradeRules;
  readonly unit: Unit;
  readonly onRules: (rules: GradeRules) => void;
};

const isAngle = (key: MeasureKey): boolean => measureGuide[key].kind === 'angle';

const written = (key: MeasureKey, step: number | undefined, unit: Unit): string => {
  if (step === undefined) return '';
  // As short as it can be: a quarter of a centimetre is a common step.
  return String(isAngle(key) ? step : Number(formatFine(step, unit).replace('\u2212', '-')));
};

/** What was typed as a step, or the sentence that says what to type; an empty field has no step. */
function stepOf(key: MeasureKey, text: string, unit: Unit): { readonly step?: number } | string {
  if (text.trim() === '') return {};
  if (isAngle(key)) {
    const read = parseAngle(text);
    return 'deg' in read ? { step: read.deg } : speak(read.said, unit);
  }
  const read = parseLength(text, unit);
  return 'mm' in read ? { step: read.mm } : speak(read.said, unit);
}

/** What each measure grows by from one size to the next, to be edited; what cannot be read stays as typed. */
export const GradeRulesTable = ({ rules, unit, onRules }: GradeRulesTableProps) => {
  const [typing, setTyping] = useState<{ readonly key: MeasureKey; readonly text: string }>();
  const [odd, setOdd] = useState<Readonly<Record<string, string>>>({});
  const type = (key: MeasureKey, text: string) => {
    setTyping({ key, text });
    const read = stepOf(key, text, unit);
    if (typeof read === 'string') {
      setOdd((now) => ({ ...now, [key]: text }));
      return;
    }
    setOdd(({ [key]: _, ...rest }) => rest);
    const { [key]: _, ...others } = rules;
    onRules(read.step === undefined ? others : { ...others, [key]: read.step });
  };
  const wrong = new Map(
    checkGradeRules(rules).map(({ field, said }) => [field, speak(said, unit)]),
  );
  return (
    <section aria-labelledby="grade-rules">
      <h2 id="grade-rules" className="heading">
        Grade rules
      </h2>
      <p className="mt-1 text-sm text-slate">
        What each measure grows by from one size to the next. A measure left open follows its
        estimate, or stays.
      </p>
      <div className="mt-2 gap-x-8 sm:columns-2">
        {gradedMeasures.map((key) => {
          const text = typing?.key === key ? typing.text : odd[key];
          const read = text === undefined ? {} : stepOf(key, text, unit);
          return (
            <div key={key} className="break-inside-avoid">
              <Field
                label={measureGuide[key].label}
                message={typeof read === 'string' ? read : wrong.get(`gradeRules.${key}`)}
              >
                {(wiring) => (
                  <LengthInput
                    wiring={wiring}
                    name={`gradeRules.${key}`}
                    text={text ?? written(key, rules[key], unit)}
                    placeholder="open"
                    onType={(next) => type(key, next)}
                    onDone={() => setTyping(undefined)}
                  />
                )}
              </Field>
            </div>
          );
        })}
      </div>
      <Button
        className="mt-3"
        onClick={() => {
          setOdd({});
          setTyping(undefined);
          onRules(starterRules);
        }}
      >
        Back to the starter set
      </Button>
    </section>
  );
};
