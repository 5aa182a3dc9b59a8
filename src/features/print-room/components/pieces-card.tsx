import type { Dispatch } from 'react';

import type { FinishedPiece } from '#shared/drafting/piece.ts';
import { orderLimits } from '#shared/sheets/print-order.ts';
import { waysToDraw } from '#shared/sheets/ways-to-draw.ts';
import { speak } from '#shared/units/speak.ts';

import { Button } from '../../../ui/button.tsx';
import { Select } from '../../../ui/select.tsx';
import { howWords } from '../paper-words.ts';
import { choiceFor, type PieceChoice, type RoomAction } from '../room-choices.ts';
import type { CardProps } from './paper-card.tsx';

type PiecesCardProps = CardProps & { readonly pieces: readonly FinishedPiece[] };

const { least, most } = orderLimits.copies;
const copyChoices = Array.from({ length: most - least + 1 }, (_, index) => {
  const value = String(least + index);
  return { value, label: `× ${value}` };
});

/** Which pieces, how often, and how each is drawn; their numbers stand on the page plan. */
export const PiecesCard = ({ room, problems, pieces, dispatch }: PiecesCardProps) => {
  const none = problems.find(({ field }) => field === 'order.pieces');
  const tops = pieces.filter(({ part }) => part === 'top').length;
  return (
    <section aria-labelledby="pieces-card">
      <h2 id="pieces-card" className="heading">
        Pieces
      </h2>
      <p className="flex gap-1 py-1">
        <Button
          kind="quiet"
          slim
          onClick={() => dispatch({ type: 'selected', pieces, selection: 'whole-gown' })}
        >
          All pieces
        </Button>
        {tops > 0 && tops < pieces.length && (
          <Button
            kind="quiet"
            slim
            onClick={() => dispatch({ type: 'selected', pieces, selection: 'bodice-toile' })}
          >
            Bodice only
          </Button>
        )}
      </p>
      {none !== undefined && (
        <p role="alert" className="py-1 text-sm text-madder">
          {speak(none.said, room.unit)}
        </p>
      )}
      <ul>
        {pieces.map((piece, index) => (
          <PieceRow
            key={piece.name}
            number={index + 1}
            piece={piece}
            choice={choiceFor(piece, room)}
            dispatch={dispatch}
          />
        ))}
      </ul>
    </section>
  );
};

type PieceRowProps = {
  readonly number: number;
  readonly piece: FinishedPiece;
  readonly choice: PieceChoice;
  readonly dispatch: Dispatch<RoomAction>;
};

const PieceRow = ({ number, piece, choice, dispatch }: PieceRowProps) => {
  const { printed, copies, how } = choice;
  const choose = (part: Partial<PieceChoice>) => dispatch({ type: 'piece', piece, choice: part });
  const ways = waysToDraw(piece).map((each) => ({ value: each, label: howWords[each] }));
  return (
    <li className="border-b border-rule py-1">
      <label className="flex min-h-9 cursor-pointer items-center gap-3 leading-tight">
        <input
          type="checkbox"
          className="size-5 shrink-0 accent-brass"
          checked={printed}
          onChange={(event) => choose({ printed: event.currentTarget.checked })}
        />
        <span className="figures w-5 shrink-0 text-right font-semibold">{number}</span>
        {piece.title}
      </label>
      {printed && (
        <span className="flex items-center justify-end gap-2 pb-1 text-sm">
          {ways.length > 1 && (
            <Select
              name={`${piece.name}.how`}
              aria-label={`How ${piece.title} is drawn`}
              choices={ways}
              value={how}
              onChoose={(value) => choose({ how: value })}
            />
          )}
          <Select
            name={`${piece.name}.copies`}
            aria-label={`Copies of ${piece.title}`}
            choices={copyChoices}
            value={String(copies)}
            onChoose={(value) => choose({ copies: Number(value) })}
          />
        </span>
      )}
    </li>
  );
};
