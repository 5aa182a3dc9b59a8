import { QueryClientProvider, useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { useParams } from 'react-router-dom';

import { queryClient } from '../../../lib/query-client.ts';
import { UsedCard } from '../components/used-card.tsx';
import { cardQuery } from '../queries.ts';

/** A card that a gown was drawn from is only read; any other is filled in as ever. */
export const CardGate = ({ children, header }: { children: ReactNode; header: ReactNode }) => (
  <QueryClientProvider client={queryClient}>
    <Gate header={header}>{children}</Gate>
  </QueryClientProvider>
);

const Gate = ({ children, header }: { children: ReactNode; header: ReactNode }) => {
  const { cardId = '' } = useParams();
  const card = useQuery(cardQuery(cardId));
  if (card.isPending) {
    return (
      <p role="status" className="p-6 text-slate">
        Fetching the card…
      </p>
    );
  }
  if (card.data === undefined || card.data.usedBy.length === 0) return children;
  return (
    <div className="flex min-h-dvh flex-col">
      {header}
      <UsedCard card={card.data} />
    </div>
  );
};
