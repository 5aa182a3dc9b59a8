import { useState } from 'react';

import { Button } from '../../../ui/button.tsx';
import type { DeedDoer } from '../queries.ts';
import { NamingDialog } from './naming-dialog.tsx';

type RecordActionsProps = {
  readonly record: { readonly id: string; readonly archived: boolean };
  readonly name: string;
  readonly label: string;
  readonly deed: DeedDoer;
};

/** What can be done to one record of a list, in words; its name goes along for those who listen. */
export const RecordActions = ({ record, name, label, deed }: RecordActionsProps) => {
  const [renaming, setRenaming] = useState(false);
  const { id, archived } = record;
  return (
    <div className="-mx-2 flex flex-wrap">
      <Button
        kind="quiet"
        slim
        className="text-sm"
        aria-label={`Rename ${name}`}
        onClick={() => {
          deed.reset();
          setRenaming(true);
        }}
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
      {renaming && (
        <NamingDialog
          title={`Rename ${name}`}
          label={label}
          now={name}
          deed={deed}
          onClose={() => setRenaming(false)}
          onName={(given) =>
            deed.mutate(
              { kind: 'rename', id, name: given },
              { onSuccess: () => setRenaming(false) },
            )
          }
        />
      )}
    </div>
  );
};
