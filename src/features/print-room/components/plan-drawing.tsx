import { memo, useId } from 'react';

import type { FinishedPiece } from '#shared/drafting/piece.ts';
import type { SheetPlan } from '#shared/sheets/sheet-plan.ts';

import { laidOutlines } from '../plan-picture.ts';

type PlanDrawingProps = {
  readonly plan: SheetPlan;
  readonly pieces: readonly FinishedPiece[];
  /** Pixels a millimetre on paper. */
  readonly scale: number;
  /** Where the first sheet stands, pixels from the top left. */
  readonly corner: number;
};

/** The sheets with their names, the pieces' outlines over them, and the pieces' numbers of the list. */
export const PlanDrawing = memo(function PlanDrawing(props: PlanDrawingProps) {
  const { plan, pieces, scale, corner } = props;
  const hatch = useId();
  const { use, tiles } = plan.plan;
  const outlines = laidOutlines(plan);
  const numbers = numbersOf(pieces);
  const letters = Math.min(18, Math.max(11, use.width * scale * 0.22));
  return (
    <g transform={`translate(${corner} ${corner})`}>
      <pattern
        id={hatch}
        width="7"
        height="7"
        patternUnits="userSpaceOnUse"
        patternTransform="rotate(45)"
      >
        <path d="M0 0V7" className="stroke-slate" strokeWidth="1.5" />
      </pattern>
      <g transform={`scale(${scale})`}>
        {tiles.map(({ name, at }) => (
          <rect key={name} {...at} {...use} className="fill-paper" />
        ))}
        {tiles.map(({ name, at, leftOut: out }) => (
          <rect
            key={name}
            {...at}
            {...use}
            vectorEffect="non-scaling-stroke"
            className="fill-none stroke-slate"
            strokeWidth={out ? 1.5 : 1}
            strokeOpacity={0.6}
            strokeDasharray={out ? '5 4' : undefined}
          />
        ))}
        {outlines.map(({ path }, index) => (
          <path
            key={index}
            d={path}
            vectorEffect="non-scaling-stroke"
            strokeWidth={1.4}
            className="fill-none stroke-ink"
          />
        ))}
      </g>
      {tiles
        .filter(({ leftOut }) => leftOut === true)
        .map(({ name, at }) => (
          <rect
            key={name}
            x={at.x * scale}
            y={at.y * scale}
            width={use.width * scale}
            height={use.height * scale}
            fill={`url(#${hatch})`}
            fillOpacity={0.7}
          />
        ))}
      {tiles.map(({ name, at }) => (
        <text
          key={name}
          x={at.x * scale + 4}
          y={at.y * scale + letters}
          fontSize={letters}
          className="halo fill-slate"
        >
          {name}
        </text>
      ))}
      {outlines.map(({ piece, middle }, index) => (
        <text
          key={index}
          x={middle.x * scale}
          y={middle.y * scale + letters / 3}
          fontSize={letters}
          textAnchor="middle"
          className="halo figures fill-ink font-semibold"
        >
          {numbers(piece)}
        </text>
      ))}
    </g>
  );
});

/** The number of a drawing in the list of pieces; a mirror image has that of its piece, the cover is called so. */
const numbersOf = (pieces: readonly FinishedPiece[]) => {
  const numbers = new Map(pieces.map(({ name }, index) => [name, String(index + 1)]));
  return (drawing: string): string =>
    numbers.get(drawing) ?? numbers.get(drawing.split(' ')[0] ?? '') ?? drawing;
};
