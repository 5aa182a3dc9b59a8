import { useQuery } from '@tanstack/react-query';

import { failureWords } from '../../../lib/failure-words.ts';
import { Button } from '../../../ui/button.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { PasswordForm } from '../components/password-form.tsx';
import { Sessions } from '../components/sessions.tsx';
import { accountQuery, useLeave } from '../queries.ts';

/** What belongs to the account itself: signing out, its password, where it is signed in. */
export const AccountPage = ({ onLeft }: { onLeft: () => void }) => {
  const { data: account } = useQuery(accountQuery);
  const leave = useLeave(false);
  return (
    <main id="content" className="mx-auto w-full max-w-2xl space-y-10 px-4 py-8 sm:px-8">
      <title>Ellwand · account</title>
      <header>
        <h1 className="text-3xl font-semibold">Account</h1>
        <p className="mt-2">
          {`You are signed in as ${account?.email ?? '…'}; leave a borrowed computer signed out.`}
        </p>
        <Button
          className="mt-4"
          disabled={leave.isPending}
          onClick={() => leave.mutate(undefined, { onSuccess: onLeft })}
        >
          Sign out
        </Button>
        {leave.isError && <Notice>{failureWords(leave.error)}</Notice>}
      </header>
      <section aria-labelledby="sessions">
        <h2 id="sessions" className="heading pb-2">
          Signed in
        </h2>
        <Sessions onLeft={onLeft} />
      </section>
      <section aria-labelledby="password" className="max-w-md">
        <h2 id="password" className="heading pb-2">
          Password
        </h2>
        <PasswordForm email={account?.email ?? ''} />
      </section>
    </main>
  );
};
