import type { Unit } from '#shared/units/said.ts';
import { between } from '#shared/geometry/point.ts';

import type { TapePlace } from './tape.ts';
import { toScreen, type View } from './view.ts';
import { readingWords } from './use-tape.ts';

type TapeLineProps = {
  readonly ends: readonly TapePlace[];
  /** Where the tape would be held next. */
  readonly cursor: TapePlace | undefined;
  readonly view: View;
  readonly unit: Unit;
};

/** The measuring tape as it is held: its ends, the line between them, and what it reads. */
export const TapeLine = ({ ends, cursor, view, unit }: TapeLineProps) => {
  const [first] = ends;
  const second = ends[1] ?? cursor;
  const places = [...ends, ...(cursor === undefined || ends.length === 2 ? [] : [cursor])];
  const a = first && toScreen(view, first.at);
  const b = second && toScreen(view, second.at);
  const words = first && second && readingWords(first, second, unit);
  const middle = a && b && between(a, b, 0.5);
  return (
    <g aria-hidden="true">
      {a && b && (
        <path
          d={`M${a.x} ${a.y}L${b.x} ${b.y}`}
          className="fill-none stroke-brass"
          strokeWidth={2}
          strokeDasharray="10 3 2 3"
        />
      )}
      {places.map((place, index) => {
        const at = toScreen(view, place.at);
        const caught = place.words !== undefined;
        return (
          <g key={`${at.x} ${at.y} ${index}`} transform={`translate(${at.x} ${at.y})`}>
            <path d="M-12 0H-4M4 0H12M0 -12V-4M0 4V12" className="stroke-brass" strokeWidth={2} />
            <circle r={3.5} className={`stroke-brass ${caught ? 'fill-brass' : 'fill-paper'}`} />
          </g>
        );
      })}
      {middle && words !== undefined && words !== '' && (
        <foreignObject x={middle.x + 10} y={middle.y - 13} width={320} height={28}>
          <span className="figures inline-block rounded-one bg-brass px-2 text-sm leading-6 font-semibold whitespace-nowrap text-on-brass">
            {words}
          </span>
        </foreignObject>
      )}
    </g>
  );
};
