import { lineChoices } from '#shared/sheets/print-order.ts';

import { Field } from '../../../ui/field.tsx';
import { Select } from '../../../ui/select.tsx';
import { lineWords, scaleChoices } from '../paper-words.ts';
import type { CardProps } from './paper-card.tsx';
import { Tick } from './tick.tsx';

const lines = lineChoices.map((value) => ({ value, label: lineWords[value] }));

/** What is drawn of the pieces, how boldly, and how large. */
export const LinesCard = ({ room, dispatch }: Omit<CardProps, 'problems'>) => {
  const { scale } = room;
  return (
    <section aria-labelledby="lines-card">
      <h2 id="lines-card" className="heading">
        Lines and scale
      </h2>
      <Field label="Lines">
        {({ id }) => (
          <Select
            id={id}
            name="lines"
            choices={lines}
            value={room.lines}
            onChoose={(chosen) => dispatch({ type: 'chosen', choice: { lines: chosen } })}
          />
        )}
      </Field>
      <Field
        label="Scale"
        hint={scale === 1 ? undefined : 'Every piece says it is not to be cut from.'}
      >
        {({ id }) => (
          <Select
            id={id}
            name="scale"
            choices={scaleChoices}
            value={String(scale)}
            onChoose={(chosen) => {
              const found = scaleChoices.find(({ value }) => value === chosen);
              if (found) dispatch({ type: 'chosen', choice: { scale: found.scale } });
            }}
          />
        )}
      </Field>
      <Tick
        label="Save ink: thin lines, no pale letters"
        ticked={room.inkSaving}
        onTick={(chosen) => dispatch({ type: 'chosen', choice: { inkSaving: chosen } })}
      />
    </section>
  );
};
