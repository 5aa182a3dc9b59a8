import { SignInForm } from '../features/account/components/sign-in-form.tsx';
import { GownPage } from '../features/drafting-table/routes/gown-page.tsx';

/** The table of one gown, where who is no longer signed in can sign in without leaving it. */
export const GownPlace = () => (
  <GownPage signIn={(onSignedIn) => <SignInForm onSignedIn={onSignedIn} />} />
);
