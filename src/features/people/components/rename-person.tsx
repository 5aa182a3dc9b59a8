import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';

import type { Person } from '#shared/api/people.ts';

import { fieldWords, failureWords } from '../../../lib/failure-words.ts';
import { Button } from '../../../ui/button.tsx';
import { Dialog } from '../../../ui/dialog.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { TextField } from '../../../ui/text-field.tsx';
import { nameIt } from '../queries.ts';

/** Gives a person another name; what was typed stays when the server refuses it. */
export const RenamePerson = ({ person }: { person: Person }) => {
  const [open, setOpen] = useState(false);
  const [name, setName] = useState(person.name);
  const client = useQueryClient();
  const naming = useMutation({
    mutationFn: () => nameIt(person.id, name),
    onSuccess: async () => {
      setOpen(false);
      await client.invalidateQueries();
    },
  });
  const atName = fieldWords(naming.error, 'name');
  return (
    <>
      <Button kind="quiet" slim className="-ml-2" onClick={() => setOpen(true)}>
        Rename
      </Button>
      <Dialog title={`Rename ${person.name}`} open={open} onClose={() => setOpen(false)}>
        <form
          noValidate
          className="mt-4 space-y-4"
          onSubmit={(event) => {
            event.preventDefault();
            naming.mutate();
          }}
        >
          <TextField
            label="Name of the client"
            autoComplete="off"
            maxLength={80}
            value={name}
            message={atName}
            onType={setName}
          />
          {naming.isError && atName === undefined && <Notice>{failureWords(naming.error)}</Notice>}
          <Button kind="primary" type="submit" disabled={naming.isPending}>
            Keep the name
          </Button>
        </form>
      </Dialog>
    </>
  );
};
