import type { Dispatch } from 'react';

import type { Problem } from '#shared/units/problem.ts';

import { Field } from '../../../ui/field.tsx';
import { Segmented } from '../../../ui/segmented.tsx';
import { Select } from '../../../ui/select.tsx';
import { fieldOf, typedFields } from '../order-of.ts';
import { orientationChoices, paperChoices } from '../paper-words.ts';
import type { PaperField, RoomAction, RoomChoices } from '../room-choices.ts';
import { LengthField } from './length-field.tsx';
import { Tick } from './tick.tsx';

export type CardProps = {
  readonly room: RoomChoices;
  readonly problems: readonly Problem[];
  readonly dispatch: Dispatch<RoomAction>;
};

const labels: { readonly [F in PaperField]: string } = {
  margin: 'Margin of the printer',
  overlap: 'Overlap to glue',
  width: 'Width',
  height: 'Height',
};

/** Which paper, how it lies, and what is left white or glued over. */
export const PaperCard = ({ room, problems, dispatch }: CardProps) => {
  const { paper, orientation, glueMarks } = room;
  const lengths = typedFields(room);
  const field = (each: PaperField) => (
    <LengthField
      key={each}
      field={each}
      label={labels[each]}
      room={room}
      message={problems.find(({ field: at }) => at === fieldOf[each])?.said}
      dispatch={dispatch}
      onSettled={() => dispatch({ type: 'settled', field: each })}
    />
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
