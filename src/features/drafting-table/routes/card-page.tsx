import { QueryClientProvider, useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { useParams } from 'react-router-dom';

import { cardContent } from '#shared/api/measure-cards.ts';

import { queryClient } from '../../../lib/query-client.ts';
import { cardQuery } from '../card-queries.ts';
import { CardTable } from '../components/card-table.tsx';
import { mayOpenKept, OpeningFailed } from '../components/opening-failed.tsx';
import { useDraftPlace } from '../use-draft-place.ts';

type CardPageProps = {
  /** The form for who is no longer signed in. */
  readonly signIn: (onSignedIn: () => void) => ReactNode;
};

/** One measure card of its own. */
export const CardPage = ({ signIn }: CardPageProps) => {
  const { cardId = '' } = useParams();
  return (
    <QueryClientProvider client={queryClient}>
      <OpenCard key={cardId} cardId={cardId} signIn={signIn} />
    </QueryClientProvider>
  );
};

const OpenCard = ({ cardId, signIn }: CardPageProps & { readonly cardId: string }) => {
  const place = useDraftPlace('card', cardId, cardContent);
  const card = useQuery(cardQuery(cardId));
  if (place === undefined || card.isPending) {
    return (
      <p role="status" className="p-6 text-slate">
        Fetching the card…
      </p>
    );
  }
  const { found } = place;
  if (card.isError && (found === undefined || !mayOpenKept(card.error))) {
    return (
      <OpeningFailed
        what="measure card"
        error={card.error}
        unsent={found?.changed === true}
        signIn={signIn}
        onRetry={() => void card.refetch()}
      />
    );
  }
  return <CardTable cardId={cardId} card={card.data} place={place} signIn={signIn} />;
};
