import { useState, type Dispatch } from 'react';

import type { Problem } from '#shared/units/problem.ts';
import { speak } from '#shared/units/speak.ts';

import { Field } from '../../../ui/field.tsx';
import { LengthInput } from '../../../ui/length-input.tsx';
import { Segmented } from '../../../ui/segmented.tsx';
import { Select } from '../../../ui/select.tsx';
import { fieldOf, typedFields } from '../order-of.ts';
import { orientationChoices, paperChoices } from '../paper-words.ts';
import type { LengthField, RoomAction, RoomChoices } from '../room-choices.ts';
import { Tick } from './tick.tsx';

export type CardProps = {
  readonly room: RoomChoices;
  readonly problems: readonly Problem[];
  readonly dispatch: Dispatch<RoomAction>;
};

const labels: { readonly [F in LengthField]: string } = {
  margin: 'Margin of the printer',
  overlap: 'Overlap to glue',
  width: 'Width',
  height: 'Height',
};

/** Which paper, how it lies, and what is left white or glued over. */
export const PaperCard = ({ room, problems, dispatch }: CardProps) => {
  const { paper, orientation, glueMarks } = room;
  const lengths = typedFields(room);
  const field = (each: LengthField) => (
    <LengthField key={each} {...{ field: each, room, problems, dispatch }} />
  );
  return (
    <section aria-labelledby="paper-card">
      <h2 id="paper-card" className="heading">
        Paper
      </h2>
      <Field label="Paper">
        {({ id }) => (
          <Select
            id={id}
            name="paper"
            choices={paperChoices}
            value={paper}
            onChoose={(chosen) => dispatch({ type: 'chosen', choice: { paper: chosen } })}
          />
        )}
      </Field>
      {lengths.filter((each) => each === 'width' || each === 'height').map(field)}
      <div className="flex flex-wrap items-center justify-between gap-2 border-b border-rule py-1">
        <span>Lies</span>
        <Segmented
          legend="How the sheets lie"
          choices={orientationChoices}
          value={orientation}
          onChoose={(chosen) => dispatch({ type: 'chosen', choice: { orientation: chosen } })}
        />
      </div>
      {lengths.filter((each) => each === 'margin' || each === 'overlap').map(field)}
      <Tick
        label="Marks to glue by"
        ticked={glueMarks}
        onTick={(chosen) => dispatch({ type: 'chosen', choice: { glueMarks: chosen } })}
      />
    </section>
  );
};

type LengthFieldProps = CardProps & { readonly field: LengthField };

/** One length; its message waits until the maker has finished typing. */
const LengthField = ({ field, room, problems, dispatch }: LengthFieldProps) => {
  const [typing, setTyping] = useState(false);
  const found = problems.find((problem) => problem.field === fieldOf[field]);
  return (
    <Field
      label={`${labels[field]}, ${room.unit}`}
      message={typing || found === undefined ? undefined : speak(found.said, room.unit)}
    >
      {(wiring) => (
        <LengthInput
          wiring={wiring}
          name={fieldOf[field]}
          text={room.lengths[field].text}
          onType={(text) => {
            setTyping(true);
            dispatch({ type: 'typed', field, text });
          }}
          onDone={() => {
            setTyping(false);
            dispatch({ type: 'settled', field });
          }}
        />
      )}
    </Field>
  );
};
