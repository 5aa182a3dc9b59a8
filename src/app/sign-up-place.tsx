import { useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { Link, useNavigate } from 'react-router-dom';

import { accountQuery } from '../features/account/queries.ts';
import { SignUpPage } from '../features/account/routes/sign-up-page.tsx';
import { clearTriedTable, triedGown } from '../features/drafting-table/tried-gown.ts';
import { newId } from '../lib/new-id.ts';
import { paths } from './paths.ts';

/** A new account, which takes along what lies on the table at Try it. */
export const SignUpPlace = () => {
  const navigate = useNavigate();
  const client = useQueryClient();
  // Read once: sent again after a lost answer, it is the same gown with the same number.
  const [drawn] = useState(() => {
    const gown = triedGown();
    return gown && { saveId: newId(), ...gown };
  });
  return (
    <SignUpPage
      drawn={drawn}
      onSignedUp={(gownId) => {
        if (gownId !== undefined) clearTriedTable();
        void client.invalidateQueries({ queryKey: accountQuery.queryKey });
        void navigate(gownId === undefined ? paths.gowns : `${paths.gowns}/${gownId}`);
      }}
      signIn={
        <>
          {'Have you one already? '}
          <Link to={paths.signIn} className="text-brass underline">
            Sign in
          </Link>
        </>
      }
    />
  );
};
