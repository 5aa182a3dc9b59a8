import { useQuery } from '@tanstack/react-query';
import { Outlet } from 'react-router-dom';

import { accountQuery } from '../features/account/queries.ts';
import { SignInPage } from '../features/account/routes/sign-in-page.tsx';
import { failureWords } from '../lib/failure-words.ts';
import { Button } from '../ui/button.tsx';
import { Notice } from '../ui/notice.tsx';
import { Opening } from './opening.tsx';
import { ToSignUp } from './sign-in-place.tsx';

/** Places of an account: who is not signed in is asked to, here, and then goes on. */
export const OwnPlaces = () => {
  const account = useQuery(accountQuery);
  if (account.isPending) return <Opening />;
  if (account.isError) {
    return (
      <main id="content" className="mx-auto w-full max-w-xl space-y-4 p-6">
        <h1 className="text-2xl font-semibold">This page did not open</h1>
        <Notice>{failureWords(account.error)}</Notice>
        <Button kind="primary" onClick={() => void account.refetch()}>
          Try again
        </Button>
      </main>
    );
  }
  if (account.data === null) {
    return <SignInPage onSignedIn={() => void account.refetch()} signUp={<ToSignUp />} />;
  }
  return <Outlet />;
};
