import { useState, type Dispatch } from 'react';

import { Field } from '../../../ui/field.tsx';
import { LengthInput } from '../../../ui/length-input.tsx';
import { writeValue, type FieldKey } from '../fields.ts';
import { messageFor } from '../problem-words.ts';
import type { TableAction, TableState } from '../table-state.ts';

type FigureFieldProps = {
  readonly field: FieldKey;
  readonly label: string;
  readonly state: TableState;
  readonly dispatch: Dispatch<TableAction>;
  /** What holds while the field is empty: an estimate or a default. */
  readonly open: { readonly value: number; readonly mark?: string } | undefined;
  /** What the figure means, shown while it is typed. */
  readonly hint?: string;
  readonly describedBy?: string;
  readonly onStart?: () => void;
};

/** One figure of a card. Its message waits until the maker has finished typing. */
export const FigureField = ({ field, label, state, dispatch, open, ...rest }: FigureFieldProps) => {
  const [typing, setTyping] = useState(false);
  const [here, setHere] = useState(false);
  const message = typing ? undefined : messageFor(field, state.drawn.problems, state.unit);
  const { onStart } = rest;
  return (
    <Field
      label={label}
      message={message?.text}
      tone={message?.tone ?? 'error'}
      hint={here ? rest.hint : undefined}
      describedBy={rest.describedBy}
    >
      {(wiring) => (
        <LengthInput
          wiring={wiring}
          name={field}
          text={state.entries[field]?.text ?? ''}
          placeholder={
            open === undefined
              ? undefined
              : [writeValue(field, open.value, state.unit), open.mark].filter(Boolean).join(' ')
          }
          onType={(text) => {
            setTyping(true);
            dispatch({ type: 'typed', field, text });
          }}
          onStart={() => {
            setHere(true);
            onStart?.();
          }}
          onDone={() => {
            setTyping(false);
            setHere(false);
            dispatch({ type: 'settled', field });
          }}
        />
      )}
    </Field>
  );
};
