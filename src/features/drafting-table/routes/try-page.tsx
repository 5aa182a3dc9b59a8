import { QueryClientProvider } from '@tanstack/react-query';

import { queryClient } from '../../../lib/query-client.ts';
import { TryTable } from '../components/try-table.tsx';

/** The drafting table without an account. */
export const TryPage = () => (
  <QueryClientProvider client={queryClient}>
    <title>Ellwand · drafting table</title>
    <TryTable />
  </QueryClientProvider>
);
