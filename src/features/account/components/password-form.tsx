import { useState } from 'react';

import { CallFailed } from '../../../lib/call.ts';
import { failureWords, fieldWords } from '../../../lib/failure-words.ts';
import { Button } from '../../../ui/button.tsx';
import { Notice } from '../../../ui/notice.tsx';
import { TextField } from '../../../ui/text-field.tsx';
import { useChangePassword } from '../queries.ts';

const empty = { password: '', newPassword: '' };

/** The present password once more, and the one to take its place. */
export const PasswordForm = ({ email }: { email: string }) => {
  const [value, setValue] = useState(empty);
  const change = useChangePassword();
  const atField = change.error instanceof CallFailed && change.error.problems.length > 0;
  return (
    <form
      noValidate
      className="space-y-4"
      onSubmit={(event) => {
        event.preventDefault();
        change.mutate(value, { onSuccess: () => setValue(empty) });
      }}
    >
      <input type="hidden" name="username" autoComplete="username" value={email} readOnly />
      <TextField
        label="Present password"
        name="password"
        type="password"
        autoComplete="current-password"
        maxLength={200}
        value={value.password}
        message={fieldWords(change.error, 'password')}
        onType={(password) => setValue({ ...value, password })}
      />
      <TextField
        label="New password"
        name="newPassword"
        type="password"
        autoComplete="new-password"
        maxLength={200}
        hint="At least 10 letters. Every other session is signed out."
        value={value.newPassword}
        message={fieldWords(change.error, 'newPassword')}
        onType={(newPassword) => setValue({ ...value, newPassword })}
      />
      {change.isError && !atField && <Notice>{failureWords(change.error)}</Notice>}
      <div className="flex flex-wrap items-center gap-4">
        <Button type="submit" disabled={change.isPending}>
          Change password
        </Button>
        <p role="status" className="text-verdigris">
          {change.isSuccess && '✓ changed'}
        </p>
      </div>
    </form>
  );
};
