import type { WantedGirth } from '../drafting/construction.ts';
import type { LevelName, Piece } from '../drafting/piece.ts';
import type { Point } from '../geometry/point.ts';

/** A block drawn: pieces without allowances, and what proof and screens need to know of them. */
export type DrawnBlock = {
  readonly pieces: readonly Piece[];
  /** Heights, mm below the side neck point. */
  readonly levels: { readonly [L in LevelName]?: number };
  readonly wanted: readonly WantedGirth[];
  /** Where the bust dart turns; absent on a skirt. */
  readonly bustPoint?: Point;
};
