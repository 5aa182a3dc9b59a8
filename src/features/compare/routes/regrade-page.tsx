import { useQuery } from '@tanstack/react-query';
import { useMemo, useState } from 'react';
import { Link, useParams, useSearchParams } from 'react-router-dom';

import { measureCard } from '#shared/api/card.ts';
import type { Gown } from '#shared/api/gowns.ts';
import { coreMeasures } from '#shared/body/card.ts';
import { type Alignment, atCentreWaist } from '#shared/compare/alignment.ts';
import type { Drafted } from '#shared/engine/drafted.ts';
import { dayInWords } from '#shared/exports/day.ts';
import { pieceTitles } from '#shared/exports/figure-words.ts';
import { regradeTo } from '#shared/regrade/what-moved.ts';
import type { Unit } from '#shared/units/said.ts';

import { failureWords } from '../../../lib/failure-words.ts';
import { useUnit } from '../../../lib/use-unit.ts';
import { Notice } from '../../../ui/notice.tsx';
import { Select } from '../../../ui/select.tsx';
import { UnitChoice } from '../../../ui/unit-choice.tsx';
import { KeepRegrade } from '../components/keep-regrade.tsx';
import { OverlayBench } from '../components/overlay-bench.tsx';
import { Labelled } from '../components/overlay-tools.tsx';
import { ProblemList } from '../components/problem-list.tsx';
import { TopEdgeDepths } from '../components/top-edge-depths.tsx';
import { WhatMoved } from '../components/what-moved.tsx';
import { depthsFor, type DepthChoice } from '../depth-choices.ts';
import { cardQuery, cardsQuery, gownQuery, type ListedCard } from '../queries.ts';
import { orProblems, useDraft } from '../use-draft.ts';

const isWhole = ({ taken }: ListedCard): boolean => taken.core === coreMeasures.length;

const cardLabel = ({ person, name, takenOn }: ListedCard): string =>
  `${person.name}, ${dayInWords(takenOn)} (${name})`;

/** A saved gown redrawn for another measure card, over what it was. */
export const RegradePage = () => {
  const { gownId = '' } = useParams();
  const gown = useQuery(gownQuery(gownId));
  const cards = useQuery(cardsQuery);
  const failed = gown.error ?? cards.error;
  return (
    <main id="content" className="mx-auto w-full max-w-[86rem] grow space-y-4 px-4 py-8 sm:px-8">
      <title>Ellwand · regrade</title>
      {failed !== null && <Notice>{failureWords(failed)}</Notice>}
      {gown.data !== undefined && cards.data !== undefined ? (
        <RegradeBench gown={gown.data} cards={cards.data.filter(({ archived }) => !archived)} />
      ) : (
        failed === null && (
          <p role="status" className="text-slate">
            Fetching…
          </p>
        )
      )}
    </main>
  );
};

const RegradeBench = ({ gown, cards }: { gown: Gown; cards: readonly ListedCard[] }) => {
  const [address, setAddress] = useSearchParams();
  const [unit, setUnit] = useUnit(gown.content.typed.unit);
  const [choice, setChoice] = useState<DepthChoice>('fixed');
  const hers = cards.filter(({ person }) => person.id === gown.personId);
  const order = [...hers, ...cards.filter((card) => !hers.includes(card))].filter(isWhole);
  const card = order.find(({ id }) => id === address.get('card')) ?? order[0];
  // What stood there when the page was opened: keeping the regrade does not change what is compared.
  const [opened] = useState(gown.drawn);
  const before = useDraft(opened?.inputs);
  const kept = useQuery({ ...cardQuery(card?.id ?? ''), enabled: card !== undefined });
  const whole = measureCard.safeParse(kept.data?.content.card);
  return (
    <>
      <div className="flex flex-wrap items-end justify-between gap-4">
        <div>
          <p>
            <Link to={`/gowns/${gown.id}`} className="text-brass underline underline-offset-4">
              {gown.title}
            </Link>
            {' · '}
            <Link to={`/gowns/${gown.id}/nest`} className="text-brass underline underline-offset-4">
              Nest of sizes
            </Link>
          </p>
          <h1 className="text-3xl font-semibold">Regrade</h1>
          <p className="mt-2 max-w-prose">
            The gown is redrawn for another measure card and lies over what it was; nothing saved is
            overwritten.
          </p>
        </div>
        <UnitChoice unit={unit} onUnit={setUnit} />
      </div>
      {opened === null && (
        <Notice>This gown has not been drawn yet: draw it on the drafting table first.</Notice>
      )}
      {opened !== null && !gown.fresh && (
        <Notice>
          Figures are still open on the drafting table, so what is drawn here is not what stands
          there. Finish them first, then regrade.
        </Notice>
      )}
      {card === undefined ? (
        <p>
          There is no filled measure card yet. Start one with{' '}
          <Link to="/clients" className="text-brass underline underline-offset-4">
            Clients
          </Link>
          .
        </p>
      ) : (
        <div className="flex flex-wrap items-end gap-x-6 gap-y-3">
          <Labelled label="Measure card">
            {(id) => (
              <Select
                id={id}
                name="card"
                choices={order.map((each) => ({ value: each.id, label: cardLabel(each) }))}
                value={card.id}
                onChoose={(chosen) => setAddress({ card: chosen }, { replace: true })}
              />
            )}
          </Labelled>
          <TopEdgeDepths choice={choice} onChoose={setChoice} />
        </div>
      )}
      {kept.isError && <Notice>{failureWords(kept.error)}</Notice>}
      {before && 'problems' in before && (
        <ProblemList
          title="Today’s rules do not draw this gown any more"
          problems={before.problems}
          unit={unit}
        />
      )}
      {gown.fresh && before && 'draft' in before && card && whole.success && (
        <Regraded
          key={card.id}
          before={before.draft}
          gown={gown}
          card={card}
          measures={whole.data}
          choice={choice}
          unit={unit}
        />
      )}
    </>
  );
};

type RegradedProps = {
  readonly before: Drafted;
  readonly gown: Gown;
  readonly card: ListedCard;
  readonly measures: Drafted['inputs']['card'];
  readonly choice: DepthChoice;
  readonly unit: Unit;
};

const Regraded = ({ before, gown, card, measures, choice, unit }: RegradedProps) => {
  const [align, setAlign] = useState<Alignment>(atCentreWaist);
  const written = JSON.stringify(measures);
  const tried = useMemo(
    () => orProblems(() => regradeTo(before, measures, depthsFor(choice), align)),
    // The same card is often read anew.
    [before, written, choice, align],
  );
  if ('problems' in tried) {
    return (
      <ProblemList
        title="This gown cannot be drawn for this card"
        problems={tried.problems}
        unit={unit}
      />
    );
  }
  const { made: regrade } = tried;
  return (
    <>
      <KeepRegrade key={choice} gown={gown} card={card} after={regrade.after} />
      <OverlayBench
        first={before}
        second={regrade.after}
        names={{ first: 'as it was', second: `card of ${dayInWords(card.takenOn)}` }}
        unit={unit}
        onAlign={setAlign}
        figures={false}
      />
      <WhatMoved regrade={regrade} titles={pieceTitles(before, regrade.after)} unit={unit} />
    </>
  );
};
