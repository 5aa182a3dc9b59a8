import type { FinishedPiece, LevelName, Side } from '../drafting/piece.ts';
import type { Draft } from '../engine/draft.ts';
import type { Drafted } from '../engine/drafted.ts';
import type { Point } from '../geometry/point.ts';

/** Of a draft what comparing reads: a gown, a block, or pieces kept with their levels. */
export type Comparable = {
  readonly pieces: readonly FinishedPiece[];
  readonly levels: { readonly [L in LevelName]?: number };
  readonly bodyLevels: Draft['bodyLevels'];
  readonly proof: Pick<Drafted['proof'], 'girths'>;
  readonly bustPoint?: Point;
};

/** Pieces drawn in the half-body frame; flares and sleeves lie in frames of their own. */
export const inBodyFrame = ({ part }: Pick<FinishedPiece, 'part'>): boolean =>
  part !== 'flare' && part !== 'sleeve';

/** The gown's own cloth, whose widths make up the girths. */
export const isOuter = ({ part, cloth }: Pick<FinishedPiece, 'part' | 'cloth'>): boolean =>
  part !== 'inner' && cloth === undefined;

/** Pieces of one half of the body that its girths are counted on. */
export const bodyPieces = ({ pieces }: Comparable, side: Side): readonly FinishedPiece[] =>
  pieces.filter((each) => each.side === side && inBodyFrame(each) && isOuter(each));
