import { QueryClientProvider, useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { generatePath, useParams } from 'react-router-dom';

import { draftNumber } from '#shared/engine/draft-number.ts';

import { SignInForm } from '../features/account/components/sign-in-form.tsx';
import { accountQuery } from '../features/account/queries.ts';
import type { GownStart } from '../features/drafting-table/components/gown-table.tsx';
import { OpenedGown } from '../features/drafting-table/components/opened-gown.tsx';
import { PrintRoomPage } from '../features/print-room/routes/print-room-page.tsx';
import { queryClient } from '../lib/query-client.ts';
import { Opening } from './opening.tsx';
import { paths } from './paths.ts';

/** The print room for a kept gown, with what this browser has not sent of it yet. */
export const GownPrintPlace = () => {
  const { gownId = '' } = useParams();
  return (
    <QueryClientProvider client={queryClient}>
      <OpenedGown
        key={gownId}
        gownId={gownId}
        signIn={(onSignedIn) => <SignInForm onSignedIn={onSignedIn} />}
      >
        {(start) => <GownInRoom table={generatePath(paths.gown, { gownId })} start={start} />}
      </OpenedGown>
    </QueryClientProvider>
  );
};

type GownInRoomProps = { readonly table: string; readonly start: () => GownStart };

const GownInRoom = ({ table, start }: GownInRoomProps) => {
  const account = useQuery(accountQuery);
  const [{ bench, title }] = useState(start);
  if (account.isPending) return <Opening />;
  const { drawn, unit } = bench.table;
  return (
    <PrintRoomPage
      draft={drawn.draft}
      fresh={drawn.fresh}
      title={title}
      unit={unit}
      table={table}
      // The address itself is not left lying in the browser.
      maker={account.data ? draftNumber(account.data.email) : 'try'}
    />
  );
};
