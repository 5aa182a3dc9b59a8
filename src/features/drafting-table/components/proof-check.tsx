import { useState, type Dispatch } from 'react';

import type { Finding, ProofLine } from '#shared/proof/proof.ts';
import type { Unit } from '#shared/units/said.ts';
import { speak } from '#shared/units/speak.ts';

import { boundWords } from '../bound-words.ts';
import type { TableAction } from '../table-state.ts';

type ProofCheckProps = {
  readonly line: ProofLine;
  readonly unit: Unit;
  readonly dispatch: Dispatch<TableAction>;
};

/** One line of the proof: what was looked at, found and allowed; pointing at a place lights it on the pieces. */
export const ProofCheck = ({ line, unit, dispatch }: ProofCheckProps) => {
  const failing = line.findings.filter((finding) => !finding.holds);
  const [opened, setOpened] = useState<boolean>();
  const open = opened ?? failing.length > 0;
  const look = (finding: Finding | undefined) =>
    dispatch({ type: 'looked', at: finding?.where ?? [] });
  return (
    <details
      className="border-b border-rule"
      open={open}
      onToggle={(event) => setOpened(event.currentTarget.open)}
    >
      <summary className="flex justify-between gap-3 py-2">
        <span>{line.title}</span>
        <span className={line.holds ? 'text-verdigris' : 'font-semibold text-madder'}>
          {line.holds ? 'holds' : `${failing.length} of ${line.findings.length} fail`}
        </span>
      </summary>
      {open && (
        <ul className="figures pb-2 text-sm" onPointerLeave={() => look(undefined)}>
          {[...failing, ...line.findings.filter(({ holds }) => holds)].map((finding, index) => (
            <li key={`${index} ${speak(finding.said, unit)}`}>
              <button
                type="button"
                className={`block w-full py-0.5 text-left leading-snug hover:underline ${finding.holds ? 'text-slate' : 'text-madder'}`}
                onPointerEnter={() => look(finding)}
                onFocus={() => look(finding)}
                onBlur={() => look(undefined)}
              >
                {speak(finding.said, unit)}
                <span className="pl-1 whitespace-nowrap">{`(within ${boundWords(finding)})`}</span>
              </button>
            </li>
          ))}
        </ul>
      )}
    </details>
  );
};
