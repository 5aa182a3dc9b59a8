import { useId, type ReactNode } from 'react';

/** What a field's control needs so that its label and message are read with it. */
export type Wiring = {
  readonly id: string;
  readonly 'aria-invalid': boolean;
  readonly 'aria-describedby': string | undefined;
};

type FieldProps = {
  readonly label: ReactNode;
  readonly message?: string | undefined;
  readonly hint?: string | undefined;
  readonly describedBy?: string | undefined;
  readonly children: (wiring: Wiring) => ReactNode;
};

/** A label, its control on the right, and under both a message when something needs doing. */
export function Field({ label, message, ...rest }: FieldProps) {
  const id = useId();
  const messageId = message === undefined ? undefined : `${id}-message`;
  const hintId = rest.hint === undefined ? undefined : `${id}-hint`;
  const described = [messageId, hintId, rest.describedBy]
    .filter((each) => each !== undefined)
    .join(' ');
  return (
    <div className="border-b border-rule py-1">
      <div className="flex items-center justify-between gap-3">
        <label htmlFor={id} className="grow py-1 leading-tight">
          {label}
        </label>
        {rest.children({
          id,
          'aria-invalid': message !== undefined,
          'aria-describedby': described === '' ? undefined : described,
        })}
      </div>
      {rest.hint !== undefined && (
        <p id={hintId} className="pb-1 text-sm leading-snug text-slate">
          {rest.hint}
        </p>
      )}
      {message !== undefined && (
        <p id={messageId} className="py-1 text-sm leading-snug text-madder">
          {message}
        </p>
      )}
    </div>
  );
}
