import { SignInForm } from '../features/account/components/sign-in-form.tsx';
import { CardPage } from '../features/drafting-table/routes/card-page.tsx';
import { CardGate } from '../features/people/routes/card-gate.tsx';
import { PlaceHeader } from './place-header.tsx';

/** One measure card, where who is no longer signed in can sign in without leaving it. */
export const CardPlace = () => (
  <CardGate header={<PlaceHeader signedIn />}>
    <CardPage signIn={(onSignedIn) => <SignInForm onSignedIn={onSignedIn} />} />
  </CardGate>
);
