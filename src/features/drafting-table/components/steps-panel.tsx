import { memo, type Dispatch } from 'react';
import { Link } from 'react-router-dom';

import type { Drafted } from '#shared/engine/drafted.ts';
import type { Unit } from '#shared/units/said.ts';
import { speak } from '#shared/units/speak.ts';

import type { TableAction } from '../table-state.ts';

type StepsPanelProps = {
  readonly draft: Drafted;
  readonly chosen: string | undefined;
  readonly unit: Unit;
  readonly dispatch: Dispatch<TableAction>;
  /** Address of this draft's replay. */
  readonly replay: string;
};

/** How the draft came about, step by step; a chosen step shows what it drew. */
export const StepsPanel = memo(function StepsPanel({
  draft,
  chosen,
  unit,
  dispatch,
  replay,
}: StepsPanelProps) {
  const parts = [...new Set(draft.steps.map((step) => step.part))];
  const choose = (id: string | undefined) => dispatch({ type: 'step', step: id });
  return (
    <section className="space-y-6">
      <h2 className="sr-only">Steps</h2>
      <p className="flex items-center justify-between gap-3">
        <span className="text-sm text-slate">Step by step, with every number’s measure.</span>
        <Link
          to={chosen === undefined ? replay : `${replay}?step=${encodeURIComponent(chosen)}`}
          className="inline-flex min-h-9 items-center rounded-one border border-rule bg-paper px-3 font-semibold"
        >
          Replay
        </Link>
      </p>
      {parts.map((part) => (
        <div key={part}>
          <h3 className="heading">{part}</h3>
          <ol>
            {draft.steps
              .filter((step) => step.part === part)
              .map((step) => (
                <li key={step.id} className="border-b border-rule">
                  <button
                    type="button"
                    aria-pressed={step.id === chosen}
                    className="figures w-full border-l-2 border-transparent py-2 pl-2 text-left aria-pressed:border-brass aria-pressed:bg-paper"
                    onClick={() => choose(step.id === chosen ? undefined : step.id)}
                  >
                    <strong className="block font-semibold">{step.title}</strong>
                    {speak(step.said, unit)}
                    {step.why !== undefined && (
                      <span className="block text-sm text-slate">{speak(step.why, unit)}</span>
                    )}
                  </button>
                </li>
              ))}
          </ol>
        </div>
      ))}
    </section>
  );
});
