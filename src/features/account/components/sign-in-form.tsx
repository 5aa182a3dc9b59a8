import { useState } from 'react';

import { failureWords } from '../../../lib/failure-words.ts';
import { Button } from '../../../ui/button.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { useSignIn } from '../queries.ts';
import { CredentialFields, type Credentials } from './credential-fields.tsx';

type SignInFormProps = {
  readonly email?: string | undefined;
  readonly onSignedIn: () => void;
};

/** E-mail and password; whether it was the one or the other that is wrong is not said. */
export const SignInForm = ({ email = '', onSignedIn }: SignInFormProps) => {
  const [value, setValue] = useState<Credentials>({ email, password: '' });
  const signIn = useSignIn();
  return (
    <form
      noValidate
      className="space-y-4"
      onSubmit={(event) => {
        event.preventDefault();
        signIn.mutate(value, { onSuccess: onSignedIn });
      }}
    >
      <CredentialFields value={value} onChange={setValue} error={undefined} />
      {signIn.isError && <Notice>{failureWords(signIn.error)}</Notice>}
      <Button kind="primary" type="submit" disabled={signIn.isPending}>
        {signIn.isPending ? 'Signing in…' : 'Sign in'}
      </Button>
    </form>
  );
};
