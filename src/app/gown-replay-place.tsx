import { QueryClientProvider } from '@tanstack/react-query';
import { useState } from 'react';
import { useParams } from 'react-router-dom';

import { SignInForm } from '../features/account/components/sign-in-form.tsx';
import type { GownStart } from '../features/drafting-table/components/gown-table.tsx';
import { OpenedGown } from '../features/drafting-table/components/opened-gown.tsx';
import { GownReplayPage } from '../features/replay/routes/gown-replay-page.tsx';
import { queryClient } from '../lib/query-client.ts';

/** The replay of a kept gown, with what this browser has not sent of it yet. */
export const GownReplayPlace = () => {
  const { gownId = '' } = useParams();
  return (
    <QueryClientProvider client={queryClient}>
      <OpenedGown
        key={gownId}
        gownId={gownId}
        signIn={(onSignedIn) => <SignInForm onSignedIn={onSignedIn} />}
      >
        {(start) => <Told gownId={gownId} start={start} />}
      </OpenedGown>
    </QueryClientProvider>
  );
};

type ToldProps = { readonly gownId: string; readonly start: () => GownStart };

const Told = ({ gownId, start }: ToldProps) => {
  const [{ bench, title }] = useState(start);
  const { drawn, unit } = bench.table;
  return (
    <GownReplayPage
      gownId={gownId}
      draft={drawn.draft}
      fresh={drawn.fresh}
      title={title}
      unit={unit}
    />
  );
};
