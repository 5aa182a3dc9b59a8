import type { Dispatch } from 'react';

import { plainOrder, type PrintOrder } from '#shared/sheets/print-order.ts';
import { meantInstead, scaleCheck, type SquareName } from '#shared/sheets/scale-check.ts';
import { speak } from '#shared/units/speak.ts';

import { Button } from '../../../ui/button.tsx';
import { Segmented } from '../../../ui/segmented.tsx';
import type { RoomAction, RoomChoices } from '../room-choices.ts';
import { LengthField } from './length-field.tsx';

type ScaleCheckCardProps = {
  readonly room: RoomChoices;
  /** The paper the square was ordered on. */
  readonly paper: PrintOrder['paper'] | undefined;
  readonly dispatch: Dispatch<RoomAction>;
};

const squares: readonly { readonly value: SquareName; readonly label: string }[] = [
  { value: 'metric', label: '10 cm' },
  { value: 'inch', label: '4 in' },
];

/** What the printed square measures, and what that says of the print. */
export const ScaleCheckCard = ({ room, paper, dispatch }: ScaleCheckCardProps) => {
  const { unit, lengths } = room;
  const square = room.square ?? (unit === 'in' ? 'inch' : 'metric');
  const { across, down } = lengths;
  const meant = (['across', 'down'] as const).flatMap((field) => {
    const text = meantInstead(lengths[field].text, unit, square);
    return text === undefined ? [] : [{ field, text }];
  });
  const finding =
    meant.length === 0 && 'mm' in across.read && 'mm' in down.read
      ? scaleCheck({
          square,
          across: across.read.mm,
          down: down.read.mm,
          paper: paper ?? plainOrder.paper,
        })
      : undefined;
  const meantWords = [...new Set(meant.map(({ text }) => text))].join(' by ');
  return (
    <section aria-labelledby="scale-check">
      <h2 id="scale-check" className="heading">
        Scale check
      </h2>
      <p className="py-1 text-sm leading-snug text-slate">
        Print the cover, lay a ruler on one of its squares, and type both sides.
      </p>
      <div className="flex flex-wrap items-center justify-between gap-2 border-b border-rule py-1">
        <span>Square</span>
        <Segmented
          legend="Which square is measured"
          choices={squares}
          value={square}
          onChoose={(chosen) => dispatch({ type: 'chosen', choice: { square: chosen } })}
        />
      </div>
      {(
        [
          ['across', 'Side to side'],
          ['down', 'Top to bottom'],
        ] as const
      ).map(([field, label]) => {
        const { text, read } = lengths[field];
        const wrong = text.trim() !== '' && 'said' in read ? read.said : undefined;
        return <LengthField key={field} {...{ field, label, room, dispatch }} message={wrong} />;
      })}
      <div role="status" className="space-y-1 py-2 leading-snug">
        {meant.length > 0 && (
          <>
            <p>{`Did you mean ${meantWords}?`}</p>
            <Button
              onClick={() => meant.forEach((each) => dispatch({ type: 'typed', ...each }))}
            >{`Take ${meantWords}`}</Button>
          </>
        )}
        {finding !== undefined && (
          <>
            <p
              className={`font-semibold ${finding.kind === 'true' ? 'text-verdigris' : 'text-madder'}`}
            >
              {`${finding.kind === 'true' ? '✓ ' : ''}${speak(finding.what, unit)}`}
            </p>
            <p>{speak(finding.again, unit)}</p>
          </>
        )}
      </div>
    </section>
  );
};
