import { useId, useState, type Dispatch } from 'react';

import { isAbout, mayOverrule, overruling } from '#shared/body/overrule.ts';
import type { Problem } from '#shared/units/problem.ts';
import { speak } from '#shared/units/speak.ts';

import { Button } from '../../../ui/button.tsx';
import type { TableAction, TableState } from '../table-state.ts';

type DoubtsProps = {
  readonly state: TableState;
  readonly dispatch: Dispatch<TableAction>;
};

/** What is unlikely about the measures; the maker may keep it, with a reason that stays on the card. */
export const Doubts = ({ state, dispatch }: DoubtsProps) => {
  const heading = useId();
  const doubts = state.drawn.problems.filter(mayOverrule);
  if (doubts.length === 0) return null;
  const keep = (problem: Problem, reason: string) =>
    dispatch({ type: 'overruled', overruled: [...others(problem), overruling(problem, reason)] });
  const others = (problem: Problem) => state.overruled.filter((each) => !isAbout(each, problem));
  return (
    <section aria-labelledby={heading} className="border-b border-rule py-2">
      <h3 id={heading} className="font-semibold">
        Look again
      </h3>
      <ul className="figures text-sm leading-snug">
        {doubts.map((problem) => (
          <li key={`${problem.code} ${problem.field}`} className="py-1">
            <p>{speak(problem.said, state.unit)}</p>
            {problem.overruled === undefined ? (
              <KeepForm about={problem.field} onKeep={(reason) => keep(problem, reason)} />
            ) : (
              <p className="flex items-baseline justify-between gap-3">
                <span className="text-verdigris">{`✓ Kept: ${problem.overruled}`}</span>
                <Button
                  kind="quiet"
                  slim
                  onClick={() => dispatch({ type: 'overruled', overruled: others(problem) })}
                >
                  Ask again
                </Button>
              </p>
            )}
          </li>
        ))}
      </ul>
    </section>
  );
};

type KeepFormProps = {
  readonly about: string;
  readonly onKeep: (reason: string) => void;
};

/** Asks for the reason; without one nothing is kept. */
const KeepForm = ({ about, onKeep }: KeepFormProps) => {
  const [open, setOpen] = useState(false);
  const [reason, setReason] = useState('');
  const given = reason.trim();
  if (!open) {
    return (
      <Button kind="quiet" slim className="-ml-2" onClick={() => setOpen(true)}>
        Keep it, with a reason
      </Button>
    );
  }
  const keep = () => {
    if (given !== '') onKeep(given);
  };
  return (
    <div className="flex items-end gap-2 pt-1">
      <label className="grow">
        <span className="block text-slate">Why it is right</span>
        <input
          name={`reason.${about}`}
          autoFocus
          autoComplete="off"
          maxLength={200}
          value={reason}
          className="h-9 w-full rounded-one border border-rule bg-paper px-2 text-base"
          onChange={(event) => setReason(event.currentTarget.value)}
          onKeyDown={(event) => {
            if (event.key !== 'Enter') return;
            event.preventDefault();
            keep();
          }}
        />
      </label>
      <Button slim disabled={given === ''} onClick={keep}>
        Keep
      </Button>
    </div>
  );
};
