import { useState } from 'react';

import { Button } from '../../../ui/button.tsx';
import type { DeedDoer } from '../queries.ts';
import { DeletingDialog } from './deleting-dialog.tsx';
import { NamingDialog } from './naming-dialog.tsx';

type RecordActionsProps = {
  readonly record: { readonly id: string; readonly archived: boolean };
  readonly name: string;
  readonly label: string;
  /** What goes with it when it is deleted, one sentence. */
  readonly goes: string;
  readonly deed: DeedDoer;
};

/** What can be done to one record of a list, in words; its name goes along for those who listen. */
export const RecordActions = ({ record, name, label, goes, deed }: RecordActionsProps) => {
  const [open, setOpen] = useState<'renaming' | 'deleting'>();
  const close = () => setOpen(undefined);
  const begin = (what: 'renaming' | 'deleting') => {
    deed.reset();
    setOpen(what);
  };
  const { id, archived } = record;
  return (
    <div className="-mx-2 flex flex-wrap">
      <Button
        kind="quiet"
        slim
        className="text-sm"
        aria-label={`Rename ${name}`}
        onClick={() => begin('renaming')}
      >
        Rename
      </Button>
      <Button
        kind="quiet"
        slim
        className="text-sm"
        aria-label={`Duplicate ${name}`}
        disabled={deed.isPending}
        onClick={() => deed.mutate({ kind: 'duplicate', id, name: `Copy of ${name}`.slice(0, 80) })}
      >
        Duplicate
      </Button>
      <Button
        kind="quiet"
        slim
        className="text-sm"
        aria-label={`${archived ? 'Take back' : 'Archive'} ${name}`}
        disabled={deed.isPending}
        onClick={() => deed.mutate({ kind: archived ? 'unarchive' : 'archive', id })}
      >
        {archived ? 'Take back' : 'Archive'}
      </Button>
      {archived && (
        <Button
          kind="quiet"
          slim
          className="text-sm"
          aria-label={`Delete ${name}`}
          onClick={() => begin('deleting')}
        >
          Delete
        </Button>
      )}
      {open === 'deleting' && (
        <DeletingDialog
          name={name}
          goes={goes}
          deed={deed}
          onClose={close}
          onDelete={() => deed.mutate({ kind: 'delete', id }, { onSuccess: close })}
        />
      )}
      {open === 'renaming' && (
        <NamingDialog
          title={`Rename ${name}`}
          label={label}
          now={name}
          deed={deed}
          onClose={close}
          onName={(given) => deed.mutate({ kind: 'rename', id, name: given }, { onSuccess: close })}
        />
      )}
    </div>
  );
};
