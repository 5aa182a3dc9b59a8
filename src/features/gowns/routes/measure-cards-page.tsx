import { useQuery } from '@tanstack/react-query';
import { Link, useNavigate } from 'react-router-dom';

import { coreMeasures } from '#shared/body/card.ts';

import { momentWords } from '../../../lib/moment-words.ts';
import { Button } from '../../../ui/button.tsx';
import { ListFrame } from '../components/list-frame.tsx';
import { ListTabs } from '../components/list-tabs.tsx';
import { RecordActions } from '../components/record-actions.tsx';
import { cardsQuery, useCardDeed } from '../queries.ts';

/** Measure cards kept by themselves, to draw gowns from. */
export const MeasureCardsPage = () => {
  const list = useQuery(cardsQuery);
  const deed = useCardDeed();
  const navigate = useNavigate();
  return (
    <ListFrame
      title="Measure cards"
      help="A card keeps one body’s measures of one day; lay it on any gown, and copy it when you measure again."
      tabs={<ListTabs />}
      none="No card yet. Start one here, or keep the card of a gown from its drafting table."
      list={list}
      deed={deed}
      make={
        <Button
          kind="primary"
          disabled={deed.isPending}
          onClick={() =>
            deed.mutate(
              { kind: 'new', name: `Card of ${dayOf.format(new Date())}` },
              {
                onSuccess: ({ id }) =>
                  id !== undefined && void navigate(`/gowns/measure-cards/${id}`),
              },
            )
          }
        >
          New measure card
        </Button>
      }
      render={(card) => (
        <>
          <Link to={`/gowns/measure-cards/${card.id}`} className="group block">
            <TakenRod taken={card.taken.core} />
            <span className="mt-3 block text-lg leading-tight font-semibold break-words group-hover:underline">
              {card.name}
            </span>
          </Link>
          <p className="mt-1 mb-2 grow text-sm text-slate">
            {`saved ${momentWords(card.savedAt)}`}
            <span className="block">{takenWords(card.taken)}</span>
          </p>
          <RecordActions
            record={card}
            name={card.name}
            label="Name of the card"
            goes="Its measures go for good. A card that a gown was drawn from stays."
            deed={deed}
          />
        </>
      )}
    />
  );
};

const dayOf = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long' });
const needed = coreMeasures.length;

const takenWords = ({ core, all }: { readonly core: number; readonly all: number }): string =>
  core === needed
    ? `${all} measures taken`
    : `${core} of the ${needed} needed, ${all} taken in all`;

/** The rod, filled as far as the measures a gown needs have been taken. */
const TakenRod = ({ taken }: { taken: number }) => (
  <svg viewBox="0 0 202 20" className="h-8 w-full" aria-hidden="true">
    <rect x={1} y={12} width={(200 * taken) / needed} height={6} className="fill-brass" />
    <path
      d={`M1 18H201${Array.from({ length: needed + 1 }, (_, mark) => `M${1 + (mark * 200) / needed} 18V5`).join('')}`}
      className="fill-none stroke-brass"
    />
  </svg>
);
