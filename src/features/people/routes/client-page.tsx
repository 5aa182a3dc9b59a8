import { useMutation, useQuery } from '@tanstack/react-query';
import { useRef, useState } from 'react';
import { Link, useNavigate, useParams } from 'react-router-dom';

import type { Person } from '#shared/api/people.ts';
import { dayInWords } from '#shared/exports/day.ts';

import { failureWords } from '../../../lib/failure-words.ts';
import { momentWords } from '../../../lib/moment-words.ts';
import { newId } from '../../../lib/new-id.ts';
import { readersUnit } from '../../../lib/reader.ts';
import { Button } from '../../../ui/button.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { CardRow, DayField, today } from '../components/card-row.tsx';
import { DeletePerson } from '../components/delete-person.tsx';
import { RenamePerson } from '../components/rename-person.tsx';
import { cardsQuery, gownsQuery, type ListedGown, personQuery, sendCard } from '../queries.ts';

/** One client: her measure cards through the years, and her gowns. */
export const ClientPage = () => {
  const { personId = '' } = useParams();
  const person = useQuery(personQuery(personId));
  const cards = useQuery(cardsQuery);
  const gowns = useQuery(gownsQuery);
  const failed = person.error ?? cards.error ?? gowns.error;
  return (
    <main id="content" className="mx-auto w-full max-w-3xl grow px-4 py-8 sm:px-8">
      <title>{`Ellwand · ${person.data?.name ?? 'client'}`}</title>
      <p>
        <Link to="/clients" className="text-brass underline underline-offset-4">
          Clients
        </Link>
      </p>
      {failed !== null && <Notice>{failureWords(failed)}</Notice>}
      {person.data === undefined || cards.data === undefined || gowns.data === undefined ? (
        failed === null && (
          <p role="status" className="text-slate">
            Fetching…
          </p>
        )
      ) : (
        <ClientBench
          person={person.data}
          cards={cards.data
            .filter((card) => card.person.id === personId)
            .toSorted((a, b) => b.takenOn.localeCompare(a.takenOn))}
          gowns={gowns.data.filter((gown) => gown.personId === personId)}
        />
      )}
    </main>
  );
};

type ClientBenchProps = {
  readonly person: Person;
  readonly cards: readonly Parameters<typeof CardRow>[0]['card'][];
  readonly gowns: readonly ListedGown[];
};

const ClientBench = ({ person, cards, gowns }: ClientBenchProps) => (
  <>
    <h1 className="text-3xl font-semibold break-words">{person.name}</h1>
    <RenamePerson key={person.name} person={person} />
    <section aria-labelledby="cards" className="mt-6">
      <h2 id="cards" className="heading">
        Measure cards, last taken first
      </h2>
      <NewCard person={person} />
      <ul className="mt-2 border-t border-rule">
        {cards.map((card) => (
          <CardRow key={card.id} card={card} />
        ))}
      </ul>
      {cards.length === 0 && <p>No card yet: start one with the day the measures are taken.</p>}
    </section>
    <section aria-labelledby="gowns" className="mt-8">
      <h2 id="gowns" className="heading">
        Gowns
      </h2>
      <ul className="mt-2 border-t border-rule">
        {gowns.map((gown) => (
          <GownRow key={gown.id} gown={gown} cards={cards} />
        ))}
      </ul>
      {gowns.length === 0 && <p>No gown was drawn from one of these cards yet.</p>}
    </section>
    <div className="mt-10 border-t border-rule pt-4">
      <DeletePerson person={person} cards={cards} gowns={gowns} />
    </div>
  </>
);

/** Starts an empty card for a day. */
const NewCard = ({ person }: { person: Person }) => {
  const navigate = useNavigate();
  const [day, setDay] = useState(today);
  const saveId = useRef(newId());
  const making = useMutation({
    mutationFn: () =>
      sendCard({
        saveId: saveId.current,
        name: `Card of ${dayInWords(day)}`,
        personId: person.id,
        content: {
          typed: { unit: readersUnit(), fields: { 'card.name': person.name } },
          card: { name: person.name, date: day },
        },
      }),
    onSuccess: ({ id }) => navigate(`/gowns/measure-cards/${id}`),
  });
  return (
    <form
      className="mt-2 flex flex-wrap items-center gap-3"
      onSubmit={(event) => {
        event.preventDefault();
        making.mutate();
      }}
    >
      <DayField day={day} onDay={setDay} />
      <Button type="submit" slim disabled={making.isPending}>
        New measure card
      </Button>
      {making.isError && <Notice>{failureWords(making.error)}</Notice>}
    </form>
  );
};

const GownRow = ({ gown, cards }: { gown: ListedGown; cards: ClientBenchProps['cards'] }) => {
  const card = cards.find(({ id }) => id === gown.cardId);
  const newest = cards[0];
  return (
    <li className="border-b border-rule py-3">
      <div className="flex flex-wrap items-baseline justify-between gap-x-6">
        <Link to={`/gowns/${gown.id}`} className="text-lg font-semibold hover:underline">
          {gown.title}
        </Link>
        <span className="text-slate">
          {[
            ...(card === undefined ? [] : [`card of ${dayInWords(card.takenOn)}`]),
            `saved ${momentWords(gown.savedAt)}`,
            ...(gown.archived ? ['in the archive'] : []),
          ].join(' · ')}
        </span>
      </div>
      {newest !== undefined && newest.id !== gown.cardId && (
        <Link
          to={`/gowns/${gown.id}/regrade?card=${newest.id}`}
          className="text-brass underline underline-offset-4"
        >
          {`Regrade for the card of ${dayInWords(newest.takenOn)}`}
        </Link>
      )}
    </li>
  );
};
