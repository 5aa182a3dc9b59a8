import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useRef, useState, type Dispatch } from 'react';
import { useParams } from 'react-router-dom';

import { failureWords } from '../../../lib/failure-words.ts';
import { newId } from '../../../lib/new-id.ts';
import { Button } from '../../../ui/button.tsx';
import type { BenchAction } from '../bench.ts';
import { cardChoices, cardContentOf } from '../card-content.ts';
import { fetchCard, keepCard, keptCardsQuery, noteLaid } from '../card-queries.ts';
import type { TableState } from '../table-state.ts';

type CardToolsProps = {
  readonly table: TableState;
  readonly dispatch: Dispatch<BenchAction>;
};

/** From this table to the measure cards kept by themselves, and from them onto the table. */
export const CardTools = ({ table, dispatch }: CardToolsProps) => {
  const [choosing, setChoosing] = useState(false);
  const { gownId } = useParams();
  const client = useQueryClient();
  const cards = useQuery({ ...keptCardsQuery, enabled: choosing });
  const saveId = useRef(newId());
  const keeping = useMutation({
    mutationFn: () => {
      const name = table.name.trim();
      const content = cardContentOf(table, table.unit);
      return keepCard({
        saveId: saveId.current,
        name: name === '' ? 'Measure card' : name,
        content,
      });
    },
    onSuccess: () => {
      saveId.current = newId();
      return client.invalidateQueries({ queryKey: keptCardsQuery.queryKey });
    },
  });
  const laying = useMutation({
    mutationFn: async (cardId: string) => {
      if (gownId !== undefined) await noteLaid(gownId, cardId);
      return fetchCard(cardId);
    },
    onSuccess: ({ content }) => {
      setChoosing(false);
      dispatch({ type: 'work laid', work: cardChoices(table, content) });
    },
  });
  const failed = keeping.error ?? laying.error ?? cards.error;
  const inUse = cards.data?.filter(({ archived }) => !archived) ?? [];
  return (
    <div className="clear-both flex flex-wrap items-center gap-x-4 border-t border-rule py-1 text-sm">
      <Button
        kind="quiet"
        slim
        className="-ml-2"
        aria-expanded={choosing}
        onClick={() => setChoosing(!choosing)}
      >
        Lay a kept card
      </Button>
      <Button
        kind="quiet"
        slim
        className="-ml-2"
        disabled={keeping.isPending || Object.keys(table.entries).length === 0}
        onClick={() => keeping.mutate()}
      >
        Keep this card
      </Button>
      <span role="status" className="text-verdigris">
        {keeping.isSuccess && '✓ among the measure cards'}
      </span>
      {failed !== null && <p className="basis-full text-madder">{failureWords(failed)}</p>}
      {choosing && (
        <ul className="basis-full pb-2">
          {cards.data !== undefined && inUse.length === 0 && (
            <li className="text-slate">No card has been kept yet.</li>
          )}
          {inUse.map((card) => (
            <li key={card.id}>
              <Button
                kind="quiet"
                slim
                className="w-full justify-start"
                disabled={laying.isPending}
                onClick={() => laying.mutate(card.id)}
              >
                {`${card.name} · ${card.taken.all} measures`}
              </Button>
            </li>
          ))}
        </ul>
      )}
    </div>
  );
};
