import type { Body } from '../../body/card.ts';
import type { BodyLevels } from '../../body/levels.ts';
import type { DraftingTable } from '../../drafting/drafting-table.ts';
import type { Piece } from '../../drafting/piece.ts';
import { boneGown } from './boning.ts';
import { faceGown } from './facing.ts';
import { lineGown } from './lining.ts';
import type { GownStyle } from './style-card.ts';
import { stayWaist } from './waist-stay.ts';

/** The gown with what lies inside it: lining, bones and waist stay, facing, as the style card asks. */
export function fitOut(
  table: DraftingTable,
  pieces: readonly Piece[],
  { body, levels, style }: { body: Body; levels: BodyLevels; style: GownStyle },
): readonly Piece[] {
  const paper = table.part('Inside', 'both');
  const lining = style.lining === 'lined' ? lineGown(paper, pieces, style.facing === 'faced') : [];
  const boned = style.boning === 'boned' ? boneGown(paper, pieces, levels.waist) : pieces;
  const stayed = style.boning === 'boned' ? stayWaist(paper, boned, body) : boned;
  const faced = style.facing === 'faced' ? faceGown(paper, stayed) : stayed;
  return [...faced, ...lining];
}
