import { useState } from 'react';

import { fieldWords, failureWords } from '../../../lib/failure-words.ts';
import { Button } from '../../../ui/button.tsx';
import { Dialog } from '../../../ui/dialog.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { TextField } from '../../../ui/text-field.tsx';
import type { DeedDoer } from '../queries.ts';

type NamingDialogProps = {
  readonly title: string;
  readonly label: string;
  readonly now: string;
  readonly deed: DeedDoer;
  readonly onName: (name: string) => void;
  readonly onClose: () => void;
};

/** Asks for a name; what was typed stays when the server refuses it. */
export const NamingDialog = ({ title, label, now, deed, onName, onClose }: NamingDialogProps) => {
  const [name, setName] = useState(now);
  const atField = fieldWords(deed.error, 'title') ?? fieldWords(deed.error, 'name');
  return (
    <Dialog title={title} open onClose={onClose}>
      <form
        noValidate
        className="mt-4 space-y-4"
        onSubmit={(event) => {
          event.preventDefault();
          onName(name);
        }}
      >
        <TextField
          label={label}
          autoFocus
          autoComplete="off"
          maxLength={80}
          value={name}
          message={atField}
          onType={setName}
        />
        {deed.isError && atField === undefined && <Notice>{failureWords(deed.error)}</Notice>}
        <Button kind="primary" type="submit" disabled={deed.isPending}>
          Keep the name
        </Button>
      </form>
    </Dialog>
  );
};
