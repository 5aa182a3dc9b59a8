import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';

import type { Gown } from '#shared/api/gowns.ts';

import { failureWords } from '../../../lib/failure-words.ts';
import { momentWords } from '../../../lib/moment-words.ts';
import { Button } from '../../../ui/button.tsx';
import { FullSheet } from '../../../ui/full-sheet.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { TextField } from '../../../ui/text-field.tsx';
import { choicesOf } from '../gown-content.ts';
import {
  revisionQuery,
  revisionsQuery,
  useNameRevision,
  useReturnToRevision,
  type SaveFirst,
} from '../revision-queries.ts';
import type { TableState } from '../table-state.ts';
import { SideBySide } from './side-by-side.tsx';

type RevisionsSheetProps = {
  readonly gownId: string;
  readonly table: TableState;
  readonly saveFirst: SaveFirst;
  readonly onReturned: (gown: Gown) => void;
  readonly onClose: () => void;
};

/** States of the gown worth coming back to: name this one, look at any, return to one. */
export const RevisionsSheet = (props: RevisionsSheetProps) => {
  const { gownId, table, saveFirst, onReturned, onClose } = props;
  const [name, setName] = useState('');
  const [chosen, setChosen] = useState<string>();
  const revisions = useQuery(revisionsQuery(gownId));
  const naming = useNameRevision(gownId, saveFirst);
  const returning = useReturnToRevision(gownId, saveFirst);
  const shown = revisions.data?.find(({ id }) => id === chosen);
  const failed = naming.error ?? returning.error ?? revisions.error;
  return (
    <FullSheet
      title="Revisions"
      help="Name the gown as it lies here, look at any earlier state, and return to one."
      actions={
        <>
          {shown !== undefined && (
            <Button
              kind="primary"
              disabled={returning.isPending}
              onClick={() => returning.mutate(shown.id, { onSuccess: onReturned })}
            >
              {`Return to “${shown.name}”`}
            </Button>
          )}
          <Button onClick={onClose}>Close</Button>
          {shown !== undefined && (
            <p className="text-sm text-slate sm:basis-full">
              What lies on the table now is kept as a revision of its own.
            </p>
          )}
        </>
      }
    >
      <div className="grid gap-6 lg:grid-cols-[20rem_minmax(0,1fr)]">
        <div className="space-y-4">
          <form
            noValidate
            className="space-y-3"
            onSubmit={(event) => {
              event.preventDefault();
              if (name.trim() !== '') naming.mutate(name, { onSuccess: () => setName('') });
            }}
          >
            <TextField
              label="Name this state"
              placeholder="before the fitting"
              autoComplete="off"
              maxLength={80}
              value={name}
              onType={setName}
            />
            <Button type="submit" disabled={naming.isPending || name.trim() === ''}>
              Keep as a revision
            </Button>
          </form>
          {failed !== null && <Notice>{failureWords(failed)}</Notice>}
          {revisions.data?.length === 0 && <p className="text-slate">No revision yet.</p>}
          <ul>
            {revisions.data?.map((revision) => (
              <li key={revision.id} className="border-b border-rule">
                <button
                  type="button"
                  aria-pressed={revision.id === chosen}
                  className="w-full border-l-2 border-transparent py-2 pl-2 text-left aria-pressed:border-brass aria-pressed:bg-paper"
                  onClick={() => setChosen(revision.id === chosen ? undefined : revision.id)}
                >
                  <strong className="block font-semibold break-words">{revision.name}</strong>
                  <span className="text-sm text-slate">
                    {`${momentWords(revision.createdAt)}${revision.automatic ? ' · kept by itself' : ''}`}
                  </span>
                </button>
              </li>
            ))}
          </ul>
        </div>
        {shown === undefined ? (
          <p className="text-slate">Choose a revision to see it beside what lies on the table.</p>
        ) : (
          <Shown key={shown.id} gownId={gownId} revisionId={shown.id} table={table} />
        )}
      </div>
    </FullSheet>
  );
};

type ShownProps = {
  readonly gownId: string;
  readonly revisionId: string;
  readonly table: TableState;
};

const Shown = ({ gownId, revisionId, table }: ShownProps) => {
  const revision = useQuery(revisionQuery(gownId, revisionId));
  if (revision.isPending) return <p className="text-slate">Fetching…</p>;
  if (revision.isError) return <Notice>{failureWords(revision.error)}</Notice>;
  const { name, createdAt, content, drawn } = revision.data;
  return (
    <SideBySide
      unit={table.unit}
      left={{
        title: name,
        note: momentWords(createdAt),
        work: choicesOf(content).choices,
        pieces: drawn?.pieces,
      }}
      right={{
        title: 'On the table',
        note: 'now',
        work: table,
        pieces: table.drawn.draft?.pieces,
      }}
    />
  );
};
