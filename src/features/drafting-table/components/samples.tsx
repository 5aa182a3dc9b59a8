import { useQuery } from '@tanstack/react-query';
import type { Dispatch } from 'react';

import { Button } from '../../../ui/button.tsx';
import { samplesQuery } from '../queries.ts';
import type { TableAction } from '../table-state.ts';

/** Sample bodies to lay out, invented by us; without a server the maker types her own. */
export const Samples = ({ dispatch }: { dispatch: Dispatch<TableAction> }) => {
  const samples = useQuery(samplesQuery);
  if (samples.isPending) return <p className="text-slate">Fetching the sample bodies…</p>;
  if (samples.isError) {
    return (
      <p className="flex flex-wrap items-center gap-2 text-slate" role="status">
        The sample bodies could not be fetched; your own measures work without them.
        <Button kind="quiet" className="px-1" onClick={() => void samples.refetch()}>
          Fetch again
        </Button>
      </p>
    );
  }
  return (
    <ul className="w-full max-w-2xl">
      {samples.data.samples.map((sample) => (
        <li
          key={sample.id}
          className="flex flex-wrap items-center gap-x-4 gap-y-1 border-b border-rule py-2 sm:flex-nowrap"
        >
          <Button
            className="w-56 shrink-0"
            onClick={() => dispatch({ type: 'gown laid', gown: sample })}
          >
            {sample.title}
          </Button>
          <span className="text-sm text-slate">{sample.note}</span>
        </li>
      ))}
    </ul>
  );
};
