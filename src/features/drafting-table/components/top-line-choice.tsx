import { useId } from 'react';

import { topLineShapes, type TopLineShape } from '#shared/drafts/gown/style-card.ts';

type TopLineChoiceProps = {
  readonly value: TopLineShape;
  readonly onChoose: (shape: TopLineShape) => void;
};

/** The right half of each top line over the bust, from the centre out; the left one is its mirror. */
const halves: { readonly [S in TopLineShape]: string } = {
  sweetheart: 'C6 15 8 4 14 4C20 4 23 8 26 14',
  straight: 'C8 6 18 7 26 14',
  scooped: 'C11 17 13 5 19 5C23 5 24 9 26 14',
  notched: 'L8 6C10 4 12 4 14 4C20 4 23 8 26 14',
};
const centres: { readonly [S in TopLineShape]: number } = {
  sweetheart: 15,
  straight: 6,
  scooped: 17,
  notched: 15,
};

const half = (shape: TopLineShape): string => `M0 ${centres[shape]}${halves[shape]}L24 34H0Z`;

/** The shapes of the top line side by side, each in one small drawing and its word. */
export const TopLineChoice = ({ value, onChoose }: TopLineChoiceProps) => {
  const name = useId();
  return (
    <fieldset className="border-b border-rule py-2">
      <legend className="float-left w-full pb-1">Top line</legend>
      <div className="clear-both grid grid-cols-4 gap-1">
        {topLineShapes.map((shape) => (
          <label
            key={shape}
            className="relative cursor-pointer rounded-one border border-transparent py-1 text-center text-xs text-slate has-checked:border-brass has-checked:bg-paper has-checked:font-semibold has-checked:text-ink has-focus-visible:outline-2 has-focus-visible:outline-brass"
          >
            <input
              type="radio"
              name={name}
              className="absolute inset-0 cursor-pointer appearance-none outline-none"
              checked={shape === value}
              onChange={() => onChoose(shape)}
            />
            <svg viewBox="-28 0 56 36" className="mx-auto h-9 w-14" aria-hidden="true">
              {[1, -1].map((way) => (
                <path
                  key={way}
                  d={half(shape)}
                  transform={`scale(${way} 1)`}
                  className="fill-paper stroke-none"
                />
              ))}
              {[1, -1].map((way) => (
                <path
                  key={way}
                  d={`M0 ${centres[shape]}${halves[shape]}L24 34`}
                  transform={`scale(${way} 1)`}
                  strokeWidth={1.4}
                  strokeLinejoin="round"
                  className={`fill-none ${shape === value ? 'stroke-brass' : 'stroke-slate'}`}
                />
              ))}
            </svg>
            {shape}
          </label>
        ))}
      </div>
    </fieldset>
  );
};
