import { useState, type ReactNode } from 'react';

import { CallFailed } from '../../../lib/call.ts';
import { failureWords, fieldWords } from '../../../lib/failure-words.ts';
import { Button } from '../../../ui/button.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { TextField } from '../../../ui/text-field.tsx';
import { CredentialFields, type Credentials } from '../components/credential-fields.tsx';
import { useSignUp, type FirstGown } from '../queries.ts';

type SignUpPageProps = {
  /** What lies on the table at Try it, to be kept as the first gown. */
  readonly drawn: FirstGown | undefined;
  readonly onSignedUp: (gownId: string | undefined) => void;
  readonly signIn: ReactNode;
};

/** A new account, which takes along what was drawn before there was one. */
export const SignUpPage = ({ drawn, onSignedUp, signIn }: SignUpPageProps) => {
  const [value, setValue] = useState<Credentials>({ email: '', password: '' });
  const [title, setTitle] = useState(drawn?.title ?? '');
  const signUp = useSignUp();
  const gown = drawn && { ...drawn, title: title.trim() === '' ? drawn.title : title };
  return (
    <main id="content" className="mx-auto w-full max-w-md px-4 py-10">
      <title>Ellwand · keep your gowns</title>
      <h1 className="text-3xl font-semibold">Keep your gowns</h1>
      <p className="mt-2 mb-6">
        {drawn === undefined
          ? 'An account keeps every gown and measure card you make, safe from a closed lid and a lost browser.'
          : 'An account keeps what you drew as your first gown, and every one you draw from now on.'}
      </p>
      <form
        noValidate
        className="space-y-4"
        onSubmit={(event) => {
          event.preventDefault();
          signUp.mutate(
            { ...value, ...(gown === undefined ? {} : { gown }) },
            { onSuccess: ({ gownId }) => onSignedUp(gownId) },
          );
        }}
      >
        {drawn !== undefined && (
          <TextField
            label="Name of the gown"
            name="title"
            autoComplete="off"
            maxLength={80}
            value={title}
            message={fieldWords(signUp.error, 'gown.title')}
            onType={setTitle}
          />
        )}
        <CredentialFields chosen value={value} onChange={setValue} error={signUp.error} />
        {signUp.isError && !isShownAtField(signUp.error) && (
          <Notice>{failureWords(signUp.error)}</Notice>
        )}
        <Button kind="primary" type="submit" disabled={signUp.isPending}>
          {signUp.isPending ? 'Opening the account…' : 'Open an account'}
        </Button>
      </form>
      <p className="mt-6 border-t border-rule pt-4">{signIn}</p>
    </main>
  );
};

const shownFields = ['email', 'password', 'gown.title'];

/** Whether all that is wrong stands beside the field it is wrong with. */
const isShownAtField = (error: unknown): boolean =>
  error instanceof CallFailed &&
  error.problems.length > 0 &&
  error.problems.every(({ field }) => shownFields.includes(field));
