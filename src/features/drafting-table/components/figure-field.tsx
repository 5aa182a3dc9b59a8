import { memo, useState, type Dispatch } from 'react';

import type { Unit } from '#shared/units/said.ts';

import { Field } from '../../../ui/field.tsx';
import { LengthInput } from '../../../ui/length-input.tsx';
import { marked, type FieldKey } from '../fields.ts';
import { messageFor } from '../problem-words.ts';
import type { TableAction, TableState } from '../table-state.ts';

type FigureFieldProps = {
  readonly field: FieldKey;
  readonly label: string;
  readonly text: string;
  /** What is wrong with it, if anything. */
  readonly fault: string | undefined;
  readonly unit: Unit;
  /** What holds while the field is empty: a default, or an estimate marked as one. */
  readonly open: number | undefined;
  readonly mark?: string | undefined;
  /** What the figure means, shown while it is typed. */
  readonly hint?: string;
  readonly describedBy?: string;
  readonly dispatch: Dispatch<TableAction>;
  readonly onStart?: (field: FieldKey) => void;
};

/** What the state says of one field. */
export const fieldProps = (field: FieldKey, state: TableState) => ({
  field,
  text: state.entries[field]?.text ?? '',
  fault: messageFor(field, state.drawn.problems, state),
  unit: state.unit,
});

/**
 * One figure of a card. Its message waits until the maker has finished typing. Remembered: thirty of them
 * stand on the table, and one is typed at a time.
 */
export const FigureField = memo(function FigureField(props: FigureFieldProps) {
  const { field, dispatch, onStart, open, unit } = props;
  const [typing, setTyping] = useState(false);
  const [here, setHere] = useState(false);
  return (
    <Field
      label={props.label}
      message={typing ? undefined : props.fault}
      hint={here ? props.hint : undefined}
      describedBy={props.describedBy}
    >
      {(wiring) => (
        <LengthInput
          wiring={wiring}
          name={field}
          text={props.text}
          placeholder={
            open === undefined
              ? undefined
              : [marked(field, open, unit), props.mark].filter(Boolean).join(' ')
          }
          onType={(text) => {
            setTyping(true);
            dispatch({ type: 'typed', field, text });
          }}
          onStart={() => {
            setHere(true);
            onStart?.(field);
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
});
