import { useQuery } from '@tanstack/react-query';

import { failureWords } from '../../../lib/failure-words.ts';
import { momentWords } from '../../../lib/moment-words.ts';
import { Button } from '../../../ui/button.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { sessionsQuery, useLeave } from '../queries.ts';

/** Where the account is signed in, and the way out of all of them at once. */
export const Sessions = ({ onLeft }: { onLeft: () => void }) => {
  const sessions = useQuery(sessionsQuery);
  const leave = useLeave(true);
  return (
    <>
      {sessions.isPending && <p className="text-slate">Looking up the sessions…</p>}
      {sessions.isError && <Notice>{failureWords(sessions.error)}</Notice>}
      <ul>
        {sessions.data?.map(({ device, startedAt, lastUsedAt, here }) => (
          <li
            key={`${device} ${startedAt}`}
            className="flex flex-wrap justify-between gap-x-4 border-b border-rule py-2"
          >
            <span className="font-semibold">
              {device}
              {here && <span className="font-normal text-verdigris"> · this one</span>}
            </span>
            <span className="text-slate">{`last used ${momentWords(lastUsedAt)}`}</span>
          </li>
        ))}
      </ul>
      {leave.isError && <Notice>{failureWords(leave.error)}</Notice>}
      <Button
        className="mt-4"
        disabled={leave.isPending}
        onClick={() => leave.mutate(undefined, { onSuccess: onLeft })}
      >
        Sign out everywhere
      </Button>
    </>
  );
};
