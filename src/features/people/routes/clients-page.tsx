import { useMutation, useQuery } from '@tanstack/react-query';
import { useRef, useState } from 'react';
import { Link, useNavigate } from 'react-router-dom';

import { dayInWords } from '#shared/exports/day.ts';

import { fieldWords, failureWords } from '../../../lib/failure-words.ts';
import { newId } from '../../../lib/new-id.ts';
import { Button } from '../../../ui/button.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { TextField } from '../../../ui/text-field.tsx';
import { type ListedPerson, peopleQuery, sendPerson } from '../queries.ts';

const counted = (count: number, one: string): string => `${count} ${count === 1 ? one : `${one}s`}`;

const PersonRow = ({ person }: { person: ListedPerson }) => (
  <li className="flex flex-wrap items-baseline justify-between gap-x-6 border-b border-rule py-3">
    <Link
      to={`/clients/${person.id}`}
      className="text-lg font-semibold break-words hover:underline"
    >
      {person.name}
    </Link>
    <span className="text-slate">
      {[
        counted(person.cards, 'measure card'),
        counted(person.gowns, 'gown'),
        ...(person.measuredOn === null ? [] : [`measured ${dayInWords(person.measuredOn)}`]),
      ].join(' · ')}
    </span>
  </li>
);

/** The maker's own list of people, by name. */
export const ClientsPage = () => {
  const people = useQuery(peopleQuery);
  const navigate = useNavigate();
  const [name, setName] = useState('');
  const saveId = useRef(newId());
  const adding = useMutation({
    mutationFn: () => sendPerson({ saveId: saveId.current, name }),
    onSuccess: ({ id }) => navigate(`/clients/${id}`),
  });
  const atName = fieldWords(adding.error, 'name');
  return (
    <main id="content" className="mx-auto w-full max-w-3xl grow px-4 py-8 sm:px-8">
      <title>Ellwand · clients</title>
      <h1 className="text-3xl font-semibold">Clients</h1>
      <p className="mt-2 max-w-prose">
        Whom you sew for, with their measures through the years and their gowns. A name is all that
        is kept of them beside those.
      </p>
      <form
        noValidate
        className="mt-6 flex flex-wrap items-end gap-3"
        onSubmit={(event) => {
          event.preventDefault();
          adding.mutate();
        }}
      >
        <div className="min-w-56 grow">
          <TextField
            label="Name of a new client"
            autoComplete="off"
            maxLength={80}
            value={name}
            message={atName}
            onType={(text) => {
              setName(text);
              saveId.current = newId();
            }}
          />
        </div>
        <Button kind="primary" type="submit" className="min-h-11" disabled={adding.isPending}>
          Put on the list
        </Button>
      </form>
      {adding.isError && atName === undefined && <Notice>{failureWords(adding.error)}</Notice>}
      {people.isPending && (
        <p role="status" className="mt-6 text-slate">
          Fetching…
        </p>
      )}
      {people.isError && <Notice>{failureWords(people.error)}</Notice>}
      {people.data?.length === 0 && <p className="mt-6 text-lg">Nobody is on the list yet.</p>}
      <ul className="mt-6 border-t border-rule">
        {people.data?.map((person) => (
          <PersonRow key={person.id} person={person} />
        ))}
      </ul>
    </main>
  );
};
