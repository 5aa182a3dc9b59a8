import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Link } from 'react-router-dom';

import { classHours, type ListedClass } from '#shared/api/classes.ts';
import type { Unit } from '#shared/units/said.ts';

import { failureWords } from '../../../lib/failure-words.ts';
import { momentWords } from '../../../lib/moment-words.ts';
import { Button } from '../../../ui/button.tsx';
import { Dialog } from '../../../ui/dialog.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { TextField } from '../../../ui/text-field.tsx';
import { classesQuery, startClass } from '../queries.ts';
import { WithdrawButton } from './withdraw-button.tsx';

type ShareSheetProps = {
  readonly gownId: string;
  /** What is drawn there, as the class would call it. */
  readonly what: string;
  readonly step: string;
  readonly unit: Unit;
  readonly open: boolean;
  readonly onClose: () => void;
  /** Classes of this gown that are open already. */
  readonly classes: readonly ListedClass[];
};

const hourWords: { readonly [H in (typeof classHours)[number]]: string } = {
  2: '2 hours',
  8: '8 hours',
  24: 'a day',
  72: '3 days',
  168: 'a week',
  720: '30 days',
};

/** Opens a class at this step and gives its link, once; those that are open can be withdrawn here. */
export const ShareSheet = (props: ShareSheetProps) => {
  const { gownId, what, step, unit, open, onClose, classes } = props;
  const client = useQueryClient();
  const [title, setTitle] = useState(`A ${what}, step by step`);
  const [hours, setHours] = useState<(typeof classHours)[number]>(8);
  const sharing = useMutation({
    mutationFn: () => startClass(gownId, { title, step, unit, hours }),
    onSuccess: () => client.invalidateQueries({ queryKey: classesQuery.queryKey }),
  });
  const close = () => {
    sharing.reset();
    onClose();
  };
  return (
    <Dialog title="Share with a class" open={open} onClose={close}>
      {sharing.data === undefined ? (
        <form
          className="space-y-4 pt-3"
          onSubmit={(event) => {
            event.preventDefault();
            sharing.mutate();
          }}
        >
          <p>
            Whoever has the link sees the drawing as it is now, its steps with their numbers, and
            the measures those numbers come from. The name and day on the card, the gown’s own name
            and yours are not shown.
          </p>
          <TextField
            label="What the class sees as its name"
            name="title"
            maxLength={80}
            value={title}
            onType={setTitle}
          />
          <div className="space-y-1">
            <label htmlFor="class-hours" className="block font-semibold">
              The link works for
            </label>
            <select
              id="class-hours"
              className="h-11 w-full rounded-one border border-rule bg-paper px-3"
              value={hours}
              onChange={(event) => {
                const chosen = classHours.find((each) => String(each) === event.target.value);
                if (chosen !== undefined) setHours(chosen);
              }}
            >
              {classHours.map((each) => (
                <option key={each} value={each}>
                  {hourWords[each]}
                </option>
              ))}
            </select>
          </div>
          {sharing.error !== null && <Notice>{failureWords(sharing.error, unit)}</Notice>}
          <Button kind="primary" type="submit" disabled={sharing.isPending}>
            Make the link
          </Button>
        </form>
      ) : (
        <NewLink token={sharing.data.token} expiresAt={sharing.data.expiresAt} />
      )}
      {classes.length > 0 && (
        <section className="mt-6 border-t border-rule pt-3">
          <h3 className="heading">Open classes of this gown</h3>
          <ul>
            {classes.map((each) => (
              <li
                key={each.id}
                className="flex flex-wrap items-center justify-between gap-x-3 border-b border-rule py-1"
              >
                <span>{`${each.title}, until ${momentWords(each.expiresAt)}`}</span>
                <WithdrawButton classId={each.id} title={each.title} />
              </li>
            ))}
          </ul>
          <p className="pt-2 text-sm text-slate">
            While you turn the steps here, those who follow turn with you. All of them stand under{' '}
            <Link to="/classes" className="text-brass underline">
              Classes
            </Link>
            .
          </p>
        </section>
      )}
    </Dialog>
  );
};

type NewLinkProps = { readonly token: string; readonly expiresAt: string };

const NewLink = ({ token, expiresAt }: NewLinkProps) => {
  const [copied, setCopied] = useState<boolean>();
  const address = `${location.origin}/class/${token}`;
  const copy = () => {
    // A page that came over plain http has no clipboard.
    const written =
      'clipboard' in navigator
        ? navigator.clipboard.writeText(address)
        : Promise.reject(new Error());
    written.then(
      () => setCopied(true),
      () => setCopied(false),
    );
  };
  return (
    <div className="space-y-3 pt-3">
      <p>
        {`This is the link, until ${momentWords(expiresAt)}. It is shown only now: pass it on, or make another.`}
      </p>
      <input
        readOnly
        aria-label="Link for the class"
        className="h-11 w-full rounded-one border border-rule bg-paper px-3"
        value={address}
        onFocus={(event) => event.currentTarget.select()}
      />
      <p className="flex items-center gap-3">
        <Button kind="primary" onClick={copy}>
          Copy the link
        </Button>
        <span role="status" className="text-sm text-slate">
          {copied === true && '✓ copied'}
          {copied === false && 'This browser does not copy: mark the link and copy it yourself.'}
        </span>
      </p>
    </div>
  );
};
