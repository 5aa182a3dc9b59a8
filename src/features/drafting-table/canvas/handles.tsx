import { useState, type KeyboardEvent, type PointerEvent } from 'react';

import type { Handle } from '#shared/drafting/construction.ts';
import { styleLabels } from '#shared/drafts/gown/style-labels.ts';
import { styleLimits, type Limit } from '#shared/drafts/gown/style-limits.ts';
import type { Draft } from '#shared/engine/draft.ts';
import { add, distance, dot, scale, subtract } from '#shared/geometry/point.ts';
import { formatLength, formatWithUnit } from '#shared/units/format-length.ts';
import type { Unit } from '#shared/units/said.ts';

import type { Layout } from './layout.ts';
import { toScreen, type View } from './view.ts';
import { whileHeld } from './while-held.ts';

/** One press of an arrow key, and with shift, millimetres. */
const nudges: Record<Unit, { readonly small: number; readonly large: number }> = {
  cm: { small: 1, large: 10 },
  in: { small: 25.4 / 8, large: 25.4 },
};

/** The most a figure changes by for one pixel of the hand: a finger shakes more than a pointer, millimetres. */
const finest = { touch: 2, pointer: 4 };

type HandlesProps = {
  readonly draft: Draft;
  readonly layout: Layout;
  readonly view: View;
  readonly unit: Unit;
  readonly onMove: (key: Handle['key'], value: number) => void;
  /** The hand takes a handle, draws it to a value, and lets it go there. */
  readonly onHold: (key: Handle['key']) => void;
  readonly onDrag: (value: number) => void;
  readonly onDrop: () => void;
  /** The hand leaves a handle: what comes next is another change. */
  readonly onRelease: () => void;
};

/** Brass lozenges at the points a maker moves by hand; drag them, or step them with the arrow keys. */
export const Handles = ({ draft, ...rest }: HandlesProps) => {
  const limits = styleLimits(draft.body, draft.bodyLevels, draft.inputs.style);
  return draft.handles.map((handle, index) => (
    <Lozenge
      key={handle.key}
      handle={handle}
      aside={draft.handles.slice(0, index).some((other) => together(other, handle))}
      value={draft.style[handle.key]}
      limit={limits[handle.key]}
      {...rest}
    />
  ));
};

const together = (a: Handle, b: Handle): boolean => a.piece === b.piece && distance(a.at, b.at) < 1;

type LozengeProps = Omit<HandlesProps, 'draft'> & {
  readonly handle: Handle;
  /** Set a little along its way, where another handle holds the same point. */
  readonly aside: boolean;
  readonly value: number;
  readonly limit: Limit;
};

const Lozenge = ({
  handle,
  aside,
  value,
  limit,
  layout,
  view,
  unit,
  onMove,
  onHold,
  onDrag,
  onDrop,
  onRelease,
}: LozengeProps) => {
  const [near, setNear] = useState(false);
  const placed = layout.placed.find(({ piece }) => piece.name === handle.piece);
  if (placed === undefined) return null;
  const point = toScreen(view, add(handle.at, placed.at));
  const at = aside ? add(point, scale(handle.along, 26)) : point;
  const { small, large } = nudges[unit];
  const within = (to: number) => Math.min(limit.max, Math.max(limit.min, to));
  const move = (to: number) => onMove(handle.key, within(to));

  const press = (event: KeyboardEvent) => {
    const way = { ArrowUp: 1, ArrowRight: 1, ArrowDown: -1, ArrowLeft: -1 }[event.key];
    if (way === undefined) return;
    event.preventDefault();
    event.stopPropagation();
    // A depth grows downwards, so the arrow that points down deepens it.
    const upright = Math.abs(handle.along.y) > 0.7 && /Up|Down/.test(event.key);
    const grows = upright && handle.along.y > 0 ? -1 : 1;
    move(value + way * grows * (event.shiftKey ? large : small));
  };
  const grab = (event: PointerEvent<SVGGElement>) => {
    event.stopPropagation();
    const { currentTarget, pointerId, pointerType } = event;
    currentTarget.setPointerCapture(pointerId);
    currentTarget.focus();
    const from = { x: event.clientX, y: event.clientY };
    // Seen from far off a pixel is a long way: then the lozenge follows slower than the hand.
    const most = pointerType === 'touch' ? finest.touch : finest.pointer;
    const perPixel = Math.min(most, Math.max(-most, handle.perMillimetre / view.scale));
    let drawnTo: number | undefined;
    onHold(handle.key);
    whileHeld(currentTarget, {
      move: (to) => {
        const grown = dot(subtract(to, from), handle.along) * perPixel;
        const next = within(Math.round((value + grown) / small) * small);
        if (next !== drawnTo) onDrag(next);
        drawnTo = next;
      },
      drop: () => {
        if (drawnTo !== undefined) onMove(handle.key, drawnTo);
        onDrop();
        onRelease();
      },
    });
  };

  return (
    <g
      role="slider"
      tabIndex={0}
      aria-label={styleLabels[handle.key]}
      aria-valuemin={Math.round(limit.min)}
      aria-valuemax={Math.round(limit.max)}
      aria-valuenow={Math.round(value)}
      aria-valuetext={formatWithUnit(value, unit)}
      data-handle={handle.key}
      transform={`translate(${at.x} ${at.y})`}
      className="pointer-events-auto cursor-grab touch-none outline-none group-data-dragging:opacity-0 focus-visible:[&_.ring]:opacity-100"
      onKeyDown={press}
      onKeyUp={(event) => event.key.startsWith('Arrow') && onRelease()}
      onPointerDown={grab}
      onPointerEnter={() => setNear(true)}
      onPointerLeave={() => setNear(false)}
      onFocus={() => setNear(true)}
      onBlur={() => setNear(false)}
    >
      <circle r={13} className="fill-transparent pointer-coarse:[r:20px]" />
      <path
        d="M0 -13L13 0L0 13L-13 0Z"
        className="ring fill-none stroke-brass opacity-0"
        strokeWidth={2}
      />
      <path
        d="M0 -7L7 0L0 7L-7 0Z"
        strokeWidth={1.5}
        className={`stroke-brass ${near ? 'fill-brass' : 'fill-paper'}`}
      />
      {near && <Flag text={`${styleLabels[handle.key]} ${formatLength(value, unit)}`} />}
    </g>
  );
};

/** The value written beside a lozenge while it matters. */
const Flag = ({ text }: { text: string }) => (
  <foreignObject x={14} y={-12} width={240} height={26} className="pointer-events-none">
    <span className="figures inline-block rounded-one bg-brass px-2 text-sm leading-6 font-semibold text-on-brass">
      {text}
    </span>
  </foreignObject>
);
