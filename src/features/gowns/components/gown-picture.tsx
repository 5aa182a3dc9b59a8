import type { ListedGown } from '../queries.ts';

/** The pieces of a gown, small; a bare rod where nothing has been drawn yet. */
export const GownPicture = ({ picture }: Pick<ListedGown, 'picture'>) => (
  <svg
    viewBox={picture === null ? '0 0 160 100' : `-4 -4 ${picture.width + 8} ${picture.height + 8}`}
    className="h-36 w-full text-ink"
    aria-hidden="true"
  >
    {picture === null ? (
      <path
        d={`M20 60H140${Array.from({ length: 13 }, (_, mark) => `M${20 + mark * 10} 60V${mark % 4 === 0 ? 46 : 53}`).join('')}`}
        className="fill-none stroke-brass"
      />
    ) : (
      <path
        d={picture.path}
        vectorEffect="non-scaling-stroke"
        className="fill-paper stroke-ink"
        strokeWidth={1.2}
        strokeLinejoin="round"
      />
    )}
  </svg>
);
