import { QueryClientProvider } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { useParams } from 'react-router-dom';

import { queryClient } from '../../../lib/query-client.ts';
import { GownTable } from '../components/gown-table.tsx';
import { OpenedGown } from '../components/opened-gown.tsx';

type GownPageProps = {
  /** The form for who is no longer signed in. */
  readonly signIn: (onSignedIn: () => void) => ReactNode;
};

/** The drafting table of one gown. */
export const GownPage = ({ signIn }: GownPageProps) => {
  const { gownId = '' } = useParams();
  return (
    <QueryClientProvider client={queryClient}>
      <OpenedGown key={gownId} gownId={gownId} signIn={signIn}>
        {(start, place) => (
          <GownTable gownId={gownId} start={start} place={place} signIn={signIn} />
        )}
      </OpenedGown>
    </QueryClientProvider>
  );
};
