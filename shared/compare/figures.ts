import type { FinishedPiece, LevelName, Side } from '../drafting/piece.ts';
import { levelNames } from '../drafting/piece.ts';
import { pathLength } from '../geometry/curve.ts';
import { areaInside } from '../geometry/region.ts';
import { widthAtLevel } from '../proof/girths.ts';
import { type Comparable, bodyPieces } from './comparable.ts';
import { seamOutline } from './moved-piece.ts';

/** A figure of a draft by a name both drafts share: mm, or mm² for an area. */
export type Figure = {
  readonly key: string;
  readonly kind: 'girth' | 'quarter' | 'seam' | 'area';
  readonly value: number;
  /** Level of a girth or quarter; piece and edge of a seam; piece of an area. */
  readonly level?: LevelName;
  readonly side?: Side;
  readonly piece?: string;
  readonly edge?: string;
};

/** Finished girths as the proof measured them on the pieces, round the whole body. */
export const girthsOf = ({ proof }: Comparable): readonly Figure[] =>
  proof.girths.map(({ level, pieces }) => ({
    key: `girth:${level}`,
    kind: 'girth',
    level,
    value: pieces,
  }));

/** Width of one half at a level, darts taken out, measured on the pieces; no row where none has the level. */
export function quartersOf(draft: Comparable): readonly Figure[] {
  return (['front', 'back'] as const).flatMap((side) =>
    levelNames.flatMap((level): readonly Figure[] => {
      const widths = bodyPieces(draft, side).flatMap((piece) => {
        const line = piece.levels.find((each) => each.level === level);
        const width = line && widthAtLevel(piece, line);
        return width === undefined ? [] : [width];
      });
      if (widths.length === 0) return [];
      const value = widths.reduce((sum, each) => sum + each, 0);
      return [{ key: `quarter:${side}:${level}`, kind: 'quarter', level, side, value }];
    }),
  );
}

const edgesOf = (piece: FinishedPiece): readonly Figure[] =>
  piece.edges
    .filter((edge) => edge.open !== true)
    .map((edge) => ({
      key: `seam:${piece.name}:${edge.name}`,
      kind: 'seam',
      piece: piece.name,
      edge: edge.name,
      value: pathLength(edge.path),
    }));

const areaFigure = (piece: FinishedPiece): Figure => ({
  key: `area:${piece.name}`,
  kind: 'area',
  piece: piece.name,
  value: areaInside(seamOutline(piece)),
});

/** Every figure two drafts are compared by: girths, quarters, lengths of edges, areas inside the seam lines. */
export const figuresOf = (draft: Comparable): readonly Figure[] => [
  ...girthsOf(draft),
  ...quartersOf(draft),
  ...draft.pieces.flatMap(edgesOf),
  ...draft.pieces.map(areaFigure),
];

/** A figure in both drafts; one side is absent where only one of them has it. */
export type FigureRow = Omit<Figure, 'value'> & {
  readonly first?: number;
  readonly second?: number;
};

/** The figures of two drafts side by side, in the first's order, then what only the second has. */
export function figureRows(first: Comparable, second: Comparable): readonly FigureRow[] {
  const [before, after] = [figuresOf(first), figuresOf(second)];
  const later = new Map(after.map((each) => [each.key, each.value]));
  const earlier = new Set(before.map((each) => each.key));
  return [
    ...before.map(({ value, ...row }): FigureRow => {
      const other = later.get(row.key);
      return { ...row, first: value, ...(other === undefined ? {} : { second: other }) };
    }),
    ...after
      .filter((each) => !earlier.has(each.key))
      .map(({ value, ...row }): FigureRow => ({ ...row, second: value })),
  ];
}
