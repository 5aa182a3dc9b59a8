import type { Unit } from '#shared/units/said.ts';
import type { Told } from '#shared/lesson/told.ts';

import { Button } from '../../../ui/button.tsx';
import { Sentence } from './sentence.tsx';

type TellingProps = {
  readonly told: Told;
  readonly place: number;
  readonly unit: Unit;
  readonly far: boolean;
  /** The same step of a learner's own draft, and whether that body needs it. */
  readonly own?:
    { readonly told: Told; readonly place: number; readonly exact: boolean } | undefined;
  /** Whether only the learner's own sentence has room. */
  readonly alone: boolean;
  readonly why: boolean;
  readonly onWhy: () => void;
};

/** The step in words: what was done with this body's numbers and, asked for, why. */
export const Telling = (props: TellingProps) => {
  const { told, place, unit, far, own, alone, why, onWhy } = props;
  const step = told.steps[place];
  if (step === undefined) return null;
  const ownStep = own?.told.steps[own.place];
  // Two sentences share the room of one, and are still read from the back of it.
  const afar = own ? 'text-[clamp(1.2rem,1.9vw,2rem)]' : 'text-[clamp(1.35rem,2.5vw,2.6rem)]';
  const size = `leading-snug ${far ? afar : 'text-lg'}`;
  return (
    <section aria-label="This step" className={far ? 'space-y-2' : 'space-y-1'}>
      <div aria-live="polite">
        <h1 className={`font-semibold ${far ? 'text-[clamp(1.6rem,3vw,3rem)]' : 'text-xl'}`}>
          <span className="font-normal text-slate">{step.part} · </span>
          {step.title}
        </h1>
        {(!alone || ownStep === undefined) && (
          <Sentence
            key={step.id}
            step={step}
            sentence={step.said}
            body={told.body}
            unit={unit}
            className={size}
          />
        )}
      </div>
      {own !== undefined && ownStep !== undefined && (
        <div className="border-l-2 border-verdigris pl-3">
          <h2 className="font-semibold text-verdigris">
            {own.exact
              ? 'With your measures'
              : `Your body does not need this step; before it, ${ownStep.title.toLowerCase()}`}
          </h2>
          <Sentence
            key={ownStep.id}
            step={ownStep}
            sentence={ownStep.said}
            body={own.told.body}
            unit={unit}
            className={size}
          />
        </div>
      )}
      {step.why !== undefined && (
        <div className={far ? size : ''}>
          <Button kind="quiet" slim className="-ml-2" aria-expanded={why} onClick={onWhy}>
            Why?
          </Button>
          {why && (
            <Sentence
              key={`${step.id} why`}
              step={step}
              sentence={step.why}
              body={told.body}
              unit={unit}
            />
          )}
        </div>
      )}
    </section>
  );
};
