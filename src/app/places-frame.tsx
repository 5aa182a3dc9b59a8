import { QueryClientProvider, useQuery } from '@tanstack/react-query';
import { Outlet } from 'react-router-dom';

import { accountQuery } from '../features/account/queries.ts';
import { queryClient } from '../lib/query-client.ts';
import { PlaceHeader } from './place-header.tsx';

/** What the places beside the drafting table stand in. */
export const PlacesFrame = () => (
  <QueryClientProvider client={queryClient}>
    <Places />
  </QueryClientProvider>
);

const Places = () => {
  const { data: account } = useQuery(accountQuery);
  return (
    <div className="flex min-h-dvh flex-col">
      <PlaceHeader signedIn={account !== null && account !== undefined} />
      <Outlet />
    </div>
  );
};
