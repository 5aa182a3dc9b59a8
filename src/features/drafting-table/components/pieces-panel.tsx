import { memo } from 'react';

import type { Drafted } from '#shared/engine/drafted.ts';
import { cuttingCautions } from '#shared/exports/cautions.ts';
import { formatLength } from '#shared/units/format-length.ts';
import type { Unit } from '#shared/units/said.ts';

import { asDrafted } from '../canvas/layout.ts';

type PiecesPanelProps = { readonly draft: Drafted; readonly unit: Unit };

/** The pieces in words and figures: what the drawing shows, for those who do not see it. */
export const PiecesPanel = memo(function PiecesPanel({ draft, unit }: PiecesPanelProps) {
  const { placed } = asDrafted(draft.pieces);
  const cloth = draft.pieces.reduce((sum, piece) => sum + piece.copies, 0);
  return (
    <section>
      <h2 className="sr-only">Pieces</h2>
      <p>
        {`Draft ${draft.number}: ${draft.pieces.length} pieces, ${cloth} to cut. Sizes in ${unit === 'in' ? 'inches' : 'cm'}, with allowances.`}
      </p>
      <ul>
        {placed.map(({ piece, box }) => (
          <li key={piece.name} className="border-b border-rule py-2">
            <h3 className="flex justify-between gap-3 font-semibold">
              <span>{piece.title}</span>
              <span className="figures shrink-0">
                {`${formatLength(box.right - box.left, unit)} × ${formatLength(box.bottom - box.top, unit)}`}
              </span>
            </h3>
            <p className="text-sm text-slate">{[piece.cut, ...joins(piece, draft)].join(' · ')}</p>
          </li>
        ))}
      </ul>
      <p className="pt-3 text-sm text-slate">{cuttingCautions}</p>
    </section>
  );
});

function joins(piece: Drafted['pieces'][number], draft: Drafted): string[] {
  const partners = piece.edges.flatMap(({ joins: to }) =>
    to === undefined ? [] : to === 'self' ? [piece.name] : [to.piece],
  );
  const titles = [...new Set(partners)].map((name) =>
    name === piece.name
      ? 'its own pair'
      : (draft.pieces.find((each) => each.name === name)?.title ?? name),
  );
  return titles.length === 0 ? [] : [`sewn to ${titles.join('; ')}`];
}
