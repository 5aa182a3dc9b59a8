import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useRef, useState } from 'react';
import { Link, useNavigate } from 'react-router-dom';

import { coreMeasures } from '#shared/body/card.ts';
import { dayInWords } from '#shared/exports/day.ts';

import { failureWords } from '../../../lib/failure-words.ts';
import { newId } from '../../../lib/new-id.ts';
import { Button } from '../../../ui/button.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { Select } from '../../../ui/select.tsx';
import { giveIt, type ListedCard, peopleQuery, startCard, startGown } from '../queries.ts';

/** The day on this device's calendar, as cards write it. */
export function today(now = new Date()): string {
  const two = (part: number): string => String(part).padStart(2, '0');
  return `${now.getFullYear()}-${two(now.getMonth() + 1)}-${two(now.getDate())}`;
}

/** Asks for a day; the present one stands there. */
export const DayField = ({ day, onDay }: { day: string; onDay: (day: string) => void }) => (
  <label className="flex items-center gap-2">
    <span>Measured on</span>
    <input
      type="date"
      required
      className="h-9 rounded-one border border-rule bg-paper px-2"
      value={day}
      onChange={(event) => onDay(event.currentTarget.value)}
    />
  </label>
);

const takenWords = ({ core, all }: ListedCard['taken']): string =>
  core === coreMeasures.length ? `${all} measures` : `${core} of the ${coreMeasures.length} needed`;

/** Says whose card it is after all. */
const GiveCard = ({ card }: { card: ListedCard }) => {
  const [asking, setAsking] = useState(false);
  const client = useQueryClient();
  const people = useQuery({ ...peopleQuery, enabled: asking });
  const giving = useMutation({
    mutationFn: (personId: string) => giveIt(card.id, personId),
    onSuccess: () => client.invalidateQueries(),
  });
  const others = (people.data ?? []).filter(({ id }) => id !== card.person.id);
  return (
    <>
      <Button kind="quiet" slim aria-expanded={asking} onClick={() => setAsking(!asking)}>
        It is somebody else’s
      </Button>
      {asking && people.data !== undefined && (
        <Select
          name="whose"
          aria-label="Whose card it is"
          choices={[
            {
              value: '',
              label: others.length === 0 ? 'nobody else is on the list' : 'choose whose',
            },
            ...others.map(({ id, name }) => ({ value: id, label: name })),
          ]}
          value=""
          disabled={giving.isPending}
          onChoose={(personId) => personId !== '' && giving.mutate(personId)}
        />
      )}
      {giving.isError && <Notice>{failureWords(giving.error)}</Notice>}
    </>
  );
};

/** One card of a person: its day, what it was used for, and what can be begun from it. */
export const CardRow = ({ card }: { card: ListedCard }) => {
  const navigate = useNavigate();
  const [starting, setStarting] = useState(false);
  const [day, setDay] = useState(today);
  const saveId = useRef(newId());
  const next = useMutation({
    mutationFn: () =>
      startCard(card.id, {
        saveId: saveId.current,
        name: `Card of ${dayInWords(day)}`,
        takenOn: day,
      }),
    onSuccess: ({ id }) => navigate(`/gowns/measure-cards/${id}`),
  });
  const gown = useMutation({
    mutationFn: () =>
      startGown(card.id, saveId.current, `Gown for ${card.person.name}`.slice(0, 80)),
    onSuccess: ({ id }) => navigate(`/gowns/${id}`),
  });
  const failed = next.error ?? gown.error;
  return (
    <li className="border-b border-rule py-3">
      <div className="flex flex-wrap items-baseline justify-between gap-x-6">
        <Link
          to={`/gowns/measure-cards/${card.id}`}
          className="text-lg font-semibold hover:underline"
        >
          {dayInWords(card.takenOn)}
        </Link>
        <span className="text-slate">{`${card.name} · ${takenWords(card.taken)}`}</span>
      </div>
      {card.usedBy.length > 0 && (
        <p className="text-slate">
          {`Stays as it is: ${card.usedBy.map(({ title }) => `“${title}”`).join(', ')} ${card.usedBy.length === 1 ? 'was' : 'were'} drawn from it.`}
        </p>
      )}
      <div className="-ml-2 flex flex-wrap items-center">
        <Button kind="quiet" slim aria-expanded={starting} onClick={() => setStarting(!starting)}>
          Start the next card from it
        </Button>
        <Button kind="quiet" slim disabled={gown.isPending} onClick={() => gown.mutate()}>
          Begin a gown from it
        </Button>
        <GiveCard card={card} />
      </div>
      {starting && (
        <form
          className="flex flex-wrap items-center gap-3 py-2"
          onSubmit={(event) => {
            event.preventDefault();
            next.mutate();
          }}
        >
          <DayField day={day} onDay={setDay} />
          <Button kind="primary" slim type="submit" disabled={next.isPending}>
            Copy it for that day
          </Button>
        </form>
      )}
      {failed !== null && <Notice>{failureWords(failed)}</Notice>}
    </li>
  );
};
