import { useState, type Dispatch } from 'react';

import type { Said } from '#shared/units/said.ts';
import { speak } from '#shared/units/speak.ts';

import { Field } from '../../../ui/field.tsx';
import { LengthInput } from '../../../ui/length-input.tsx';
import type { LengthField as FieldName, RoomAction, RoomChoices } from '../room-choices.ts';

type LengthFieldProps = {
  readonly field: FieldName;
  readonly label: string;
  readonly room: RoomChoices;
  /** What is wrong with it, if anything. */
  readonly message: Said | undefined;
  readonly dispatch: Dispatch<RoomAction>;
  readonly onSettled?: () => void;
};

/** One length; its message waits until the maker has finished typing. */
export const LengthField = (props: LengthFieldProps) => {
  const { field, label, room, message, dispatch, onSettled } = props;
  const [typing, setTyping] = useState(false);
  return (
    <Field
      label={`${label}, ${room.unit}`}
      message={typing || message === undefined ? undefined : speak(message, room.unit)}
    >
      {(wiring) => (
        <LengthInput
          wiring={wiring}
          name={field}
          text={room.lengths[field].text}
          onType={(text) => {
            setTyping(true);
            dispatch({ type: 'typed', field, text });
          }}
          onDone={() => {
            setTyping(false);
            onSettled?.();
          }}
        />
      )}
    </Field>
  );
};
