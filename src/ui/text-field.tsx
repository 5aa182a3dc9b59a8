import { useId, type ComponentProps } from 'react';

type TextFieldProps = Omit<ComponentProps<'input'>, 'onChange'> & {
  readonly label: string;
  readonly hint?: string | undefined;
  readonly message?: string | undefined;
  readonly onType: (text: string) => void;
};

/** Words to type: the label above, the message that needs doing below. */
export function TextField({ label, hint, message, onType, ...rest }: TextFieldProps) {
  const id = useId();
  const described = [
    message === undefined ? [] : [`${id}-message`],
    hint === undefined ? [] : [`${id}-hint`],
  ].flat();
  return (
    <div className="space-y-1">
      <label htmlFor={id} className="block font-semibold">
        {label}
      </label>
      <input
        id={id}
        type="text"
        className="h-11 w-full rounded-one border border-rule bg-paper px-3 aria-invalid:border-madder"
        aria-invalid={message !== undefined}
        aria-describedby={described.length === 0 ? undefined : described.join(' ')}
        onChange={(event) => onType(event.currentTarget.value)}
        {...rest}
      />
      {hint !== undefined && (
        <p id={`${id}-hint`} className="text-sm text-slate">
          {hint}
        </p>
      )}
      {message !== undefined && (
        <p id={`${id}-message`} className="text-sm text-madder">
          {message}
        </p>
      )}
    </div>
  );
}
