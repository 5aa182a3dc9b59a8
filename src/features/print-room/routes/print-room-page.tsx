import { QueryClientProvider } from '@tanstack/react-query';

import type { Drafted } from '#shared/engine/drafted.ts';

import { queryClient } from '../../../lib/query-client.ts';
import { NothingToPrint } from '../components/nothing-to-print.tsx';
import { PrintRoom, type ToPrint } from '../components/print-room.tsx';

type PrintRoomPageProps = Omit<ToPrint, 'draft'> & { readonly draft: Drafted | undefined };

/** The print room for what lies on a table. */
export const PrintRoomPage = ({ draft, ...rest }: PrintRoomPageProps) => (
  <QueryClientProvider client={queryClient}>
    {draft === undefined ? (
      <NothingToPrint table={rest.table} />
    ) : (
      <PrintRoom draft={draft} {...rest} />
    )}
  </QueryClientProvider>
);
