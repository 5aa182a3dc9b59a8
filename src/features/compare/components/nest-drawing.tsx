import { useMemo, useRef } from 'react';

import { seamOutline } from '#shared/compare/moved-piece.ts';
import { dartLines } from '#shared/exports/compare-svg.ts';
import type { NestStack } from '#shared/exports/nest-stacks.ts';
import { layStacks } from '#shared/exports/overlaid.ts';
import { pathData } from '#shared/exports/path-data.ts';
import { sizePens } from '#shared/exports/size-pens.ts';

import { useSize } from '../../../lib/use-size.ts';

type NestDrawingProps = {
  readonly stacks: readonly NestStack[];
  readonly steps: readonly number[];
  /** Sizes that are shown, by their steps. */
  readonly shown: ReadonlySet<number>;
  readonly cut: boolean;
};

/** Dashes are drawn this much larger than on paper, pixels a millimetre. */
const dashScale = 1.2;
const lettering = 13;
/** Below this scale, pixels a millimetre, labels would hide the lines: their key tells the sizes. */
const roomForLabels = 0.3;

/** How a size is drawn, in a little. */
export const SizeSample = ({ step, steps }: { step: number; steps: readonly number[] }) => {
  const { width = 0.35, dash } = sizePens(steps).get(step) ?? {};
  return (
    <svg viewBox="0 0 36 6" className="h-2 w-12 text-ink" aria-hidden="true">
      <path
        d="M0 3H36"
        stroke="currentColor"
        strokeWidth={width * 3}
        strokeDasharray={dash?.join(' ')}
      />
    </svg>
  );
};

/** The sizes of a nest over each other, a line style and a label for each. */
export const NestDrawing = ({ stacks, steps, shown, cut }: NestDrawingProps) => {
  const holder = useRef<HTMLDivElement>(null);
  const size = useSize(holder);
  const laid = useMemo(() => layStacks(stacks), [stacks]);
  const pens = sizePens(steps);
  const scale = size.width === 0 ? 0 : Math.min(size.width / laid.width, size.height / laid.height);
  return (
    <div
      ref={holder}
      className="max-h-[min(75dvh,48rem)] w-full"
      style={{ aspectRatio: laid.width / laid.height }}
    >
      <svg
        role="img"
        aria-label={`${shown.size} sizes over each other`}
        viewBox={`0 0 ${laid.width} ${laid.height}`}
        className="h-full w-full text-ink"
      >
        {laid.placed.map(({ stack, translate }) => (
          <g key={stack.name} transform={`translate(${translate.x} ${translate.y})`}>
            <title>{stack.title}</title>
            {stack.sized
              .filter(({ step }) => shown.has(step))
              .map(({ step, label, piece, labelAt }) => {
                const { width = 0.35, dash } = pens.get(step) ?? {};
                const line = {
                  fill: 'none',
                  stroke: 'currentColor',
                  vectorEffect: 'non-scaling-stroke',
                  strokeWidth: width * 3,
                  strokeDasharray: dash?.map((each) => each * dashScale).join(' '),
                } as const;
                return (
                  <g key={step}>
                    <path d={pathData(cut ? piece.cutLine : seamOutline(piece), true)} {...line} />
                    <path d={dartLines(piece)} {...line} />
                    {scale >= roomForLabels && (
                      <text
                        x={labelAt.x}
                        y={labelAt.y}
                        fontSize={lettering / scale}
                        textAnchor="middle"
                        className="halo fill-ink font-semibold"
                        style={{ strokeWidth: 3 / scale }}
                      >
                        {label}
                      </text>
                    )}
                  </g>
                );
              })}
          </g>
        ))}
      </svg>
    </div>
  );
};
