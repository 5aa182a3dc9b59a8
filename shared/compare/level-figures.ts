import type { LevelName, Side } from '../drafting/piece.ts';
import { levelNames } from '../drafting/piece.ts';
import type { Point } from '../geometry/point.ts';
import { inBodyFrame, isOuter } from './comparable.ts';
import type { Comparison } from './compare-drafts.ts';

/** The width of a half at a level in both drafts, mm, and where it is written: at the side, in a piece's own place. */
export type LevelFigure = {
  readonly piece: string;
  readonly at: Point;
  readonly level: LevelName;
  readonly side: Side;
  readonly first: number;
  readonly second: number;
};

/** One figure for each level of each half that both drafts have, on the outermost piece there. */
export function levelFigures({ pairs, rows }: Comparison): readonly LevelFigure[] {
  const pieces = pairs.flatMap(({ first }) =>
    first && inBodyFrame(first) && isOuter(first) ? [first] : [],
  );
  return (['front', 'back'] as const).flatMap((side) =>
    levelNames.flatMap((level): readonly LevelFigure[] => {
      const row = rows.find((each) => each.key === `quarter:${side}:${level}`);
      const places = pieces
        .filter((piece) => piece.side === side)
        .flatMap((piece) =>
          piece.levels
            .filter((each) => each.level === level)
            .map(({ to }) => ({ piece: piece.name, at: to })),
        )
        .toSorted((a, b) => b.at.x - a.at.x);
      const [place] = places;
      if (!place || row?.first === undefined || row.second === undefined) return [];
      return [{ ...place, level, side, first: row.first, second: row.second }];
    }),
  );
}
