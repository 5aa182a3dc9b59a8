import type { ReactNode } from 'react';

import { SignInForm } from '../components/sign-in-form.tsx';

type SignInPageProps = {
  readonly onSignedIn: () => void;
  /** The way to a new account. */
  readonly signUp: ReactNode;
};

/** The door for those who have an account. */
export const SignInPage = ({ onSignedIn, signUp }: SignInPageProps) => (
  <main id="content" className="mx-auto w-full max-w-md px-4 py-10">
    <title>Ellwand · sign in</title>
    <h1 className="text-3xl font-semibold">Sign in</h1>
    <p className="mt-2 mb-6">Your gowns and measure cards are kept under your e-mail address.</p>
    <SignInForm onSignedIn={onSignedIn} />
    <p className="mt-6 border-t border-rule pt-4">{signUp}</p>
  </main>
);
