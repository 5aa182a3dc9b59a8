import { memo } from 'react';

import type { Unit } from '#shared/units/said.ts';

import { rodMarks, type RodMark } from './rod-marks.ts';

/** Width of the rod, pixels. */
export const rodWidth = 26;

type RodProps = {
  /** Pixels a millimetre, and where the drawing's origin lies. */
  readonly view: { readonly scale: number; readonly x: number; readonly y: number };
  readonly size: { readonly width: number; readonly height: number };
  readonly unit: Unit;
};

/** The brass measuring rod along the top and left edge, in the reader's unit. */
export const Rod = memo(function Rod({ view, size, unit }: RodProps) {
  const across = rodMarks(unit, view.scale, view.x, size.width).filter(inside);
  const down = rodMarks(unit, view.scale, view.y, size.height).filter(inside);
  return (
    <g aria-hidden="true" className="fill-brass stroke-brass text-[0.6875rem]">
      <path
        className="fill-ground stroke-none"
        d={`M0 0H${size.width}V${rodWidth}H${rodWidth}V${size.height}H0Z`}
      />
      <path
        fill="none"
        d={`M${size.width} 0.5H0.5V${size.height}${across.map(tickDown).join('')}${down.map(tickRight).join('')}`}
      />
      <g className="figures stroke-none">
        {across.map(
          ({ at, figure }) =>
            figure !== undefined && (
              <text key={figure} x={at + 4} y={rodWidth - 5}>
                {figure}
              </text>
            ),
        )}
        {down.map(
          ({ at, figure }) =>
            figure !== undefined && (
              <text key={figure} x={rodWidth - 3} y={at + 12} textAnchor="end">
                {figure}
              </text>
            ),
        )}
        <text x={5} y={rodWidth - 8} className="font-semibold">
          {unit}
        </text>
      </g>
    </g>
  );
});

/** The corner belongs to the unit's name. */
const inside = ({ at }: RodMark): boolean => at >= rodWidth;

const reach = (long: boolean): number => (long ? 14 : 7);
const tickDown = ({ at, long }: RodMark): string => `M${at} 0V${reach(long)}`;
const tickRight = ({ at, long }: RodMark): string => `M0 ${at}H${reach(long)}`;
