import { useQuery } from '@tanstack/react-query';
import { Link, Navigate, useNavigate } from 'react-router-dom';

import { accountQuery } from '../features/account/queries.ts';
import { SignInPage } from '../features/account/routes/sign-in-page.tsx';
import { paths } from './paths.ts';

export const ToSignUp = () => (
  <>
    {'No account yet? '}
    <Link to={paths.signUp} className="text-brass underline">
      Open one
    </Link>
  </>
);

/** Signing in, and on to the gowns; who is signed in already goes there at once. */
export const SignInPlace = () => {
  const { data: account } = useQuery(accountQuery);
  const navigate = useNavigate();
  if (account) return <Navigate to={paths.gowns} replace />;
  return <SignInPage onSignedIn={() => void navigate(paths.gowns)} signUp={<ToSignUp />} />;
};
