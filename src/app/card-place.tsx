import { SignInForm } from '../features/account/components/sign-in-form.tsx';
import { CardPage } from '../features/drafting-table/routes/card-page.tsx';

/** One measure card, where who is no longer signed in can sign in without leaving it. */
export const CardPlace = () => (
  <CardPage signIn={(onSignedIn) => <SignInForm onSignedIn={onSignedIn} />} />
);
