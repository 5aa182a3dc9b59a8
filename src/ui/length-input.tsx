import type { KeyboardEvent } from 'react';

import { focusNext } from '../lib/focus-next.ts';
import type { Wiring } from './field.tsx';

type LengthInputProps = {
  readonly wiring: Wiring;
  readonly text: string;
  /** Shown while the field is empty: what holds then. */
  readonly placeholder?: string | undefined;
  readonly name: string;
  readonly onType: (text: string) => void;
  readonly onStart?: () => void;
  readonly onDone: () => void;
};

/** A figure typed the way it is read off the tape; what it means is decided elsewhere. */
export function LengthInput(props: LengthInputProps) {
  const key = (event: KeyboardEvent<HTMLInputElement>) => {
    if (event.key !== 'Enter') return;
    event.preventDefault();
    focusNext(event.currentTarget);
  };
  return (
    <input
      {...props.wiring}
      name={props.name}
      type="text"
      inputMode="text"
      enterKeyHint="next"
      autoComplete="off"
      spellCheck={false}
      maxLength={24}
      value={props.text}
      placeholder={props.placeholder}
      onChange={(event) => props.onType(event.currentTarget.value)}
      onFocus={(event) => {
        event.currentTarget.select();
        props.onStart?.();
      }}
      onBlur={props.onDone}
      onKeyDown={key}
      className="figures h-9 scroll-mt-48 scroll-mb-4 w-26 shrink-0 rounded-one border border-rule bg-paper px-2 text-right aria-invalid:border-madder aria-invalid:text-madder"
    />
  );
}
