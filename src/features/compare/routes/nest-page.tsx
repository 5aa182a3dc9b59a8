import { useQuery } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import { Link, useParams } from 'react-router-dom';

import type { Gown } from '#shared/api/gowns.ts';
import { mostSizes } from '#shared/regrade/grade-rules.ts';
import { nestOf } from '#shared/regrade/nest.ts';

import { failureWords } from '../../../lib/failure-words.ts';
import { useUnit } from '../../../lib/use-unit.ts';
import { Notice } from '../../../ui/notice.tsx';
import { Select } from '../../../ui/select.tsx';
import { UnitChoice } from '../../../ui/unit-choice.tsx';
import { GradeRulesTable } from '../components/grade-rules-table.tsx';
import { NestBench } from '../components/nest-bench.tsx';
import { Labelled } from '../components/overlay-tools.tsx';
import { ProblemList } from '../components/problem-list.tsx';
import { TopEdgeDepths } from '../components/top-edge-depths.tsx';
import { depthsFor, type DepthChoice } from '../depth-choices.ts';
import { keepGradeRules, keptGradeRules } from '../kept-grade-rules.ts';
import { gownQuery } from '../queries.ts';
import { orProblems, useDraft } from '../use-draft.ts';

/** A saved gown stepped by grade rules into a nest of sizes. */
export const NestPage = () => {
  const { gownId = '' } = useParams();
  const gown = useQuery(gownQuery(gownId));
  return (
    <main id="content" className="mx-auto w-full max-w-[86rem] grow space-y-4 px-4 py-8 sm:px-8">
      <title>Ellwand · nest of sizes</title>
      {gown.isError && <Notice>{failureWords(gown.error)}</Notice>}
      {gown.isPending && (
        <p role="status" className="text-slate">
          Fetching…
        </p>
      )}
      {gown.data !== undefined && <NestOfGown gown={gown.data} />}
    </main>
  );
};

/** Numbers of sizes on one side that leave room for those on the other. */
const upTo = (most: number) =>
  Array.from({ length: most + 1 }, (_, count) => ({ value: String(count), label: String(count) }));

const NestOfGown = ({ gown }: { gown: Gown }) => {
  const [unit, setUnit] = useUnit(gown.content.typed.unit);
  const [rules, setRules] = useState(keptGradeRules);
  const [smaller, setSmaller] = useState(2);
  const [larger, setLarger] = useState(3);
  const [choice, setChoice] = useState<DepthChoice>('fixed');
  const base = useDraft(gown.drawn?.inputs);
  const order = useMemo(
    () => ({ rules, smaller, larger, depths: depthsFor(choice) }),
    [rules, smaller, larger, choice],
  );
  const tried = useMemo(
    () => (base && 'draft' in base ? orProblems(() => nestOf(base.draft, order)) : undefined),
    [base, order],
  );
  return (
    <>
      <div className="flex flex-wrap items-end justify-between gap-4">
        <div>
          <p>
            <Link to={`/gowns/${gown.id}`} className="text-brass underline underline-offset-4">
              {gown.title}
            </Link>
            {' · '}
            <Link
              to={`/gowns/${gown.id}/regrade`}
              className="text-brass underline underline-offset-4"
            >
              Regrade for another card
            </Link>
          </p>
          <h1 className="text-3xl font-semibold">Nest of sizes</h1>
          <p className="mt-2 max-w-prose">
            Each size is drafted afresh from the card stepped by your grade rules; darts and gores
            are those of the largest.
          </p>
        </div>
        <UnitChoice unit={unit} onUnit={setUnit} />
      </div>
      {gown.drawn === null && (
        <Notice>This gown has not been drawn yet: draw it on the drafting table first.</Notice>
      )}
      {base && 'problems' in base && (
        <ProblemList
          title="Today’s rules do not draw this gown any more"
          problems={base.problems}
          unit={unit}
        />
      )}
      <div className="flex flex-wrap items-end gap-x-6 gap-y-3">
        <Labelled label="Sizes smaller">
          {(id) => (
            <Select
              id={id}
              name="smaller"
              choices={upTo(mostSizes - 1 - larger)}
              value={String(smaller)}
              onChoose={(count) => setSmaller(Number(count))}
            />
          )}
        </Labelled>
        <Labelled label="Sizes larger">
          {(id) => (
            <Select
              id={id}
              name="larger"
              choices={upTo(mostSizes - 1 - smaller)}
              value={String(larger)}
              onChoose={(count) => setLarger(Number(count))}
            />
          )}
        </Labelled>
        <TopEdgeDepths choice={choice} onChoose={setChoice} />
      </div>
      {tried && 'problems' in tried && (
        <ProblemList title="This nest cannot be drawn" problems={tried.problems} unit={unit} />
      )}
      {tried && 'made' in tried && base && 'draft' in base && (
        <NestBench base={base.draft} nest={tried.made} order={order} unit={unit} />
      )}
      <GradeRulesTable
        rules={rules}
        unit={unit}
        onRules={(next) => {
          setRules(next);
          keepGradeRules(next);
        }}
      />
    </>
  );
};
