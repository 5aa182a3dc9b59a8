import { fieldWords } from '../../../lib/failure-words.ts';
import { TextField } from '../../../ui/text-field.tsx';

export type Credentials = { readonly email: string; readonly password: string };

type CredentialFieldsProps = {
  readonly value: Credentials;
  readonly onChange: (value: Credentials) => void;
  /** A password somebody chooses, not one they have. */
  readonly chosen?: boolean;
  readonly error: unknown;
};

/** E-mail and password, as password keepers know them. */
export const CredentialFields = ({ value, onChange, chosen, error }: CredentialFieldsProps) => (
  <>
    <TextField
      label="E-mail"
      name="email"
      type="email"
      autoComplete="username"
      autoCapitalize="none"
      spellCheck={false}
      required
      maxLength={254}
      value={value.email}
      message={fieldWords(error, 'email')}
      onType={(email) => onChange({ ...value, email })}
    />
    <TextField
      label="Password"
      name="password"
      type="password"
      autoComplete={chosen === true ? 'new-password' : 'current-password'}
      required
      maxLength={200}
      value={value.password}
      {...(chosen === true
        ? { hint: 'At least 10 letters. A few words in a row are easier to keep than signs.' }
        : {})}
      message={fieldWords(error, 'password')}
      onType={(password) => onChange({ ...value, password })}
    />
  </>
);
