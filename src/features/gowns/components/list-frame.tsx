import { useState, type ReactNode } from 'react';

import { failureWords } from '../../../lib/failure-words.ts';
import { Button } from '../../../ui/button.tsx';
import { Notice } from '../../../ui/notice.tsx';
import type { DeedDoer } from '../queries.ts';

type Listed = { readonly id: string; readonly archived: boolean };

type ListFrameProps<T extends Listed> = {
  readonly title: string;
  /** What this list is for, one sentence. */
  readonly help: string;
  readonly tabs: ReactNode;
  readonly make: ReactNode;
  readonly none: string;
  readonly list: {
    readonly data: readonly T[] | undefined;
    readonly error: Error | null;
    readonly isPending: boolean;
    readonly refetch: () => unknown;
  };
  readonly deed: DeedDoer;
  readonly render: (record: T) => ReactNode;
};

/** A list of one's own: those in use, and on request those put away. */
export function ListFrame<T extends Listed>(props: ListFrameProps<T>) {
  const { list, deed, render } = props;
  const [archive, setArchive] = useState(false);
  const records = list.data ?? [];
  const shown = records.filter(({ archived }) => archived === archive);
  const away = records.filter(({ archived }) => archived).length;
  return (
    <main id="content" className="mx-auto w-full max-w-[86rem] grow px-4 py-8 sm:px-8">
      <title>{`Ellwand · ${props.title.toLowerCase()}`}</title>
      <div className="flex flex-wrap items-end justify-between gap-x-8 gap-y-4">
        <div>
          <h1 className="text-3xl font-semibold">{props.title}</h1>
          <p className="mt-2 max-w-prose">{props.help}</p>
        </div>
        {props.make}
      </div>
      <div className="mt-6 mb-4 flex flex-wrap items-center justify-between gap-4 border-b border-rule">
        {props.tabs}
        {(away > 0 || archive) && (
          <Button kind="quiet" slim onClick={() => setArchive(!archive)}>
            {archive ? 'Back to those in use' : `Archive (${away})`}
          </Button>
        )}
      </div>
      {deed.isError && <Notice>{failureWords(deed.error)}</Notice>}
      {list.isPending && (
        <p role="status" className="text-slate">
          Fetching…
        </p>
      )}
      {list.error !== null && (
        <Notice>
          {failureWords(list.error)}{' '}
          <Button kind="quiet" slim onClick={() => void list.refetch()}>
            Try again
          </Button>
        </Notice>
      )}
      {list.data !== undefined && shown.length === 0 && (
        <p className="text-lg">{archive ? 'Nothing has been put away.' : props.none}</p>
      )}
      <ul className="grid grid-cols-[repeat(auto-fill,minmax(min(100%,15.5rem),1fr))] gap-4">
        {shown.map((record) => (
          <li
            key={record.id}
            className="flex flex-col rounded-one border border-rule bg-cloth p-4 shadow-sheet"
          >
            {render(record)}
          </li>
        ))}
      </ul>
    </main>
  );
}
