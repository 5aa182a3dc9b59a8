import { useEffect, useRef } from 'react';

import type { Handle } from '#shared/drafting/construction.ts';
import { styleLabels } from '#shared/drafts/gown/style-labels.ts';
import { formatLength } from '#shared/units/format-length.ts';
import type { Unit } from '#shared/units/said.ts';

import type { Dragged } from './use-drag.ts';
import { toScreen, type View } from './view.ts';

type DragViewProps = {
  readonly held: Handle['key'];
  readonly view: View;
  readonly unit: Unit;
  readonly listen: (to: (dragged: Dragged) => void) => () => void;
  /** The first picture is here: what lies under it may go. */
  readonly onShown: () => void;
};

/**
 * The pieces as they come while a handle is dragged, in few lines, over the drawing that waits below.
 * They are put on the page past React: at every frame there is just time for the lines themselves.
 */
export const DragView = ({ held, view, unit, listen, onShown }: DragViewProps) => {
  const cut = useRef<SVGPathElement>(null);
  const seams = useRef<SVGPathElement>(null);
  const darts = useRef<SVGPathElement>(null);
  const lozenge = useRef<SVGGElement>(null);
  const words = useRef<SVGTextElement>(null);
  useEffect(() => {
    let first = true;
    return listen(({ value, picture }) => {
      const at = toScreen(view, picture.at);
      cut.current?.setAttribute('d', picture.cut);
      seams.current?.setAttribute('d', picture.seams);
      darts.current?.setAttribute('d', picture.darts);
      lozenge.current?.setAttribute('transform', `translate(${at.x} ${at.y})`);
      if (words.current !== null) {
        words.current.textContent = `${styleLabels[held]} ${formatLength(value, unit)}`;
      }
      if (first) onShown();
      first = false;
    });
  });
  return (
    <svg
      aria-hidden="true"
      className="pointer-events-none absolute inset-0 h-full w-full fill-none"
    >
      <g transform={`matrix(${view.scale} 0 0 ${view.scale} ${view.x} ${view.y})`}>
        <path
          ref={cut}
          vectorEffect="non-scaling-stroke"
          strokeWidth={1.4}
          className="fill-paper stroke-ink"
        />
        <path
          ref={seams}
          vectorEffect="non-scaling-stroke"
          strokeDasharray="5 3"
          className="stroke-slate"
        />
        <path
          ref={darts}
          vectorEffect="non-scaling-stroke"
          strokeWidth={0.8}
          className="stroke-slate"
        />
      </g>
      <g ref={lozenge} transform="translate(-99 -99)">
        <path d="M0 -7L7 0L0 7L-7 0Z" strokeWidth={1.5} className="fill-brass stroke-brass" />
        <text
          ref={words}
          x={14}
          y={5}
          className="halo figures fill-brass text-[0.9375rem] font-semibold"
        />
      </g>
    </svg>
  );
};
