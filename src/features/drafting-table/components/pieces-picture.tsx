import type { FinishedPiece } from '#shared/drafting/piece.ts';
import { pathData } from '#shared/exports/path-data.ts';
import { spread } from '#shared/exports/spread.ts';

type PiecesPictureProps = {
  readonly pieces: readonly FinishedPiece[];
  readonly label: string;
  /** Pieces that the other side draws otherwise. */
  readonly marked: ReadonlySet<string>;
};

/** All pieces of a gown as they lie on the table, cutting line and seam line; marked ones stand out. */
export const PiecesPicture = ({ pieces, label, marked }: PiecesPictureProps) => {
  const { placed, width, height } = spread(pieces);
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      role="img"
      aria-label={label}
      className="block h-auto max-h-[46dvh] w-full"
    >
      {placed.map(({ piece, translate }) => (
        <g key={piece.name} transform={`translate(${translate.x} ${translate.y})`}>
          <path
            d={pathData(piece.cutLine, true)}
            vectorEffect="non-scaling-stroke"
            strokeWidth={marked.has(piece.name) ? 2.5 : 1.2}
            className={`fill-paper ${marked.has(piece.name) ? 'stroke-brass' : 'stroke-ink'}`}
          />
          <path
            d={piece.edges.map((edge) => pathData(edge.path)).join('')}
            vectorEffect="non-scaling-stroke"
            strokeDasharray="4 3"
            className="fill-none stroke-slate"
          />
          <path
            d={piece.darts
              .map((dart) => pathData(dart.centreLeg) + pathData(dart.sideLeg))
              .join('')}
            vectorEffect="non-scaling-stroke"
            className="fill-none stroke-slate"
          />
        </g>
      ))}
    </svg>
  );
};
