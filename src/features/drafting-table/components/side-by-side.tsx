import { pieceChanges, type PieceChange } from '#shared/compare/piece-changes.ts';
import type { FinishedPiece } from '#shared/drafting/piece.ts';
import { formatWithUnit } from '#shared/units/format-length.ts';
import type { Unit } from '#shared/units/said.ts';

import { differingParts, partOf } from '../parts.ts';
import { partLabel, partWords } from '../part-words.ts';
import type { Choices } from '../table-inputs.ts';
import { PiecesPicture } from './pieces-picture.tsx';

/** One of two states of a gown. */
export type GownSide = {
  readonly title: string;
  /** When and where it was made. */
  readonly note: string;
  readonly work: Choices;
  /** Absent where there is nothing to draw, as on a measure card. */
  readonly pieces?: readonly FinishedPiece[] | undefined;
};

type SideBySideProps = {
  readonly left: GownSide;
  readonly right: GownSide;
  readonly unit: Unit;
};

/** Two states of one gown: their pieces beside each other, then every figure in which they differ. */
export const SideBySide = ({ left, right, unit }: SideBySideProps) => {
  const changes = pieceChanges(left.pieces ?? [], right.pieces ?? []);
  const marked = new Set(changes.map(({ piece }) => piece));
  const keys = differingParts(left.work, right.work);
  const drawn = left.pieces !== undefined || right.pieces !== undefined;
  return (
    <div className="space-y-6">
      <div className="grid gap-4 sm:grid-cols-2">
        {[left, right].map((side) => (
          <figure key={side.title} className="rounded-one border border-rule bg-cloth p-3">
            <figcaption className="mb-2">
              <strong className="block font-semibold">{side.title}</strong>
              <span className="text-sm text-slate">{side.note}</span>
            </figcaption>
            {drawn && side.pieces === undefined && (
              <p className="py-8 text-center text-slate">Nothing could be drawn yet.</p>
            )}
            {side.pieces !== undefined && (
              <PiecesPicture
                pieces={side.pieces}
                label={`Pieces: ${side.title.toLowerCase()}`}
                marked={marked}
              />
            )}
          </figure>
        ))}
      </div>
      {drawn && <PieceChanges changes={changes} unit={unit} />}
      {keys.length > 0 && (
        <table className="figures w-full">
          <caption className="heading pb-1 text-left">Figures that differ</caption>
          <thead className="text-sm text-slate">
            <tr className="border-b border-rule">
              <th scope="col" className="py-1 text-left font-normal">
                {unit}
              </th>
              {[left, right].map(({ title }) => (
                <th key={title} scope="col" className="py-1 pl-3 text-right font-normal">
                  {title}
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {keys.map((key) => (
              <tr key={key} className="border-b border-rule">
                <th scope="row" className="py-1 text-left font-normal">
                  {partLabel(key)}
                </th>
                {[left, right].map(({ title, work }) => (
                  <td key={title} className="py-1 pl-3 text-right">
                    {partWords(key, partOf(work, key), unit)}
                  </td>
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      )}
    </div>
  );
};

type PieceChangesProps = { readonly changes: readonly PieceChange[]; readonly unit: Unit };

/** What becomes of each piece, in words and by how much at most. */
export const PieceChanges = ({ changes, unit }: PieceChangesProps) =>
  changes.length === 0 ? (
    <p>The pieces are the same.</p>
  ) : (
    <ul className="figures" aria-label="Pieces that differ">
      {changes.map(({ piece, title, change, deviation }) => (
        <li key={piece} className="flex justify-between gap-3 border-b border-rule py-1">
          <span>{title}</span>
          <span className="text-right text-slate">
            {change === 'shape'
              ? `lines apart by up to ${formatWithUnit(deviation, unit)}`
              : change === 'new'
                ? 'only in the second'
                : 'only in the first'}
          </span>
        </li>
      ))}
    </ul>
  );
