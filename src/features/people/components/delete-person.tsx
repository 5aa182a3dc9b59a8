import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { useNavigate } from 'react-router-dom';

import type { Person } from '#shared/api/people.ts';
import { dayInWords } from '#shared/exports/day.ts';

import { failureWords } from '../../../lib/failure-words.ts';
import { Button } from '../../../ui/button.tsx';
import { Dialog } from '../../../ui/dialog.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { deleteAll, type ListedCard, type ListedGown } from '../queries.ts';

type DeletePersonProps = {
  readonly person: Person;
  readonly cards: readonly ListedCard[];
  readonly gowns: readonly ListedGown[];
};

/** Deletes a person after saying by name what goes with them. */
export const DeletePerson = ({ person, cards, gowns }: DeletePersonProps) => {
  const [asking, setAsking] = useState(false);
  const client = useQueryClient();
  const navigate = useNavigate();
  const deleting = useMutation({
    mutationFn: () =>
      deleteAll(person.id, {
        cards: cards.map(({ id }) => id),
        gowns: gowns.map(({ id }) => id),
      }),
    onSuccess: async () => {
      void navigate('/clients');
      await client.invalidateQueries();
    },
    onError: () => client.invalidateQueries(),
  });
  const goes = [
    ...cards.map(({ id, name, takenOn }) => ({
      id,
      text: `measure card “${name}” of ${dayInWords(takenOn)}`,
    })),
    ...gowns.map(({ id, title }) => ({ id, text: `gown “${title}” with all its revisions` })),
  ];
  return (
    <>
      <Button
        kind="quiet"
        slim
        className="-ml-2"
        onClick={() => {
          deleting.reset();
          setAsking(true);
        }}
      >
        {`Delete ${person.name}`}
      </Button>
      <Dialog title={`Delete ${person.name}?`} open={asking} onClose={() => setAsking(false)}>
        <div className="mt-4 space-y-4">
          {goes.length === 0 ? (
            <p>Nothing else goes: there is no measure card and no gown.</p>
          ) : (
            <>
              <p>With this name go, for good:</p>
              <ul className="list-disc pl-5">
                {goes.map(({ id, text }) => (
                  <li key={id}>{text}</li>
                ))}
              </ul>
            </>
          )}
          <p className="text-slate">
            Gowns that none of these cards was laid on are not among them, nor is what you have
            printed or saved as a file.
          </p>
          {deleting.isError && <Notice>{failureWords(deleting.error)}</Notice>}
          <div className="flex flex-wrap gap-3">
            <Button kind="primary" disabled={deleting.isPending} onClick={() => deleting.mutate()}>
              Delete all of it
            </Button>
            <Button onClick={() => setAsking(false)}>Keep everything</Button>
          </div>
        </div>
      </Dialog>
    </>
  );
};
